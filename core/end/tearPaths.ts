import { minus, over, pick, plus, step, type Tree, times } from '../formula/tree.ts';
import type { Length, Pure } from '../units/dimension.ts';
import { oneColumn } from './gates.ts';
import { at, dn, eBot, eEnd, eRow, ex, flag, m, mTop, n, p, q, supportBolts, tp, tw } from './given.ts';

const rows = times(minus(n, 1), p);
const half = (columns: Tree<Pure>): Tree<Length> => times(minus(columns, 0.5), dn);

/** A block torn out along the bolts: shear plane along the inner column, tension plane along the last row. mm2 */
export const block = (t: Tree<Length>, vertical: Tree<Length>, horizontal: Tree<Length>, columns: Tree<Pure>) => {
  const Lgv = step('L_gv', plus(vertical, rows));
  const Lgt = step('L_gt', pick([[oneColumn, horizontal]], plus(horizontal, times(minus(columns, 1), q))));
  return {
    Agv: step('A_gv', times(t, Lgv)),
    Anv: step('A_nv', times(t, minus(Lgv, times(minus(n, 0.5), dn)))),
    Agt: step('A_gt', times(t, Lgt)),
    Ant: step('A_nt', times(t, minus(Lgt, half(columns)))),
  };
};

/** Areas of a block. */
export type Block = ReturnType<typeof block>;

/** In the web: up to the cut edge and along to the beam's end, columns inside the cope only. */
export const webBlock: Block = block(tw, at, eEnd, mTop);
/** In the plate: down to its bottom edge and along to its free edge, all columns. */
export const plateBlock: Block = block(tp, eBot, ex, m);

/** Two planes beside each bolt column, torn upright out of one ply. mm */
export const upright = (t: Tree<Length>, vertical: Tree<Length>, columns: Tree<Pure>) => {
  const Lgv = step('L_gv', plus(vertical, rows));
  return { t, columns, Lgv, Lnv: step('L_nv', minus(Lgv, times(minus(n, 0.5), dn))) };
};
export type UprightTear = ReturnType<typeof upright>;
export const webTearUp: UprightTear = upright(tw, at, mTop);
export const plateTearDown: UprightTear = upright(tp, eBot, m);

const besideShortCope = flag('a short cope cuts into the row', (f) => f.eRow < f.eEnd);

/** Two planes beside one bolt of an outer row, torn along the row to an edge, or to the next column. mm */
export const along = (t: Tree<Length>, edge: Tree<Length>) => ({
  t,
  edge: { L: edge, Ln: step('L_n', minus(edge, over(dn, 2))) },
  next: { L: q, Ln: step('L_n', minus(q, dn)) },
});
export type AlongTear = ReturnType<typeof along>;
/** Web beside an outer row's first hole: to the beam's end, or to the face of a short cope that cuts into the row. mm */
export const rowEnd: Tree<Length> = pick([[besideShortCope, eRow]], eEnd);
export const webTearAlong: AlongTear = along(tw, rowEnd);
export const plateTearAlong: AlongTear = along(tp, ex);

/** A block pulled along the beam by a tie force: two planes along the outer rows, tension between them. mm2 */
export const pulled = (t: Tree<Length>, edge: Tree<Length>) => {
  const L = step('L', pick([[oneColumn, edge]], plus(edge, times(minus(m, 1), q))));
  return {
    Agv: step('A_gv', times(2, t, L)),
    Anv: step('A_nv', times(2, t, minus(L, half(m)))),
    Agt: step('A_gt', times(t, minus(n, 1), p)),
    Ant: step('A_nt', times(t, minus(n, 1), minus(p, dn))),
  };
};
export const webPulled: Block = pulled(tw, eEnd);
export const platePulled: Block = pulled(tp, ex);

/**
 * In the leg or plate on the support, beside one line of bolts: from the line's outer bolt up (or down) to the nearer edge, and along to the
 * free edge. mm2
 */
export const supportBlock: Block = (() => {
  const { n, p, dn, ev, eh } = supportBolts;
  const Lgv = step('L_gv', plus(ev, times(minus(n, 1), p)));
  return {
    Agv: step('A_gv', times(tp, Lgv)),
    Anv: step('A_nv', times(tp, minus(Lgv, times(minus(n, 0.5), dn)))),
    Agt: step('A_gt', times(tp, eh)),
    Ant: step('A_nt', times(tp, minus(eh, times(0.5, dn)))),
  };
})();

/** Two planes beside one line of support bolts, torn upright out of the leg or plate. mm */
export const supportTearUp: UprightTear = (() => {
  const { n, p, dn, ev, lines } = supportBolts;
  const Lgv = step('L_gv', plus(ev, times(minus(n, 1), p)));
  return { t: tp, columns: lines, Lgv, Lnv: step('L_nv', minus(Lgv, times(minus(n, 0.5), dn))) };
})();

/** Support leg beside an outer bolt, torn along to its free edge. mm */
export const supportTearAlong: AlongTear['edge'] & { readonly t: AlongTear['t'] } = {
  t: tp,
  L: supportBolts.eh,
  Ln: step('L_n', minus(supportBolts.eh, over(supportBolts.dn, 2))),
};
