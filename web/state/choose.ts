import { entry, lastGood } from './bench.ts';
import { changedBy } from './changedBy.ts';
import { make } from './edits.ts';
import { withProposals, withText } from './entry.ts';
import { proposalsFor } from './proposals.ts';

/**
 * Chooses a value from a list, as one step; `also` holds what goes with it, by path. Parts that are switched on get proposed values, marked as
 * assumed. With another standard goes what only the old one could mean.
 */
export const choose = (path: string, value: string, also: Readonly<Record<string, string>> = {}): void => {
  const after = Object.entries({ ...changedBy(entry.value, path, value), ...also, [path]: value }).reduce(
    (it, [one, text]) => withText(it, one, text),
    entry.value,
  );
  make(withProposals(after, proposalsFor({ entry: after, last: lastGood.value }, path, value)), path, false);
};
