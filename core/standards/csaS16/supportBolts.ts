import { fullDepthPlate } from '../../end/gates.ts';
import { flag, supportBolts, tp, ts } from '../../end/given.ts';
import { oneLine, supportForce, supportUpright } from '../../end/supportGroup.ts';
import { minus, pick, step, times } from '../../formula/tree.ts';
import { supportBearing as ofSupport, oneSupportBolt } from '../methods/supportBearing.ts';
import type { StrengthRule } from '../standard.ts';
import { bearingAt, inOnePlane } from './bolts.ts';
import { Fubs, Fup, Fus } from './given.ts';

const shear = { clause: '13.12.1.2 c', basis: 'seen' } as const;
const bearing = { clause: '13.12.1.2 a', basis: 'seen' } as const;

const { d, n, p } = supportBolts;
const threadsIn = flag('threads in the shear plane', (f) => f.supportBolts.threadsIn);
const balanced = step('R_s', supportUpright, shear, 'shared evenly: the eccentricities of the two sides balance');

/** Bolts into the support in one plane, CSA S16:19 cl. 13.12.1.2 c): V shared by two lines; one line, of one cleat, holds it at its arm. */
export const supportBoltShear: StrengthRule = {
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'R_s',
      load: 'V',
      demand: pick([[oneLine, supportForce]], balanced),
      resistance: inOnePlane({ d, Fub: Fubs, threadsIn })(times(minus(n, 1), p)),
      unbounded: oneSupportBolt,
      limits: [fullDepthPlate],
    },
  ],
};

/** Bearing at the bolts into the support, cl. 13.12.1.2 a). */
export const supportBearing: StrengthRule = ofSupport(bearing, bearingAt(tp, d, Fup), bearingAt(ts, d, Fus));
