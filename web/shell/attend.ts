import { watchTabs } from '../state/tabs.ts';
import { goOffline } from './offline.ts';

/** Looks after what goes on around the page: other tabs, the network, newer versions. */
export const attend = (): void => {
  watchTabs();
  void goOffline();
};
