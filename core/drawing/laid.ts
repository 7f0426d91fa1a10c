import type { Arc, Box, LineKind, Point, WordRole } from './drawing.ts';

/** What a mark belongs to, so that a pen may colour it: the piece, a size with its lines, words, or the way of failing shown. */
export type Layer = 'piece' | 'size' | 'words' | 'path';

/** A run of lines and arcs, drawn and not filled. */
export interface LaidRun {
  readonly shape: 'run';
  readonly layer: Layer;
  readonly kind: LineKind;
  readonly from: Point;
  readonly to: readonly (Point | Arc)[];
  readonly closed: boolean;
  /** The field whose dimension this line belongs to. */
  readonly path?: string;
  /** The oblique stroke at the end of a dimension line: narrow geometry, wide pen. */
  readonly tick?: boolean;
}

export interface LaidCircle {
  readonly shape: 'circle';
  readonly layer: Layer;
  readonly kind: LineKind;
  readonly centre: Point;
  readonly radius: number;
  readonly filled: boolean;
}

/** A filled polygon without edge: arrow heads, dots, bearing areas. */
export interface LaidFill {
  readonly shape: 'fill';
  readonly layer: Layer;
  readonly outline: readonly Point[];
}

/** One word or number. Where it is a field (`path`), a pen may leave it out and put an input on `box`. */
export interface LaidText {
  readonly shape: 'text';
  readonly layer: Layer;
  readonly text: string;
  /** On the base line, at the anchor. */
  readonly at: Point;
  readonly anchor: 'start' | 'middle' | 'end';
  /** Degrees clockwise: 0, or -90 for words that are read from the right. */
  readonly rotation: 0 | -90;
  /** Size (em), mm of the piece. */
  readonly size: number;
  readonly role: WordRole;
  readonly italic: boolean;
  readonly path?: string;
  readonly box: Box;
}

export type Mark = LaidRun | LaidCircle | LaidFill | LaidText;

/** The drawing as plain marks in mm of the piece, in the order in which they are drawn, and the box that holds them all. */
export interface Laid {
  readonly marks: readonly Mark[];
  readonly box: Box;
  /** Text size (em), mm of the piece. */
  readonly textHeight: number;
}
