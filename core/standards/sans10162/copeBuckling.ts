import { channelCope, copeLimits, type Gate, type Limit, uncoped } from '../../end/gates.ts';
import { cb, ct, db, dt, flag, fy, h, rectangle, tee, tw, V } from '../../end/given.ts';
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
import type { Pure } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { noRectangle, noTee } from './copeShear.ts';
import { E, phi } from './factors.ts';

/**
 * Local buckling of the web at a cope: Cheng, Yura and Johnson (University of Texas, 1984), as US handbooks took it up. Not a clause of
 * the standard. Top cope: c <= 2 h, d <= h/2. Both flanges coped: c <= 2 h, d <= 0.2 h. The moment is V e_c at the cope's face.
 */
const source = { clause: 'Cheng et al. 1984', basis: 'research' } as const;
const nu = constant('ν', 0.3);
const pi = constant('π', Math.PI);

const limit = (when: Limit['when'], reason: string): Limit => ({ when: not(when), reason, always: true });
const common: readonly Limit[] = [channelCope, ...copeLimits];

/** The tee behind a top cope, its cut edge in compression. */
const singleCope = (): Way => {
  const { c, dc, depth, ec, W } = tee;
  const f = step('f', pick([[atMost(c, h), over(times(2, c), h)]], plus(1, over(c, h))), source);
  const ratio: Tree<Pure> = over(depth, c);
  const k = step('k', pick([[atMost(c, depth), times(2.2, power(ratio, 1.65))]], times(2.2, ratio)), source);
  const Fcr = step(
    'F_cr',
    times(over(times(squared(pi), E), times(12, minus(1, squared(nu)))), squared(over(tw, depth)), f, k),
    source,
  );
  const bottomCut: Gate = { when: flag('', (x) => x.tee.here && !x.tee.topCut), reason: 'cut-edge-in-tension' };
  return {
    of: 'tee',
    symbol: 'V e_c',
    load: 'V',
    demand: step('M', times(V, ec), source),
    resistance: step('M_r', times(phi, least(Fcr, fy), W), source),
    off: [uncoped, noTee, bottomCut],
    limits: [
      ...common,
      limit(atMost(c, times(2, h)), 'cope-longer-than-method'),
      limit(atMost(dc, times(0.5, h)), 'cope-deeper-than-method'),
    ],
  };
};

/** The web between two copes, buckling sideways as a narrow strip. */
const doubleCope = (): Way => {
  const { depth, ec, W } = rectangle;
  const c = step('c', most(ct, cb), undefined, 'the longer cope');
  const dc = step('d_c', most(dt, db), undefined, 'the deeper cope');
  const fd = step('f_d', minus(3.5, times(7.5, over(dc, h))), source);
  const Fcr = step('F_cr', times(over(times(0.62, pi, E, squared(tw)), times(c, depth)), fd), source);
  return {
    of: 'rectangle',
    symbol: 'V e_c',
    load: 'V',
    demand: step('M', times(V, ec), source),
    resistance: step('M_r', times(phi, least(Fcr, fy), W), source),
    off: [uncoped, noRectangle],
    limits: [
      { when: not(below(0, fd)), reason: 'cope-deeper-than-method', always: true, noNumber: true },
      ...common,
      limit(atMost(c, times(2, h)), 'cope-longer-than-method'),
      limit(atMost(dc, times(0.2, h)), 'cope-deeper-than-method'),
    ],
  };
};

export const copeBuckling: StrengthRule = { source, ways: [doubleCope(), singleCope()] };
