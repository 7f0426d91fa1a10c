import { type Condition, least, pick, type Tree } from '../../formula/tree.ts';
import type { Dimension } from '../../units/dimension.ts';

/** The least of terms of which some are there only under a condition; a working shows those that are. */
export const leastOf = <D extends Dimension>(
  always: readonly [Tree<D>, ...Tree<D>[]],
  optional: readonly (readonly [Condition, Tree<D>])[],
): Tree<D> => {
  const [next, ...rest] = optional;
  if (next) {
    const [here, term] = next;
    return pick([[here, leastOf([...always, term] as never, rest)]], leastOf(always, rest) as never) as Tree<D>;
  }
  const [first, ...others] = always;
  return others.length > 0 ? (least(first, ...(others as never[])) as Tree<D>) : first;
};
