import { fullDepthPlate, noSupportBolts } from '../../end/gates.ts';
import { hp, supportBolts, ts } from '../../end/given.ts';
import { minus, most, pick, step, times } from '../../formula/tree.ts';
import { notTold } from '../methods/supportBearing.ts';
import { noSupport, onSupport } from '../methods/supportShear.ts';
import type { StrengthRule } from '../standard.ts';
import { clause } from './clauses.ts';
import { Fus, noLength } from './given.ts';
import { type Method, rupture } from './method.ts';

const source = clause('J4.2, J4-4');
const net = most(minus(hp, times(supportBolts.n, supportBolts.dn)), noLength);
const strength = step(
  'R_n',
  pick([[noSupportBolts.when, times(0.6, Fus, ts, 2, hp)]], times(0.6, Fus, ts, 2, net)),
  source,
);

/**
 * Rupture in shear of the support on both sides of the joint, holes out where it is bolted: a web, or a column's flange. A beam opposite on the
 * same web is added, which the handbook leaves out.
 */
export const supportShear = ({ available }: Method): StrengthRule => ({
  source,
  ways: onSupport({
    of: '',
    resistance: available(strength, rupture, source),
    off: [noSupport, notTold],
    limits: [fullDepthPlate],
  }),
});
