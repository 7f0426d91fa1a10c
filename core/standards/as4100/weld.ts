import { flag, hp, leg, V, z } from '../../end/given.ts';
import { supportLegWeldForce } from '../../end/weldGroup.ts';
import {
  atMost,
  constant,
  minus,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { leastLeg, legAboveEdge, legBelow } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { phiW } from './factors.ts';
import { fuw } from './given.ts';

export const source = { clause: '9.6.3.10', basis: 'seen' } as const;
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

/** Refers where the weld would hold but its leg is below the least for the thicker part. */
export const belowLeast = legBelow(
  leastLeg(
    [
      [7, 3],
      [10, 4],
      [15, 5],
    ],
    6,
    { clause: '9.6.3', basis: 'seen' },
  ),
);

const throat = step('t_t', over(leg, root(2)), source);

/** One fillet, N/mm; less where the weld is longer than 1.7 m. */
export const filletStrength = (length: Tree<Length>) => {
  const kr = step(
    'k_r',
    pick(
      [
        [atMost(length, mm(1700)), constant('1', 1)],
        [atMost(length, mm(8000)), minus(1.1, times(0.06, over(length, mm(1000))))],
      ],
      constant('0.62', 0.62),
    ),
    source,
  );
  return step('φv_w', times(phiW, 0.6, fuw, throat, kr), source);
};

const cleatLeg = flag('', (f) => f.legSupport > 0, "a cleat's leg");
const alongPlate = root(plus(squared(over(V, times(2, hp))), squared(over(times(6, V, z), times(2, squared(hp))))));

/**
 * Weld to the support, elastic line of the depth, AS 4100:2020 cl. 9.6.3.10: two upright fillets of a plate under V and V z, or one along the
 * toe of each cleat's leg under its share of V at the arm of that leg.
 */
export const weld: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'v*',
      load: 'V',
      demand: step(
        'v*',
        pick([[cleatLeg, supportLegWeldForce]], alongPlate),
        source,
        'elastic line: shear, and bending at its ends',
      ),
      resistance: filletStrength(hp),
      limits: [belowLeast, legAboveEdge],
    },
  ],
};
