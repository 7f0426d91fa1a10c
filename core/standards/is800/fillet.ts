import type { Limit } from '../../end/gates.ts';
import { leg } from '../../end/given.ts';
import { atMost, below, constant, minus, over, pick, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Stress } from '../../units/dimension.ts';
import { leastLeg, legAboveEdge, legBelow } from '../methods/leastLeg.ts';
import { gmw } from './factors.ts';

export const source = { clause: '10.5', basis: 'seen' } as const;

const throat = step('t_t', times(0.7, leg), source);

/** Length that counts of a fillet welded over this length, mm. */
export const countedOf = (overall: Tree<Length>): Tree<Length> =>
  step('L', minus(overall, times(2, leg)), source, 'without a leg at each end');

/** One fillet of this counted length, N/mm, IS 800:2007 cl. 10.5: `mild` is the weaker of weld metal and parts joined. */
export const filletStrength = (length: Tree<Length>, mild: Tree<Stress>) => {
  const long = step(
    'β_lw',
    pick(
      [[atMost(length, times(150, throat)), constant('1', 1)]],
      minus(1.2, over(times(0.2, length), times(150, throat))),
    ),
    source,
  );
  return step('q_d', over(times(throat, mild, long), times(root(3), gmw)), source);
};

const mm = (size: number) => constant(`${size} mm`, size, '1,0');
const sizeLimits: readonly Limit[] = [
  legBelow(
    leastLeg(
      [
        [10, 3],
        [20, 5],
        [32, 6],
      ],
      8,
      source,
    ),
  ),
  { when: below(throat, mm(3)), reason: 'thin-throat', always: false },
  legAboveEdge,
];

/** A weld too short, or a leg below the least for the thicker part, or above what the edge of a cleat has room for. */
export const limitsOf = (length: Tree<Length>): readonly Limit[] => [
  { when: atMost(length, mm(0)), reason: 'short-weld', always: true, noNumber: true },
  { when: below(length, times(4, leg)), reason: 'short-weld', always: true },
  ...sizeLimits,
];
