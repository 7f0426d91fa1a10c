import { flagOf, foundOf, givenOf } from '../formula/tree.ts';
import type { CutFacts, Facts } from './facts.ts';

/** A quantity read from the facts of the end. */
export const given = givenOf<Facts>();
/** A yes-or-no fact of the end. */
export const flag = flagOf<Facts>();
/** A quantity that a solver finds from facts of the end. */
export const found = foundOf<Facts>();

/** End reaction and tie force, N. */
export const V = given('V', '0,1', (f) => f.V);
export const T = given('T', '0,1', (f) => f.T);

/** The uncut beam, mm. */
export const h = given('h', '1,0', (f) => f.h);
export const b = given('b', '1,0', (f) => f.b);
export const tf = given('t_f', '1,0', (f) => f.tf);
export const tw = given('t_w', '1,0', (f) => f.tw);
export const r = given('r', '1,0', (f) => f.r);

/** Strengths of web, flange, plate or ply, support, bolts and weld metal, MPa. */
export const fy = given('f_y', '-2,1', (f) => f.fy);
export const fu = given('f_u', '-2,1', (f) => f.fu);
export const fyf = given('f_yf', '-2,1', (f) => f.fyf);
export const fyp = given('f_yp', '-2,1', (f) => f.fyp);
export const fup = given('f_up', '-2,1', (f) => f.fup);
export const fub = given('f_ub', '-2,1', (f) => f.fub);
export const fys = given('f_ys', '-2,1', (f) => f.fys);
export const fus = given('f_us', '-2,1', (f) => f.fus);
export const Xu = given('X_u', '-2,1', (f) => f.Xu);

/** Setback, copes, what remains at the end, mm. */
export const g = given('g', '1,0', (f) => f.g);
export const ct = given('c_t', '1,0', (f) => f.ct);
export const dt = given('d_t', '1,0', (f) => f.dt);
export const rt = given('ρ_t', '1,0', (f) => f.rt);
export const cb = given('c_b', '1,0', (f) => f.cb);
export const db = given('d_b', '1,0', (f) => f.db);
export const rb = given('ρ_b', '1,0', (f) => f.rb);
export const ho = given('h_o', '1,0', (f) => f.ho);

/** Bolt pattern, mm. */
export const n = given('n', '0,0', (f) => f.n);
export const m = given('m', '0,0', (f) => f.m);
/** Columns inside the top cope. */
export const mTop = given('m_i', '0,0', (f) => f.mTop);
export const p = given('p', '1,0', (f) => f.p);
export const q = given('q', '1,0', (f) => f.q);
export const y1 = given('y_1', '1,0', (f) => f.y1);
export const eEnd = given('e_end', '1,0', (f) => f.eEnd);
/** From an outer row's first hole to the beam's end or to the face of a short cope that cuts into the row. */
export const eRow = given('e_row', '1,0', (f) => f.eRow);
export const at = given('a_t', '1,0', (f) => f.at);
export const ab = given('a_b', '1,0', (f) => f.ab);
export const d = given('d', '1,0', (f) => f.d);
/** Tensile stress area of a bolt, mm2. */
export const As = given('A_s', '2,0', (f) => f.As);
export const d0 = given('d_0', '1,0', (f) => f.d0);
/** Hole diameter for net areas. */
export const dn = given('d′', '1,0', (f) => f.dn);
/** Support's face to the centroid of the bolts, and to the first column. */
export const z = given('z', '1,0', (f) => f.z);
export const z1 = given('z_1', '1,0', (f) => f.z1);

/** Plate or ply, and its weld, mm. */
export const tp = given('t_p', '1,0', (f) => f.tp);
export const hp = given('h_p', '1,0', (f) => f.hp);
export const eTop = given('e_top', '1,0', (f) => f.eTop);
export const eBot = given('e_bot', '1,0', (f) => f.eBot);
export const ex = given('e_x', '1,0', (f) => f.ex);
export const leg = given('s', '1,0', (f) => f.leg);
/** Part of the support that the joint is fixed to; 0 where it is not told. */
export const ts = given('t_s', '1,0', (f) => f.ts);

/** Top of the plate or cleat, down from top of steel, mm. */
export const yp = given('y_p', '1,0', (f) => f.yp);
/** Angles beside the web, and shear planes of its bolts. */
export const k = given('k', '0,0', (f) => f.k);
/** Legs of a cleat on web and support, width of an end plate, return of a weld along the web, mm. */
export const legWeb = given('l_w', '1,0', (f) => f.legWeb);
export const legSupport = given('l_s', '1,0', (f) => f.legSupport);
export const bp = given('b_p', '1,0', (f) => f.bp);
export const weldReturn = given('l_r', '1,0', (f) => f.weldReturn);
/** Reaction of a beam on the other side of the same web, N. */
export const Vo = given('V_o', '0,1', (f) => f.Vo);

/** Bolts into the support: rows, lines, pitch, cross centres, sizes, edges of leg or plate; mm, mm2, MPa. */
export const supportBolts = {
  n: given('n_s', '0,0', (f) => f.supportBolts.n),
  lines: given('m_s', '0,0', (f) => f.supportBolts.lines),
  p: given('p_s', '1,0', (f) => f.supportBolts.p),
  cc: given('c_c', '1,0', (f) => f.supportBolts.cc),
  d: given('d_s', '1,0', (f) => f.supportBolts.d),
  As: given('A_s,s', '2,0', (f) => f.supportBolts.As),
  d0: given('d_0,s', '1,0', (f) => f.supportBolts.d0),
  dn: given('d′_s', '1,0', (f) => f.supportBolts.dn),
  fub: given('f_ub,s', '-2,1', (f) => f.supportBolts.fub),
  fnv: given('F_nv,s', '-2,1', (f) => f.supportBolts.fnv),
  eTop: given('e_1,s', '1,0', (f) => f.supportBolts.eTop),
  eBot: given('e_2,s', '1,0', (f) => f.supportBolts.eBot),
  ev: given('e_v', '1,0', (f) => f.supportBolts.ev),
  eh: given('e_h', '1,0', (f) => f.supportBolts.eh),
};

/** Bolts of the beam opposite that go through no hole of ours: nearest to a bolt of ours, and to what lies on the support here, mm. */
export const opposite = {
  toBolt: given('p_o', '1,0', (f) => f.opposite.toBolt),
  toFitting: given('x_o', '1,0', (f) => f.opposite.toFitting),
};

/** Full section: area, second moment; first moment and thickness at the peak of V Q/(I t). */
export const whole = {
  A: given('A', '2,0', (f) => f.whole.area),
  I: given('I', '4,0', (f) => f.I),
  Q: given('Q', '3,0', (f) => f.Q),
  t: given('t', '1,0', (f) => f.t),
};

const cut = (of: (f: Facts) => CutFacts) => ({
  depth: given('h_o', '1,0', (f) => of(f).depth),
  c: given('c', '1,0', (f) => of(f).c),
  dc: given('d_c', '1,0', (f) => of(f).dc),
  ec: given('e_c', '1,0', (f) => of(f).ec),
  A: given('A', '2,0', (f) => of(f).A),
  I: given('I', '4,0', (f) => of(f).I),
  W: given('W', '3,0', (f) => of(f).W),
  Q: given('Q', '3,0', (f) => of(f).Q),
  t: given('t', '1,0', (f) => of(f).t),
});

/** What remains behind a cope, at that cope's face. */
export type Cut = ReturnType<typeof cut>;
export const rectangle = cut((f) => f.rectangle);
export const tee = cut((f) => f.tee);

/** Supporting member's section, and the level of a supporting beam, mm. */
export const support = {
  h: given('h_s', '1,0', (f) => f.support.h),
  b: given('b_s', '1,0', (f) => f.support.b),
  tw: given('t_w,s', '1,0', (f) => f.support.tw),
  tf: given('t_f,s', '1,0', (f) => f.support.tf),
  r: given('r_s', '1,0', (f) => f.support.r),
  above: given('a_s', '1,0', (f) => f.support.topOfSteel),
};
