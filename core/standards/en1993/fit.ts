import { byKind, isEndPlate } from '../../end/byKind.ts';
import { fullDepthPlate, type Gate, noWebHoles, noWebWeld } from '../../end/gates.ts';
import { ct, db, dt, flag, g, h, hp, r, rb, rt, support, tf, yp } from '../../end/given.ts';
import { atMost, constant, minus, most, over, pick, plus, step, times } from '../../formula/tree.ts';
import { betweenFlanges, onBeamWeb } from '../methods/supportOutline.ts';
import type { FitRule } from '../standard.ts';
import { upTo } from './bound.ts';
import { notCleat } from './kinds.ts';
import { guide, memory } from './sources.ts';

const holes = memory('EN 1090-2');
const ductility = memory('joint guide 2008');
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

const noTop: Gate = { when: flag('no top cope', (f) => f.dt === 0), reason: 'no-top-cope' };
const noBottom: Gate = { when: flag('no bottom cope', (f) => f.db === 0), reason: 'no-bottom-cope' };
const noSupport: Gate = { when: flag('no section of a supporting beam', (f) => !f.support.here), reason: 'no-support' };

/** Flange and root fillet. */
const flangeAndRoot = step('t_f + r', plus(tf, r), guide);
const foot = step('y_q', minus(h, plus(yp, hp)), guide, 'foot of the plate, from below');

/** The flange is cut back past all that lies beside the web: a cleat may reach past a short cope. */
const cutBack = (c: number, d: number, legWeb: number, g: number): boolean => d > 0 && c >= legWeb - g - 1e-9;
const topCut: Gate = { when: flag('a top cope', (f) => cutBack(f.ct, f.dt, f.legWeb, f.g)), reason: 'coped' };
const bottomCut: Gate = { when: flag('a bottom cope', (f) => cutBack(f.cb, f.db, f.legWeb, f.g)), reason: 'coped' };
const noPlate: Gate = {
  when: byKind('a web bolted to a ply', (kind) => kind === 'web-bolts'),
  reason: 'plates-and-cleats',
};

/**
 * The plate, or cleat, is deep enough to hold the end against twisting, and lies on the flat of the web beside a flange that is not cut; what
 * is welded along the web lies on what a cope leaves. A bolted cleat past the cut edge comes near the flange of the support: it refers. An end
 * plate of the full depth covers the flanges.
 */
export const fitPlateDepth: FitRule = {
  source: guide,
  breach: 'fails',
  parts: [
    { of: 'depth', given: hp, least: step('h_min', times(0.6, h), guide), breach: 'refer', off: [noPlate] },
    { of: 'top', given: yp, least: flangeAndRoot, off: [noPlate, fullDepthPlate, topCut] },
    { of: 'bottom', given: foot, least: flangeAndRoot, off: [noPlate, fullDepthPlate, bottomCut] },
    { of: 'top, welded', given: yp, least: dt, off: [noWebWeld, fullDepthPlate, noTop] },
    { of: 'bottom, welded', given: foot, least: db, off: [noWebWeld, fullDepthPlate, noBottom] },
    { of: 'top, cleat', given: yp, least: dt, breach: 'refer', off: [notCleat, noWebHoles, noTop] },
    { of: 'bottom, cleat', given: foot, least: db, breach: 'refer', off: [notCleat, noWebHoles, noBottom] },
    ...onBeamWeb,
  ],
};

/** The sections behind a cope are taken without flange and root. */
export const fitCopeDepth: FitRule = {
  source: guide,
  breach: 'refer',
  parts: [
    { of: 'top', given: dt, least: flangeAndRoot, off: [noTop] },
    { of: 'bottom', given: db, least: flangeAndRoot, off: [noBottom] },
  ],
};

const finest = flag('option execution: EXC4', (f) => f.options.execution === 'EXC4');
const leastRadius = step('ρ_min', pick([[finest, mm(10)]], mm(5)), holes);

/** Re-entrant corners, EN 1090-2. */
export const fitCopeRadius: FitRule = {
  source: holes,
  breach: 'fails',
  parts: [
    { of: 'top', given: rt, least: leastRadius, off: [noTop] },
    { of: 'bottom', given: rb, least: leastRadius, off: [noBottom] },
  ],
};

/** A top cope reaches past the flange of the supporting beam, and below it with its root. */
export const fitCopeLength: FitRule = {
  source: guide,
  breach: 'fails',
  parts: [
    {
      of: 'top',
      given: step('g + c_t', plus(g, ct), guide),
      least: step('l_min', plus(over(minus(support.b, support.tw), 2), mm(10)), guide),
      off: [noSupport, noTop],
    },
  ],
};
export const fitCopeClearance: FitRule = {
  source: guide,
  breach: 'fails',
  parts: [
    {
      of: 'top',
      given: dt,
      least: step('d_min', most(minus(plus(support.tf, support.r), support.above), mm(0)), guide),
      off: [noSupport, noTop],
    },
    ...betweenFlanges,
  ],
};

/** An end plate fills the setback. */
const fills: Gate = { when: byKind('an end plate', isEndPlate), reason: 'fills-setback' };

export const fitSetback: FitRule = {
  source: ductility,
  breach: 'refer',
  parts: [
    {
      of: '',
      given: g,
      least: step('g_min', pick([[atMost(h, upTo(610, '1,0')), mm(10)]], mm(20)), ductility),
      off: [fills],
    },
  ],
};
