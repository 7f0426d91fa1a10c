import { constant } from '../../formula/tree.ts';

/** Partial factors: cross-sections, their stability, bolts with welds and bearing, and tying, which the joint guide sets against f_u. */
export const gammaM0 = constant('γ_M0', 1);
export const gammaM1 = constant('γ_M1', 1);
export const gammaM2 = constant('γ_M2', 1.25);
export const gammaMu = constant('γ_Mu', 1.1);

/** Net sections and block tearing, which EN 1993-1-8 Table 2.1 sends to EN 1993-1-1: recommended, and of the UK National Annex. */
export const netRecommended = constant('γ_M2n', 1.25);
export const netUk = constant('γ_M2n', 1.1);

/** Modulus of elasticity, MPa. */
export const E = constant('E', 210_000, '-2,1');
