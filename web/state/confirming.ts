import { signal } from '@preact/signals';
import { assumedValues } from './assumedValues.ts';
import { confirm } from './edits.ts';

/** People are asked to confirm what the bench put in. */
export const confirmShown = signal(false);

let waiting: () => void = () => undefined;

/** Does something at once, or, where values stand that the bench put in and nobody has touched, once these are confirmed. */
export const onceConfirmed = (act: () => void): void => {
  if (assumedValues().length === 0) {
    act();
    return;
  }
  waiting = act;
  confirmShown.value = true;
};

/** Takes over all that the bench put in, and does what waited for it. */
export const confirmAll = (): void => {
  confirm(assumedValues().map(({ path }) => path));
  waiting();
};
