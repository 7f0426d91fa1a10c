import { signal } from '@preact/signals';

/** A file is held over the bench. */
export const fileOver = signal(false);
