import { channelCope, copeLimits, type Limit, uncoped } from '../../end/gates.ts';
import { dn, ho, hp, n, tp, tw, V } from '../../end/given.ts';
import { minus, most, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Length } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { clause } from './clauses.ts';
import { Fu, Fup, Fy, Fyp, noLength } from './given.ts';
import { slenderCutWeb } from './limits.ts';
import { type Method, rupture, shearYielding } from './method.ts';

const yielding = clause('J4.2, J4-3');
const ruptured = clause('J4.2, J4-4');

const way = (resistance: Tree<Force>, limits: readonly Limit[] = [], off: Way['off'] = []): Way => ({
  of: '',
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance,
  off,
  limits,
});

const gross = (t: Tree<Length>, depth: Tree<Length>): Tree<Area> => step('A_gv', times(t, depth), yielding);
const net = (t: Tree<Length>, depth: Tree<Length>): Tree<Area> =>
  step('A_nv', times(t, most(minus(depth, times(n, dn)), noLength)), ruptured);

const yieldForce = step('R_n', times(0.6, Fy, gross(tw, ho)), yielding);
const plateYieldForce = step('R_n', times(0.6, Fyp, gross(tp, hp)), yielding);
const ruptureForce = step('R_n', times(0.6, Fu, net(tw, ho)), ruptured);
const plateRuptureForce = step('R_n', times(0.6, Fup, net(tp, hp)), ruptured);

/** Yielding in shear of what is left behind the copes, J4-3; refers where it is too slender to yield first. */
export const copeShear = ({ available }: Method): StrengthRule => ({
  source: yielding,
  ways: [way(available(yieldForce, shearYielding, yielding), [channelCope, ...copeLimits, slenderCutWeb], [uncoped])],
});

/** Rupture in shear through one bolt column, J4-4: of the depth left at the end, coped at that column or not. */
export const webNetShear = ({ available }: Method): StrengthRule => ({
  source: ruptured,
  ways: [way(available(ruptureForce, rupture, ruptured), copeLimits)],
});

/** Available strength of the plate's full depth, yielding in shear. */
export const plateYield = ({ available }: Method): Tree<Force> => available(plateYieldForce, shearYielding, yielding);

export const plateGrossShear = (method: Method): StrengthRule => ({
  source: yielding,
  ways: [way(plateYield(method))],
});

export const plateNetShear = ({ available }: Method): StrengthRule => ({
  source: ruptured,
  ways: [way(available(plateRuptureForce, rupture, ruptured))],
});
