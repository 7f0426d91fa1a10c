import { flag } from '../../end/given.ts';
import { all, not } from '../../formula/tree.ts';
import { listedOf } from '../listed.ts';
import { elasticStress } from '../methods/elasticStress.ts';
import { fitWrench } from '../methods/fitWrench.ts';
import { noRule, type Standard } from '../standard.ts';
import { plateBlock, webBlock } from './block.ts';
import { boltShear, plateBearing, webBearing, webTearout } from './bolts.ts';
import { cleatBending } from './cleatBending.ts';
import { conventional, extended } from './conventional.ts';
import { copeBending } from './copeBending.ts';
import { copeBuckling, toTop } from './copeBuckling.ts';
import { fitEdgePlate, fitEdgeWeb, fitEnd, fitGauge, fitPitch } from './fitBolts.ts';
import { fitCopeClearance, fitCopeDepth, fitCopeLength, fitCopeRadius, twoCopes } from './fitCope.ts';
import { fitPlateDepth, fitSetback } from './fitPlate.ts';
import { fitRotation } from './fitRotation.ts';
import { cleatBearing, endplateBearing } from './fittingBearing.ts';
import {
  cleatBlock,
  cleatGrossShear,
  cleatNetShear,
  endplateBlock,
  endplateGrossShear,
  endplateNetShear,
} from './fittingShear.ts';
import { jointNotes } from './jointNotes.ts';
import { materials } from './materials.ts';
import { asd, lrfd, type Method } from './method.ts';
import { plateBending, plateBuckling } from './plate.ts';
import { copeShear, plateGrossShear, plateNetShear, webNetShear } from './shear.ts';
import { supportBearing, supportBoltShear } from './supportBolts.ts';
import { supportShear } from './supportShear.ts';
import { webTie } from './tie.ts';
import { verified } from './verified.ts';
import { webGrossShear } from './webGrossShear.ts';
import { endplateWebShear, weldWeb } from './webWeld.ts';
import { weld } from './weld.ts';

const { stressFull, stressCope } = elasticStress({ clause: 'elastic', basis: 'memory' });
const finPlate = flag('', (f) => f.kind === 'fin-plate', 'fin plate');
const tied = flag('', (f) => f.T > 0 && f.n > 0, 'a tie force');

/** ANSI/AISC 360-22 by either method: one set of rules, with φ and factored reactions or with Ω and service reactions. */
export const aisc360 = (method: Method): Standard => ({
  ...listedOf(method.id),
  options: {
    'elastic-shear': ['report', 'verdict'],
    'bolt-group': ['instantaneous-centre', 'elastic'],
    'eccentric-bearing': ['lowest', 'sum'],
    'hole-deformation': ['considered', 'not-considered'],
    'end-underrun': ['deducted', 'as-drawn'],
    'cope-method': ['current', 'older'],
    'double-cope-arm': ['longer', 'top'],
    'lap-torsion': ['limit', 'none'],
    weld: ['size', 'strength'],
  },
  factors: method.factors,
  materials,
  strength: {
    'web-gross-shear': webGrossShear(method),
    'cope-shear': copeShear(method),
    'web-net-shear': webNetShear(method),
    'web-block': webBlock(method),
    'web-tearout': webTearout(method),
    'cope-bending': copeBending(method),
    'cope-buckling': copeBuckling(method),
    'web-bearing': webBearing(method),
    'web-tie': webTie(method),
    'stress-full': stressFull,
    'stress-cope': stressCope,
    'bolt-shear': boltShear(method),
    'plate-bearing': plateBearing(method),
    'plate-tearout': noRule('plate-bearing'),
    'plate-gross-shear': plateGrossShear(method),
    'plate-net-shear': plateNetShear(method),
    'plate-block': plateBlock(method),
    'plate-bending': plateBending(method),
    'plate-buckling': plateBuckling(method),
    weld: weld(method),
    'cleat-bearing': cleatBearing(method),
    'cleat-tearout': noRule('cleat-bearing'),
    'cleat-gross-shear': cleatGrossShear(method),
    'cleat-net-shear': cleatNetShear(method),
    'cleat-block': cleatBlock(method),
    'cleat-bending': cleatBending(method),
    'cleat-buckling': noRule(),
    'endplate-bearing': endplateBearing(method),
    'endplate-tearout': noRule('endplate-bearing'),
    'endplate-gross-shear': endplateGrossShear(method),
    'endplate-net-shear': endplateNetShear(method),
    'endplate-block': endplateBlock(method),
    'endplate-web-shear': endplateWebShear(method),
    'weld-web': weldWeb(method),
    'support-bolt-shear': supportBoltShear(method),
    'support-bearing': supportBearing(method),
    'support-shear': supportShear(method),
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
    { code: 'conventional-plate', when: conventional },
    { code: 'extended-plate', when: all(finPlate, extended) },
    { code: 'double-cope-arm', when: all(twoCopes, not(toTop)) },
    { code: 'tie-in-web-only', when: tied },
    ...jointNotes,
  ],
});

export const aisc360Lrfd: Standard = aisc360(lrfd);
export const aisc360Asd: Standard = aisc360(asd);
