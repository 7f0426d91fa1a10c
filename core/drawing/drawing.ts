/**
 * A neutral drawing of one end, in mm of the real piece: x along the beam from its own end (the support is at negative x), y down from top
 * of steel. It says what is drawn and what the words point at; `layoutDrawing` finds the places, and screen, paper and DXF only trace lines.
 * Line kinds are those of ISO 128: outline and path wide, the rest narrow.
 */
export type LineKind = 'outline' | 'narrow' | 'hidden' | 'centre' | 'neighbour' | 'break' | 'path' | 'hatch' | 'force';

export interface Point {
  readonly x: number;
  readonly y: number;
}

/** An arc from the last point to `to`; clockwise as seen on the drawing. Never more than a half circle. */
export interface Arc {
  readonly to: Point;
  readonly radius: number;
  readonly clockwise: boolean;
}

/** A run of straight lines and arcs. */
export interface Stroke {
  readonly kind: LineKind;
  readonly from: Point;
  readonly to: readonly (Point | Arc)[];
  readonly closed?: boolean;
  /** An arrow head at the end of the stroke, as on forces. */
  readonly arrow?: boolean;
}

export interface Circle {
  readonly kind: LineKind;
  readonly centre: Point;
  readonly radius: number;
  readonly filled?: boolean;
}

/** A hatched or blackened area. */
export interface Area {
  readonly outline: readonly Point[];
  readonly fill: 'hatch' | 'black';
}

/** `size` is the value of a field, `derived` follows from others, `second` is said in the second ink, `path` belongs to the way of failing shown. */
export type WordRole = 'size' | 'derived' | 'note' | 'second' | 'path';

/** A word or number set as one piece; `path` names the field of the end whose value it is. */
export interface Word {
  readonly text: string;
  readonly role: WordRole;
  readonly path?: string;
  readonly italic?: boolean;
}

/** Words on one line. */
export type Line = readonly Word[];

export type Side = 'top' | 'bottom' | 'left' | 'right';

/** Where a dimension line lies: outward from the edge at `base` on the given side; lane 1 is next to it, longer ones further out. */
export interface Lane {
  readonly side: Side;
  /** x of the edge for left and right, y for top and bottom, mm. */
  readonly base: number;
  readonly lane: number;
}

/** Space within the outline's box, such as the notch itself, where a dimension reads better than further out if there is enough of it. */
export interface Room {
  /** Edge from which the dimension line stands off to the given side, and how far the space reaches from it, mm. */
  readonly side: Side;
  readonly base: number;
  readonly width: number;
  /** Width that is enough, in text heights. */
  readonly heights: number;
  /** Absent: the first line there. */
  readonly lane?: number;
}

/** A size between two points of the piece. */
export interface Dimension {
  readonly axis: 'x' | 'y';
  readonly from: Point;
  readonly to: Point;
  readonly at: Lane;
  readonly room?: Room;
  /** In the units of the file, as it is written: a value in brackets is derived and no field. */
  readonly line: Line;
  /** Field of the end; absent for derived sizes. */
  readonly path?: string;
  /** mm. */
  readonly value: number;
}

/** Words that belong to a spot on the piece, with a leader to it. */
export interface Callout {
  readonly name: string;
  /** Spots the leader may end at, the best first. */
  readonly targets: readonly Point[];
  readonly end: 'arrow' | 'dot' | 'none';
  /** Ways to break the words into lines, the best first. */
  readonly variants: readonly (readonly Line[])[];
  /** Where the words stand best. */
  readonly near: Point;
  /** True for words that should stand on the beam, not beside it. */
  readonly onBeam: boolean;
  readonly align: 'start' | 'end';
}

/** A fillet weld: its symbol's arrow ends at one of the spots, the symbol stands to the given side of it. */
export interface WeldMark {
  readonly targets: readonly Point[];
  readonly line: Line;
  readonly towards: 'left' | 'right';
  /** Fillets on both sides of the joint, or on the side of the arrow alone. */
  readonly sides: 'both' | 'arrow';
  readonly practice: WeldPractice;
  /** Said in the symbol's tail. */
  readonly tail?: Line;
}

/** ISO 2553, system A: size before the triangle, a dashed line for the other side. AWS A2.4: the arrow side below the line, each side sized. */
export type WeldPractice = 'iso' | 'aws';

/** A straight cut of the beam where the drawing stops. */
export interface Break {
  readonly x: number;
  readonly top: number;
  readonly bottom: number;
}

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** A part that is cut through, hatched; parts beside each other slant apart. */
export interface CutPart {
  readonly outline: readonly Point[];
  readonly slant: 1 | -1;
}

/** From the side; or from the beam toward the support, cut through the beam just inside its end: x then runs across, 0 in the web's middle. */
export type ViewName = 'side' | 'support';

/** One view of the end. Heights are the same in all of them. */
export interface View {
  readonly name: ViewName;
  /** Stands over the view where there are several. */
  readonly title: Line;
  /** Box of the piece and of the support's section, without dimensions. */
  readonly box: Box;
  /** Box of the beam alone. */
  readonly beam: Box;
  readonly strokes: readonly Stroke[];
  readonly cuts: readonly CutPart[];
  readonly holes: readonly Circle[];
  readonly breaks: readonly Break[];
  readonly dimensions: readonly Dimension[];
  readonly callouts: readonly Callout[];
  readonly weld: WeldMark | null;
  /** Lines along which paths of failing will run: words keep off them if they can. */
  readonly keptClear: readonly (readonly [Point, Point])[];
  /** The support's face with its name, and the reaction on it. */
  readonly face?: { readonly x: number; readonly top: number; readonly bottom: number; readonly line: Line };
  readonly reaction?: Line;
}

/** The end from the side, with the support's face and the reaction. */
export interface Drawing extends View {
  readonly face: NonNullable<View['face']>;
  readonly reaction: Line;
}

/** Words beside a part of a failure path. */
export interface Tag {
  /** The part spoken of; both points the same for a spot. */
  readonly along: readonly [Point, Point];
  readonly text: string;
}

/** The path along which one check tears, yields or shears, drawn over the piece, with its lengths. */
export interface FailurePath {
  /** The view that it is drawn over; absent: from the side. */
  readonly view?: ViewName;
  readonly strokes: readonly Stroke[];
  readonly circles: readonly Circle[];
  readonly areas: readonly Area[];
  readonly tags: readonly Tag[];
  /** What the path shows, in one sentence. */
  readonly caption: string;
  /** Fields whose sizes make the path: the bench may mark them. */
  readonly fields: readonly string[];
  /** How far the whole path may be moved along the beam, mm, so as not to run through words. */
  readonly slide?: number;
}
