import type { Facts } from '../../end/facts.ts';
import type { Gate } from '../../end/gates.ts';
import { flag } from '../../end/given.ts';
import { wrenchRoom } from '../../steel/wrenchRoom.ts';

/** mm: sizes that meet in inches meet in mm. */
const NOISE = 1e-9;

/** Beam along the axis of a support bolt that its wrench needs, mm: common practice, from memory. */
const STRAIGHT_ON = 120;

const pastRoot = ({ tf, r }: Facts, depth: number): boolean => depth >= tf + r - NOISE;

/** A cope of this length and depth leaves no flange beside the wrench of any bolt in the web. */
const cutBack = (f: Facts, length: number, depth: number): boolean =>
  pastRoot(f, depth) && length >= f.eEnd + (f.m - 1) * f.q + f.socket / 2 + wrenchRoom(f.d).spare - NOISE;

/** A cope of this length and depth leaves no flange beside the wrench that stands along the beam. */
const cutBackAlong = (f: Facts, length: number, depth: number): boolean =>
  pastRoot(f, depth) && f.g + length >= STRAIGHT_ON - NOISE;

const cutGate = (called: string, cut: (f: Facts) => boolean): Gate => ({
  when: flag('', cut, called),
  reason: 'flange-cut-back',
});

/** The flange beside bolts through the web, or into the support, is cut back past the wrench. */
export const topCut = cutGate('the top flange cut back past the wrench', (f) => cutBack(f, f.ct, f.dt));
export const bottomCut = cutGate('the bottom flange cut back past the wrench', (f) => cutBack(f, f.cb, f.db));
export const supportTopCut = cutGate('the top flange cut back past the wrench', (f) => cutBackAlong(f, f.ct, f.dt));
export const supportBottomCut = cutGate('the bottom flange cut back past the wrench', (f) =>
  cutBackAlong(f, f.cb, f.db),
);

/** The nearest level of a row of web bolts to a row of support bolts. mm */
const rowsApart = ({ n, p, y1, yp, supportBolts: s }: Facts): number => {
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i < n; i += 1) {
    for (let j = 0; j < s.n; j += 1) least = Math.min(least, Math.abs(y1 + i * p - (yp + s.eTop + j * s.p)));
  }
  return least;
};

/** The rows of web and support are staggered, so that nut and wrench pass each other. */
export const headsApart: Gate = {
  when: flag(
    '',
    (f) =>
      rowsApart(f) >=
      f.supportBolts.socket / 2 + wrenchRoom(f.supportBolts.d).spare + wrenchRoom(f.d).corners / 2 - NOISE,
    'rows of web and support staggered past the wrench',
  ),
  reason: 'rows-staggered',
};
