import type { Facts } from '../../end/facts.ts';
import { type Gate, singleColumn, singleRow } from '../../end/gates.ts';
import { flag, given, h, leg, n, p, q, r, tf, y1, z1 } from '../../end/given.ts';
import { minus, over, plus, step, times } from '../../formula/tree.ts';
import { wrenchRoom } from '../../steel/wrenchRoom.ts';
import type { FitRule } from '../standard.ts';

/** Practice, no clause: an end without room for the wrench is referred, never failed, for another tool may do. */
const source = { clause: 'practice', basis: 'practice' } as const;

const socket = given('D_w', '1,0', (f) => wrenchRoom(f.d).socket);
const spare = given('s_w', '1,0', (f) => wrenchRoom(f.d).spare);
const corners = given('e_n', '1,0', (f) => wrenchRoom(f.d).corners);

const toFace = step('R_w', plus(over(socket, 2), spare), source, 'half the socket and room beside it');
const toBolt = step('p_w', plus(toFace, over(corners, 2)), source, 'past head or nut of the next bolt');

/** mm: sizes that meet in inches meet in mm. */
const NOISE = 1e-9;

/** A cope of this length and depth leaves no flange beside the wrench of any bolt. */
const cutBack = ({ eEnd, m, q, tf, r, d }: Facts, length: number, depth: number): boolean => {
  const { socket, spare } = wrenchRoom(d);
  return depth >= tf + r - NOISE && length >= eEnd + (m - 1) * q + socket / 2 + spare - NOISE;
};
const topCut: Gate = {
  when: flag('', (f) => cutBack(f, f.ct, f.dt), 'the top flange cut back past the wrench'),
  reason: 'flange-cut-back',
};
const bottomCut: Gate = {
  when: flag('', (f) => cutBack(f, f.cb, f.db), 'the bottom flange cut back past the wrench'),
  reason: 'flange-cut-back',
};
const noWeld: Gate = { when: flag('', (f) => f.kind !== 'fin-plate', 'no fin plate'), reason: 'no-weld' };

const root = plus(tf, r);
const toTop = step('y_w', minus(y1, root), source, 'from the first row to the root of the top flange');
const toBottom = step(
  'y_w',
  minus(h, plus(y1, times(minus(n, 1), p), tf, r)),
  source,
  'from the last row to the root of the bottom flange',
);
const toWeld = step('x_w', minus(z1, leg), source, 'from the first column to the toe of the weld');

/**
 * Room for head, washer, nut and wrench about every bolt, across its axis, mm: to the beam's flanges where these are not cut back, to the
 * support on the web's side and past the weld on the plate's, and to the next bolt. Along its axis the space is taken to be open: a column's
 * flanges or a beam opposite are not looked at. Bolts M12 to M36, 1/2 to 1-1/4 in.
 */
export const fitWrench: FitRule = {
  source,
  breach: 'refer',
  parts: [
    { of: 'top flange', given: toTop, least: toFace, off: [topCut] },
    { of: 'bottom flange', given: toBottom, least: toFace, off: [bottomCut] },
    { of: 'support, web side', given: z1, least: toFace },
    { of: 'support, plate side', given: toWeld, least: toFace, off: [noWeld] },
    { of: 'rows', given: p, least: toBolt, off: [singleRow] },
    { of: 'columns', given: q, least: toBolt, off: [singleColumn] },
  ],
};
