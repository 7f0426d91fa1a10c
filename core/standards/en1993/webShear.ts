import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { fy, tf, tw, V } from '../../end/given.ts';
import {
  atMost,
  below,
  constant,
  least,
  minus,
  not,
  over,
  pick,
  root,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Pure } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { gammaM1 } from './factors.ts';
import { type CutInShear, epsilon, hw, plastic, rectangleInShear, teeInShear, wholeArea } from './shearArea.ts';
import { seen } from './sources.ts';

const source = seen('1-1 6.2.6');
const panel = seen('1-5 5.3');

/** Beyond this an unstiffened web is checked for shear buckling, η = 1. */
const slender = times(72, epsilon);
const lambda = step('λ_w', over(hw, times(86.4, tw, epsilon)), panel);
const chi = step(
  'χ_w',
  pick([[below(lambda, 0.83), constant('1', 1)]], over(0.83, lambda)),
  panel,
  'non-rigid end post',
);
const buckling = step('V_bw', over(times(chi, fy, hw, tw), times(root(3), gammaM1)), panel);
const yielding = step('V_pl', plastic(wholeArea, fy), source);

/** Shear resistance of the uncut section, N. */
export const wholeShear = step(
  'V_Rd,g',
  pick([[atMost(over(hw, tw), slender), yielding]], least(yielding, buckling)),
  source,
);

/** Shear of the uncut section: plastic, EN 1993-1-1 6.2.6; a slender web also buckling, EN 1993-1-5 5.2 and 5.3 without stiffeners. */
export const webGrossShear: StrengthRule = {
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: wholeShear }],
};

/** The rule for panels needs both edges held, so that a slender cut web refers. */
const way = (of: 'rectangle' | 'tee', { V: Vpl }: CutInShear, slenderness: Tree<Pure>, off: Gate): Way => ({
  of,
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: Vpl,
  off: [uncoped, off],
  limits: [
    channelCope,
    ...copeLimits,
    { when: not(atMost(slenderness, slender)), reason: 'slender-cut-panel', always: false },
  ],
});

/** Plastic shear of what remains behind each cope, EN 1993-1-1 6.2.6. */
export const copeShear: StrengthRule = {
  source,
  ways: [
    way('rectangle', rectangleInShear, over(rectangleInShear.cut.depth, tw), noRectangle),
    way('tee', teeInShear, over(minus(teeInShear.cut.depth, tf), tw), noTee),
  ],
};
