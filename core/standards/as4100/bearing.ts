import { elasticForce, H, upright } from '../../end/boltGroup.ts';
import { intactFlange, oneBoltRefers, oneColumn, singleRow, wideHole } from '../../end/gates.ts';
import { at, d, d0, eBot, ex, fup, p, q, tp, tw } from '../../end/given.ts';
import { webTearAlong } from '../../end/tearPaths.ts';
import { least, minus, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';
import { fu } from './given.ts';

const source = { clause: '9.2.2.4', basis: 'seen' } as const;

/** Edge of the hole to an edge of the ply, plus d/2: from the centre's distance e. */
const toEdge = (e: Tree<Length>): Tree<Length> => minus(e, over(minus(d0, d), 2));
/** Edge of the hole to the next hole, plus d/2. */
const toNext = (spacing: Tree<Length>): Tree<Length> => plus(minus(spacing, d0), over(d, 2));
const nearest = (distance: Tree<Length>): Tree<Length> => step('a_e', distance, source);

/** Along a row: to the edge or, with several columns, to the next hole. */
const alongRow = (e: Tree<Length>): Tree<Length> =>
  nearest(pick([[oneColumn, toEdge(e)]], least(toEdge(e), toNext(q))));
export const webAlong = alongRow(webTearAlong.edge.L);

/** One bolt against a ply, N: bearing, and tear-out over the length a_e. */
const bearingOn = (t: Tree<Length>, fu: Tree<Stress>): Tree<Force> => step('φV_b', times(phi, 3.2, d, t, fu), source);
export const tearing = (ae: Tree<Length>, t: Tree<Length>, fu: Tree<Stress>): Tree<Force> =>
  step('φV_b', times(phi, ae, t, fu), source);

const resultant = (t: Tree<Length>, fu: Tree<Stress>): Way => ({
  of: 'resultant',
  symbol: 'R_max',
  load: 'V',
  demand: elasticForce,
  resistance: bearingOn(t, fu),
  limits: [oneBoltRefers, wideHole],
});

const along = (resistance: Tree<Force>): Way => ({
  of: 'along',
  symbol: 'H',
  load: 'V',
  demand: H,
  resistance,
  off: [singleRow],
  limits: [wideHole],
});

const upDown = (of: 'up' | 'down', resistance: Tree<Force>, limits: Way['limits'] = [wideHole]): Way => ({
  of,
  symbol: 'R_v',
  load: 'V',
  demand: upright,
  resistance,
  limits,
});

/**
 * A ply in bearing, AS 4100:2020 cl. 9.2.2.4, by the whole force on a bolt and by its parts towards an edge or the next hole, which counts
 * as an edge.
 */
export const webBearing: StrengthRule = {
  source,
  ways: [
    resultant(tw, fu),
    { ...upDown('up', tearing(nearest(toNext(p)), tw, fu), [oneBoltRefers, wideHole]), off: [singleRow] },
    along(tearing(webAlong, tw, fu)),
  ],
};

const below = nearest(pick([[singleRow.when, toEdge(eBot)]], least(toEdge(eBot), toNext(p))));

export const plateBearing: StrengthRule = {
  source,
  ways: [
    resultant(tp, fup),
    upDown('down', tearing(below, tp, fup), [oneBoltRefers, wideHole]),
    along(tearing(alongRow(ex), tp, fup)),
  ],
};

/** The upright part of a bolt's force towards the cut edge; one bolt alone takes V itself. */
export const webTearout: StrengthRule = {
  source,
  ways: [{ ...upDown('up', tearing(nearest(toEdge(at)), tw, fu)), off: [intactFlange] }],
};
export { bearingOn };
