import { fullDepthPlate, type Limit, noSupportBolts, noWebHoles, oneColumn } from '../../end/gates.ts';
import { dn, eBot, ex, hp, m, n, supportBolts, tp, V } from '../../end/given.ts';
import { block } from '../../end/tearPaths.ts';
import { minus, most, plus, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Pure } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { blockForce, evenness } from './block.ts';
import { clause } from './clauses.ts';
import { Fup, Fyp, noLength } from './given.ts';
import { type Method, rupture, shearYielding } from './method.ts';
import { plies } from './plies.ts';

const yielding = clause('J4.2, J4-3');
const ruptured = clause('J4.2, J4-4');
const torn = clause('J4.3, J4-5');

const way = (of: string, resistance: Tree<Force>, off: Way['off'] = [], limits: readonly Limit[] = []): Way => ({
  of,
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance,
  off,
  limits,
});
const rule = (source: Source, ways: readonly Way[]): StrengthRule => ({ source, ways });

/** Thickness of all legs on the support, or of the end plate on both sides of the web, mm. */
const legs = times(supportBolts.lines, tp);

const yieldForce = (t: Tree<Length>): Tree<Force> =>
  step('R_n', times(0.6, Fyp, step('A_gv', times(t, hp), yielding)), yielding);
const ruptureForce = (t: Tree<Length>, n: Tree<Pure>, dn: Tree<Length>): Tree<Force> => {
  const net = step('A_nv', times(t, most(minus(hp, times(n, dn)), noLength)), ruptured);
  return step('R_n', times(0.6, Fup, net), ruptured);
};

const webLegNet = ruptureForce(plies, n, dn);
const supportNet = ruptureForce(legs, supportBolts.n, supportBolts.dn);
const webLegBlock = blockForce(block(plies, eBot, ex, m), Fyp, Fup, evenness(oneColumn));

/** Beside one line of bolts into the support: up to the top edge, along to the side edge. */
const supportBlock = (() => {
  const { n, p, dn, eTop, eh } = supportBolts;
  const Lgv = step('L_gv', plus(eTop, times(minus(n, 1), p)));
  return blockForce(
    {
      Agv: step('A_gv', times(legs, Lgv)),
      Anv: step('A_nv', times(legs, minus(Lgv, times(minus(n, 0.5), dn)))),
      Agt: step('A_gt', times(legs, eh)),
      Ant: step('A_nt', times(legs, minus(eh, times(0.5, dn)))),
    },
    Fyp,
    Fup,
  );
})();

/** Yielding in shear of the angles, J4-3; both legs of an angle have the same section. */
export const cleatGrossShear = ({ available }: Method): StrengthRule =>
  rule(yielding, [way('', available(yieldForce(plies), shearYielding, yielding))]);

/** Rupture in shear of the angles through the bolts of either leg, J4-4. */
export const cleatNetShear = ({ available }: Method): StrengthRule =>
  rule(ruptured, [
    way('web leg', available(webLegNet, rupture, ruptured), [noWebHoles]),
    way('support leg', available(supportNet, rupture, ruptured), [noSupportBolts]),
  ]);

/** Block shear of the angles, J4-5: the web leg down and out, the leg on the support up and to its side edge. */
export const cleatBlock = ({ available }: Method): StrengthRule =>
  rule(torn, [
    way('web leg', available(webLegBlock, rupture, torn), [noWebHoles]),
    way('support leg', available(supportBlock, rupture, torn), [noSupportBolts]),
  ]);

/** Yielding in shear of an end plate on both sides of the web, J4-3. */
export const endplateGrossShear = ({ available }: Method): StrengthRule =>
  rule(yielding, [way('', available(yieldForce(legs), shearYielding, yielding), [], [fullDepthPlate])]);

/** Rupture in shear of an end plate along both lines of bolts, J4-4. */
export const endplateNetShear = ({ available }: Method): StrengthRule =>
  rule(ruptured, [way('', available(supportNet, rupture, ruptured), [], [fullDepthPlate])]);

/** Block shear of an end plate beside both lines of bolts, J4-5, up and to the side edges. */
export const endplateBlock = ({ available }: Method): StrengthRule =>
  rule(torn, [way('', available(supportBlock, rupture, torn), [], [fullDepthPlate])]);
