import { goTo } from '../order/goTo.ts';
import { entry } from '../state/bench.ts';
import { replace } from '../state/edits.ts';
import { emptyEntry, textOf } from '../state/entry.ts';
import { tell } from '../state/notice.ts';

/** Clears the bench for a new end under the same standard and units, as one step that can be undone, and goes to the first field. */
export const beginEmpty = (): void => {
  const { units } = entry.value;
  replace(emptyEntry(textOf(entry.value, 'standard') || 'sans-10162-1', units), 'New end');
  tell('A new end. Undo brings back what was there.');
  goTo('beam.section');
};
