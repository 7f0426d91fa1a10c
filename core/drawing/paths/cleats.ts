import { plateBending } from './bending.ts';
import { plateBlock } from './block.ts';
import { plateBearing } from './bolts.ts';
import { plateBuckling } from './buckling.ts';
import { supportLegBending, supportLegBlock, supportLegNet, supportLegShear, supportLegTearout } from './onSupport.ts';
import type { PathMaker } from './pathMaker.ts';
import { plateGrossShear, plateNetShear } from './shear.ts';
import { supportBearing } from './supportBolts.ts';
import { plateTearout } from './tearOut.ts';

/** The web leg as a plate beside the web, or the support leg: which of them the way names; where it names none, the one that has bolts. */
const legs =
  (web: PathMaker, support: PathMaker): PathMaker =>
  (it, words, of) =>
    of.startsWith('support leg') || (of === '' && it.n === 0)
      ? support(it, words, of)
      : web(it, words, of.replace(/^web leg(, )?/, ''));

/** A maker for ends with bolts through the web. */
export const throughWeb =
  (maker: PathMaker): PathMaker =>
  (it, words, of) =>
    it.n > 0 ? maker(it, words, of) : null;

export const cleatBearing = legs(throughWeb(plateBearing), supportBearing);
export const cleatTearout = legs(throughWeb(plateTearout), supportLegTearout);
export const cleatGrossShear = legs(plateGrossShear, supportLegShear);
export const cleatNetShear = legs(throughWeb(plateNetShear), supportLegNet);
export const cleatBlock = legs(throughWeb(plateBlock), supportLegBlock);
export const cleatBuckling = legs(plateBuckling, plateBuckling);

/** Where no leg is named, the one at which V has the longer arm; ways of yield and rupture are those of one cleat's support leg. */
export const cleatBending: PathMaker = (it, words, of) => {
  const longer = of === '' && it.k === 1 && it.n > 0 && it.supportBolts.cc / 2 > it.z;
  if (longer || of === 'yield' || of === 'rupture' || of === 'support leg') return supportLegBending(it, words, of);
  return plateBending(it, words, '');
};
