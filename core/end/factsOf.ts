import type { Section } from '../shape/section.ts';
import { firstMoment, type Shape, thickness, wholeShape } from '../shape/shape.ts';
import { shearPeak } from '../shape/shearStress.ts';
import { fromSystem, INCH } from '../units/systems.ts';
import { cutsOf } from './cuts.ts';
import type { Facts, SupportFacts } from './facts.ts';
import { fittingSizes } from './fittingSizes.ts';
import { cleatsIn, webBoltsOf, weldOf } from './jointParts.ts';
import { noOpposite, oppositeFacts } from './oppositeFacts.ts';
import type { End } from './schema.ts';
import { type SupportBoltGiven, supportBoltFacts } from './supportBoltFacts.ts';

/** What is known of a bolt and its hole, as in the facts. */
export type BoltFacts = Pick<
  Facts,
  'd' | 'd0' | 'dStandard' | 'dn' | 'fub' | 'fnv' | 'boltListed' | 'inch' | 'As' | 'socket'
>;

/** What is known of the support: its outline, and what the joint is fixed to. MPa, mm; 0 where it is not told. */
export interface SupportGiven {
  readonly kind: Facts['supportKind'];
  readonly outline: SupportFacts;
  readonly thickness: number;
  readonly steel: { readonly fy: number; readonly fu: number };
}

/** What a standard says of the materials, bolts and holes of one end. MPa, mm. */
export interface Strengths {
  readonly fy: number;
  readonly fu: number;
  readonly fyf: number;
  readonly fyp: number;
  readonly fup: number;
  readonly Xu: number;
  readonly bolt: BoltFacts;
  readonly supportBolt: SupportBoltGiven;
}

/** No supporting member's section is known. */
export const noSupport: SupportFacts = { here: false, b: 0, tw: 0, tf: 0, r: 0, h: 0, topOfSteel: 0 };

export const noSupportGiven: SupportGiven = {
  kind: 'none',
  outline: noSupport,
  thickness: 0,
  steel: { fy: 0, fu: 0 },
};

/** mm in one length unit of a file. */
export const lengthSize = (end: Pick<End, 'units'>): number => (end.units === 'mm-kN' ? 1 : INCH);

interface WholeShear {
  readonly whole: Shape;
  readonly I: number;
  readonly Q: number;
  readonly t: number;
}

const shearOf = new WeakMap<Section, WholeShear>();

const wholeShear = (section: Section): WholeShear => {
  const known = shearOf.get(section);
  if (known) return known;
  const whole = wholeShape(section);
  const { at } = shearPeak(whole);
  const made = { whole, I: whole.inertia, Q: firstMoment(whole, at), t: thickness(whole, at) };
  shearOf.set(section, made);
  return made;
};

/** mm: sizes that meet exactly in inches still meet once converted. */
const NOISE = 1e-9;

/** Columns that stand inside a cope of this length: those before the first whose hole lies wholly beyond its face. */
const columnsInside = (c: number, eEnd: number, q: number, m: number, d0: number): number => {
  let inside = 0;
  while (inside < m && c >= eEnd + inside * q - d0 / 2 - NOISE) inside += 1;
  return inside;
};

const holeAtFace = (c: number, eEnd: number, q: number, m: number, d0: number): boolean => {
  for (let j = 0; j < m; j += 1) if (Math.abs(eEnd + j * q - c) < d0 / 2 - NOISE) return true;
  return false;
};

/** Turns an end, in its own units, and what is known of its materials into facts in N and mm. The reaction is left at 1 N. */
export const factsOf = (
  end: End,
  section: Section,
  strengths: Strengths,
  support: SupportGiven,
  options: Readonly<Record<string, string>>,
): Facts => {
  const k = lengthSize(end);
  const { joint } = end;
  const placed = webBoltsOf(joint);
  const sizes = fittingSizes(end, k);
  const g = joint.kind === 'end-plate' || joint.kind === 'full-end-plate' ? sizes.tp : end.setback * k;
  const ct = (end.top?.length ?? 0) * k;
  const dt = (end.top?.depth ?? 0) * k;
  const cb = (end.bottom?.length ?? 0) * k;
  const db = (end.bottom?.depth ?? 0) * k;
  const n = placed?.bolts.rows ?? 0;
  const m = placed ? (placed.bolts.columns ?? 1) : 0;
  const p = n > 1 ? (placed?.bolts.pitch ?? 0) * k : 0;
  const q = m > 1 ? (placed?.bolts.gauge ?? 0) * k : 0;
  const y1 = (placed?.firstRow ?? 0) * k;
  const yn = n > 0 ? y1 + (n - 1) * p : 0;
  const eEnd = (placed?.endDistance ?? 0) * k;
  const { bolt } = strengths;
  const { d0 } = bolt;
  const { h, b, tf, tw, r } = section;
  const cuts = cutsOf(section, { g, ct, dt, cb, db });
  const shear = wholeShear(section);
  const weld = weldOf(joint);
  const supportBolts = supportBoltFacts(end, k, sizes, tw, strengths.supportBolt);
  const told = end.support?.opposite;
  return {
    V: 1,
    T: fromSystem(end.tie ?? 0, '0,1', end.units),
    section,
    h,
    b,
    tf,
    tw,
    r,
    channel: section.family === 'channel',
    fy: strengths.fy,
    fu: strengths.fu,
    fyf: strengths.fyf,
    fyp: strengths.fyp,
    fup: strengths.fup,
    fub: bolt.fub,
    fnv: bolt.fnv,
    boltListed: bolt.boltListed,
    Xu: strengths.Xu,
    g,
    ct,
    dt,
    rt: (end.top?.radius ?? 0) * k,
    cb,
    db,
    rb: (end.bottom?.radius ?? 0) * k,
    ho: h - dt - db,
    n,
    m,
    p,
    q,
    y1,
    yn,
    eEnd,
    eRow: eEnd - Math.max(y1 - d0 / 2 < dt ? ct : 0, yn + d0 / 2 > h - db ? cb : 0),
    at: y1 - dt,
    ab: h - db - yn,
    mTop: dt > 0 ? columnsInside(ct, eEnd, q, m, d0) : 0,
    mBottom: db > 0 ? columnsInside(cb, eEnd, q, m, d0) : 0,
    d: bolt.d,
    inch: bolt.inch,
    As: bolt.As,
    d0,
    dStandard: bolt.dStandard,
    dn: bolt.dn,
    socket: bolt.socket,
    threadsIn: placed?.bolts.threads !== 'out',
    z: n > 0 ? g + eEnd + ((m - 1) * q) / 2 : 0,
    z1: n > 0 ? g + eEnd : 0,
    tp: sizes.tp,
    hp: sizes.hp,
    eTop: sizes.eTop,
    eBot: sizes.eBot,
    ex: sizes.ex,
    yp: sizes.yp,
    legWeb: sizes.legWeb,
    legSupport: sizes.legSupport,
    rootRadius: sizes.rootRadius,
    bp: sizes.bp,
    weldReturn: sizes.weldReturn,
    k: cleatsIn(joint),
    leg: (weld?.leg ?? 0) * k,
    weldTo: weld?.to ?? 'none',
    supportBolts,
    opposite: told ? oppositeFacts(told, k, { ...sizes, tw, supportBolts }) : noOpposite,
    kind: joint.kind,
    whole: shear.whole,
    I: shear.I,
    Q: shear.Q,
    t: shear.t,
    rectangle: cuts.rectangle,
    tee: cuts.tee,
    holeAtCopeFace: (dt > 0 && holeAtFace(ct, eEnd, q, m, d0)) || (db > 0 && holeAtFace(cb, eEnd, q, m, d0)),
    flangeLeft: (dt > 0 && dt < tf) || (db > 0 && db < tf),
    support: support.outline,
    supportKind: support.kind,
    Vo: fromSystem(end.support?.otherReaction ?? 0, '0,1', end.units),
    ts: support.thickness,
    fys: support.steel.fy,
    fus: support.steel.fu,
    options,
  };
};
