import { noColumnInCope, oneColumn, oneRow } from '../../end/gates.ts';
import { at, d, d0, eBot, ex, n, p, q, tw } from '../../end/given.ts';
import { least, minus, most, over, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import { either } from './bearingShares.ts';
import { clause } from './clauses.ts';
import { Fnv, Fu, Fup, noLength } from './given.ts';
import { pair, plies } from './plies.ts';
import { inOnePlane, shank } from './shearOfBolt.ts';
import { endUsed } from './webEnd.ts';

/** Nominal strengths of one bolt: in shear, J3.7; in bearing on a ply and tearing out of it, J3.11. N */
const shear = clause('J3.7');
const bearing = clause('J3.11');

/** Shank area, mm2. */
export const boltArea = shank(d);
const onePlane = inOnePlane(Fnv, boltArea, n, p);
/** In all its planes: two where a pair of angles holds the web. */
export const rv = step('r_v', pick([[pair, times(2, onePlane)]], onePlane), shear);

const between = minus(p, d0);
const beside = minus(q, d0);
const half = over(d0, 2);

/** Bearing, and tear-out to the next hole of the column. */
const inner = (symbol: string, t: Tree<Length>, Fu: Tree<Stress>, note: string): Tree<Force> =>
  step(
    symbol,
    either(({ borne, torn }) => pick([[oneRow, borne(d, t, Fu)]], least(borne(d, t, Fu), torn(between, t, Fu)))),
    bearing,
    note,
  );

export const rw = inner('r_w', tw, Fu, 'bolt in the web');
/** First row of a column inside the cope: tear-out up to the cut edge. */
export const rwTop = step(
  'r_w1',
  either(({ torn }) => least(rw, torn(minus(at, half), tw, Fu))),
  bearing,
  'first row, to the cut edge',
);
export const rp = inner('r_p', plies, Fup, 'bolt in plate or angles');
/** Last row: tear-out down to the plate's edge. */
export const rpFoot = step(
  'r_pn',
  either(({ borne, torn }) => least(borne(d, plies, Fup), torn(minus(eBot, half), plies, Fup))),
  bearing,
  'last row, to the foot of plate or angles',
);

/** Clear distance to the beam's end and to the plate's free edge, none where the end distance used is too short. */
const endClear = step('l_cw', most(minus(endUsed, half), noLength), bearing, "to the beam's end");
const edgeClear = step('l_cp', minus(ex, half), bearing, 'to the free edge');
const nearer = (symbol: string, clear: Tree<Length>): Tree<Length> =>
  step(symbol, pick([[oneColumn, clear]], least(clear, beside)), bearing, 'along the row');

const webAlong = nearer('l_aw', endClear);
const plateAlong = nearer('l_ap', edgeClear);
/** Tear-out along the row: to the end or edge, or to the next column, whichever is nearer. */
export const rwEnd = step(
  'r_we',
  either(({ torn }) => torn(webAlong, tw, Fu)),
  bearing,
  'along the row, web',
);
export const rpEdge = step(
  'r_pe',
  either(({ torn }) => torn(plateAlong, plies, Fup)),
  bearing,
  'along the row, plate or angles',
);

const along = (symbol: string, clear: Tree<Length>, t: Tree<Length>, Fu: Tree<Stress>, note: string): Tree<Force> =>
  step(
    symbol,
    either(({ borne, torn }) => least(borne(d, t, Fu), torn(clear, t, Fu))),
    bearing,
    note,
  );

/** Column next to the beam's end and that next to the plate's free edge, pulled along the beam; and those between. */
export const pulled = {
  webLast: along('r_we', endClear, tw, Fu, "to the beam's end"),
  webInner: along('r_w', beside, tw, Fu, 'in the web, to the next column'),
  plateLast: along('r_pe', edgeClear, plies, Fup, 'to the free edge'),
  plateInner: along('r_p', beside, plies, Fup, 'in plate or angles, to the next column'),
};

/** The web's first row where some column stands inside the cope, else any of its bolts. */
export const rwWeakest = pick([[noColumnInCope, rw]], rwTop);
