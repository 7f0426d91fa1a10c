import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, flag, rectangle, tee, tw, V } from '../../end/given.ts';
import { atMost, not, over, pick, step, times } from '../../formula/tree.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';
import { Fy } from './given.ts';
import { firstLimit, shearStress } from './shearStress.ts';

const source = { clause: '13.4', basis: 'memory' } as const;
const mean = flag('option cope-shear: mean', (f) => f.options['cope-shear'] === 'mean');

/**
 * Shear of a section without two flanges, CSA S16:19 cl. 13.4 (members without two flanges): elastic distribution, its peak held to F_s;
 * option `mean` takes the average over the depth. The limits of F_s are those of a web held at both edges, so beyond the first it refers.
 */
const way = (of: 'rectangle' | 'tee', cut: Cut, off: Gate): Way => {
  const slenderness = step('λ_o', over(cut.depth, tw), source);
  const Fs = shearStress(slenderness, Fy);
  return {
    of,
    symbol: 'V',
    load: 'V',
    demand: V,
    resistance: step(
      'V_r',
      pick([[mean, times(phi, Fs, cut.depth, tw)]], over(times(phi, Fs, cut.I, cut.t), cut.Q)),
      source,
    ),
    off: [uncoped, off],
    limits: [
      channelCope,
      ...copeLimits,
      { when: not(atMost(slenderness, firstLimit(Fy))), reason: 'slender-cut', always: false },
    ],
  };
};

export const copeShear: StrengthRule = {
  source,
  ways: [way('rectangle', rectangle, noRectangle), way('tee', tee, noTee)],
};
