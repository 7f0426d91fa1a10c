import { elasticForce, H, upright } from '../../end/boltGroup.ts';
import { noColumnInCope, oneBoltRefers, oneColumn, oneRow, singleRow, wideHole } from '../../end/gates.ts';
import { at, d, d0, eBot, ex, fu, fub, fup, p, q, tp, tw } from '../../end/given.ts';
import { webTearAlong } from '../../end/tearPaths.ts';
import { all, least, minus, over, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { gmb } from './factors.ts';

const source = { clause: '10.3.4', basis: 'seen' } as const;

const byEdge = (e: Tree<Length>): Tree<Pure> => over(e, times(3, d0));
const bySpacing = (spacing: Tree<Length>): Tree<Pure> => minus(over(spacing, times(3, d0)), 0.25);
/** Least of the strengths' ratio, 1 and what the distances allow. */
const kb = (fu: Tree<Stress>, ...distances: Tree<Pure>[]): Tree<Pure> => least(over(fub, fu), 1, ...distances);
const factor = (value: Tree<Pure>): Tree<Pure> => step('k_b', value, source);

/** One bolt against a ply, N. */
const bearingOn = (k: Tree<Pure>, t: Tree<Length>, fu: Tree<Stress>): Tree<Force> =>
  step('V_dpb', over(times(2.5, k, d, t, fu), gmb), source);

const way = (of: string, symbol: string, demand: Tree<Force>, resistance: Tree<Force>): Way => ({
  of,
  symbol,
  load: 'V',
  demand,
  resistance,
  limits: [oneBoltRefers, wideHole],
});

const along = (e: Tree<Length>, fu: Tree<Stress>): Tree<Pure> =>
  factor(pick([[oneColumn, kb(fu, byEdge(e))]], kb(fu, byEdge(e), bySpacing(q))));

/** Along a row of the web, towards the beam's end and the next column. */
export const webAlong = bearingOn(along(webTearAlong.edge.L, fu), tw, fu);

const up = factor(
  pick(
    [
      [all(noColumnInCope, oneRow), kb(fu)],
      [noColumnInCope, kb(fu, bySpacing(p))],
      [oneRow, kb(fu, byEdge(at))],
    ],
    kb(fu, byEdge(at), bySpacing(p)),
  ),
);
const down = factor(pick([[oneRow, kb(fup, byEdge(eBot))]], kb(fup, byEdge(eBot), bySpacing(p))));

/**
 * A ply in bearing, IS 800:2007 cl. 10.3.4, with edge and pitch along the force: the whole force on a bolt with the strengths alone, its
 * upright and level parts each with the distances of their own direction.
 */
export const webBearing: StrengthRule = {
  source,
  ways: [
    way('resultant', 'R_max', elasticForce, bearingOn(factor(kb(fu)), tw, fu)),
    way('up', 'R_v', upright, bearingOn(up, tw, fu)),
    { ...way('along', 'H', H, webAlong), off: [singleRow] },
  ],
};

export const plateBearing: StrengthRule = {
  source,
  ways: [
    way('resultant', 'R_max', elasticForce, bearingOn(factor(kb(fup)), tp, fup)),
    way('down', 'R_v', upright, bearingOn(down, tp, fup)),
    { ...way('along', 'H', H, bearingOn(along(ex, fup), tp, fup)), off: [singleRow] },
  ],
};
