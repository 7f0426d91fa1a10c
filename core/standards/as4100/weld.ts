import { hp, leg, V, z } from '../../end/given.ts';
import { atMost, constant, minus, over, pick, plus, root, squared, step, times } from '../../formula/tree.ts';
import { leastLeg, legBelow } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { phiW } from './factors.ts';
import { fuw } from './given.ts';

const source = { clause: '9.6.3.10', basis: 'seen' } as const;
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

const least = leastLeg(
  [
    [7, 3],
    [10, 4],
    [15, 5],
  ],
  6,
  { clause: '9.6.3', basis: 'seen' },
);

const throat = step('t_t', over(leg, root(2)), source);
/** Long welds, l_w = h_p. */
const kr = step(
  'k_r',
  pick(
    [
      [atMost(hp, mm(1700)), constant('1', 1)],
      [atMost(hp, mm(8000)), minus(1.1, times(0.06, over(hp, mm(1000))))],
    ],
    constant('0.62', 0.62),
  ),
  source,
);

/** Two upright fillets of the plate's depth under V and V z, elastic line, AS 4100:2020 cl. 9.6.3.10. */
export const weld: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'v*',
      load: 'V',
      demand: step(
        'v*',
        root(plus(squared(over(V, times(2, hp))), squared(over(times(6, V, z), times(2, squared(hp)))))),
        source,
        'elastic line: shear, and bending at its ends',
      ),
      resistance: step('φv_w', times(phiW, 0.6, fuw, throat, kr), source),
      limits: [legBelow(least)],
    },
  ],
};
