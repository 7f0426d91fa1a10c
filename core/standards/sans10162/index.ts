import { flag } from '../../end/given.ts';
import { all } from '../../formula/tree.ts';
import { noRule, type Standard } from '../standard.ts';
import { plateBlock, webBlock } from './block.ts';
import { boltShear, plateBearing, webBearing } from './bolts.ts';
import { copeBending } from './copeBending.ts';
import { copeBuckling } from './copeBuckling.ts';
import { copeShear } from './copeShear.ts';
import { stressCope, stressFull } from './elasticStress.ts';
import { phi, phiB, phiBr, phiW } from './factors.ts';
import { fitEdgePlate, fitEdgeWeb, fitEnd, fitGauge, fitPitch } from './fitClauses.ts';
import {
  fitCopeClearance,
  fitCopeDepth,
  fitCopeLength,
  fitCopeRadius,
  fitPlateDepth,
  fitRotation,
  fitSetback,
} from './fitPractice.ts';
import { materials } from './materials.ts';
import { plateNetShear, webNetShear } from './netShear.ts';
import { plateBending, plateBuckling, plateGrossShear } from './plate.ts';
import { plateTearout, webTearout } from './tearOut.ts';
import { webTie } from './tie.ts';
import { verified } from './verified.ts';
import { webGrossShear } from './webGrossShear.ts';
import { weld } from './weld.ts';

const twoColumns = flag('two bolt columns inside the cope', (f) => f.mTop > 1);
const standardBlock = flag('', (f) => f.options['web-block'] === 'standard');
const finPlate = flag('', (f) => f.kind === 'fin-plate');
const slimWeld = flag('', (f) => f.leg < 0.625 * f.tp);

/** SANS 10162-1:2011, structural use of steel, limit-states design of hot-rolled steelwork. */
export const sans10162: Standard = {
  id: 'sans-10162-1',
  title: 'SANS 10162-1',
  edition: '2011',
  level: 'factored',
  options: {
    'elastic-shear': ['report', 'verdict'],
    'bolt-group': ['elastic', 'instantaneous-centre'],
    'cope-shear': ['elastic', 'mean'],
    'web-block': ['standard', 'cautious'],
    'plate-edges': ['sheared', 'cut'],
  },
  factors: [phi, phiB, phiBr, phiW],
  materials,
  strength: {
    'web-gross-shear': webGrossShear,
    'cope-shear': copeShear,
    'web-net-shear': webNetShear,
    'web-block': webBlock,
    'web-tearout': webTearout,
    'cope-bending': copeBending,
    'cope-buckling': copeBuckling,
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
    'plate-buckling': plateBuckling,
    weld,
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
    'fit-wrench': noRule(),
  },
  verified,
  notes: [
    { code: 'two-column-block', when: all(twoColumns, standardBlock) },
    { code: 'weld-slimmer-than-plate', when: all(finPlate, slimWeld) },
  ],
};
