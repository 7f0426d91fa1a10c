import { hp, leg, V, Xu, z } from '../../end/given.ts';
import { over, plus, root, squared, step, times } from '../../formula/tree.ts';
import { leastLeg, legBelow } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { phiW } from './factors.ts';

const source = { clause: '13.13.2.2', basis: 'memory' } as const;
/** Least leg by the thicker part, mm. */
const least = leastLeg(
  [
    [12, 5],
    [20, 6],
  ],
  8,
  source,
);

/** Strength of one fillet along its length, N/mm: weld metal, no gain for the angle of the force. */
export const filletLine = step('v_r', over(times(0.67, phiW, Xu, leg), root(2)), source);

/** Two upright fillets of the plate's depth under V and V z, elastic line, SANS 10162-1:2011 cl. 13.13.2.2 with θ = 0. */
export const weld: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'v',
      load: 'V',
      demand: step(
        'v',
        root(plus(squared(over(V, times(2, hp))), squared(over(times(6, V, z), times(2, squared(hp)))))),
        source,
        'elastic line: shear, and bending at its ends',
      ),
      resistance: filletLine,
      limits: [legBelow(least)],
    },
  ],
};
