import { given } from '../../end/given.ts';
import { constant, least, over, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Pure, Stress } from '../../units/dimension.ts';

/** Strengths by the symbols of AS 4100, MPa: yield of web and flange, tensile strength of the web, of bolts and of weld metal. */
export const fyw = given('f_yw', '-2,1', (f) => f.fy);
const fyf = given('f_yf', '-2,1', (f) => f.fyf);
export const fu = given('f_u', '-2,1', (f) => f.fu);
export const fuf = given('f_uf', '-2,1', (f) => f.fub);
export const fuw = given('f_uw', '-2,1', (f) => f.Xu);

/** Yield strength for bending and buckling of what is left behind a cope: the lesser of web and flange. */
export const fyb = step('f_yb', least(fyw, fyf), undefined, 'web or flange');

/** A slenderness by the yield strength, √(f_y/250). */
export const byYield = (ratio: Tree<Pure>, fy: Tree<Stress>): Tree<Pure> =>
  times(ratio, root(over(fy, constant('250 MPa', 250, '-2,1'))));
