import { noSupportBolts, noWebHoles, pairOfCleats } from '../../end/gates.ts';
import { k, legSupport, V, z } from '../../end/given.ts';
import { supportArm } from '../../end/supportGroup.ts';
import { legWeldArm } from '../../end/weldGroup.ts';
import { pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { bending, bendingUnder, shear, Vd, Z, Zp } from './plate.ts';

/** From the support's face to the centroid of what holds the web leg, mm: its bolts, or its weld. */
const webArm = step('e', pick([[noWebHoles.when, legWeldArm]], z));
/** From the web's middle to the bolts of one cleat's support leg; to the toe where that is welded, mm. */
const supportLegArm = step('e', pick([[noSupportBolts.when, legSupport]], supportArm));

const inShear = step('k V_d', times(k, Vd), shear);

/** Shear of the cleats' whole depth, IS 800:2007 cl. 8.4.1. */
export const cleatGrossShear: StrengthRule = {
  source: shear,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: inShear }],
};

const way = (of: string, arm: Tree<Length>): Way => ({
  of,
  symbol: 'V e',
  load: 'V',
  demand: step('M', times(V, arm), bending),
  resistance: bendingUnder(arm, step('k Z', times(k, Z)), step('k Z_p', times(k, Zp)), inShear),
});

/** Bending of the cleats, as of a plate; one cleat's support leg at its own arm too. */
export const cleatBending: StrengthRule = {
  source: bending,
  ways: [way('web leg', webArm), { ...way('support leg', supportLegArm), off: [pairOfCleats] }],
};
