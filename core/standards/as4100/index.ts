import { noSupportBolts } from '../../end/gates.ts';
import { d, flag, fys, hp, supportBolts, ts } from '../../end/given.ts';
import { constant, least, pick, step, times } from '../../formula/tree.ts';
import { listedOf } from '../listed.ts';
import { copeBuckling } from '../methods/copeBuckling.ts';
import { elasticStress } from '../methods/elasticStress.ts';
import {
  fitCopeClearance,
  fitCopeDepth,
  fitCopeLengthToCentres,
  fitPlateDepth,
  fitSetback,
} from '../methods/fitPractice.ts';
import { fitRotationBy } from '../methods/fitRotation.ts';
import { fitWrench } from '../methods/fitWrench.ts';
import { plateBuckling } from '../methods/plateBuckling.ts';
import { supportShear } from '../methods/supportShear.ts';
import { noRule, type Standard } from '../standard.ts';
import { cleatBearing, plateBearing, webBearing, webTearout } from './bearing.ts';
import { cleatBlock, endPlateBlock, plateBlock, webBlock } from './block.ts';
import { boltShear, supportBoltShear } from './bolts.ts';
import { cleatBending, cleatGrossShear } from './cleat.ts';
import { copeBending } from './copeBending.ts';
import { copeShear } from './copeShear.ts';
import { endPlateGrossShear, endPlateWebShear } from './endPlate.ts';
import { E, factors, phi } from './factors.ts';
import { fitCopeRadius, fitEdgePlate, fitEdgeWeb, fitEnd, fitGauge, fitPitch } from './fitClauses.ts';
import { fyb } from './given.ts';
import { materials } from './materials.ts';
import { plateBending, plateGrossShear } from './plate.ts';
import { supportBearing } from './supportBearing.ts';
import { webTie } from './tie.ts';
import { verified } from './verified.ts';
import { fullShear, webGrossShear } from './webGrossShear.ts';
import { weld } from './weld.ts';
import { weldWeb } from './weldWeb.ts';

const { stressFull, stressCope } = elasticStress({ clause: 'elastic', basis: 'practice' });
const shear = { clause: '5.11.3', basis: 'seen' } as const;
const structuralWeld = flag('welds of category SP', (f) => f.weldTo !== 'none' && f.options.weld === 'SP');
const always = flag('every end', () => true);
const tied = flag('a tie force at bolts through the web', (f) => f.T > 0 && f.n > 0);

/** AS 4100:2020, steel structures. Coped ends after ASI Design Guide Handbook 1 (Hogan 2007), as the standard has no clause for them. */
export const as4100: Standard = {
  ...listedOf('as-4100'),
  options: {
    'elastic-shear': ['report', 'verdict'],
    'web-block': ['non-uniform', 'uniform'],
    'plate-block': ['uniform', 'non-uniform'],
    edges: ['hand', 'machine'],
    weld: ['SP', 'GP'],
  },
  factors,
  materials,
  leastReaction: step('V_min', least(times(0.15, fullShear), constant('40 kN', 40_000, '0,1')), {
    clause: '9.1.4',
    basis: 'seen',
  }),
  strength: {
    'web-gross-shear': webGrossShear,
    'cope-shear': copeShear,
    'web-net-shear': noRule(),
    'web-block': webBlock,
    'web-tearout': webTearout,
    'cope-bending': copeBending,
    'cope-buckling': copeBuckling(E, fyb, (stress, Z) => times(phi, stress, Z)),
    'web-bearing': webBearing,
    'web-tie': webTie,
    'stress-full': stressFull,
    'stress-cope': stressCope,
    'bolt-shear': boltShear,
    'plate-bearing': plateBearing,
    'plate-tearout': noRule('plate-bearing'),
    'plate-gross-shear': plateGrossShear,
    'plate-net-shear': noRule(),
    'plate-block': plateBlock,
    'plate-bending': plateBending,
    'plate-buckling': plateBuckling((Q, fy, Z) => times(phi, Q, fy, Z)),
    weld,
    'cleat-bearing': cleatBearing,
    'cleat-tearout': noRule('cleat-bearing'),
    'cleat-gross-shear': cleatGrossShear,
    'cleat-net-shear': noRule(),
    'cleat-block': cleatBlock,
    'cleat-bending': cleatBending,
    'cleat-buckling': noRule(),
    'endplate-bearing': noRule('support-bearing'),
    'endplate-tearout': noRule('support-bearing'),
    'endplate-gross-shear': endPlateGrossShear,
    'endplate-net-shear': noRule(),
    'endplate-block': endPlateBlock,
    'endplate-web-shear': endPlateWebShear,
    'weld-web': weldWeb,
    'support-bolt-shear': supportBoltShear,
    'support-bearing': supportBearing,
    'support-shear': supportShear(
      shear,
      step('φV_c', times(2, 0.5, phi, fys, ts, hp), shear, 'both sides of the plate'),
    ),
  },
  fit: {
    'fit-pitch': fitPitch,
    'fit-gauge': fitGauge,
    'fit-edge-web': fitEdgeWeb,
    'fit-edge-plate': fitEdgePlate,
    'fit-end': fitEnd,
    'fit-plate-depth': fitPlateDepth,
    'fit-cope-length': fitCopeLengthToCentres,
    'fit-cope-depth': fitCopeDepth,
    'fit-cope-radius': fitCopeRadius,
    'fit-cope-clearance': fitCopeClearance,
    'fit-setback': fitSetback,
    'fit-rotation': fitRotationBy(pick([[noSupportBolts.when, d]], supportBolts.d)),
    'fit-wrench': fitWrench,
  },
  verified,
  notes: [
    { code: 'least-action', when: always },
    { code: 'weld-category', when: structuralWeld },
    { code: 'tie-in-web-only', when: tied },
  ],
};
