import { signal } from '@preact/signals';

/** What the bench says to screen readers; `Announcer` holds the one live region. */
export const announced = signal('');

const QUIET = 1000;
let waiting: ReturnType<typeof setTimeout> | undefined;
let next = '';
let saidAt = Number.NEGATIVE_INFINITY;

const say = (): void => {
  waiting = undefined;
  saidAt = performance.now();
  announced.value = next;
};

/** Says a sentence politely, at most once a second: of several in a second the last is said. */
export const announce = (text: string): void => {
  next = text;
  if (waiting !== undefined) return;
  waiting = setTimeout(say, Math.max(0, QUIET - (performance.now() - saidAt)));
};
