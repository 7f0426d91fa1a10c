import { watchTabs } from '../state/tabs.ts';
import { goOffline } from './offline.ts';
import { watchDrops } from './watchDrops.ts';

/** Looks after what goes on around the page: other tabs, files held over it, the network, newer versions. */
export const attend = (): void => {
  watchTabs();
  watchDrops();
  void goOffline();
};
