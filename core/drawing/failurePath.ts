import type { CheckName, StrengthName } from '../end/checkNames.ts';
import type { Facts } from '../end/facts.ts';
import type { FailurePath } from './drawing.ts';
import { copeBending, plateBending } from './paths/bending.ts';
import { plateBlock, webBlock } from './paths/block.ts';
import { boltShear, plateBearing, webBearing } from './paths/bolts.ts';
import { copeBuckling, plateBuckling } from './paths/buckling.ts';
import type { PathMaker } from './paths/pathMaker.ts';
import { copeShear, plateGrossShear, plateNetShear, webGrossShear, webNetShear } from './paths/shear.ts';
import { stressCope, stressFull } from './paths/stress.ts';
import { supportShear } from './paths/support.ts';
import { plateTearout, webTearout } from './paths/tearOut.ts';
import { webTie } from './paths/tie.ts';
import { weld } from './paths/weld.ts';
import type { DrawingWords } from './words.ts';

const noPath: PathMaker = () => null;

const makers: Readonly<Record<StrengthName, PathMaker>> = {
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
  'cleat-bearing': plateBearing,
  'cleat-tearout': plateTearout,
  'cleat-gross-shear': plateGrossShear,
  'cleat-net-shear': plateNetShear,
  'cleat-block': plateBlock,
  'cleat-bending': plateBending,
  'cleat-buckling': plateBuckling,
  'endplate-bearing': noPath,
  'endplate-tearout': noPath,
  'endplate-gross-shear': noPath,
  'endplate-net-shear': noPath,
  'endplate-block': noPath,
  'endplate-web-shear': noPath,
  'weld-web': noPath,
  'support-bolt-shear': noPath,
  'support-bearing': noPath,
  'support-shear': supportShear,
};

const known = (id: CheckName): id is StrengthName => Object.hasOwn(makers, id);

/**
 * The path along which a check fails, drawn over the piece of `drawEnd`; null for rules of fit and where the end has no such path.
 * `of`: the way or part that the report names, '' where there is one only. The bolts push the web up and the plate down.
 */
export const failurePath = (id: CheckName, of: string, facts: Facts, words: DrawingWords): FailurePath | null =>
  known(id) ? makers[id](facts, words, of) : null;
