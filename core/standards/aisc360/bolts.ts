import { N } from '../../end/boltGroup.ts';
import { boltNotListed, intactFlange, type Limit, noColumnInCope, oneBoltRefers, oneRow } from '../../end/gates.ts';
import { flag, m, mTop, V } from '../../end/given.ts';
import { all, least, minus, not, over, pick, plus, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { C } from './boltGroup.ts';
import { clause } from './clauses.ts';
import { concentric, extended } from './conventional.ts';
import { wideHoleRefers } from './limits.ts';
import { type Method, rupture } from './method.ts';
import { rp, rpEdge, rpFoot, rv, rw, rwEnd, rwTop, rwWeakest } from './oneBolt.ts';

const shear = clause('J3.7');
const bearing = clause('J3.11');
export const sumAsked = flag('option eccentric-bearing: sum', (f) => f.options['eccentric-bearing'] === 'sum');
/** An eccentric group carries C times its weakest bolt; one that is nearly concentric C/N times the sum of its bolts. */
const byWeakest = all(extended, not(concentric), not(sumAsked));

const oneBoltAtArm: Limit = { ...oneBoltRefers, when: all(not(concentric), oneBoltRefers.when) };

const group = (weakest: Tree<Force>, sum: Tree<Force>): Tree<Force> =>
  step('R_n', pick([[byWeakest, times(C, weakest)]], times(over(C, N), sum)), bearing);

const way = (resistance: Tree<Force>, limits: readonly Limit[], off: Way['off'] = []): Way => ({
  of: '',
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance,
  off,
  limits: [oneBoltAtArm, ...limits],
});

const rule = (source: Source, one: Way): StrengthRule => ({ source, ways: [one] });

const shearForce = step('R_n', times(C, rv), shear);
/** Bolts in shear, J3.7, as an eccentric group. */
export const boltShear = ({ available }: Method): StrengthRule =>
  rule(shear, way(available(shearForce, rupture, shear), [wideHoleRefers, boltNotListed]));

const bearingForce = step('R_n', times(C, rw), bearing);
/** Bearing on the web, and tear-out from row to row, J3.11. */
export const webBearing = ({ available }: Method): StrengthRule =>
  rule(bearing, way(available(bearingForce, rupture, bearing), [wideHoleRefers]));

const tornForce = group(
  step('r_min', least(rv, rwTop, rwEnd), bearing, 'the weakest bolt'),
  step(
    'Σr',
    plus(times(mTop, least(rv, rwTop)), times(minus(N, mTop), least(rv, rw))),
    bearing,
    'each bolt by what gives way first, shear or web',
  ),
);
/** Tear-out of the first row up to the cut edge, of all bolts along their rows where the group is eccentric; J3.11. */
export const webTearout = ({ available }: Method): StrengthRule =>
  rule(bearing, {
    ...way(available(tornForce, rupture, bearing), [wideHoleRefers, boltNotListed], [intactFlange]),
    of: 'first row',
  });

/** Each bolt at its weakest: shear, web, plate; the first row inside the cope and the plate's last row have their own. */
const weakestSum = step(
  'Σr',
  pick(
    [
      [all(oneRow, noColumnInCope), times(m, least(rv, rw, rpFoot))],
      [oneRow, plus(times(mTop, least(rv, rwTop, rpFoot)), times(minus(m, mTop), least(rv, rw, rpFoot)))],
      [noColumnInCope, plus(times(minus(N, m), least(rv, rw, rp)), times(m, least(rv, rw, rpFoot)))],
    ],
    plus(
      times(mTop, least(rv, rwTop, rp)),
      times(minus(N, plus(mTop, m)), least(rv, rw, rp)),
      times(m, least(rv, rw, rpFoot)),
    ),
  ),
  bearing,
  'each bolt by what gives way first, shear, web or plate',
);
const plateForce = group(
  step('r_min', least(rv, rwWeakest, rp, rpFoot, rwEnd, rpEdge), bearing, 'the weakest bolt'),
  weakestSum,
);
/** The bolt group with every bolt at its weakest, notes of J3.7 and J3.11. */
export const plateBearing = ({ available }: Method): StrengthRule =>
  rule(bearing, way(available(plateForce, rupture, bearing), [wideHoleRefers, boltNotListed]));
