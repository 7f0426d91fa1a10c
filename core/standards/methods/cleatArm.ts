import { noSupportBolts, noWebHoles, pairOfCleats } from '../../end/gates.ts';
import { legWeb, weldReturn, z, z1 } from '../../end/given.ts';
import { supportArm } from '../../end/supportGroup.ts';
import { legWeldArm, supportLegArm } from '../../end/weldGroup.ts';
import { minus, most, pick, step } from '../../formula/tree.ts';

const toWeb = pick([[noWebHoles.when, legWeldArm]], z);
const toSupport = pick([[noSupportBolts.when, supportLegArm]], supportArm);

/**
 * Arm at which V bends cleats, mm: from the support's face to the centroid of what holds the web leg; of one cleat alone also from the web to
 * what holds the support leg, its bolts or the weld along its toe, the larger.
 */
export const cleatArm = step('e', pick([[pairOfCleats.when, toWeb]], most(toWeb, toSupport)));

/** Length of a web leg that nothing holds, mm: from the heel to the first bolt column, or to the ends of the weld. */
export const freeLeg = step('z_f', pick([[noWebHoles.when, minus(legWeb, weldReturn)]], z1));
