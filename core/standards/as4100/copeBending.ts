import { channelCope, copeLimits, type Gate, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { b, type Cut, flag, found, given, rectangle, tee, tf, tw, V } from '../../end/given.ts';
import { atMost, least, minus, over, pick, squared, step, type Tree, times } from '../../formula/tree.ts';
import { plasticModulus } from '../../shape/plasticModulus.ts';
import type { Moment } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';
import { byYield, fyb } from './given.ts';

const source = { clause: 'ASI Handbook 1', basis: 'seen' } as const;

const Z = given('Z', '3,0', (f) => f.tee.W);
const S = step(
  'S',
  found('3,0', 'plastic modulus of the tee', [], ({ tee: { shape } }) => (shape ? plasticModulus(shape) : 0)),
);
const cutEdgeCompressed = flag('cut edge in compression', (f) => f.tee.topCut);
const outstand = step('λ_f', byYield(over(minus(b, tw), times(2, tf)), fyb), source);
const compact = least(S, times(1.5, Z));
const Ze = step(
  'Z_e',
  pick(
    [
      [cutEdgeCompressed, compact],
      [atMost(outstand, 9), compact],
    ],
    Z,
  ),
  source,
  'Z to the cut edge',
);

/** Moments that the sections behind the copes carry, N mm: the tee with its effective modulus, the rectangle fully plastic. */
export const teeMoment = step('φM_s', times(phi, fyb, Ze), source);
export const rectangleMoment = step('φM_s', times(0.25, phi, fyb, tw, squared(rectangle.depth)), source);

const way = (of: 'rectangle' | 'tee', cut: Cut, resistance: Tree<Moment>, off: Gate): Way => ({
  of,
  symbol: 'V e_c',
  load: 'V',
  demand: step('M', times(V, cut.ec), source),
  resistance,
  off: [uncoped, off],
  limits: [channelCope, ...copeLimits],
});

/**
 * Bending of what remains at each cope's face under V e_c: ASI Design Guide Handbook 1 (Hogan 2007) ch. 6, as AS 4100 has no clause for
 * coped ends. Tee: Z_e = min(S; 1.5 Z), but Z where the flange is compressed and its outstand is not compact (λ > 9). Holes not taken off.
 */
export const copeBending: StrengthRule = {
  source,
  ways: [way('rectangle', rectangle, rectangleMoment, noRectangle), way('tee', tee, teeMoment, noTee)],
};
