import { noColumnInCope, oneColumn, oneRow } from '../../end/gates.ts';
import { at, d, d0, eBot, ex, flag, n, p, q, tp, tw } from '../../end/given.ts';
import {
  atMost,
  constant,
  least,
  minus,
  most,
  over,
  pick,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import { clause } from './clauses.ts';
import { Fnv, Fu, Fup, inches, noLength } from './given.ts';
import { endUsed } from './webEnd.ts';

/** Nominal strengths of one bolt: in shear, J3.7; in bearing on a ply and tearing out of it, J3.11. N */
const shear = clause('J3.7');
const bearing = clause('J3.11');

const area = step('A_b', over(times(constant('π', Math.PI), squared(d)), 4));
const long = step('L', times(minus(n, 1), p));

/** In one plane, threads as they lie; less in rows longer than 38 in. */
export const rv = step(
  'r_v',
  pick([[atMost(long, inches('38', 38)), times(Fnv, area)]], times(0.833, Fnv, area)),
  shear,
);
export const boltArea = area;

const freely = flag(
  'option hole-deformation: not-considered',
  (f) => f.options['hole-deformation'] === 'not-considered',
);

/** Bearing and tear-out where the deformation of the hole counts, 2.4 and 1.2, or does not, 3.0 and 1.5. */
interface Shares {
  readonly borne: (t: Tree<Length>, Fu: Tree<Stress>) => Tree<Force>;
  readonly torn: (clear: Tree<Length>, t: Tree<Length>, Fu: Tree<Stress>) => Tree<Force>;
}
const shares = (said: readonly [string, string]): Shares => {
  const [b, t] = said.map((one) => constant(one, Number(one))) as [Tree<'0,0'>, Tree<'0,0'>];
  return { borne: (ply, Fu) => times(b, d, ply, Fu), torn: (clear, ply, Fu) => times(t, clear, ply, Fu) };
};
const counted = shares(['2.4', '1.2']);
const notCounted = shares(['3.0', '1.5']);
const either = (force: (by: Shares) => Tree<Force>): Tree<Force> => pick([[freely, force(notCounted)]], force(counted));

const between = minus(p, d0);
const beside = minus(q, d0);
const half = over(d0, 2);

/** Bearing, and tear-out to the next hole of the column. */
const inner = (symbol: string, t: Tree<Length>, Fu: Tree<Stress>, note: string): Tree<Force> =>
  step(
    symbol,
    either(({ borne, torn }) => pick([[oneRow, borne(t, Fu)]], least(borne(t, Fu), torn(between, t, Fu)))),
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
export const rp = inner('r_p', tp, Fup, 'bolt in the plate');
/** Last row: tear-out down to the plate's edge. */
export const rpFoot = step(
  'r_pn',
  either(({ borne, torn }) => least(borne(tp, Fup), torn(minus(eBot, half), tp, Fup))),
  bearing,
  'last row, to the edge of the plate',
);

/** Clear distance to the beam's end and to the plate's free edge, none where the end distance used is too short. */
const endClear = step('l_cw', most(minus(endUsed, half), noLength), bearing, "to the beam's end");
const edgeClear = step('l_cp', minus(ex, half), bearing, "to the plate's free edge");
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
  either(({ torn }) => torn(plateAlong, tp, Fup)),
  bearing,
  'along the row, plate',
);

const along = (symbol: string, clear: Tree<Length>, t: Tree<Length>, Fu: Tree<Stress>, note: string): Tree<Force> =>
  step(
    symbol,
    either(({ borne, torn }) => least(borne(t, Fu), torn(clear, t, Fu))),
    bearing,
    note,
  );

/** Column next to the beam's end and that next to the plate's free edge, pulled along the beam; and those between. */
export const pulled = {
  webLast: along('r_we', endClear, tw, Fu, "to the beam's end"),
  webInner: along('r_w', beside, tw, Fu, 'in the web, to the next column'),
  plateLast: along('r_pe', edgeClear, tp, Fup, "to the plate's free edge"),
  plateInner: along('r_p', beside, tp, Fup, 'in the plate, to the next column'),
};

/** The web's first row where some column stands inside the cope, else any of its bolts. */
export const rwWeakest = pick([[noColumnInCope, rw]], rwTop);
