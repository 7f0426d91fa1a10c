import { signal } from '@preact/signals';

/** The page has no network; every check still works. */
export const isOffline = signal(false);
/** The page is stored whole, so that it opens without a network. */
export const isStored = signal(false);
/** Lets a newer version in that waits for this page; null while there is none. */
export const newVersion = signal<(() => void) | null>(null);
/** Another tab of this browser has the bench open: what is kept is that of the tab changed last. */
export const otherTab = signal(false);
