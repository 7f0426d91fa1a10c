import { J, N, xMax, yMax } from '../../end/boltGroup.ts';
import { noWebHoles, oneColumn, pairOfCleats } from '../../end/gates.ts';
import { k, z } from '../../end/given.ts';
import { over, pick, plus, root, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { boltLimits, noStressArea } from './limits.ts';
import { longShearOf, webBolt } from './oneBolt.ts';
import { guide, seen } from './sources.ts';
import { underV } from './underV.ts';

/** Force on the farthest bolt for each unit of V, upright and along the beam: elastic, V at arm z. */
export const v = step('v', pick([[oneColumn, over(1, N)]], plus(over(1, N), over(times(z, xMax), J))), guide);
export const w = step('w', over(times(z, yMax), J), guide);

const onePlane = longShearOf(webBolt);

/** Bolts in shear, V that uses the farthest one up. N */
export const boltGroup = step(
  'V_Rd',
  over(pick([[pairOfCleats.when, times(k, onePlane)]], onePlane), root(plus(squared(v), squared(w)))),
  guide,
);

/** Bolts in shear, in two planes between a pair of cleats: EN 1993-1-8 3.6.1 and 3.8, elastic group of the joint guide. */
export const boltShear: StrengthRule = {
  source: seen('1-8 3.6.1'),
  ways: [underV('', boltGroup, [noWebHoles], [noStressArea, ...boltLimits])],
};
