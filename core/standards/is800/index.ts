import { noTieForce } from '../../end/gates.ts';
import { flag, fys, hp, ts } from '../../end/given.ts';
import { all, not, over, step, times } from '../../formula/tree.ts';
import { listedOf } from '../listed.ts';
import { copeBuckling } from '../methods/copeBuckling.ts';
import { elasticStress } from '../methods/elasticStress.ts';
import {
  fitCopeClearance,
  fitCopeDepth,
  fitCopeLengthToCentres,
  fitCopeRadius,
  fitPlateDepth,
  fitRotation,
  fitSetback,
} from '../methods/fitPractice.ts';
import { fitWrench } from '../methods/fitWrench.ts';
import { plateBuckling } from '../methods/plateBuckling.ts';
import { supportShear } from '../methods/supportShear.ts';
import { noRule, type Standard } from '../standard.ts';
import { plateBearing, webBearing } from './bearing.ts';
import { cautious, plateBlock, severalColumns, webBlock } from './block.ts';
import { boltShear } from './bolts.ts';
import { copeBending } from './copeBending.ts';
import { copeShear } from './copeShear.ts';
import { E, factors, gm0 } from './factors.ts';
import { fitEdgePlate, fitEdgeWeb, fitEnd, fitGauge, fitPitch } from './fitClauses.ts';
import { fyb, yieldShear } from './given.ts';
import { materials } from './materials.ts';
import { plateNetShear, webNetShear } from './netShear.ts';
import { plateBending, plateGrossShear } from './plate.ts';
import { webTearout } from './tearOut.ts';
import { webTie } from './tie.ts';
import { verified } from './verified.ts';
import { webGrossShear } from './webGrossShear.ts';
import { weld } from './weld.ts';

const { stressFull, stressCope } = elasticStress({ clause: 'elastic', basis: 'practice' });
const shear = { clause: '8.4.1', basis: 'seen' } as const;
const parallel = flag('flanges without a slope', (f) => f.section.slope === undefined);

/** IS 800:2007, general construction in steel, limit-state part. */
export const is800: Standard = {
  ...listedOf('is-800'),
  options: {
    'elastic-shear': ['report', 'verdict'],
    'cope-shear': ['plastic', 'elastic'],
    'web-block': ['cautious', 'standard'],
    'cope-bending': ['elastic', 'plastic'],
    'plate-bending': ['elastic', 'plastic'],
    edges: ['hand', 'machine'],
    weld: ['shop', 'site'],
  },
  factors,
  materials,
  strength: {
    'web-gross-shear': webGrossShear,
    'cope-shear': copeShear,
    'web-net-shear': webNetShear,
    'web-block': webBlock,
    'web-tearout': webTearout,
    'cope-bending': copeBending,
    'cope-buckling': copeBuckling(E, fyb, (stress, Z) => over(times(stress, Z), gm0)),
    'web-bearing': webBearing,
    'web-tie': webTie,
    'stress-full': stressFull,
    'stress-cope': stressCope,
    'bolt-shear': boltShear,
    'plate-bearing': plateBearing,
    'plate-tearout': noRule('plate-bearing'),
    'plate-gross-shear': plateGrossShear,
    'plate-net-shear': plateNetShear,
    'plate-block': plateBlock,
    'plate-bending': plateBending,
    'plate-buckling': plateBuckling((Q, fy, Z) => over(times(Q, fy, Z), gm0)),
    weld,
    'cleat-bearing': noRule(),
    'cleat-tearout': noRule(),
    'cleat-gross-shear': noRule(),
    'cleat-net-shear': noRule(),
    'cleat-block': noRule(),
    'cleat-bending': noRule(),
    'cleat-buckling': noRule(),
    'endplate-bearing': noRule(),
    'endplate-tearout': noRule(),
    'endplate-gross-shear': noRule(),
    'endplate-net-shear': noRule(),
    'endplate-block': noRule(),
    'endplate-web-shear': noRule(),
    'weld-web': noRule(),
    'support-bolt-shear': noRule(),
    'support-bearing': noRule(),
    'support-shear': supportShear(
      shear,
      step('V_d', yieldShear(times(2, hp, ts), fys), shear, 'both sides of the plate'),
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
    'fit-rotation': fitRotation,
    'fit-wrench': fitWrench,
  },
  verified,
  notes: [
    { code: 'parallel-flanges', when: parallel },
    { code: 'half-tension-plane', when: all(severalColumns, cautious) },
    { code: 'tie-in-web-only', when: not(noTieForce.when) },
  ],
};
