import type { CheckName, StrengthName } from '../end/checkNames.ts';
import type { Facts } from '../end/facts.ts';
import type { FailurePath } from './drawing.ts';
import { copeBending, plateBending } from './paths/bending.ts';
import { plateBlock, webBlock } from './paths/block.ts';
import { boltShear, plateBearing, webBearing } from './paths/bolts.ts';
import { copeBuckling, plateBuckling } from './paths/buckling.ts';
import {
  cleatBearing,
  cleatBending,
  cleatBlock,
  cleatBuckling,
  cleatGrossShear,
  cleatNetShear,
  cleatTearout,
  throughWeb,
} from './paths/cleats.ts';
import { supportLegBlock, supportLegNet, supportLegShear, supportLegTearout } from './paths/onSupport.ts';
import type { PathMaker } from './paths/pathMaker.ts';
import { copeShear, plateGrossShear, plateNetShear, webGrossShear, webNetShear } from './paths/shear.ts';
import { stressCope, stressFull } from './paths/stress.ts';
import { supportShear } from './paths/support.ts';
import { supportBearing, supportBoltShear } from './paths/supportBolts.ts';
import { plateTearout, webTearout } from './paths/tearOut.ts';
import { webTie } from './paths/tie.ts';
import { endPlateWebShear, weld, weldWeb } from './paths/weld.ts';
import type { DrawingWords } from './words.ts';

/** Makers of the paths that an end plate has: its bolts hold it on both sides of the web. */
const onPlate =
  (maker: PathMaker): PathMaker =>
  (it, words, of) =>
    it.bp > 0 ? maker(it, words, of) : null;

const makers: Readonly<Record<StrengthName, PathMaker>> = {
  'web-gross-shear': webGrossShear,
  'cope-shear': copeShear,
  'web-net-shear': throughWeb(webNetShear),
  'web-block': throughWeb(webBlock),
  'web-tearout': throughWeb(webTearout),
  'cope-bending': copeBending,
  'cope-buckling': copeBuckling,
  'web-bearing': throughWeb(webBearing),
  'web-tie': webTie,
  'stress-full': stressFull,
  'stress-cope': stressCope,
  'bolt-shear': throughWeb(boltShear),
  'plate-bearing': plateBearing,
  'plate-tearout': plateTearout,
  'plate-gross-shear': plateGrossShear,
  'plate-net-shear': plateNetShear,
  'plate-block': plateBlock,
  'plate-bending': plateBending,
  'plate-buckling': plateBuckling,
  weld,
  'cleat-bearing': cleatBearing,
  'cleat-tearout': cleatTearout,
  'cleat-gross-shear': cleatGrossShear,
  'cleat-net-shear': cleatNetShear,
  'cleat-block': cleatBlock,
  'cleat-bending': cleatBending,
  'cleat-buckling': cleatBuckling,
  'endplate-bearing': onPlate(supportBearing),
  'endplate-tearout': onPlate(supportLegTearout),
  'endplate-gross-shear': onPlate(supportLegShear),
  'endplate-net-shear': onPlate(supportLegNet),
  'endplate-block': onPlate(supportLegBlock),
  'endplate-web-shear': endPlateWebShear,
  'weld-web': weldWeb,
  'support-bolt-shear': supportBoltShear,
  'support-bearing': supportBearing,
  'support-shear': supportShear,
};

const known = (id: CheckName): id is StrengthName => Object.hasOwn(makers, id);

/**
 * The path along which a check fails, drawn over the piece of `drawEnd`; null for rules of fit and where the end has no such path.
 * `of`: the way or part that the report names, '' where there is one only. The bolts push the web up and the plate down.
 */
export const failurePath = (id: CheckName, of: string, facts: Facts, words: DrawingWords): FailurePath | null =>
  known(id) ? makers[id](facts, words, of) : null;
