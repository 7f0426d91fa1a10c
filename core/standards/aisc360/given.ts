import { given } from '../../end/given.ts';
import { constant } from '../../formula/tree.ts';
import { INCH, KIP } from '../../units/systems.ts';

/** MPa in one ksi. */
export const KSI = KIP / INCH ** 2;

/** Modulus of elasticity, 29 000 ksi in either unit system. */
export const E = constant('E', 29_000 * KSI, '-2,1');

/** Strengths in the standard's symbols, MPa: web, plate or ply, support, bolts, weld metal. */
export const Fy = given('F_y', '-2,1', (f) => f.fy);
export const Fu = given('F_u', '-2,1', (f) => f.fu);
export const Fyp = given('F_yp', '-2,1', (f) => f.fyp);
export const Fup = given('F_up', '-2,1', (f) => f.fup);
export const Fus = given('F_us', '-2,1', (f) => f.fus);
/** Nominal shear strength of the bolts, threads as they lie. */
export const Fnv = given('F_nv', '-2,1', (f) => f.fnv);
/** Of the bolts into the support. */
export const Fnvs = given('F_nv', '-2,1', (f) => f.supportBolts.fnv);
export const FEXX = given('F_EXX', '-2,1', (f) => f.Xu);

/** A length that the standard gives in inches; `said` as it is written there. */
export const inches = (said: string, length: number) => constant(`${said} in`, length * INCH, '1,0');
export const noLength = constant('0', 0, '1,0');
