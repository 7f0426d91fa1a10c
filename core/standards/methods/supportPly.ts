import { fullDepthPlate, type Gate, type Limit, oneSupportRow, wideSupportHole } from '../../end/gates.ts';
import { flag, supportBolts } from '../../end/given.ts';
import { oneLine, oneRowOfSupport, supportForce, supportUpright } from '../../end/supportGroup.ts';
import { all, least, not, pick, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { Way } from '../standard.ts';
import { onSupport, sharedWeb } from './supportShear.ts';

/** One bolt of a single line holds no moment: no force on it can be stated. */
export const oneSupportBoltRefers: Limit = {
  when: all(oneLine, oneRowOfSupport),
  reason: 'one-bolt',
  always: true,
  noNumber: true,
};
/** Two lines of bolts, one on either side of the web: what is eccentric in one is balanced by the other. */
export const twoLines: Gate = { when: not(oneLine), reason: 'pair-of-cleats' };

const noSupport: Gate = { when: flag('no support is given', (f) => f.supportKind === 'none'), reason: 'no-support' };
const notTold: Gate = {
  when: flag('thickness or grade of the support not told', (f) => f.ts === 0 || f.fus === 0),
  reason: 'support-not-told',
};
const single: Gate = { when: oneLine, reason: 'one-line' };
/** The line of one cleat's bolts holds V at its arm; how the beam opposite shares in that no formula here says. */
const oneLineOpposite: Limit = { when: sharedWeb, reason: 'one-line-opposite', always: true };

/**
 * Bearing of the support's own ply at the joint's bolts, N a bolt: `full` whatever its direction, `upright` towards the next hole. A beam on
 * the other side of the same web is taken to hang on the same bolts: its reaction is added. A column's flange bears one beam alone.
 */
export const supportPly = (full: Tree<Force>, upright: Tree<Force>, source: Source): readonly Way[] => {
  const bolts = times(supportBolts.lines, supportBolts.n);
  const weaker = pick([[oneRowOfSupport, full]], least(full, upright));
  const limits = [fullDepthPlate, wideSupportHole];
  const ofOneLine = {
    load: 'V',
    off: [noSupport, notTold, twoLines],
    limits: [oneSupportBoltRefers, oneLineOpposite, ...limits],
  } as const;
  return [
    ...onSupport({
      of: 'support',
      resistance: step('R_b', times(bolts, weaker), source, 'all bolts'),
      off: [noSupport, notTold, single],
      limits,
    }),
    { of: 'support, in full', symbol: 'R_s', demand: supportForce, resistance: full, ...ofOneLine },
    {
      of: 'support, to the next hole',
      symbol: 'R_v,s',
      demand: supportUpright,
      resistance: upright,
      ...ofOneLine,
      off: [...ofOneLine.off, oneSupportRow],
    },
  ];
};
