import { fullDepthPlate } from '../../end/gates.ts';
import { flag, fup, fus, supportBolts, tp, ts } from '../../end/given.ts';
import { oneLine, supportForce, supportUpright } from '../../end/supportGroup.ts';
import { pick, step } from '../../formula/tree.ts';
import { supportBearing as ofSupport, oneSupportBolt } from '../methods/supportBearing.ts';
import type { StrengthRule } from '../standard.ts';
import { bearingAt, inOnePlane } from './bolts.ts';

const shear = { clause: '13.12', basis: 'memory' } as const;
const bearing = { clause: '13.10', basis: 'memory' } as const;

const threadsIn = flag('threads in the shear plane', (f) => f.supportBolts.threadsIn);
const balanced = step('R_s', supportUpright, shear, 'shared evenly: the eccentricities of the two sides balance');

/** Bolts into the support in one plane, SANS 10162-1:2011 cl. 13.12: V shared by two lines; one line, of one cleat, holds it at its arm. */
export const supportBoltShear: StrengthRule = {
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'R_s',
      load: 'V',
      demand: pick([[oneLine, supportForce]], balanced),
      resistance: inOnePlane({ ...supportBolts, threadsIn }),
      unbounded: oneSupportBolt,
      limits: [fullDepthPlate],
    },
  ],
};

/** Bearing at the bolts into the support, cl. 13.10. */
export const supportBearing: StrengthRule = ofSupport(
  bearing,
  bearingAt(tp, supportBolts.d, fup),
  bearingAt(ts, supportBolts.d, fus),
);
