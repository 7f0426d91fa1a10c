import { type Limit, supportBoltNotListed, wideSupportHole } from '../../end/gates.ts';
import { oneLine, oneRowOfSupport } from '../../end/supportGroup.ts';
import { all, not } from '../../formula/tree.ts';
import { notTold } from '../methods/supportBearing.ts';
import { noSupport, sharedWeb } from '../methods/supportShear.ts';

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
