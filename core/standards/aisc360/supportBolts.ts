import { byKind, isEndPlate } from '../../end/byKind.ts';
import { fullDepthPlate, type Gate, noWebHoles } from '../../end/gates.ts';
import { supportBolts, V, Vo } from '../../end/given.ts';
import { oneLine } from '../../end/supportGroup.ts';
import { least, minus, not, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import { oppositeApart } from '../methods/opposite.ts';
import { notTold } from '../methods/supportBearing.ts';
import { noSupport, onSupport, sharedWeb } from '../methods/supportShear.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { sumAsked } from './bolts.ts';
import { clause } from './clauses.ts';
import { type Method, rupture } from './method.ts';
import { alike, Cs, rLeg, rLegSide, rLegTop, rSupport, rvs } from './supportBolt.ts';
import { oneLineOpposite, supportBoltLimits, supportHoleLimits, told } from './supportGates.ts';

const { n, lines } = supportBolts;
const shear = clause('J3.7');
const bearing = clause('J3.11');

const shearForce = step('R_n', alike(rvs), shear);
/** Bolts into the support, J3.7, one plane: two lines carry V evenly, the line of one angle at its arm. */
export const supportBoltShear = ({ available }: Method): StrengthRule => ({
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: available(shearForce, rupture, shear),
      limits: [...supportBoltLimits, fullDepthPlate],
    },
  ],
});

/**
 * The support side with every bolt at its weakest, notes of J3.7 and J3.11, N: its shear, the leg or end plate, the support's own ply where it
 * is told, less what a beam opposite on the same web brings on it. One angle's line: C times its weakest bolt, side edge in.
 */
const weakestBolts = ({ available }: Method): Tree<Force> => {
  const ply = available(rSupport, rupture, bearing, 'r_s');
  const left = pick([[sharedWeb, step('r_V', minus(ply, over(Vo, times(lines, n))), bearing, 'left for V')]], ply);
  const one = (symbol: string, r: Tree<Force>, note: string): Tree<Force> => {
    const own = available(r, rupture, bearing, 'r_n');
    return step(symbol, pick([[told, least(own, left)]], own), bearing, note);
  };
  const first = one('r_1', least(rvs, rLegTop), 'bolt of the first row');
  const others = one('r_i', least(rvs, rLeg), 'bolt of another row');
  const sum = step('Σr', plus(first, times(minus(n, 1), others)), bearing, 'one line');
  const weakest = one('r_min', least(rvs, rLegTop, rLeg, rLegSide), 'the weakest bolt');
  return step(
    'R_a',
    pick([[oneLine, pick([[sumAsked, times(over(Cs, n), sum)]], times(Cs, weakest))]], times(lines, sum)),
    bearing,
  );
};

const bolted: Gate = { when: not(noWebHoles.when), reason: 'covered' };

/** The leg on the support, or an end plate, with its bolts. */
export const supportSide = (method: Method): Way => ({
  of: 'support leg',
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: weakestBolts(method),
  limits: [...supportBoltLimits, oppositeApart, oneLineOpposite, fullDepthPlate],
});

const plyForce = step('R_n', alike(rSupport), bearing);
/**
 * Bearing on the support's own ply, where it is told, J3.11; a beam opposite on the same web is added, which the handbook leaves out. Of
 * angles welded to the web this row holds their leg on the support too.
 */
export const supportBearing = (method: Method): StrengthRule => ({
  source: bearing,
  ways: [
    { ...supportSide(method), off: [{ when: byKind('', isEndPlate, 'an end plate'), reason: 'covered' }, bolted] },
    ...onSupport({
      of: 'support',
      resistance: method.available(plyForce, rupture, bearing),
      off: [noSupport, notTold],
      limits: [...supportHoleLimits, oppositeApart, oneLineOpposite, fullDepthPlate],
    }),
  ],
});
