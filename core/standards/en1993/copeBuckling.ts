import { channelCope, copeLimits, type Gate, noRectangle, uncoped } from '../../end/gates.ts';
import { cb, ct, db, dt, flag, fy, h, tee, tw, V } from '../../end/given.ts';
import {
  all,
  any,
  atMost,
  below,
  type Condition,
  cubed,
  inMPa,
  least,
  most,
  not,
  over,
  pick,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { methodLimits, teeStress } from '../methods/copeBuckling.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { upTo } from './bound.ts';
import { E, gammaM1 } from './factors.ts';
import { guide } from './sources.ts';

const research = { clause: 'Cheng et al. 1984', basis: 'research' } as const;
const twoCopes = flag('both flanges coped', (f) => f.dt > 0 && f.db > 0);
const ratio = over(h, tw);

const longer = step('l', most(ct, cb), guide, 'the longer cope');
const deeper = step('D', most(dt, db), guide, 'the deeper cope');
const depthLimit = step('D_lim', pick([[twoCopes, over(h, 5)]], over(h, 2)), guide);

/** Longest cope that needs no check: h in stocky webs, less in slender ones; S235 by the row of S275. */
const longest = (stocky: number, slender: number): Tree<Length> =>
  pick([[atMost(ratio, upTo(stocky)), h]], over(times(slender, h), cubed(ratio)));
const lengthLimit = step(
  'L',
  pick([[atMost(inMPa(fy), upTo(275)), longest(54.3, 160_000)]], longest(48, 110_000)),
  guide,
);

/** No limits are published for steels above S355. */
const noLimits: Condition = below(upTo(355, '-2,1'), fy);
const outside = any(noLimits, below(times(upTo(1), lengthLimit), longer), below(times(upTo(1), depthLimit), deeper));

const beyondLimits: Gate = { when: outside, reason: 'outside-cope-limits' };
const withinLimits: Gate = { when: not(outside), reason: 'inside-cope-limits' };
const bottomAlone: Gate = {
  when: flag('a bottom cope alone', (f) => f.dt === 0 && f.db > 0),
  reason: 'cut-edge-in-tension',
};
const limits = [channelCope, ...copeLimits];

/** Inside the published limits no check is needed: sizes are compared, whatever V. */
const within = (of: string, symbol: string, demand: Tree<Length>, resistance: Tree<Length>): Way => ({
  of,
  symbol,
  load: 'none',
  demand,
  resistance,
  off: [uncoped, bottomAlone, beyondLimits],
  limits,
});

const elastic: Way = {
  of: 'tee',
  symbol: 'V e_c',
  load: 'V',
  demand: step('M', times(V, tee.ec), research),
  resistance: step('M_Rd', over(times(least(teeStress(E), fy), tee.W), gammaM1), research),
  off: [uncoped, bottomAlone, { when: twoCopes, reason: 'both-coped' }, withinLimits],
  limits: [...limits, ...methodLimits(tee.c, tee.dc, 0.5)],
  source: research,
};

/** Two copes outside the limits: no method at hand. */
const noMethod: Way = {
  of: 'rectangle',
  symbol: 'l',
  load: 'none',
  demand: longer,
  resistance: lengthLimit,
  off: [uncoped, noRectangle, withinLimits],
  limits: [{ when: all(twoCopes, outside), reason: 'outside-cope-limits', always: true, noNumber: true }],
};

/**
 * Local buckling of the web at a top cope of a beam held against lateral-torsional buckling: published limits of length and depth; outside
 * them the elastic method of Cheng, Yura and Johnson (1984), no clause of EN 1993, where one flange is coped.
 */
export const copeBuckling: StrengthRule = {
  source: guide,
  ways: [
    noMethod,
    elastic,
    within('cope length', 'l', longer, lengthLimit),
    within('cope depth', 'D', deeper, depthLimit),
  ],
};
