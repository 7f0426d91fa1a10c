import { noSupportBolts } from '../../end/gates.ts';
import { d, flag, fys, hp, supportBolts, ts } from '../../end/given.ts';
import { all, over, pick, step, times } from '../../formula/tree.ts';
import { listedOf } from '../listed.ts';
import { copeBuckling } from '../methods/copeBuckling.ts';
import { elasticStress } from '../methods/elasticStress.ts';
import {
  fitCopeClearance,
  fitCopeDepth,
  fitCopeLengthToCentres,
  fitCopeRadius,
  fitPlateDepth,
  fitSetback,
} from '../methods/fitPractice.ts';
import { fitRotationBy } from '../methods/fitRotation.ts';
import { fitWrench } from '../methods/fitWrench.ts';
import { plateBuckling } from '../methods/plateBuckling.ts';
import { supportShear } from '../methods/supportShear.ts';
import { noRule, type Standard } from '../standard.ts';
import { cleatBearing, plateBearing, webBearing } from './bearing.ts';
import { cautious, cleatBlock, endPlateBlock, plateBlock, severalColumns, webBlock } from './block.ts';
import { boltShear, supportBoltShear } from './bolts.ts';
import { cleatBending, cleatGrossShear } from './cleat.ts';
import { copeBending } from './copeBending.ts';
import { copeShear } from './copeShear.ts';
import { endPlateGrossShear, endPlateWebShear } from './endPlate.ts';
import { E, factors, gm0 } from './factors.ts';
import { fitEdgePlate, fitEdgeWeb, fitEnd, fitGauge, fitPitch } from './fitClauses.ts';
import { fyb, yieldShear } from './given.ts';
import { materials } from './materials.ts';
import { cleatNetShear, endPlateNetShear, plateNetShear, webNetShear } from './netShear.ts';
import { plateBending, plateGrossShear } from './plate.ts';
import { supportBearing } from './supportBearing.ts';
import { webTearout } from './tearOut.ts';
import { webTie } from './tie.ts';
import { verified } from './verified.ts';
import { webGrossShear } from './webGrossShear.ts';
import { weld } from './weld.ts';
import { weldWeb } from './weldWeb.ts';

const { stressFull, stressCope } = elasticStress({ clause: 'elastic', basis: 'practice' });
const shear = { clause: '8.4.1', basis: 'seen' } as const;
const parallel = flag('flanges without a slope', (f) => f.section.slope === undefined);

const tied = flag('a tie force at bolts through the web', (f) => f.T > 0 && f.n > 0);
const gripInDoubt = flag('thickness of the support not told', (f) => f.supportBolts.n > 0 && f.ts === 0);

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
    'cleat-bearing': cleatBearing,
    'cleat-tearout': noRule('cleat-bearing'),
    'cleat-gross-shear': cleatGrossShear,
    'cleat-net-shear': cleatNetShear,
    'cleat-block': cleatBlock,
    'cleat-bending': cleatBending,
    'cleat-buckling': noRule(),
    'endplate-bearing': noRule('support-bearing'),
    'endplate-tearout': noRule('support-bearing'),
    'endplate-gross-shear': endPlateGrossShear,
    'endplate-net-shear': endPlateNetShear,
    'endplate-block': endPlateBlock,
    'endplate-web-shear': endPlateWebShear,
    'weld-web': weldWeb,
    'support-bolt-shear': supportBoltShear,
    'support-bearing': supportBearing,
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
    'fit-rotation': fitRotationBy(pick([[noSupportBolts.when, d]], supportBolts.d)),
    'fit-wrench': fitWrench,
  },
  verified,
  notes: [
    { code: 'parallel-flanges', when: parallel },
    { code: 'half-tension-plane', when: all(severalColumns, cautious) },
    { code: 'support-grip', when: gripInDoubt },
    { code: 'tie-in-web-only', when: tied },
  ],
};
