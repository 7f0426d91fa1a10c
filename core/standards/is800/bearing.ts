import { elasticForce, H, upright } from '../../end/boltGroup.ts';
import { noColumnInCope, oneBoltRefers, oneColumn, oneRow, singleRow, wideHole } from '../../end/gates.ts';
import { at, d, d0, eBot, ex, fu, fub, fup, k, p, q, tp, tw } from '../../end/given.ts';
import { webTearAlong } from '../../end/tearPaths.ts';
import { all, over, pick, type Tree } from '../../formula/tree.ts';
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { inPly, source } from './plyBearing.ts';

const { byEdge, bySpacing, kb, bearingOn } = inPly({ d, d0, fub });

const way = (of: string, symbol: string, demand: Tree<Force>, resistance: Tree<Force>): Way => ({
  of,
  symbol,
  load: 'V',
  demand,
  resistance,
  limits: [oneBoltRefers, wideHole],
});

const along = (e: Tree<Length>, fu: Tree<Stress>): Tree<Pure> =>
  pick([[oneColumn, kb(fu, byEdge(e))]], kb(fu, byEdge(e), bySpacing(q)));

/** Along a row of the web, towards the beam's end and the next column. */
export const webAlong = bearingOn(along(webTearAlong.edge.L, fu), tw, fu);

const up = pick(
  [
    [all(noColumnInCope, oneRow), kb(fu)],
    [noColumnInCope, kb(fu, bySpacing(p))],
    [oneRow, kb(fu, byEdge(at))],
  ],
  kb(fu, byEdge(at), bySpacing(p)),
);

/**
 * A ply in bearing, IS 800:2007 cl. 10.3.4, with edge and pitch along the force: the whole force on a bolt with the strengths alone, its
 * upright and level parts each with the distances of their own direction.
 */
export const webBearing: StrengthRule = {
  source,
  ways: [
    way('resultant', 'R_max', elasticForce, bearingOn(kb(fu), tw, fu)),
    way('up', 'R_v', upright, bearingOn(up, tw, fu)),
    { ...way('along', 'H', H, webAlong), off: [singleRow] },
  ],
};

const full = bearingOn(kb(fup), tp, fup);
const down = bearingOn(pick([[oneRow, kb(fup, byEdge(eBot))]], kb(fup, byEdge(eBot), bySpacing(p))), tp, fup);
const toToe = bearingOn(along(ex, fup), tp, fup);

export const plateBearing: StrengthRule = {
  source,
  ways: [
    way('resultant', 'R_max', elasticForce, full),
    way('down', 'R_v', upright, down),
    { ...way('along', 'H', H, toToe), off: [singleRow] },
  ],
};

/** The web leg of each cleat, as a plate, with its share of the force. */
export const cleatBearing: StrengthRule = {
  source,
  ways: [
    way('resultant', 'R_max/k', over(elasticForce, k), full),
    way('down', 'R_v/k', over(upright, k), down),
    { ...way('along', 'H/k', over(H, k), toToe), off: [singleRow] },
  ],
};
