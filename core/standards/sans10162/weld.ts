import { hp, leg, V, Xu, z } from '../../end/given.ts';
import { supportLegWeldForce } from '../../end/weldGroup.ts';
import { over, plus, root, squared, step, times } from '../../formula/tree.ts';
import { notCleat, ofCleat } from '../methods/kinds.ts';
import { leastLeg, legAboveEdge, legBelow } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { phiW } from './factors.ts';

const source = { clause: '13.13.2.2', basis: 'memory' } as const;
/** Least leg by the thicker part, mm. */
export const least = leastLeg(
  [
    [12, 5],
    [20, 6],
  ],
  8,
  source,
);

/** Strength of one fillet along its length, N/mm: weld metal, no gain for the angle of the force. */
export const filletLine = step('v_r', over(times(0.67, phiW, Xu, leg), root(2)), source);

/**
 * SANS 10162-1:2011 cl. 13.13.2.2 with θ = 0: two upright fillets of the plate's depth under V and V z, elastic line; or one fillet along the
 * toe of a cleat's support leg with its share of V at the arm of that leg.
 */
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
      off: [ofCleat],
      limits: [legBelow(least)],
    },
    {
      of: 'support leg',
      symbol: 'q_w',
      load: 'V',
      demand: supportLegWeldForce,
      resistance: filletLine,
      off: [notCleat],
      limits: [legBelow(least), legAboveEdge],
    },
  ],
};
