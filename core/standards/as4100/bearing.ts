import { elasticForce, H, upright } from '../../end/boltGroup.ts';
import { intactFlange, oneBoltRefers, oneColumn, singleRow, wideHole } from '../../end/gates.ts';
import { at, d, d0, eBot, ex, fup, k, p, q, tp, tw } from '../../end/given.ts';
import { webTearAlong } from '../../end/tearPaths.ts';
import { least, over, pick, type Tree } from '../../formula/tree.ts';
import type { Force, Length } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { fu } from './given.ts';
import { inPly, nearest, source, tearing } from './plyBearing.ts';

const { crushing, toEdge, toNext } = inPly({ d, d0 });

/** Along a row: to the edge or, with several columns, to the next hole. */
const alongRow = (e: Tree<Length>): Tree<Length> =>
  nearest(pick([[oneColumn, toEdge(e)]], least(toEdge(e), toNext(q))));
const webAlong = alongRow(webTearAlong.edge.L);
/** One bolt along a row of the web, N. */
export const webPull = least(crushing(tw, fu), tearing(webAlong, tw, fu));

const resultant = (resistance: Tree<Force>, demand: Tree<Force>): Way => ({
  of: 'resultant',
  symbol: 'R_max',
  load: 'V',
  demand,
  resistance,
  limits: [oneBoltRefers, wideHole],
});

const along = (resistance: Tree<Force>, demand: Tree<Force>): Way => ({
  of: 'along',
  symbol: 'H',
  load: 'V',
  demand,
  resistance,
  off: [singleRow],
  limits: [wideHole],
});

const upDown = (
  of: 'up' | 'down',
  resistance: Tree<Force>,
  demand: Tree<Force>,
  limits: Way['limits'] = [oneBoltRefers, wideHole],
): Way => ({ of, symbol: 'R_v', load: 'V', demand, resistance, limits });

/**
 * A ply in bearing, AS 4100:2020 cl. 9.2.2.4, by the whole force on a bolt and by its parts towards an edge or the next hole, which counts
 * as an edge.
 */
export const webBearing: StrengthRule = {
  source,
  ways: [
    resultant(crushing(tw, fu), elasticForce),
    { ...upDown('up', tearing(nearest(toNext(p)), tw, fu), upright), off: [singleRow] },
    along(tearing(webAlong, tw, fu), H),
  ],
};

const below = nearest(pick([[singleRow.when, toEdge(eBot)]], least(toEdge(eBot), toNext(p))));
const full = crushing(tp, fup);
const down = tearing(below, tp, fup);
const toToe = tearing(alongRow(ex), tp, fup);

export const plateBearing: StrengthRule = {
  source,
  ways: [resultant(full, elasticForce), upDown('down', down, upright), along(toToe, H)],
};

/** The web leg of each cleat, as a plate, with its share of the force. */
export const cleatBearing: StrengthRule = {
  source,
  ways: [
    { ...resultant(full, over(elasticForce, k)), symbol: 'R_max/k' },
    { ...upDown('down', down, over(upright, k)), symbol: 'R_v/k' },
    { ...along(toToe, over(H, k)), symbol: 'H/k' },
  ],
};

/** The upright part of a bolt's force towards the cut edge; one bolt alone takes V itself. */
export const webTearout: StrengthRule = {
  source,
  ways: [{ ...upDown('up', tearing(nearest(toEdge(at)), tw, fu), upright, [wideHole]), off: [intactFlange] }],
};
