import type { Tree } from '../../formula/tree.ts';
import type { Pure } from '../../units/dimension.ts';
import { listedOf, type StandardId } from '../listed.ts';
import type { Steels } from '../materials.ts';
import { fitWrench } from '../methods/fitWrench.ts';
import { noRule, type Standard } from '../standard.ts';
import { cleatBearing, plateBearing, webBearing } from './bearing.ts';
import { plateBlock, webBlock, webBlockOf, webTearout } from './block.ts';
import { boltShear } from './bolts.ts';
import { cleatBending, cleatBlock, cleatGrossShear, cleatNetShear } from './cleats.ts';
import { copeBending } from './copeBending.ts';
import { copeBuckling } from './copeBuckling.ts';
import { stressCope, stressFull } from './elasticStress.ts';
import { endPlateBlock, endPlateGrossShear, endPlateNetShear, endPlateWebShear } from './endPlate.ts';
import { gammaM0, gammaM1, gammaM2, gammaMu, netRecommended, netUk } from './factors.ts';
import { fitCopeClearance, fitCopeDepth, fitCopeLength, fitCopeRadius, fitPlateDepth, fitSetback } from './fit.ts';
import { fitRotation } from './fitRotation.ts';
import { fitEdgePlate, fitEdgeWeb, fitEnd, fitGauge, fitPitch } from './fitSpacing.ts';
import { webBesideLongPlate } from './longPlate.ts';
import { materialsWith } from './materials.ts';
import { plateNetShear, webNet, webNetShear } from './netShear.ts';
import { notes } from './notes.ts';
import { plateBending, plateGrossShear } from './plate.ts';
import { plateBuckling } from './plateBuckling.ts';
import { recommendedSteels, ukSteels } from './steels.ts';
import { supportShear } from './support.ts';
import { supportBearing, supportBoltShear } from './supportBolts.ts';
import { webTie } from './tie.ts';
import { verified } from './verified.ts';
import { copeShear, webGrossShear } from './webShear.ts';
import { weld } from './weld.ts';
import { weldWeb } from './weldWeb.ts';

/** What a country chooses: the factor of net sections, the strengths of its steels. */
interface Annex {
  readonly id: StandardId;
  readonly gammaM2n: Standard['factors'][number] & Tree<Pure>;
  readonly steels: Steels;
}

const strengthWith = (gammaM2n: Tree<Pure>): Standard['strength'] => {
  const net = webNet(gammaM2n);
  const block = webBlockOf(gammaM2n);
  return {
    'web-gross-shear': webGrossShear,
    'cope-shear': copeShear,
    'web-net-shear': webNetShear(net),
    'web-block': webBlock(block),
    'web-tearout': webTearout,
    'cope-bending': copeBending(block, webBesideLongPlate(net, gammaM2n)),
    'cope-buckling': copeBuckling,
    'web-bearing': webBearing,
    'web-tie': webTie,
    'stress-full': stressFull,
    'stress-cope': stressCope,
    'bolt-shear': boltShear,
    'plate-bearing': plateBearing,
    'plate-tearout': noRule(),
    'plate-gross-shear': plateGrossShear,
    'plate-net-shear': plateNetShear(gammaM2n),
    'plate-block': plateBlock(gammaM2n),
    'plate-bending': plateBending,
    'plate-buckling': plateBuckling,
    weld,
    'cleat-bearing': cleatBearing,
    'cleat-tearout': noRule(),
    'cleat-gross-shear': cleatGrossShear,
    'cleat-net-shear': cleatNetShear(gammaM2n),
    'cleat-block': cleatBlock(gammaM2n),
    'cleat-bending': cleatBending,
    'cleat-buckling': noRule(),
    'endplate-bearing': noRule('support-bearing'),
    'endplate-tearout': noRule(),
    'endplate-gross-shear': endPlateGrossShear,
    'endplate-net-shear': endPlateNetShear(gammaM2n),
    'endplate-block': endPlateBlock(gammaM2n),
    'endplate-web-shear': endPlateWebShear,
    'weld-web': weldWeb,
    'support-bolt-shear': supportBoltShear,
    'support-bearing': supportBearing,
    'support-shear': supportShear(gammaM2n),
  };
};

const fit: Standard['fit'] = {
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
};

/** EN 1993-1-8:2005 and EN 1993-1-1:2005 with one country's factors and strengths. */
const withAnnex = ({ id, gammaM2n, steels }: Annex): Standard => ({
  ...listedOf(id),
  options: {
    'elastic-shear': ['report', 'verdict'],
    'plain-web': ['reduced', 'full'],
    'tee-shear': ['amended', 'first-print'],
    'long-joint': ['on', 'off'],
    execution: ['EXC2', 'EXC1', 'EXC3', 'EXC4'],
  },
  factors: [gammaM0, gammaM1, gammaM2, gammaM2n, gammaMu],
  materials: materialsWith(steels),
  strength: strengthWith(gammaM2n),
  fit,
  verified,
  notes,
});

export const en1993: Standard = withAnnex({
  id: 'en-1993',
  gammaM2n: netRecommended,
  steels: recommendedSteels,
});

export const en1993Uk: Standard = withAnnex({
  id: 'en-1993-uk',
  gammaM2n: netUk,
  steels: ukSteels,
});
