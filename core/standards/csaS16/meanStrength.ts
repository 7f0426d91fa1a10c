import { atMost, constant, over, pick, plus, step, type Tree } from '../../formula/tree.ts';
import type { Stress } from '../../units/dimension.ts';
import { Fu, Fup, Fy, Fyp } from './given.ts';

const source = { clause: '13.11', basis: 'seen' } as const;

/** Free of the noise that a strength given in ksi brings. */
const limit = constant('460 MPa', 460 * (1 + 1e-12), '-2,1');

/**
 * Stress on the gross shear plane of cl. 13.11, MPa: the mean of yield and tensile strength; above 460 MPa of yield strength the yield
 * strength alone. The step there is the clause's own.
 */
const meanStrength = (Fy: Tree<Stress>, Fu: Tree<Stress>): Tree<Stress> =>
  step('F_m', pick([[atMost(Fy, limit), over(plus(Fy, Fu), 2)]], Fy), source);

/** Of the web, of the plate or ply. */
export const Fm = meanStrength(Fy, Fu);
export const Fmp = meanStrength(Fyp, Fup);
