import { constant } from '../../formula/tree.ts';

/** Resistance factors of SANS 10162-1:2011, cl. 13.1 (yielding and shear), bolts, bearing, welds. From memory of the standard. */
export const phi = constant('φ', 0.9);
export const phiB = constant('φ_b', 0.8);
export const phiBr = constant('φ_br', 0.67);
export const phiW = constant('φ_w', 0.67);

/** Modulus of elasticity, MPa. */
export const E = constant('E', 200_000, '-2,1');
