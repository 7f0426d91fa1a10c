import { byKind, isEndPlate } from '../../end/byKind.ts';
import { fullDepthPlate, type Gate, noWebHoles, uncoped } from '../../end/gates.ts';
import { cb, ct, d0, db, dt, eEnd, flag, g, h, hp, m, q, r, rb, rt, support, tf, yp } from '../../end/given.ts';
import { atMost, constant, minus, most, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { FitRule } from '../standard.ts';
import { betweenFlanges, onBeamWeb } from './supportOutline.ts';

/** Rules of good practice, no clauses: an end that breaks one is referred, never failed, unless it cannot be built. */
const source = { clause: 'practice', basis: 'practice' } as const;
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

const noTop: Gate = { when: flag('', (f) => f.dt === 0), reason: 'no-top-cope' };
const noBottom: Gate = { when: flag('', (f) => f.db === 0), reason: 'no-bottom-cope' };
const noSupport: Gate = { when: flag('', (f) => !f.support.here), reason: 'no-support' };
const outsideSupport: Gate = {
  when: flag('', (f) => f.g >= (f.support.b - f.support.tw) / 2),
  reason: 'clear-of-support',
};

/** Flange and root fillet. */
const root = step('t_f + r', plus(tf, r), source);
const plateFoot = step('y_q', minus(h, plus(yp, hp)), source, 'foot of the plate, from below');

/** Plate or cleat takes half of the clear web and stands between the fillets, or the cut edges, and on the flat of a supporting web. */
export const fitPlateDepth: FitRule = {
  source,
  breach: 'refer',
  parts: [
    {
      of: 'depth',
      given: hp,
      least: step('h_min', times(0.5, minus(h, times(2, plus(tf, r)))), source, 'half the clear web'),
      off: [fullDepthPlate],
    },
    {
      of: 'top',
      given: yp,
      least: pick([[flag('', (f) => f.dt > 0, 'coped above'), dt]], root),
      off: [fullDepthPlate],
    },
    {
      of: 'bottom',
      given: plateFoot,
      least: pick([[flag('', (f) => f.db > 0, 'coped below'), db]], root),
      off: [fullDepthPlate],
    },
    ...onBeamWeb,
  ],
};

const lastColumn = plus(eEnd, times(minus(m, 1), q));
const copeLength = (past: Tree<Length>): FitRule => {
  const least = step('c_min', past, source);
  return {
    source,
    breach: 'refer',
    parts: [
      { of: 'top', given: ct, least, off: [noWebHoles, uncoped, noTop] },
      { of: 'bottom', given: cb, least, off: [noWebHoles, uncoped, noBottom] },
    ],
  };
};

/** A cope clears the last column's holes. */
export const fitCopeLength: FitRule = copeLength(plus(lastColumn, over(d0, 2)));
/** A cope reaches the last column's centres. */
export const fitCopeLengthToCentres: FitRule = copeLength(lastColumn);

const positive = (length: Tree<Length>): Tree<Length> => most(length, mm(0));
const underTop = step('d_min', positive(minus(plus(support.tf, support.r), support.above)), source);
const overBottom = step(
  'd_min',
  positive(minus(h, minus(support.h, plus(support.tf, support.r, support.above)))),
  source,
);
const noneNeeded = (
  needed: (f: { support: { tf: number; r: number; h: number; topOfSteel: number }; h: number }) => number,
): Gate => ({
  when: flag('', (f) => needed(f) <= 0),
  reason: 'clear-of-support',
});

/** The support's flange above the beam, or below its foot. */
const flangeAbove = noneNeeded((f) => f.support.tf + f.support.r - f.support.topOfSteel);
const flangeBelow = noneNeeded((f) => f.h - (f.support.h - f.support.tf - f.support.r - f.support.topOfSteel));

/** Copes reach past flange and fillet, and clear the supporting beam's flanges where the end stands within them. */
export const fitCopeDepth: FitRule = {
  source,
  breach: 'refer',
  parts: [
    { of: 'top', given: dt, least: root, off: [uncoped, noTop] },
    { of: 'bottom', given: db, least: root, off: [uncoped, noBottom] },
    {
      of: 'top, at the support',
      given: dt,
      least: underTop,
      off: [noSupport, outsideSupport, flangeAbove],
    },
    {
      of: 'bottom, at the support',
      given: db,
      least: overBottom,
      off: [noSupport, outsideSupport, flangeBelow],
    },
  ],
};

export const fitCopeRadius: FitRule = {
  source,
  breach: 'refer',
  parts: [
    { of: 'top', given: rt, least: mm(10), off: [uncoped, noTop] },
    { of: 'bottom', given: rb, least: mm(10), off: [uncoped, noBottom] },
  ],
};

const clearance = (c: Tree<Length>): Tree<Length> =>
  step('gap', minus(plus(g, c), over(minus(support.b, support.tw), 2)), source, 'past the flange of the support');
const clearTop = clearance(ct);
const clearBottom = clearance(cb);

/** Room between a cope's face and the supporting beam's flange, and beside a beam between a column's flanges. */
export const fitCopeClearance: FitRule = {
  source,
  breach: 'refer',
  parts: [
    {
      of: 'top',
      given: clearTop,
      least: mm(10),
      off: [noSupport, uncoped, noTop, flangeAbove],
      clash: atMost(clearTop, mm(0)),
    },
    {
      of: 'bottom',
      given: clearBottom,
      least: mm(10),
      off: [noSupport, uncoped, noBottom, flangeBelow],
      clash: atMost(clearBottom, mm(0)),
    },
    ...betweenFlanges,
  ],
};

const fillsSetback: Gate = { when: byKind('an end plate', isEndPlate), reason: 'fills-setback' };

export const fitSetback: FitRule = {
  source,
  breach: 'refer',
  parts: [{ of: '', given: g, least: mm(8), most: mm(20), off: [fillsSetback] }],
};
