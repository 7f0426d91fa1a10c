import { fullDepthPlate } from '../../end/gates.ts';
import { fu, fup, fy, k, tw, V } from '../../end/given.ts';
import { legWeldForce } from '../../end/weldGroup.ts';
import { most, over, root, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { gammaM0 } from './factors.ts';
import { notCleat, notEndPlate } from './kinds.ts';
import { leastOf } from './optional.ts';
import { guide, memory, seen } from './sources.ts';
import { betaOf, filletStrength, fullWebLength, metal, weldLimits } from './weld.ts';

const source = seen('1-8 4.5.3.3');
const elastic = { clause: 'elastic weld group', basis: 'practice' } as const;
const yielding = memory('1-1 6.2.6');

/** The weaker of web and plate, and of the weld metal where it is told; the larger factor of the two. */
export const webWeldStrength = filletStrength(
  step('f_uw', leastOf([fup, fu], [metal]), source),
  step('β_w', most(step('β_1', betaOf(fup), source), step('β_2', betaOf(fu), source)), source),
);

/**
 * Fillets along the beam's web: two of an end plate, 1.27 for the bending that goes with V; or the C-shaped weld of a cleat's leg, taken as
 * full size to the ends of its returns, and the web behind it, on which both cleats of a pair pull.
 */
export const weldWeb: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'v',
      load: 'V',
      demand: step('v', over(times(1.27, V), times(2, fullWebLength)), guide, '1.27 stands for bending'),
      resistance: webWeldStrength,
      off: [notEndPlate],
      limits: [...weldLimits, fullDepthPlate],
    },
    {
      of: 'weld',
      symbol: 'q_w',
      load: 'V',
      demand: legWeldForce,
      resistance: webWeldStrength,
      off: [notCleat],
      limits: weldLimits,
    },
    {
      of: 'web',
      symbol: 'k q_w',
      load: 'V',
      demand: step('q', times(k, legWeldForce), elastic, 'of the cleats on both sides'),
      resistance: step('q_Rd', over(times(fy, tw), times(root(3), gammaM0)), yielding),
      off: [notCleat],
      source: yielding,
    },
  ],
};
