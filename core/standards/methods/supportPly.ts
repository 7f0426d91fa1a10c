import { fullDepthPlate, type Limit, oneSupportRow, wideSupportHole } from '../../end/gates.ts';
import { supportBolts } from '../../end/given.ts';
import { oneRowOfSupport, supportForce, supportUpright } from '../../end/supportGroup.ts';
import { least, pick, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { Way } from '../standard.ts';
import { oppositeApart } from './opposite.ts';
import { notTold, oneLineOpposite, oneSupportBolt, single, twoLines } from './supportBearing.ts';
import { noSupport, onSupport } from './supportShear.ts';

/** One bolt of a single line holds no moment: no force on it can be stated. */
export const oneSupportBoltRefers: Limit = { when: oneSupportBolt, reason: 'one-bolt', always: true, noNumber: true };

/**
 * Bearing of the support's own ply at the joint's bolts, N a bolt: `full` whatever its direction, `upright` towards the next hole. A beam on
 * the other side of the same web is taken to hang on the same bolts: its reaction is added; where it is told not to, that refers. A column's flange bears one beam alone.
 */
export const supportPly = (full: Tree<Force>, upright: Tree<Force>, source: Source): readonly Way[] => {
  const bolts = times(supportBolts.lines, supportBolts.n);
  const weaker = pick([[oneRowOfSupport, full]], least(full, upright));
  const limits = [fullDepthPlate, wideSupportHole];
  const ofOneLine = {
    load: 'V',
    off: [noSupport, notTold, twoLines],
    limits: [oneSupportBoltRefers, oppositeApart, oneLineOpposite, ...limits],
  } as const;
  return [
    ...onSupport({
      of: 'support',
      resistance: step('R_b', times(bolts, weaker), source, 'all bolts'),
      off: [noSupport, notTold, single],
      limits: [oppositeApart, ...limits],
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
