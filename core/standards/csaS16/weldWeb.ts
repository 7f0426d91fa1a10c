import { fullDepthPlate } from '../../end/gates.ts';
import { k, tw, V } from '../../end/given.ts';
import { legWeldForce } from '../../end/weldGroup.ts';
import { least, step, times } from '../../formula/tree.ts';
import { notCleat, ofCleat } from '../methods/kinds.ts';
import { legAboveEdge, legBelow } from '../methods/leastLeg.ts';
import { webWeldLength } from '../methods/webWeldLength.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { Fu, Fup, Fy } from './given.ts';
import { filletOn, leastLegSize } from './weld.ts';

const source = { clause: '13.13.2.2', basis: 'seen' } as const;
const memory = { clause: '13.13.2.2', basis: 'memory' } as const;
const shear = { clause: '13.4 mean', basis: 'memory' } as const;

/** One fillet between the web and what is welded to it, N/mm. */
const filletLine = filletOn(step('F_u', least(Fup, Fu), memory, 'parts joined'));

/** The web beside a weld, N/mm: shear yielding. */
const webLine = step('v_w', times(0.66, phi, Fy, tw), shear);

/**
 * Welds along the web, CSA S16:19 cl. 13.13.2.2: the two fillets of an end plate under V; the C-shaped weld of each cleat's
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
      limits: [legBelow(leastLegSize), fullDepthPlate],
    },
    {
      of: 'web leg',
      symbol: 'q_w',
      load: 'V',
      demand: legWeldForce,
      resistance: filletLine,
      off: [notCleat],
      limits: [legBelow(leastLegSize), legAboveEdge],
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
