import type { Faces, Family } from './faces.ts';
import type { Run } from './richText.ts';
import { type Face, UNKNOWN } from './trueType.ts';

/** mm on the page from its upper left corner, x to the right, y down. */
export interface Spot {
  readonly x: number;
  readonly y: number;
}

/** An arc from the last point to this one, never more than a half circle; clockwise as seen. */
export interface ArcTo extends Spot {
  readonly radius: number;
  readonly clockwise: boolean;
}

/** `width` in mm; `dash` lengths of stroke and gap in mm. `fill` black or white without an edge, unless a width is given too. */
export interface PathStyle {
  readonly width?: number;
  readonly dash?: readonly number[];
  readonly fill?: 'black' | 'white';
  readonly closed?: boolean;
  readonly evenOdd?: boolean;
}

/** Type in points; `turned` reads upward. */
export interface TextStyle {
  readonly size: number;
  readonly family?: Family;
  readonly bold?: boolean;
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly turned?: boolean;
  /** On black. */
  readonly white?: boolean;
}

export interface TextMark {
  readonly kind: 'text';
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly face: Face;
  readonly size: number;
  readonly turned: boolean;
  readonly white: boolean;
}

export interface PathMark extends PathStyle {
  readonly kind: 'path';
  readonly from: Spot;
  readonly to: readonly (Spot | ArcTo)[];
}

export interface CircleMark extends PathStyle {
  readonly kind: 'circle';
  readonly centre: Spot;
  readonly radius: number;
}

/** Black and white squares of one size in rows, such as a square code; what is not dark stays as it was. */
export interface GridMark {
  readonly kind: 'grid';
  readonly x: number;
  readonly y: number;
  /** Side of a square, mm. */
  readonly module: number;
  /** True for dark. */
  readonly rows: readonly (readonly boolean[])[];
}

export type Mark = TextMark | PathMark | CircleMark | GridMark;

/** A run that may be bolder than the line it stands in. */
export interface SetRun extends Run {
  readonly bold?: boolean;
}

/** mm in a point of type. */
export const POINT = 25.4 / 72;
/** Subscripts and exponents: share of the type's size, and how far they stand off the line. */
const SMALL = 0.78;
const LOWERED = 0.2;
const RAISED = 0.34;
/** Least size of a subscript, pt. */
const LEAST = 6.5;

/** Collects marks page by page; nothing is written before all is placed. Measures in mm. */
export class Pen {
  readonly pages: Mark[][] = [[]];
  private page = 0;

  constructor(private readonly faces: Faces) {}

  /** The marks that follow go on this page, 0 the first; pages in between are made. */
  turnTo(page: number): void {
    while (this.pages.length <= page) this.pages.push([]);
    this.page = page;
  }

  private put(mark: Mark): void {
    this.pages[this.page]!.push(mark);
  }

  line(x1: number, y1: number, x2: number, y2: number, width: number, dash?: readonly number[]): void {
    this.path({ x: x1, y: y1 }, [{ x: x2, y: y2 }], { width, ...(dash && { dash }) });
  }

  path(from: Spot, to: readonly (Spot | ArcTo)[], style: PathStyle): void {
    this.put({ kind: 'path', from, to, ...style });
  }

  box(x: number, y: number, width: number, height: number, style: PathStyle): void {
    const corners = [
      { x: x + width, y },
      { x: x + width, y: y + height },
      { x, y: y + height },
    ];
    this.path({ x, y }, corners, { ...style, closed: true });
  }

  circle(x: number, y: number, radius: number, style: PathStyle): void {
    this.put({ kind: 'circle', centre: { x, y }, radius, ...style });
  }

  grid(x: number, y: number, module: number, rows: GridMark['rows']): void {
    this.put({ kind: 'grid', x, y, module, rows });
  }

  private faceOf(run: SetRun, { family = 'narrow', bold = false }: TextStyle): Face {
    return this.faces({ family, bold: run.bold ?? bold, italic: run.italic });
  }

  private sizeOf(run: Run, { size }: TextStyle): number {
    return run.sub || run.sup ? Math.max(LEAST, size * SMALL) : size;
  }

  private covered(text: string, face: Face): string {
    if (face.covers(text)) return text;
    return [...text].map((one) => (face.has(one) ? one : UNKNOWN)).join('');
  }

  /** Width of a line, mm. */
  width(text: string | readonly SetRun[], style: TextStyle): number {
    return runsOf(text).reduce((sum, run) => {
      const face = this.faceOf(run, style);
      return sum + (face.width(run.text) * this.sizeOf(run, style) * POINT) / 1000;
    }, 0);
  }

  /** Sets a line on its base line at x, y; returns its width. */
  text(x: number, y: number, text: string | readonly SetRun[], style: TextStyle): number {
    const width = this.width(text, style);
    const { anchor = 'start', turned = false, white = false } = style;
    const back = anchor === 'middle' ? width / 2 : anchor === 'end' ? width : 0;
    let along = -back;
    for (const run of runsOf(text)) {
      if (!run.text) continue;
      const face = this.faceOf(run, style);
      const size = this.sizeOf(run, style);
      const shown = this.covered(run.text, face);
      const down = style.size * POINT * (run.sub ? LOWERED : run.sup ? -RAISED : 0);
      const at = turned ? { x: x + down, y: y - along } : { x: x + along, y: y + down };
      this.put({ kind: 'text', ...at, text: shown, face, size, turned, white });
      along += (face.width(shown) * size * POINT) / 1000;
    }
    return width;
  }
}

const runsOf = (text: string | readonly SetRun[]): readonly SetRun[] =>
  typeof text === 'string' ? [{ text, italic: false, sub: false }] : text;
