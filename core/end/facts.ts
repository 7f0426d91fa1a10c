import type { Section } from '../shape/section.ts';
import type { Shape } from '../shape/shape.ts';

/** The section that remains behind a cope, as seen at the face of that cope. N and mm. */
export interface CutFacts {
  /** False where the end has no such section; the numbers then are zero and nothing reads them. */
  readonly here: boolean;
  readonly shape: Shape | null;
  /** True where the top is cut (the cut edge is in compression). */
  readonly topCut: boolean;
  /** Depth of what remains: h_o of the rectangle, h - d of the tee. */
  readonly depth: number;
  /** Length and depth of the cope that ends here. */
  readonly c: number;
  readonly dc: number;
  /** Arm of the reaction to the cope's face, e_c = g + c. */
  readonly ec: number;
  readonly A: number;
  readonly I: number;
  /** Elastic modulus to the cut edge (rectangle: either edge). */
  readonly W: number;
  /** First moment and thickness where V Q/(I t) peaks in the web. */
  readonly Q: number;
  readonly t: number;
}

/** The supporting member's flange, where a supporting beam's section is known; heights as the beam's own. */
export interface SupportFacts {
  readonly here: boolean;
  readonly b: number;
  readonly tw: number;
  readonly tf: number;
  readonly r: number;
  readonly h: number;
  /** Support's top flange above the beam's, positive up. */
  readonly topOfSteel: number;
}

/**
 * What is known of one end once its names are looked up: no standard owns these numbers. N, mm, MPa; symbols of the trade.
 * Heights run down from top of steel, lengths along the beam from its own end.
 */
export interface Facts {
  /** End reaction; set to 1 N while ways of failing are measured. */
  V: number;
  readonly T: number;
  readonly section: Section;
  readonly h: number;
  readonly b: number;
  readonly tf: number;
  readonly tw: number;
  readonly r: number;
  readonly channel: boolean;
  /** Strengths of the web, of the flange (yield), of the plate (or ply), of bolt and electrode (0 where it plays no part). */
  readonly fy: number;
  readonly fu: number;
  readonly fyf: number;
  readonly fyp: number;
  readonly fup: number;
  readonly fub: number;
  /** Nominal shear strength that the standard lists for the bolt, threads as they lie; 0 where it lists none. */
  readonly fnv: number;
  /** False for a bolt that the standard does not list. */
  readonly boltListed: boolean;
  readonly Xu: number;
  /** Setback. */
  readonly g: number;
  readonly ct: number;
  readonly dt: number;
  readonly rt: number;
  readonly cb: number;
  readonly db: number;
  readonly rb: number;
  readonly ho: number;
  /** Rows, columns, pitch, gauge, first row, last row, end distance. */
  readonly n: number;
  readonly m: number;
  readonly p: number;
  readonly q: number;
  readonly y1: number;
  readonly yn: number;
  readonly eEnd: number;
  /** Web between an outer row's first hole and the beam's end or, where a short cope cuts into that row, the cope's face. */
  readonly eRow: number;
  readonly at: number;
  readonly ab: number;
  /** Columns inside the top cope, and inside the bottom cope. */
  readonly mTop: number;
  readonly mBottom: number;
  readonly d: number;
  /** True for a bolt of an inch series. */
  readonly inch: boolean;
  /** Tensile stress area; 0 where it is not listed. */
  readonly As: number;
  readonly d0: number;
  /** Nominal hole that the standard gives this bolt. */
  readonly dStandard: number;
  /** Hole diameter for net areas, d'. */
  readonly dn: number;
  readonly threadsIn: boolean;
  readonly z: number;
  readonly z1: number;
  readonly tp: number;
  readonly hp: number;
  readonly eTop: number;
  readonly eBot: number;
  readonly ex: number;
  readonly leg: number;
  readonly kind: 'fin-plate' | 'web-bolts';
  /** Full section: second moment, and first moment and thickness where V Q/(I t) peaks in the web. */
  readonly whole: Shape;
  readonly I: number;
  readonly Q: number;
  readonly t: number;
  readonly rectangle: CutFacts;
  readonly tee: CutFacts;
  readonly holeAtCopeFace: boolean;
  readonly flangeLeft: boolean;
  readonly support: SupportFacts;
  readonly supportKind: 'none' | 'beam-web' | 'column-flange' | 'column-web';
  /** Thickness of the part of the support that the joint is fixed to; 0 where it is not told. */
  readonly ts: number;
  /** Strengths of the support; 0 where its grade is not told. */
  readonly fys: number;
  readonly fus: number;
  /** Options in force, every key of the standard present. */
  readonly options: Readonly<Record<string, string>>;
}
