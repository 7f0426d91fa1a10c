import { type Gate, intactFlange, singleColumn, singleRow } from '../../end/gates.ts';
import {
  ab,
  at,
  ct,
  d,
  d0,
  db,
  dt,
  eBot,
  eEnd,
  eTop,
  ex,
  flag,
  fus,
  fy,
  fyp,
  g,
  h,
  hp,
  n,
  p,
  q,
  r,
  rb,
  rt,
  support,
  tf,
  tp,
  ts,
  tw,
  y1,
} from '../../end/given.ts';
import {
  atMost,
  constant,
  inMPa,
  least,
  minus,
  most,
  over,
  pick,
  plus,
  root,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Length, Stress } from '../../units/dimension.ts';
import type { FitRule } from '../standard.ts';
import { upTo } from './bound.ts';
import { gammaM2 } from './factors.ts';
import { guide, memory, seen } from './sources.ts';
import { supportGates } from './support.ts';
import { betaW, throat, weldedFu } from './weld.ts';

const spacing = seen('1-8 3.5');
const holes = memory('EN 1090-2');
const ductility = memory('joint guide 2008');
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

const noTop: Gate = { when: flag('no top cope', (f) => f.dt === 0), reason: 'no-top-cope' };
const noBottom: Gate = { when: flag('no bottom cope', (f) => f.db === 0), reason: 'no-bottom-cope' };
const bottomFlange: Gate = {
  when: flag('a bottom flange below every column', (f) => f.mBottom === 0),
  reason: 'no-bottom-cope',
};
const notFinPlate: Gate = { when: flag('no fin plate', (f) => f.kind !== 'fin-plate'), reason: 'fin-plates-only' };
const noSupport: Gate = { when: flag('no section of a supporting beam', (f) => !f.support.here), reason: 'no-support' };

const widest = step('p_max', least(times(14, least(tw, tp)), mm(200)), spacing);

/** EN 1993-1-8 Table 3.3, steel not exposed to the weather. */
export const fitPitch: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [{ of: '', given: p, least: step('p_min', times(2.2, d0), spacing), most: widest, off: [singleRow] }],
};
export const fitGauge: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [{ of: '', given: q, least: step('q_min', times(2.4, d0), spacing), most: widest, off: [singleColumn] }],
};

const edge = step('e_min', times(1.2, d0), spacing);
export const fitEdgeWeb: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: 'top', given: at, least: edge, off: [intactFlange] },
    { of: 'bottom', given: ab, least: edge, off: [bottomFlange] },
  ],
};
export const fitEnd: FitRule = { source: spacing, breach: 'fails', parts: [{ of: '', given: eEnd, least: edge }] };
export const fitEdgePlate: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: 'top', given: eTop, least: edge },
    { of: 'bottom', given: eBot, least: edge },
    { of: 'free edge', given: ex, least: edge },
  ],
};

/** Flange and root fillet. */
const flangeAndRoot = step('t_f + r', plus(tf, r), guide);
const plateTop = step('y_p', minus(y1, eTop), guide, 'top of the plate');
const plateFoot = step('y_q', minus(h, plus(y1, times(minus(n, 1), p), eBot)), guide, 'foot of the plate, from below');

/** The plate is deep enough to hold the end against twisting, and lies on the flat of the web beside a flange that is not cut. */
export const fitPlateDepth: FitRule = {
  source: guide,
  breach: 'fails',
  parts: [
    { of: 'depth', given: hp, least: step('h_min', times(0.6, h), guide), breach: 'refer', off: [notFinPlate] },
    {
      of: 'top',
      given: plateTop,
      least: flangeAndRoot,
      off: [notFinPlate, { when: flag('a top cope', (f) => f.dt > 0), reason: 'coped' }],
    },
    {
      of: 'bottom',
      given: plateFoot,
      least: flangeAndRoot,
      off: [notFinPlate, { when: flag('a bottom cope', (f) => f.db > 0), reason: 'coped' }],
    },
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
  ],
};

export const fitSetback: FitRule = {
  source: ductility,
  breach: 'refer',
  parts: [{ of: '', given: g, least: step('g_min', pick([[atMost(h, upTo(610, '1,0')), mm(10)]], mm(20)), ductility) }],
};

/** Thickest ply in which a bolt's hole gives before the bolt; none above S355. */
const thickest = (fy: Tree<Stress>): Tree<Length> =>
  pick(
    [
      [atMost(inMPa(fy), upTo(275)), times(0.5, d)],
      [atMost(inMPa(fy), upTo(355)), times(0.42, d)],
    ],
    mm(0),
  );
const ofWeb = step('t_max,w', thickest(fy), ductility);
const ofPlate = step('t_max,p', thickest(fyp), ductility);
const webFirst = atMost(times(tw, ofPlate), times(tp, ofWeb));

/** The end turns by its bolts ploughing the plate or the web; the weld outlasts the plate, and the plate does not punch through the support. */
export const fitRotation: FitRule = {
  source: ductility,
  breach: 'refer',
  parts: [
    {
      of: 'plate or web',
      given: step('t', pick([[webFirst, tw]], tp), ductility),
      most: step('t_max', pick([[webFirst, ofWeb]], ofPlate), ductility),
      off: [notFinPlate],
    },
    {
      of: 'throat of the weld',
      given: throat,
      least: step('a_min', over(times(tp, fyp, betaW, gammaM2), times(root(2), weldedFu)), guide),
      off: [notFinPlate],
      source: guide,
    },
    {
      of: 'plate on the support',
      given: tp,
      most: step('t_max', over(times(ts, fus), times(fyp, gammaM2)), ductility),
      off: [notFinPlate, ...supportGates],
    },
  ],
};
