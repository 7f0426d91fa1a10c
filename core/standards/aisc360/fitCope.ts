import type { Facts } from '../../end/facts.ts';
import { type Gate, noWebHoles, uncoped } from '../../end/gates.ts';
import { cb, ct, d0, db, dt, flag, found, g, h, rb, rt, support, tf } from '../../end/given.ts';
import { constant, minus, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { INCH } from '../../units/systems.ts';
import { betweenFlanges } from '../methods/supportOutline.ts';
import type { FitPart, FitRule } from '../standard.ts';
import { clause, manual } from './clauses.ts';
import { older } from './copeBending.ts';
import { inches } from './given.ts';

const method = manual(9);
const corner = clause('J1.6, M2.2');

const noTop: Gate = { when: flag('', (f) => f.dt === 0, 'no cope above'), reason: 'no-top-cope' };
const noBottom: Gate = { when: flag('', (f) => f.db === 0, 'no cope below'), reason: 'no-bottom-cope' };
const bothCopes = flag('two copes', (f) => f.dt > 0 && f.db > 0);

/** From a cope's face to the nearest bolt column, mm. */
const toFace = ({ ct, dt, cb, db, eEnd, q, m }: Facts): number => {
  let nearest = Number.POSITIVE_INFINITY;
  for (let j = 0; j < m; j += 1) {
    const x = eEnd + j * q;
    if (dt > 0) nearest = Math.min(nearest, Math.abs(x - ct));
    if (db > 0) nearest = Math.min(nearest, Math.abs(x - cb));
  }
  return nearest;
};
const apart = found('1,0', 'nearest column to the face of a cope', [], toFace);

/** A cope no longer than the method covers, its face clear of holes. */
export const fitCopeLength: FitRule = {
  source: method,
  breach: 'refer',
  parts: [
    { of: 'top', given: ct, most: times(2, h), off: [uncoped, noTop] },
    { of: 'bottom', given: cb, most: times(2, h), off: [uncoped, noBottom] },
    { of: 'face to hole', given: apart, least: over(d0, 2), off: [uncoped, noWebHoles] },
  ],
};

const greatest = step(
  'd_max',
  times(
    pick(
      [
        [flag('', (f) => f.dt === 0 || f.db === 0, 'one cope'), constant('0.5', 0.5)],
        [older, constant('0.2', 0.2)],
      ],
      constant('0.4', 0.4),
    ),
    h,
  ),
  method,
);

/** Copes within the depth that the method covers, and past the flange. */
export const fitCopeDepth: FitRule = {
  source: method,
  breach: 'refer',
  parts: [
    { of: 'top', given: dt, least: tf, most: greatest, off: [uncoped, noTop] },
    { of: 'bottom', given: db, least: tf, most: greatest, off: [uncoped, noBottom] },
  ],
};

const roundedPart = (of: string, radius: Tree<Length>, off: Gate, notStated: Gate): FitPart[] => [
  { of, given: radius, least: inches('1/2', 1 / 2), off: [uncoped, off] },
  { of, given: radius, least: inches('3/8', 3 / 8), off: [uncoped, off, notStated], breach: 'fails' },
];
const notStated = (of: (f: Facts) => number): Gate => ({
  when: flag('', (f) => of(f) === 0, 'radius not stated'),
  reason: 'radius-not-stated',
});

/** Re-entrant corners of 1/2 in; from 3/8 in a drilled corner may do, below that none. */
export const fitCopeRadius: FitRule = {
  source: corner,
  breach: 'refer',
  parts: [
    ...roundedPart(
      'top',
      rt,
      noTop,
      notStated((f) => f.rt),
    ),
    ...roundedPart(
      'bottom',
      rb,
      noBottom,
      notStated((f) => f.rb),
    ),
  ],
};

const noSupport: Gate = {
  when: flag('', (f) => !f.support.here, 'no supporting beam given'),
  reason: 'no-support',
};
/** Room that a cope leaves to the flange of the support. */
const ROOM = 0.5 * INCH;
const beyondFlange: Gate = {
  when: flag('', (f) => (f.support.b - f.support.tw) / 2 - f.g + ROOM <= 0, 'beyond the flange of the support'),
  reason: 'clear-of-support',
};
const underTopFlange = ({ support: s }: Facts): number => s.tf + s.r - s.topOfSteel;
const overBottomFlange = ({ support: s }: Facts): number => s.h - s.tf - s.r - s.topOfSteel;
const topFlangeClear: Gate = {
  when: flag(
    '',
    (f) => underTopFlange(f) <= 0 || -f.support.topOfSteel >= f.h,
    'top flange of the support clear of the beam',
  ),
  reason: 'clear-of-support',
};
const bottomFlangeClear: Gate = {
  when: flag(
    '',
    (f) => overBottomFlange(f) >= f.h || f.support.h - f.support.topOfSteel <= 0,
    'bottom flange of the support clear of the beam',
  ),
  reason: 'clear-of-support',
};

const underTop = step('d_min', minus(plus(support.tf, support.r), support.above), method);
const overBottom = step('d_min', minus(h, minus(support.h, plus(support.tf, support.r, support.above))), method);
const pastFlange = step('c_min', plus(minus(over(minus(support.b, support.tw), 2), g), inches('1/2', 1 / 2)), method);

/** Copes that clear the flanges of the supporting beam, where these reach into the depth of this one; room beside a beam between a column's flanges. */
export const fitCopeClearance: FitRule = {
  source: method,
  breach: 'fails',
  parts: [
    { of: 'top, depth', given: dt, least: underTop, off: [noSupport, beyondFlange, topFlangeClear] },
    { of: 'top, length', given: ct, least: pastFlange, off: [noSupport, beyondFlange, topFlangeClear] },
    { of: 'bottom, depth', given: db, least: overBottom, off: [noSupport, beyondFlange, bottomFlangeClear] },
    { of: 'bottom, length', given: cb, least: pastFlange, off: [noSupport, beyondFlange, bottomFlangeClear] },
    ...betweenFlanges,
  ],
};

export const twoCopes = bothCopes;
