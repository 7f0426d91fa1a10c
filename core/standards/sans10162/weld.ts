import { hp, leg, tp, ts, V, Xu, z } from '../../end/given.ts';
import { atMost, below, constant, most, over, pick, plus, root, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { phiW } from './factors.ts';

const source = { clause: '13.13.2.2', basis: 'memory' } as const;
const mm = (length: number) => constant('s_min', length, '1,0');

/** Thicker of the parts joined, as far as the support's is told. */
const thicker = step('t', most(tp, ts), source);

/** Least leg by the thicker part, mm. */
export const leastLeg = step(
  's_min',
  pick(
    [
      [atMost(thicker, constant('12 mm', 12, '1,0')), mm(5)],
      [atMost(thicker, constant('20 mm', 20, '1,0')), mm(6)],
    ],
    mm(8),
  ),
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
      limits: [{ when: below(leg, leastLeg), reason: 'weld-leg-below-least', always: false }],
    },
  ],
};
