import { flag } from '../../end/given.ts';
import { all, times } from '../../formula/tree.ts';
import { listedOf } from '../listed.ts';
import { copeBuckling } from '../methods/copeBuckling.ts';
import {
  fitCopeClearance,
  fitCopeDepth,
  fitCopeLength,
  fitCopeRadius,
  fitPlateDepth,
  fitSetback,
} from '../methods/fitPractice.ts';
import { fitRotation } from '../methods/fitRotation.ts';
import { fitWrench } from '../methods/fitWrench.ts';
import { plateBuckling } from '../methods/plateBuckling.ts';
import { noRule, type Standard } from '../standard.ts';
import { cleatBlock, endPlateBlock, plateBlock, webBlock } from './block.ts';
import { boltShear, cleatBearing, plateBearing, webBearing } from './bolts.ts';
import { cleatBending, cleatBuckling } from './cleat.ts';
import { copeBending } from './copeBending.ts';
import { copeShear } from './copeShear.ts';
import { stressCope, stressFull } from './elasticStress.ts';
import { E, phi, phiB, phiBr, phiU, phiW } from './factors.ts';
import { fitEdgePlate, fitEdgeWeb, fitEnd, fitGauge, fitPitch } from './fitClauses.ts';
import { Fy, Fyp } from './given.ts';
import { materials } from './materials.ts';
import { cleatNetShear, endPlateNetShear, plateNetShear, webNetShear } from './netShear.ts';
import { cleatGrossShear, endPlateGrossShear, plateBending, plateGrossShear, supportShear } from './plate.ts';
import { supportBearing, supportBoltShear } from './supportBolts.ts';
import { cleatTearout, endPlateTearout, plateTearout, webTearout } from './tearOut.ts';
import { webTie } from './tie.ts';
import { verified } from './verified.ts';
import { webGrossShear } from './webGrossShear.ts';
import { weld } from './weld.ts';
import { endPlateWebShear, weldWeb } from './weldWeb.ts';

const twoColumns = flag('two bolt columns', (f) => f.m === 2);
const threeColumns = flag('three bolt columns or more', (f) => f.m > 2);
const finPlate = flag('a fin plate', (f) => f.kind === 'fin-plate');
const slimWeld = flag('a weld leg below 0.625 t_p', (f) => f.leg < 0.625 * f.tp);

/** CSA S16:19, design of steel structures, limit states. */
export const csaS16: Standard = {
  ...listedOf('csa-s16'),
  options: {
    'elastic-shear': ['report', 'verdict'],
    'bolt-group': ['elastic', 'instantaneous-centre'],
    'cope-shear': ['elastic', 'mean'],
    'web-net-shear': ['unified', 'net'],
    'plate-edges': ['sheared', 'cut'],
  },
  factors: [phi, phiU, phiB, phiBr, phiW],
  materials,
  strength: {
    'web-gross-shear': webGrossShear,
    'cope-shear': copeShear,
    'web-net-shear': webNetShear,
    'web-block': webBlock,
    'web-tearout': webTearout,
    'cope-bending': copeBending,
    'cope-buckling': copeBuckling(E, Fy, (stress, W) => times(phi, stress, W)),
    'web-bearing': webBearing,
    'web-tie': webTie,
    'stress-full': stressFull,
    'stress-cope': stressCope,
    'bolt-shear': boltShear,
    'plate-bearing': plateBearing,
    'plate-tearout': plateTearout,
    'plate-gross-shear': plateGrossShear,
    'plate-net-shear': plateNetShear,
    'plate-block': plateBlock,
    'plate-bending': plateBending,
    'plate-buckling': plateBuckling((Q, fy, W) => times(phi, Q, fy, W), Fyp),
    weld,
    'cleat-bearing': cleatBearing,
    'cleat-tearout': cleatTearout,
    'cleat-gross-shear': cleatGrossShear,
    'cleat-net-shear': cleatNetShear,
    'cleat-block': cleatBlock,
    'cleat-bending': cleatBending,
    'cleat-buckling': cleatBuckling,
    'endplate-bearing': noRule('support-bearing'),
    'endplate-tearout': endPlateTearout,
    'endplate-gross-shear': endPlateGrossShear,
    'endplate-net-shear': endPlateNetShear,
    'endplate-block': endPlateBlock,
    'endplate-web-shear': endPlateWebShear,
    'weld-web': weldWeb,
    'support-bolt-shear': supportBoltShear,
    'support-bearing': supportBearing,
    'support-shear': supportShear,
  },
  fit: {
    'fit-pitch': fitPitch,
    'fit-gauge': fitGauge,
    'fit-edge-web': fitEdgeWeb,
    'fit-edge-plate': fitEdgePlate,
    'fit-end': fitEnd,
    'fit-plate-depth': fitPlateDepth,
    'fit-cope-length': fitCopeLength,
    'fit-cope-depth': fitCopeDepth,
    'fit-cope-radius': fitCopeRadius,
    'fit-cope-clearance': fitCopeClearance,
    'fit-setback': fitSetback,
    'fit-rotation': fitRotation,
    'fit-wrench': fitWrench,
  },
  verified,
  notes: [
    { code: 'two-columns-ut', when: twoColumns },
    { code: 'three-columns-ut', when: threeColumns },
    { code: 'weld-slimmer-than-plate', when: all(finPlate, slimWeld) },
  ],
};
