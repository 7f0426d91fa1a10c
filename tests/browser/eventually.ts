import { expect } from 'vitest';

/** Waits until what is read from the page is as expected; the page writes a moment after the key. */
export const eventually = <T>(read: () => Promise<T> | T) => expect.poll(read, { timeout: 15_000, interval: 20 });
