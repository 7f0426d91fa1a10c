import { flag } from '../../end/given.ts';
import { constant, pick } from '../../formula/tree.ts';

/** Capacity factors of AS 4100:2020 Table 3.4: web shear, bending, plates and ply bearing; block shear; bolts; fillet welds. From published notes. */
export const phi = constant('φ', 0.9);
export const phiBs = constant('φ_bs', 0.75);
export const phiB = constant('φ_b', 0.8);
const phiSP = constant('φ_w', 0.8);
const phiGP = constant('φ_w', 0.6);
const generalPurpose = flag('option weld: GP', (f) => f.options.weld === 'GP');
/** Of fillet welds: category SP, or GP by option. */
export const phiW = pick([[generalPurpose, phiGP]], phiSP);
export const factors = [phi, phiBs, phiB, phiSP, phiGP] as const;

/** Modulus of elasticity, MPa. */
export const E = constant('E', 200_000, '-2,1');
