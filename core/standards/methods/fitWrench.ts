import { byKind, isCleat } from '../../end/byKind.ts';
import {
  type Gate,
  noSupportBolts,
  noWebHoles,
  oneSupportRow,
  pairOfCleats,
  singleColumn,
  singleRow,
} from '../../end/gates.ts';
import {
  given,
  h,
  leg,
  n,
  support as outline,
  p,
  q,
  r,
  supportBolts,
  tf,
  tp,
  tw,
  y1,
  yp,
  z1,
} from '../../end/given.ts';
import { minus, over, plus, step, type Tree, times } from '../../formula/tree.ts';
import { wrenchRoom } from '../../steel/wrenchRoom.ts';
import type { Length } from '../../units/dimension.ts';
import type { FitRule } from '../standard.ts';
import { notFinPlate } from './kinds.ts';
import { underFitting } from './opposite.ts';
import { columnFace, notBeamWeb, notColumnWeb } from './supportOutline.ts';
import { bottomCut, headsApart, supportBottomCut, supportTopCut, topCut } from './wrenchGates.ts';

/** Practice, no clause: an end without room for the wrench is referred, never failed, for another tool may do. */
const source = { clause: 'practice', basis: 'practice' } as const;

const inWeb = {
  socket: given('D_w', '1,0', (f) => f.socket),
  spare: given('s_w', '1,0', (f) => wrenchRoom(f.d).spare),
  corners: given('e_n', '1,0', (f) => wrenchRoom(f.d).corners),
};
const inSupport = {
  socket: given('D_w,s', '1,0', (f) => f.supportBolts.socket),
  spare: given('s_w,s', '1,0', (f) => wrenchRoom(f.supportBolts.d).spare),
  corners: given('e_n,s', '1,0', (f) => wrenchRoom(f.supportBolts.d).corners),
};

/** From a bolt's axis: to a face beside it, and to the next bolt. mm */
const roomOf = ({ socket, spare, corners }: typeof inWeb) => {
  const toFace = step('R_w', plus(over(socket, 2), spare), source, 'half the socket and room beside it');
  return { toFace, toBolt: step('p_w', plus(toFace, over(corners, 2)), source, 'past head or nut of the next bolt') };
};
const web = roomOf(inWeb);
const support = roomOf(inSupport);

const noCleat: Gate = { when: byKind('', (kind) => !isCleat(kind), 'no cleat'), reason: 'no-cleat' };
const cleat: Gate = { when: byKind('', isCleat, 'a cleat'), reason: 'cleats' };
const root = plus(tf, r);
const toTop = step('y_w', minus(y1, root), source, 'from the first row to the root of the top flange');
const toBottom = step(
  'y_w',
  minus(h, plus(y1, times(minus(n, 1), p), tf, r)),
  source,
  'from the last row to the root of the bottom flange',
);
const toWeld = step('x_w', minus(z1, leg), source, 'from the first column to the toe of the weld');
const toOtherLeg = step('x_w', minus(z1, tp), source, 'from the first column to the leg on the support');

const firstRow = plus(yp, supportBolts.eTop);
const supportToTop = step('y_w', minus(firstRow, root), source, 'from the first row to the root of the top flange');
const lastRow = plus(firstRow, times(minus(supportBolts.n, 1), supportBolts.p));
const supportToBottom = step(
  'y_w',
  minus(h, plus(lastRow, tf, r)),
  source,
  'from the last row to the root of the bottom flange',
);
const itsRoot = plus(outline.tf, outline.r);
const supportToItsTop = step(
  'y_w',
  minus(plus(firstRow, outline.above), itsRoot),
  source,
  "from the first row to the root of the support's top flange",
);
const supportToItsFoot = step(
  'y_w',
  minus(outline.h, plus(lastRow, outline.above, itsRoot)),
  source,
  "from the last row to the root of the support's bottom flange",
);
const beside: Tree<Length> = over(minus(supportBolts.cc, tw), 2);
const toWebLeg = step('x_w', minus(beside, tp), source, 'from the line to the leg on the web');
const toWebWeld = step('x_w', minus(beside, leg), source, 'from the line to the weld along the web');
/** Nut, washer and tail: common practice, from memory, on either side. */
const projection = step(
  'l_n',
  times(
    1.3,
    given('d', '1,0', (f) => f.d),
  ),
  source,
  'nut, washer and tail of a web bolt',
);
const toHeads = step('x_w', minus(toWebLeg, projection), source, 'from the line to the nuts of the web bolts');

/**
 * Room for head, washer, nut and wrench about every bolt, across its axis, mm: to the beam's flanges where these are not cut back, to the
 * support or to the cleat's other leg, to the flanges of the support, past welds and the nuts of the other bolts, and to the next bolt. Along its axis the space is taken
 * to be open. Bolts M12 to M36, 1/2 to 1-1/4 in.
 */
export const fitWrench: FitRule = {
  source,
  breach: 'refer',
  parts: [
    { of: 'top flange', given: toTop, least: web.toFace, off: [noWebHoles, topCut] },
    { of: 'bottom flange', given: toBottom, least: web.toFace, off: [noWebHoles, bottomCut] },
    { of: 'support, web side', given: z1, least: web.toFace, off: [noWebHoles, pairOfCleats] },
    { of: 'support, plate side', given: toWeld, least: web.toFace, off: [notFinPlate] },
    { of: 'support leg', given: toOtherLeg, least: web.toFace, off: [noWebHoles, noCleat] },
    { of: 'rows', given: p, least: web.toBolt, off: [noWebHoles, singleRow] },
    { of: 'columns', given: q, least: web.toBolt, off: [noWebHoles, singleColumn] },
    {
      of: 'support bolts, top flange',
      given: supportToTop,
      least: support.toFace,
      off: [noSupportBolts, supportTopCut],
    },
    {
      of: 'support bolts, bottom flange',
      given: supportToBottom,
      least: support.toFace,
      off: [noSupportBolts, supportBottomCut],
    },
    { of: 'support bolts, web leg', given: toWebLeg, least: support.toFace, off: [noSupportBolts, noCleat] },
    {
      of: 'support bolts, web bolts',
      given: toHeads,
      least: support.toFace,
      off: [noSupportBolts, noWebHoles, headsApart],
    },
    { of: 'support bolts, web', given: toWebWeld, least: support.toFace, off: [noSupportBolts, cleat] },
    {
      of: "support bolts, column's flange",
      given: step('x_w', minus(columnFace, over(supportBolts.cc, 2)), source, "from the line to the column's flange"),
      least: support.toFace,
      off: [noSupportBolts, notColumnWeb],
    },
    {
      of: "support bolts, support's top flange",
      given: supportToItsTop,
      least: support.toFace,
      off: [noSupportBolts, notBeamWeb],
    },
    {
      of: "support bolts, support's bottom flange",
      given: supportToItsFoot,
      least: support.toFace,
      off: [noSupportBolts, notBeamWeb],
    },
    underFitting(over(inSupport.socket, 2)),
    { of: 'support bolts, rows', given: supportBolts.p, least: support.toBolt, off: [noSupportBolts, oneSupportRow] },
  ],
};
