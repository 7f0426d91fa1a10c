import { given } from '../../end/given.ts';
import { constant, least, over, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Pure, Stress } from '../../units/dimension.ts';
import { gm0, gm1 } from './factors.ts';

/** Strengths by the symbols of IS 800, MPa: yield of web and flange, tensile strength of weld metal. */
export const fyw = given('f_yw', '-2,1', (f) => f.fy);
const fyf = given('f_yf', '-2,1', (f) => f.fyf);
export const fuw = given('f_uw', '-2,1', (f) => f.Xu);

/** Yield strength for bending and buckling of what is left behind a cope: the lesser of web and flange. */
export const fyb = step('f_yb', least(fyw, fyf), undefined, 'web or flange');

/** ε = √(250/f_y). */
export const epsilon = (fy: Tree<Stress>): Tree<Pure> => root(over(constant('250 MPa', 250, '-2,1'), fy));

/** Yielding and rupture of an area in shear, N. */
export const yieldShear = (area: Tree<Area>, fy: Tree<Stress>): Tree<Force> =>
  over(times(area, fy), times(root(3), gm0));
export const ruptureShear = (area: Tree<Area>, fu: Tree<Stress>): Tree<Force> =>
  over(times(0.9, area, fu), times(root(3), gm1));

/** A net area that wide holes leave below nothing counts as nothing. */
export const nothing = constant('0', 0, '2,0');
