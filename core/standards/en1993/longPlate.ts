import { byKind } from '../../end/byKind.ts';
import { coped, type Gate, singleRow } from '../../end/gates.ts';
import { d0, eEnd, found, fu, fy, m, n, p, q, tw, V, z1 } from '../../end/given.ts';
import {
  atMost,
  below,
  least,
  minus,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force, Length, Pure } from '../../units/dimension.ts';
import type { Way } from '../standard.ts';
import { gammaM0 } from './factors.ts';
import { holeLimits } from './limits.ts';
import { shortPlate } from './plateBuckling.ts';
import { guide } from './sources.ts';
import { wholeShear } from './webShear.ts';

const B = step('B', times(minus(n, 1), p), guide);
const a = step('a', plus(eEnd, times(minus(m, 1), q)), guide);
const an = step('a_n', minus(a, times(minus(m, 0.5), d0)), guide);
const arm = step('e', plus(z1, times(minus(m, 1), q)), guide, 'arm to the last column');
const M0 = step('M_0', over(times(fy, tw, squared(B)), times(6, gammaM0)), guide);

/** Yield on the gross, rupture on the net length of one shear plane of the web. */
const plane = (symbol: string, gross: Tree<Length>, net: Tree<Length>, gamma: Tree<Pure>): Tree<Force> =>
  step(
    symbol,
    least(over(times(fy, tw, gross), times(root(3), gammaM0)), over(times(fu, tw, net), times(root(3), gamma))),
    guide,
  );

/** Bending left to the plane between the outer rows when it carries V less what the rest of the web does. N mm, N */
const bendingAt = (V: number, M0: number, FBC: number, rest: number): number => {
  const shear = Math.max(0, V - rest);
  if (shear <= 0.5 * FBC) return M0;
  return shear >= FBC ? 0 : M0 * (1 - ((2 * shear) / FBC - 1) ** 2);
};

/** The V at which V e meets M_BC + F_AB B, whose right side never grows with V: bracketed and halved. N, N mm, mm */
export const webBesideRoot = (e: number, couple: number, M0: number, FBC: number, rest: number): number => {
  let low = 0;
  let high = (M0 + couple) / e;
  for (let turn = 0; turn < 200 && high - low > 1e-14 * high; turn += 1) {
    const middle = (low + high) / 2;
    if (bendingAt(middle, M0, FBC, rest) + couple > middle * e) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
};

const notFinPlate: Gate = { when: byKind('no fin plate', (kind) => kind !== 'fin-plate'), reason: 'fin-plates-only' };
const isCoped: Gate = { when: coped, reason: 'coped' };

/**
 * The web of an end that is not coped, beside a long plate: planes above and below the bolts in shear, the plane between the outer rows in
 * bending, as the joint guide has it.
 */
export const webBesideLongPlate = (net: Tree<Force>, gammaM2n: Tree<Pure>): Way => {
  const FAB = plane('F_AB', a, an, gammaM2n);
  const FBC = plane('F_BC', B, minus(B, times(minus(n, 1), d0)), gammaM2n);
  const web = step('V_w', least(wholeShear, net), guide, 'shear of the whole web');
  // With V_BC = V − (V_w − F_BC) the factor is 1 − (2 V_BC/F_BC − 1)²; written without V_BC, a small difference of large forces.
  const MBC = step(
    'M_BC',
    pick(
      [
        [atMost(V, minus(web, times(0.5, FBC))), M0],
        [below(V, web), times(M0, minus(1, squared(over(minus(plus(times(2, V), FBC), times(2, web)), FBC))))],
      ],
      times(0, M0),
    ),
    guide,
    'less as the plane shears',
  );
  const couple = step('M_AB', times(FAB, B), guide);
  return {
    of: 'beside a long plate',
    symbol: 'V e',
    load: 'V',
    demand: step('M', times(V, arm), guide),
    resistance: step('M_Rd', plus(MBC, couple), guide),
    failsAt: step(
      'V_f',
      found('0,1', 'root of V e = M_Rd, halved', [arm, couple, M0, FBC, web], (_, e, couple, M0, FBC, web) =>
        webBesideRoot(e!, couple!, M0!, FBC!, web! - FBC!),
      ),
      guide,
    ),
    off: [isCoped, notFinPlate, shortPlate, singleRow],
    limits: holeLimits,
  };
};
