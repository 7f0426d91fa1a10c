import { fullDepthPlate, type Gate, type Limit, noSupportBolts, wideSupportHole } from '../../end/gates.ts';
import { flag, supportBolts } from '../../end/given.ts';
import { oneLine, oneRowOfSupport, supportForce } from '../../end/supportGroup.ts';
import { all, not, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { notCleat, ofCleat } from './kinds.ts';
import { oppositeApart } from './opposite.ts';
import { noSupport, onSupport, sharedWeb } from './supportShear.ts';

export const notTold: Gate = {
  when: flag('thickness or grade of the support not told', (f) => f.ts === 0 || f.fus === 0),
  reason: 'support-not-told',
};
/** One line of support bolts, whose arm counts; or two, which balance each other. */
export const single: Gate = { when: oneLine, reason: 'one-line' };
export const twoLines: Gate = { when: not(oneLine), reason: 'pair-of-cleats' };

/**
 * How a beam opposite shares in the line of one cleat, which holds V at an arm, is not known: the number is that of V alone, and what fails
 * under that fails.
 */
export const oneLineOpposite: Limit = { when: sharedWeb, reason: 'one-line-opposite', always: false };

/** One bolt of one line holds no moment: used up by any load at all. */
export const oneSupportBolt = all(oneLine, oneRowOfSupport);

const limits = [wideSupportHole, fullDepthPlate];

const perBolt = (of: string, resistance: Tree<Force>): Way => ({
  of,
  symbol: 'R_s',
  load: 'V',
  demand: supportForce,
  resistance,
  unbounded: oneSupportBolt,
  limits,
});

/**
 * Bearing at the bolts into the support, N a bolt: of the leg or end plate, and of the support's own ply where it is told. A beam on the other
 * side of the same web hangs on the same bolts: its reaction is added. How it shares in the line of one cleat, which holds V at an arm, is not
 * known: that refers, and so does a beam opposite that is told not to share every bolt. A column's flange bears one beam alone.
 */
export const supportBearing = (source: Source, fitting: Tree<Force>, ply: Tree<Force>): StrengthRule => ({
  source,
  ways: [
    { ...perBolt('support leg', fitting), off: [noSupportBolts, notCleat] },
    { ...perBolt('end plate', fitting), off: [ofCleat] },
    ...onSupport({
      of: 'support',
      resistance: step('R_b', times(supportBolts.lines, supportBolts.n, ply), source, 'all bolts'),
      off: [noSupportBolts, noSupport, notTold, single],
      limits: [oppositeApart, ...limits],
    }),
    {
      ...perBolt('support', ply),
      off: [noSupportBolts, noSupport, notTold, twoLines],
      limits: [oppositeApart, oneLineOpposite, ...limits],
    },
  ],
});
