import { type Gate, type Limit, supportBoltNotListed, wideSupportHole } from '../../end/gates.ts';
import { flag } from '../../end/given.ts';
import { oneLine, oneRowOfSupport } from '../../end/supportGroup.ts';
import { all, not } from '../../formula/tree.ts';
import { sharedWeb } from '../methods/supportShear.ts';

export const noSupport: Gate = {
  when: flag('', (f) => f.supportKind === 'none', 'no support given'),
  reason: 'no-support',
};
export const notTold: Gate = {
  when: flag('', (f) => f.ts === 0 || f.fus === 0, 'thickness or grade of the support not told'),
  reason: 'support-not-told',
};
/** The support's own ply is known. */
export const told = all(not(noSupport.when), not(notTold.when));

const wide: Limit = { ...wideSupportHole, always: true };
/** One bolt of one line holds no moment: no force on it can be stated. */
const oneBolt: Limit = { when: all(oneLine, oneRowOfSupport), reason: 'one-bolt', always: true, noNumber: true };
/** The line of one angle holds V at its arm; how a beam opposite turns the same bolts is not known. */
export const oneLineOpposite: Limit = { when: all(oneLine, sharedWeb), reason: 'one-line-opposite', always: true };

/** What the formulas for holes in the support's ply, and for the bolts in them, do not cover. */
export const supportHoleLimits: readonly Limit[] = [oneBolt, wide];
export const supportBoltLimits: readonly Limit[] = [...supportHoleLimits, supportBoltNotListed];
