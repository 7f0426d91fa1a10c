import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, rectangle, tee, tf, tw, V } from '../../end/given.ts';
import { atMost, least, minus, not, over, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Moment } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { rectangleMoment, teeMoment } from './copeBending.ts';
import { phi } from './factors.ts';
import { byYield, fyw } from './given.ts';
import { withMoment } from './withMoment.ts';

const source = { clause: '5.11.3, 5.12.3', basis: 'seen' } as const;

const stem = step('d_w', minus(tee.depth, tf), source, 'clear stem, without the flange');
const uniform = step('φV_u', times(phi, 0.6, fyw, stem, tw), source);
const uneven = over(times(2, uniform), plus(0.9, over(times(tee.Q, stem), tee.I)));
const teeShear = step('φV_c', least(uniform, uneven), source, 'Q d_w/I: greatest over mean shear stress');
const rectangleShear = step('φV_c', times(0.5, phi, fyw, rectangle.depth, tw), source, 'greatest 1.5 times the mean');

interface Face {
  readonly cut: Cut;
  readonly depth: Tree<Length>;
  readonly shear: Tree<Force>;
  readonly moment: Tree<Moment>;
  readonly off: Gate;
}

const way = (of: 'rectangle' | 'tee', { cut, depth, shear, moment, off }: Face): Way => ({
  of,
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: step('φV_vm', least(shear, withMoment(shear, cut.ec, moment)), source),
  off: [uncoped, off],
  limits: [
    channelCope,
    ...copeLimits,
    { when: not(atMost(byYield(over(depth, tw), fyw), 82)), reason: 'slender-cut', always: false },
  ],
});

/**
 * Shear of what is left at each cope's face, AS 4100:2020 cl. 5.11.3 (stress not uniform over the web), with the moment V e_c of cl. 5.12.3.
 * Webs that yield before they buckle in shear: slenderness 82 at most.
 */
export const copeShear: StrengthRule = {
  source,
  ways: [
    way('rectangle', {
      cut: rectangle,
      depth: rectangle.depth,
      shear: rectangleShear,
      moment: rectangleMoment,
      off: noRectangle,
    }),
    way('tee', { cut: tee, depth: stem, shear: teeShear, moment: teeMoment, off: noTee }),
  ],
};
