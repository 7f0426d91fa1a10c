import { announced } from '../state/announce.ts';

/** The one live region in which the bench speaks to screen readers. */
export const Announcer = () => (
  <p class="unseen" role="status">
    {announced.value}
  </p>
);
