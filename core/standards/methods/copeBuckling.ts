import { channelCope, copeLimits, cutEdgeInTension, type Limit, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { cb, ct, db, dt, h, rectangle, tee, tw, V } from '../../end/given.ts';
import {
  atMost,
  below,
  constant,
  least,
  minus,
  most,
  not,
  over,
  pick,
  plus,
  power,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Length, Moment, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';

const source = { clause: 'Cheng et al. 1984', basis: 'research' } as const;
const nu = constant('ν', 0.3);
const pi = constant('π', Math.PI);

const limit = (when: Limit['when'], reason: string): Limit => ({ when: not(when), reason, always: true });
const common: readonly Limit[] = [channelCope, ...copeLimits];

/** A share of a depth as a limit: sizes that meet it exactly keep meeting it after conversion from inches. */
const shareOf = (share: number): Tree<Pure> => constant(String(share), share * (1 + 1e-12));

/** Where the method was made: c <= 2 h, and this share of h in depth. Beyond, it refers, with its number. */
export const methodLimits = (c: Tree<Length>, dc: Tree<Length>, share: number): readonly Limit[] => [
  limit(atMost(c, times(shareOf(2), h)), 'cope-longer-than-method'),
  limit(atMost(dc, times(shareOf(share), h)), 'cope-deeper-than-method'),
];

const ratio: Tree<Pure> = over(tee.depth, tee.c);

/** Of the tee behind a top cope: f for the stress that grows along the cope, k of a plate with one free edge. */
export const copeFactor = step(
  'f',
  pick([[atMost(tee.c, h), over(times(2, tee.c), h)]], plus(1, over(tee.c, h))),
  source,
);
export const plateFactor = step(
  'k',
  pick([[atMost(tee.c, tee.depth), times(2.2, power(ratio, 1.65))]], times(2.2, ratio)),
  source,
);

/** Elastic buckling stress of the tee behind a top cope, its cut edge in compression, MPa. */
export const teeStress = (E: Tree<Stress>): Tree<Stress> =>
  step(
    'F_cr',
    times(
      over(times(squared(pi), E), times(12, minus(1, squared(nu)))),
      squared(over(tw, tee.depth)),
      copeFactor,
      plateFactor,
    ),
    source,
  );

/** Moment that a section of modulus W, mm3, carries at a stress, N mm: a standard's own factor on the method. */
export type Resist = (stress: Tree<Stress>, W: Tree<'3,0'>) => Tree<Moment>;

const singleCope = (E: Tree<Stress>, fy: Tree<Stress>, resist: Resist): Way => ({
  of: 'tee',
  symbol: 'V e_c',
  load: 'V',
  demand: step('M', times(V, tee.ec), source),
  resistance: step('M_r', resist(least(teeStress(E), fy), tee.W), source),
  off: [uncoped, noTee, cutEdgeInTension],
  limits: [...common, ...methodLimits(tee.c, tee.dc, 0.5)],
});

export const longer = step('c', most(ct, cb), undefined, 'the longer cope');
export const deeper = step('d_c', most(dt, db), undefined, 'the deeper cope');
const fd = step('f_d', minus(3.5, times(7.5, over(deeper, h))), source);

/** Elastic buckling stress of the web between two copes, a narrow strip that buckles sideways, MPa. */
export const rectangleStress = (E: Tree<Stress>): Tree<Stress> =>
  step('F_cr', times(over(times(0.62, pi, E, squared(tw)), times(longer, rectangle.depth)), fd), source);

/** Two copes so deep that the method has no stress left. */
export const nothingLeft: Limit = {
  when: not(below(0, fd)),
  reason: 'cope-deeper-than-method',
  always: true,
  noNumber: true,
};

const doubleCope = (E: Tree<Stress>, fy: Tree<Stress>, resist: Resist): Way => ({
  of: 'rectangle',
  symbol: 'V e_c',
  load: 'V',
  demand: step('M', times(V, rectangle.ec), source),
  resistance: step('M_r', resist(least(rectangleStress(E), fy), rectangle.W), source),
  off: [uncoped, noRectangle],
  limits: [nothingLeft, ...common, ...methodLimits(longer, deeper, 0.2)],
});

/**
 * Local buckling of the web at a cope: Cheng, Yura and Johnson (University of Texas, 1984), as US handbooks took it up. A clause of no
 * standard. Top cope: c <= 2 h, d <= h/2. Both flanges coped: c <= 2 h, d <= 0.2 h. The moment is V e_c at the cope's face, for two copes
 * that of the shorter. `resist` puts the standard's factor on the lesser of buckling and yield stress.
 */
export const copeBuckling = (E: Tree<Stress>, fy: Tree<Stress>, resist: Resist): StrengthRule => ({
  source,
  ways: [doubleCope(E, fy, resist), singleCope(E, fy, resist)],
});
