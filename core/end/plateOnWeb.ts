import { least, minus, most, pick, plus, type Tree } from '../formula/tree.ts';
import type { Length } from '../units/dimension.ts';
import { fullDepthPlate } from './gates.ts';
import { db, dt, h, hp, r, tf, yp } from './given.ts';

const root = plus(tf, r);
const between = minus(least(plus(yp, hp), minus(h, most(db, root))), most(yp, dt, root));

/** Depth over which an end plate stands against the beam's web, mm: its own; of one of the full depth no more than the web between the root fillets. */
export const plateOnWeb: Tree<Length> = pick([[fullDepthPlate.when, between]], hp);
