import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, flag, rectangle, tee, tf, tw, V } from '../../end/given.ts';
import { atMost, minus, not, over, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { epsilon, fyw, yieldShear } from './given.ts';

const source = { clause: '8.4.1', basis: 'seen' } as const;
const elastic = flag('option cope-shear: elastic', (f) => f.options['cope-shear'] === 'elastic');

const stem = step('d_w', minus(tee.depth, tf), source, 'stem without the flange');

const shearOf = (cut: Cut, depth: Tree<Length>, note: string): Tree<Force> => {
  const area = step('A_v', pick([[elastic, over(times(cut.I, cut.t), cut.Q)]], times(depth, tw)), source, note);
  return step('V_d', yieldShear(area, fyw), source);
};

/** Shear of the sections behind the copes, N: the whole rectangle as of a plate, the stem of the tee. */
export const rectangleShear = shearOf(rectangle, rectangle.depth, 'the whole area, as of a plate');
export const teeShear = shearOf(tee, stem, 'the stem');

const way = (of: 'rectangle' | 'tee', depth: Tree<Length>, resistance: Tree<Force>, off: Gate): Way => ({
  of,
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance,
  off: [uncoped, off],
  limits: [
    channelCope,
    ...copeLimits,
    { when: not(atMost(over(depth, tw), times(67, epsilon(fyw)))), reason: 'slender-cut', always: false },
  ],
});

/**
 * Shear of what is left at each cope's face, IS 800:2007 cl. 8.4.1; the standard has no clause for coped ends. Option `cope-shear: elastic`
 * takes I t/Q for the area. Webs that yield before they buckle in shear: 67 ε at most.
 */
export const copeShear: StrengthRule = {
  source,
  ways: [way('rectangle', rectangle.depth, rectangleShear, noRectangle), way('tee', stem, teeShear, noTee)],
};
