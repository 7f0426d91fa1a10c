import { flag, hp, leg, V, Xu, z } from '../../end/given.ts';
import { supportLegWeldForce } from '../../end/weldGroup.ts';
import { least, over, pick, plus, root, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Stress } from '../../units/dimension.ts';
import { notCleat, ofCleat } from '../methods/kinds.ts';
import { leastLeg, legAboveEdge, legBelow } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { phiW } from './factors.ts';
import { Fup, Fus } from './given.ts';

const source = { clause: '13.13.2.2', basis: 'seen' } as const;
const memory = { clause: '13.13.2.2', basis: 'memory' } as const;

/** Least leg by the thicker part, mm. */
export const leastLegSize = leastLeg(
  [
    [12, 5],
    [20, 6],
  ],
  8,
  memory,
);

const supportTold = flag("the support's grade is told", (f) => f.fus > 0);

/** Strength of the parts joined beside the weld, MPa: of the plate, and of the support where it is told. */
const base = step('F_u', pick([[supportTold, least(Fup, Fus)]], Fup), memory, 'parts joined');

/** Strength of one fillet along its length, N/mm: the weaker of the throat and of the leg in the parts joined, θ = 0, M_w = 1. */
export const filletOn = (base: Tree<Stress>): Tree<'-1,1'> =>
  step('v_r', times(0.67, phiW, leg, least(over(Xu, root(2)), base)), source);
export const filletLine = filletOn(base);

/**
 * CSA S16:19 cl. 13.13.2.2: two upright fillets of the plate's depth under V and V z, elastic line; or one fillet along the toe of a cleat's
 * support leg with its share of V at the arm of that leg.
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
      limits: [legBelow(leastLegSize)],
    },
    {
      of: 'support leg',
      symbol: 'q_w',
      load: 'V',
      demand: supportLegWeldForce,
      resistance: filletLine,
      off: [notCleat],
      limits: [legBelow(leastLegSize), legAboveEdge],
    },
  ],
};
