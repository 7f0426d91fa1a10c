import { noSupportBolts, noWebHoles, pairOfCleats } from '../../end/gates.ts';
import { k, legSupport, V, z } from '../../end/given.ts';
import { supportArm } from '../../end/supportGroup.ts';
import { legWeldArm } from '../../end/weldGroup.ts';
import { least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { bending, moment, shear, Vc } from './plate.ts';
import { withMoment } from './withMoment.ts';

/** From the support's face to the centroid of what holds the web leg, mm: its bolts, or its weld. */
const webArm = step('e', pick([[noWebHoles.when, legWeldArm]], z));
/** From the web's middle to the bolts of one cleat's support leg; to the toe where that is welded, mm. */
const supportLegArm = step('e', pick([[noSupportBolts.when, legSupport]], supportArm));

const legs = (way: (arm: Tree<Length>) => Omit<Way, 'of' | 'load'>): Way[] => [
  { of: 'web leg', load: 'V', ...way(webArm) },
  { of: 'support leg', load: 'V', ...way(supportLegArm), off: [pairOfCleats] },
];

const inShear = step('k φV_c', times(k, Vc), shear);
const inBending = step('k φM_s', times(k, moment), bending);

/** Shear of the cleats' whole depth with the moment that comes with it, as of a plate; one cleat's support leg at its own arm too. */
export const cleatGrossShear: StrengthRule = {
  source: shear,
  ways: legs((arm) => ({
    symbol: 'V',
    demand: V,
    resistance: step('φV_vm', least(inShear, withMoment(inShear, arm, inBending)), shear),
  })),
};

/** Bending of the cleats, fully plastic, as of a plate; one cleat's support leg at its own arm too. */
export const cleatBending: StrengthRule = {
  source: bending,
  ways: legs((arm) => ({ symbol: 'V e', demand: step('M', times(V, arm), bending), resistance: inBending })),
};
