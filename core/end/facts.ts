import type { Section } from '../shape/section.ts';
import type { Shape } from '../shape/shape.ts';
import type { Joint } from './schema.ts';

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

/** The supporting member's outline, where its section is known, else zeros; heights as the beam's own. */
export interface SupportFacts {
  /** True for a supporting beam: its flanges may lie within the beam's depth. */
  readonly here: boolean;
  readonly b: number;
  readonly tw: number;
  readonly tf: number;
  readonly r: number;
  readonly h: number;
  /** Support's top flange above the beam's, positive up. */
  readonly topOfSteel: number;
}

/** Bolts that hold a cleat's support leg, or an end plate, to the support. mm, MPa; `n` is 0 where there are none. */
export interface SupportBoltFacts {
  /** Rows, and lines: two with an end plate or a pair of cleats, one with one cleat. */
  readonly n: number;
  readonly lines: number;
  readonly p: number;
  /** Cross centres: between the lines on either side of the web. */
  readonly cc: number;
  readonly d: number;
  readonly inch: boolean;
  readonly As: number;
  readonly d0: number;
  readonly dStandard: number;
  /** Hole diameter for net areas. */
  readonly dn: number;
  /** Outside diameter of the wrench's socket. */
  readonly socket: number;
  readonly fub: number;
  readonly fnv: number;
  readonly boltListed: boolean;
  readonly threadsIn: boolean;
  /** Edges of the leg or plate above the first row and below the last. */
  readonly eTop: number;
  readonly eBot: number;
  /** Vertical edge distance, the lesser of those two: safe for either direction of the force. */
  readonly ev: number;
  /** From a line to the free edge of the leg or plate beside it. */
  readonly eh: number;
}

/** A place on the support's face, mm: x across from the middle of the beam's web, y down from top of steel. */
export interface OnFace {
  readonly x: number;
  readonly y: number;
}

/** Bolts of a beam on the other side of the same web. mm */
export interface OppositeFacts {
  /** True where they are told; distances are nothing where there is none to measure. */
  readonly told: boolean;
  /** How many go through holes of ours, and whether every bolt of either side does. */
  readonly shared: number;
  readonly all: boolean;
  /** The others; the least distance of one to a bolt of ours, and to what lies on the support on this side, less than nothing under it. */
  readonly apart: readonly OnFace[];
  readonly toBolt: number;
  readonly toFitting: number;
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
  /** Strengths of the web, of the flange (yield), of the plate (ply, cleat), of bolt and electrode (0 where it plays no part). */
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
  /** Rows, columns, pitch, gauge, first row, last row, end distance of the bolts through the web; rows and columns are 0 where it is welded. */
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
  /** Outside diameter of the wrench's socket. */
  readonly socket: number;
  readonly threadsIn: boolean;
  readonly z: number;
  readonly z1: number;
  readonly tp: number;
  readonly hp: number;
  readonly eTop: number;
  readonly eBot: number;
  readonly ex: number;
  /** Top of the plate, ply or cleat, down from top of steel. */
  readonly yp: number;
  /** Angles beside the web and shear planes of its bolts: 2 for a pair of cleats, else 1. */
  readonly k: number;
  /** Legs of a cleat on the web and on the support, and the root radius between them; 0 where there is none. */
  readonly legWeb: number;
  readonly legSupport: number;
  readonly rootRadius: number;
  /** Width of an end plate; 0 for other joints. */
  readonly bp: number;
  /** Leg of the joint's weld, what it runs along, and the return of a cleat's weld along the web. */
  readonly leg: number;
  readonly weldTo: 'none' | 'support' | 'web';
  readonly weldReturn: number;
  readonly supportBolts: SupportBoltFacts;
  readonly opposite: OppositeFacts;
  readonly kind: Joint['kind'];
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
  /** Reaction of a beam on the other side of the same web, N; 0 where there is none. */
  readonly Vo: number;
  /** Thickness of the part of the support that the joint is fixed to; 0 where it is not told. */
  readonly ts: number;
  /** Strengths of the support; 0 where its grade is not told. */
  readonly fys: number;
  readonly fus: number;
  /** Options in force, every key of the standard present. */
  readonly options: Readonly<Record<string, string>>;
}
