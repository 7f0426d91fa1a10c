import { type Limit, wideHole } from '../../end/gates.ts';
import { ho, tw } from '../../end/given.ts';
import { atMost, not, over, root, step, times } from '../../formula/tree.ts';
import { clause } from './clauses.ts';
import { E, Fy } from './given.ts';

/** A hole wider than the standard one: other rules of slip and bearing, so that no number is a pass or a failure. */
export const wideHoleRefers: Limit = { ...wideHole, always: true };

/** Slenderness of the web that is left, and up to which a web held at both edges yields in shear, k_v = 5.34. */
export const cutSlenderness = step('λ', over(ho, tw), clause('G2.1'));
export const slenderFrom = step('λ_v', times(1.1, root(over(times(5.34, E), Fy))), clause('G2.1'));
export const slenderCutWeb: Limit = {
  when: not(atMost(cutSlenderness, slenderFrom)),
  reason: 'slender-cut-web',
  always: true,
};
