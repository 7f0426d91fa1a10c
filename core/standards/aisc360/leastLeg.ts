import { atMost, pick, step, type Tree } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { clause } from './clauses.ts';
import { inches } from './given.ts';

/** Least leg of a fillet by the thinner part joined, Table J2.4, mm. */
export const leastLeg = (t: Tree<Length>): Tree<Length> =>
  step(
    's_min',
    pick(
      [
        [atMost(t, inches('1/4', 1 / 4)), inches('1/8', 1 / 8)],
        [atMost(t, inches('1/2', 1 / 2)), inches('3/16', 3 / 16)],
        [atMost(t, inches('3/4', 3 / 4)), inches('1/4', 1 / 4)],
      ],
      inches('5/16', 5 / 16),
    ),
    clause('Table J2.4'),
  );
