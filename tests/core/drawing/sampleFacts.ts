import type { DrawingWords } from '../../../core/drawing/words.ts';
import { cutsOf } from '../../../core/end/cuts.ts';
import type { Facts, SupportFacts } from '../../../core/end/facts.ts';
import type { Section } from '../../../core/shape/section.ts';
import { firstMoment, thickness, wholeShape } from '../../../core/shape/shape.ts';
import { shearPeak } from '../../../core/shape/shearStress.ts';

/** What an end of the tests is made of, mm and N; what is left out is as at K-207/L, the invented end of the conventions. */
export interface Sample {
  readonly V?: number;
  readonly section?: Section;
  readonly kind?: Facts['kind'];
  readonly g?: number;
  readonly top?: readonly [length: number, depth: number, radius: number] | null;
  readonly bottom?: readonly [length: number, depth: number, radius: number] | null;
  readonly n?: number;
  readonly m?: number;
  readonly p?: number;
  readonly q?: number;
  readonly y1?: number;
  readonly eEnd?: number;
  readonly d?: number;
  readonly d0?: number;
  readonly tp?: number;
  readonly eTop?: number;
  readonly eBot?: number;
  readonly ex?: number;
  readonly leg?: number;
  readonly support?: SupportFacts;
}

export const section406: Section = { family: 'I', h: 406.4, b: 177.9, tf: 12.8, tw: 7.9, r: 10.2 };
export const section203: Section = { family: 'I', h: 203.2, b: 133.2, tf: 7.8, tw: 5.7, r: 7.6 };
export const section914: Section = { family: 'I', h: 903, b: 303.3, tf: 20.2, tw: 15.1, r: 19.1 };
export const channel250: Section = {
  family: 'channel',
  h: 250,
  b: 80,
  tf: 12.5,
  tw: 8,
  r: 12,
  slope: Math.atan(0.08),
  toe: 6,
};

const none: SupportFacts = { here: false, b: 0, tw: 0, tf: 0, r: 0, h: 0, topOfSteel: 0 };

const noSupportBolts: Facts['supportBolts'] = {
  n: 0,
  lines: 0,
  p: 0,
  cc: 0,
  d: 0,
  inch: false,
  As: 0,
  d0: 0,
  dStandard: 0,
  dn: 0,
  socket: 0,
  fub: 0,
  fnv: 0,
  boltListed: false,
  threadsIn: true,
  eTop: 0,
  eBot: 0,
  ev: 0,
  eh: 0,
};

/** Facts in the sense of the conventions, worked out from the sizes. */
export const sampleFacts = (given: Sample = {}): Facts => {
  const section = given.section ?? section406;
  const { h, b, tf, tw, r } = section;
  const [ct, dt, rt] = given.top === undefined ? [110, 45, 10] : (given.top ?? [0, 0, 0]);
  const [cb, db, rb] = given.bottom ?? [0, 0, 0];
  const { n = 3, m = 1, p = 70, y1 = 90, eEnd = 45, d = 20, d0 = 22, g = 10 } = given;
  const q = given.q ?? (m > 1 ? 60 : 0);
  const { tp = 10, eTop = 40, eBot = 40, ex = 50, leg = 8, kind = 'fin-plate', support = none } = given;
  const yn = y1 + (n - 1) * p;
  const inside = (c: number, depth: number): number =>
    depth > 0 ? Array.from({ length: m }, (_, j) => eEnd + j * q).filter((x) => c >= x - d0 / 2).length : 0;
  const whole = wholeShape(section);
  const peak = shearPeak(whole);
  return {
    V: given.V ?? 165_000,
    T: 0,
    section,
    h,
    b,
    tf,
    tw,
    r,
    channel: section.family === 'channel',
    fy: 355,
    fu: 470,
    fyp: 355,
    fup: 470,
    fyf: 355,
    fnv: 0,
    boltListed: true,
    inch: false,
    As: 245,
    supportKind: 'none',
    fys: 0,
    fus: 0,
    fub: 830,
    Xu: 480,
    g,
    ct,
    dt,
    rt,
    cb,
    db,
    rb,
    ho: h - dt - db,
    n,
    m,
    p,
    q,
    y1,
    yn,
    eEnd,
    eRow: eEnd,
    at: y1 - dt,
    ab: h - db - yn,
    mTop: inside(ct, dt),
    mBottom: inside(cb, db),
    d,
    d0,
    dStandard: 22,
    ts: 0,
    dn: d0,
    socket: 46,
    threadsIn: true,
    z: g + eEnd + ((m - 1) * q) / 2,
    z1: g + eEnd,
    tp,
    hp: eTop + (n - 1) * p + eBot,
    eTop,
    eBot,
    ex,
    yp: y1 - eTop,
    k: kind === 'double-cleat' ? 2 : 1,
    legWeb: 0,
    legSupport: 0,
    rootRadius: 0,
    bp: 0,
    leg,
    weldTo: kind === 'fin-plate' ? 'support' : 'none',
    weldReturn: 0,
    supportBolts: noSupportBolts,
    opposite: { told: false, shared: 0, all: false, apart: [], toBolt: 0, toFitting: 0 },
    Vo: 0,
    kind,
    whole,
    I: whole.inertia,
    Q: firstMoment(whole, peak.at),
    t: thickness(whole, peak.at),
    ...cutsOf(section, { ct, dt, cb, db, g }),
    holeAtCopeFace: Array.from({ length: m }, (_, j) => eEnd + j * q).some((x) =>
      [ct, cb].some((c) => c > 0 && Math.abs(x - c) < d0 / 2),
    ),
    flangeLeft: (dt > 0 && dt < tf) || (db > 0 && db < tf),
    support,
    options: {},
  };
};

export const sampleWords: DrawingWords = {
  units: 'mm-kN',
  section: 'UB 406 × 178 × 60',
  boltSize: 'M20',
  boltGrade: '8.8',
  holes: 'drilled',
  cope: 'notch',
  gauge: 'gauge',
  plate: 'fin plate',
  weldSymbols: 'iso',
};

/** A supporting beam whose top is level with the beam's. */
export const sampleSupport: SupportFacts = {
  here: true,
  b: 209.3,
  tw: 10.1,
  tf: 15.6,
  r: 12.7,
  h: 533.1,
  topOfSteel: 0,
};

/** Ends as varied as the drawing has to bear: shallow, deep, uncoped, coped at either flange or both, many bolts, tight sizes. */
export const variedEnds: Readonly<Record<string, Sample>> = {
  'K-207/L': {},
  'uncoped, two rows': { section: section203, top: null, n: 2, y1: 66, p: 70, eTop: 35, eBot: 35 },
  'shallow, coped': {
    section: section203,
    top: [80, 25, 10],
    n: 2,
    y1: 70,
    p: 60,
    eTop: 35,
    eBot: 35,
    eEnd: 35,
    ex: 40,
  },
  'bottom cope alone': { top: null, bottom: [120, 50, 12], y1: 80 },
  'two copes, top the longer': { top: [140, 40, 10], bottom: [90, 60, 10], y1: 90, n: 3, p: 65 },
  'two copes, bottom the longer': { top: [80, 30, 10], bottom: [150, 30, 10], y1: 80, n: 4, eEnd: 40 },
  'two columns': { m: 2, q: 60, top: [180, 45, 12], eEnd: 40, ex: 40 },
  'deep, three columns of eight': {
    section: section914,
    top: [250, 60, 15],
    m: 3,
    q: 65,
    n: 8,
    p: 80,
    y1: 120,
    eEnd: 50,
    d: 24,
    d0: 26,
    tp: 15,
    eTop: 45,
    eBot: 45,
  },
  'channel on a ply': {
    section: channel250,
    kind: 'web-bolts',
    top: null,
    n: 2,
    p: 90,
    y1: 80,
    eEnd: 40,
    d: 16,
    d0: 18,
    ex: 40,
  },
  'one bolt': { section: section203, top: [70, 30, 0], n: 1, y1: 90, eTop: 35, eBot: 35, eEnd: 35, ex: 35 },
  'shallow cope, no radius': { top: [60, 15, 0], g: 15, y1: 70 },
  'plate to the bottom flange': { n: 5, y1: 85, p: 65, eTop: 35, eBot: 35 },
};
