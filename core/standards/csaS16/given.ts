import { given } from '../../end/given.ts';

/** Yield and tensile strength of web, plate or ply, support, bolts through the web and into the support, in the standard's own symbols, MPa. */
export const Fy = given('F_y', '-2,1', (f) => f.fy);
export const Fu = given('F_u', '-2,1', (f) => f.fu);
export const Fyp = given('F_yp', '-2,1', (f) => f.fyp);
export const Fup = given('F_up', '-2,1', (f) => f.fup);
export const Fys = given('F_ys', '-2,1', (f) => f.fys);
export const Fus = given('F_us', '-2,1', (f) => f.fus);
export const Fub = given('F_ub', '-2,1', (f) => f.fub);
export const Fubs = given('F_ub,s', '-2,1', (f) => f.supportBolts.fub);
