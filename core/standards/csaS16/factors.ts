import { constant } from '../../formula/tree.ts';

/** Resistance factors of CSA S16:19, cl. 13.1: yielding and shear, rupture, bolts, bearing at bolt holes, welds. Read in notes on S16-14. */
export const phi = constant('φ', 0.9);
export const phiU = constant('φ_u', 0.75);
export const phiB = constant('φ_b', 0.8);
export const phiBr = constant('φ_br', 0.8);
export const phiW = constant('φ_w', 0.67);

/** Modulus of elasticity, MPa. */
export const E = constant('E', 200_000, '-2,1');
