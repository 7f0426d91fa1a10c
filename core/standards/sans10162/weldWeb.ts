import { fullDepthPlate } from '../../end/gates.ts';
import { fy, k, tw, V } from '../../end/given.ts';
import { legWeldForce } from '../../end/weldGroup.ts';
import { step, times } from '../../formula/tree.ts';
import { notCleat, ofCleat } from '../methods/kinds.ts';
import { legAboveEdge, legBelow } from '../methods/leastLeg.ts';
import { webWeldLength } from '../methods/webWeldLength.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { filletLine, least } from './weld.ts';

const source = { clause: '13.13.2.2', basis: 'memory' } as const;
const shear = { clause: '13.11', basis: 'memory' } as const;

/** The web beside a weld, N/mm: shear yielding. */
const webLine = step('v_w', times(0.6, phi, fy, tw), shear);

/**
 * Welds along the web, SANS 10162-1:2011 cl. 13.13.2.2 with θ = 0: the two fillets of an end plate under V; the C-shaped weld of each cleat's
 * web leg under its share of V at its arm, and the web behind it, on which a pair of cleats pulls together.
 */
export const weldWeb: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(2, filletLine, webWeldLength), source, 'two fillets'),
      off: [ofCleat],
      limits: [legBelow(least), fullDepthPlate],
    },
    {
      of: 'web leg',
      symbol: 'q_w',
      load: 'V',
      demand: legWeldForce,
      resistance: filletLine,
      off: [notCleat],
      limits: [legBelow(least), legAboveEdge],
    },
    {
      of: 'web',
      symbol: 'k q_w',
      load: 'V',
      demand: step('k q_w', times(k, legWeldForce)),
      resistance: webLine,
      off: [notCleat],
      source: shear,
    },
  ],
};

/** The web beside an end plate's welds. */
export const endPlateWebShear: StrengthRule = {
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(webLine, webWeldLength), shear),
      limits: [fullDepthPlate],
    },
  ],
};
