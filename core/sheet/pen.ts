import type { Faces, Family } from './faces.ts';
import type { Run } from './richText.ts';
import type { Face } from './trueType.ts';

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

/** Lines drawn within an outline only. */
export interface HatchMark {
  readonly kind: 'hatch';
  readonly outline: readonly Spot[];
  readonly lines: readonly (readonly [Spot, Spot])[];
  readonly width: number;
}

/** Black squares of one size, such as the modules of a QR code. */
export interface SquaresMark {
  readonly kind: 'squares';
  readonly rows: readonly { readonly x: number; readonly y: number; readonly width: number; readonly height: number }[];
}

export type Mark = TextMark | PathMark | CircleMark | HatchMark | SquaresMark;

/** mm in a point of type. */
export const POINT = 25.4 / 72;
/** Subscripts and exponents: share of the type's size, and how far they stand off the line. */
const SMALL = 0.78;
const LOWERED = 0.2;
const RAISED = 0.34;
/** Least size of a subscript, pt. */
const LEAST = 6.5;

/** Stands for characters that the faces do not have. */
const UNKNOWN = '□';

/** Collects marks page by page; nothing is written before all is placed. Measures in mm. */
export class Pen {
  readonly pages: Mark[][] = [[]];

  constructor(private readonly faces: Faces) {}

  newPage(): void {
    this.pages.push([]);
  }

  private put(mark: Mark): void {
    this.pages.at(-1)!.push(mark);
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

  squares(rows: SquaresMark['rows']): void {
    this.put({ kind: 'squares', rows });
  }

  /** Hatch at 45 degrees, `gap` apart. */
  hatch(outline: readonly Spot[], gap: number, width: number): void {
    const xs = outline.map((spot) => spot.x);
    const ys = outline.map((spot) => spot.y);
    const [left, right, top, bottom] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
    const step = gap * Math.SQRT2;
    const lines: [Spot, Spot][] = [];
    for (let c = Math.ceil((left + top) / step) * step; c <= right + bottom; c += step) {
      lines.push([
        { x: c - bottom, y: bottom },
        { x: c - top, y: top },
      ]);
    }
    this.put({ kind: 'hatch', outline, lines, width });
  }

  private faceOf(run: Run, { family = 'narrow', bold = false }: TextStyle): Face {
    return this.faces({ family, bold, italic: run.italic });
  }

  private sizeOf(run: Run, { size }: TextStyle): number {
    return run.sub || run.sup ? Math.max(LEAST, size * SMALL) : size;
  }

  private covered(text: string, face: Face): string {
    return [...text].map((one) => (face.has(one) ? one : UNKNOWN)).join('');
  }

  /** Width of a line, mm. */
  width(text: string | readonly Run[], style: TextStyle): number {
    return runsOf(text).reduce((sum, run) => {
      const face = this.faceOf(run, style);
      return sum + (face.width(this.covered(run.text, face)) * this.sizeOf(run, style) * POINT) / 1000;
    }, 0);
  }

  /** Sets a line on its base line at x, y; returns its width. */
  text(x: number, y: number, text: string | readonly Run[], style: TextStyle): number {
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

const runsOf = (text: string | readonly Run[]): readonly Run[] =>
  typeof text === 'string' ? [{ text, italic: false, sub: false }] : text;
