import { noColumnInCope, noWebHoles, oneColumn, oneRow } from '../../end/gates.ts';
import { ab, at, eBot, eEnd, eTop, ex, flag, fu, fub, fup, k, p, q, tp, tw } from '../../end/given.ts';
import {
  type Condition,
  constant,
  least,
  most,
  not,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { v, w } from './bolts.ts';
import { gammaM2, gammaMu } from './factors.ts';
import { boltLimits } from './limits.ts';
import { bearingOf, bearingTermsOf, webBolt } from './oneBolt.ts';
import { leastOf } from './optional.ts';
import { guide, seen } from './sources.ts';
import { underV } from './underV.ts';

const source = seen('1-8 3.6.1');
const most1 = constant('1', 1);
const most25 = constant('2.5', 2.5);
const several = { rows: not(oneRow), columns: not(oneColumn) };

/** A term of the least, and when it is there. */
type Term = readonly [Condition, Tree<Pure>];

/** Distances of one ply: an edge beside the outer row that counts only under a condition, the edge level with it, and its strength. */
interface Ply {
  readonly fu: Tree<Stress>;
  readonly t: Tree<Length>;
  /** Toward it the upright force presses; absent where a flange closes the way. */
  readonly before: readonly (readonly [Condition, Tree<Length>])[];
  /** Above and below the rows. */
  readonly beside: readonly (readonly [Condition, Tree<Length>])[];
  readonly level: Tree<Length>;
}

const terms = bearingTermsOf(webBolt);

/** The lowest serves every bolt, and never below nothing. */
const lowest = (symbol: 'α_b' | 'k_1', always: readonly [Tree<Pure>, ...Tree<Pure>[]], optional: readonly Term[]) =>
  step(symbol, most(leastOf(always, optional), 0), source);

const bearingOn = (ply: Ply) => {
  const { fu, before, beside, level } = ply;
  const strength = over(fub, fu);
  const upright = {
    alphaB: lowest(
      'α_b',
      [strength, most1],
      [...before.map(([here, e]): Term => [here, terms.end(e)]), [several.rows, terms.inner(p)]],
    ),
    k1: lowest('k_1', [terms.edge(level), most25], [[several.columns, terms.between(q)]]),
  };
  const along = {
    alphaB: lowest('α_b', [terms.end(level), strength, most1], [[several.columns, terms.inner(q)]]),
    k1: lowest(
      'k_1',
      [most25],
      [...beside.map(([here, e]): Term => [here, terms.edge(e)]), [several.rows, terms.between(p)]],
    ),
  };
  return {
    vertical: bearingOf('F_ver', webBolt, ply, upright, gammaM2),
    horizontal: bearingOf('F_hor', webBolt, ply, along, gammaM2),
    tie: bearingOf('F_hor', webBolt, ply, along, gammaMu),
  };
};

const topCoped = not(noColumnInCope);
const bottomCoped = flag('', (f) => f.mBottom > 0, 'a column inside the bottom cope');
const always = flag('', () => true, 'always');

const onWeb = bearingOn({
  fu,
  t: tw,
  before: [[topCoped, at]],
  beside: [
    [topCoped, at],
    [bottomCoped, ab],
  ],
  level: eEnd,
});
const onPlate = bearingOn({
  fu: fup,
  t: tp,
  before: [[always, eBot]],
  beside: [[always, least(eTop, eBot)]],
  level: ex,
});

/** Bearing of one bolt along the beam under the tie force, N. */
export const webTieBearing: Tree<Force> = onWeb.tie;
export const plateTieBearing: Tree<Force> = onPlate.tie;

/**
 * V at which the farthest bolt's two components use its bearing up on plies alike, added as squares: stricter than each alone, as the joint
 * guide. N
 */
const group = ({ vertical, horizontal }: ReturnType<typeof bearingOn>, plies: Tree<Pure> | 1 = 1): Tree<Force> => {
  const both = root(plus(squared(over(v, vertical)), squared(over(w, horizontal))));
  const row = plies === 1 ? vertical : times(plies, vertical);
  return step('V_Rd', pick([[oneRow, over(row, v)]], over(plies, both) as Tree<Force>), guide);
};
export const webGroup: Tree<Force> = group(onWeb);
export const plateGroup: Tree<Force> = group(onPlate);

const rule = (resistance: Tree<Force>): StrengthRule => ({
  source,
  ways: [underV('', resistance, [noWebHoles], boltLimits)],
});

/** Bearing, EN 1993-1-8 3.6.1 Table 3.4: the web is pressed up, the plate down, both along the beam. */
export const webBearing: StrengthRule = rule(webGroup);
export const plateBearing: StrengthRule = rule(plateGroup);
/** One cleat, or a pair that shares V. */
export const cleatBearing: StrengthRule = rule(group(onPlate, k));
