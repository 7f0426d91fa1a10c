import { curvesOf } from './curves.ts';
import type { CircleMark, GridMark, Mark, PathMark, PathStyle, Spot, TextMark } from './pen.ts';
import { POINT } from './pen.ts';
import type { Face } from './trueType.ts';

/** Units of the content in a mm: whole numbers then place every mark within 0.013 mm. */
const UNITS = 40;
/** Points in a unit: to so many places that the far edge of the paper is right within 0.001 mm. */
const SCALE = (72 / 25.4 / UNITS).toFixed(8);

const SOLID = '[] 0 d';
/** Where the control points of a quarter of a circle of radius 1 stand along its tangents. */
const QUARTER = (4 / 3) * Math.tan(Math.PI / 8);

type Corner = readonly [x: number, y: number];

/** A number as PDF writes it: no exponent, no closing zeros. */
const number = (value: number): string => String(Math.round(value * 1000) / 1000);

/** A byte of a text; brackets, backslash and the end of a line are written with a backslash. */
const bytes = Array.from({ length: 256 }, (_, i) => {
  const one = String.fromCharCode(i);
  return i === 13 ? '\\r' : '()\\'.includes(one) ? `\\${one}` : one;
});
/** The two bytes of each glyph's number. */
const pairs: string[] = [];
const pairOf = (glyph: number): string => {
  pairs[glyph] ??= bytes[glyph >>> 8]! + bytes[glyph & 255]!;
  return pairs[glyph];
};

/** Writes the marks of one page as the drawing operators of PDF, telling the state only where it changes. */
class Content {
  private readonly out: string[] = [];
  private width = '';
  private dash = SOLID;
  private ink = '0 g';
  private face = '';
  private inText = false;
  private at: Corner | null = null;
  /** Lines of one style that wait to be drawn in one go. */
  private open = '';

  /** `height` of the paper, mm. */
  constructor(
    private readonly height: number,
    private readonly font: string,
    private readonly numbers: ReadonlyMap<Face, Uint16Array>,
  ) {
    this.out.push(`${SCALE} 0 0 ${SCALE} 0 0 cm`);
  }

  write(marks: readonly Mark[]): string {
    for (const mark of marks) {
      if (mark.kind === 'text') this.text(mark);
      else if (mark.kind === 'path') this.path(mark);
      else if (mark.kind === 'circle') this.circle(mark);
      else this.grid(mark);
    }
    this.endText();
    this.endLines();
    return this.out.join('\n');
  }

  private corner({ x, y }: Spot): Corner {
    return [Math.round(x * UNITS), Math.round((this.height - y) * UNITS)];
  }

  private place(spot: Spot): string {
    const [x, y] = this.corner(spot);
    return `${x} ${y}`;
  }

  private endText(): void {
    if (this.inText) this.out.push('ET');
    this.inText = false;
  }

  private endLines(): void {
    if (this.open) this.out.push('S');
    this.open = '';
  }

  private colour(ink: string): void {
    if (ink !== this.ink) this.out.push(ink);
    this.ink = ink;
  }

  private text({ face, size, text, x, y, turned, white }: TextMark): void {
    this.endLines();
    this.colour(white ? '1 g' : '0 g');
    if (!this.inText) {
      this.out.push('BT');
      this.at = [0, 0];
    }
    this.inText = true;
    const numbers = this.numbers.get(face)!;
    const set = `/${this.font} ${number(size * POINT * UNITS)} Tf`;
    if (set !== this.face) this.out.push(set);
    this.face = set;
    let shown = '';
    for (let i = 0; i < text.length; i += 1) shown += pairOf(numbers[text.charCodeAt(i)]!);
    this.out.push(`${this.move(this.corner({ x, y }), turned)} (${shown})Tj`);
  }

  /** Turned text, and what follows it, is placed anew; all else from the text before. */
  private move([x, y]: Corner, turned: boolean): string {
    const last = this.at;
    this.at = turned ? null : [x, y];
    if (turned) return `0 1 -1 0 ${x} ${y} Tm`;
    return last ? `${x - last[0]} ${y - last[1]} Td` : `1 0 0 1 ${x} ${y} Tm`;
  }

  /** State stands before a path begins: PDF allows no change within it. */
  private begin({ width, dash = [], fill }: PathStyle): void {
    const w = `${number((width ?? 0) * UNITS)} w`;
    const d = dash.length === 0 ? SOLID : `[${dash.map((one) => number(one * UNITS)).join(' ')}] 0 d`;
    const key = w + d;
    const lines = fill === undefined;
    if (!lines || this.open !== key) this.endLines();
    this.endText();
    if (fill) this.colour(fill === 'black' ? '0 g' : '1 g');
    if (width !== undefined) this.stroke(w, d);
    if (lines) this.open = key;
  }

  private stroke(width: string, dash: string): void {
    if (width !== this.width) this.out.push(width);
    if (dash !== this.dash) this.out.push(dash);
    this.width = width;
    this.dash = dash;
  }

  private end({ fill, width }: PathStyle): void {
    if (fill) this.out.push(width === undefined ? 'f' : 'B');
  }

  private path(mark: PathMark): void {
    this.begin(mark);
    this.out.push(`${this.place(mark.from)} m`);
    let last = mark.from;
    for (const to of mark.to) {
      if ('radius' in to) {
        for (const [a, b, c] of curvesOf(last, to))
          this.out.push(`${this.place(a)} ${this.place(b)} ${this.place(c)} c`);
      } else this.out.push(`${this.place(to)} l`);
      last = to;
    }
    if (mark.closed) this.out.push('h');
    this.end(mark);
  }

  /** Four quarters, clockwise from the right. */
  private circle({ centre: { x, y }, radius: r, ...style }: CircleMark): void {
    this.begin(style);
    const k = QUARTER * r;
    const at = (dx: number, dy: number): string => this.place({ x: x + dx, y: y + dy });
    this.out.push(
      `${at(r, 0)} m`,
      `${at(r, k)} ${at(k, r)} ${at(0, r)} c`,
      `${at(-k, r)} ${at(-r, k)} ${at(-r, 0)} c`,
      `${at(-r, -k)} ${at(-k, -r)} ${at(0, -r)} c`,
      `${at(k, -r)} ${at(r, -k)} ${at(r, 0)} c`,
      'h',
    );
    this.end(style);
  }

  /** A stencil of one bit a square, painted in black: rows of hexadecimal digits, each filled up to whole bytes. */
  private grid({ x, y, module, rows }: GridMark): void {
    this.endText();
    this.endLines();
    this.colour('0 g');
    const [wide, high] = [rows[0]?.length ?? 0, rows.length];
    const [left, bottom] = this.corner({ x, y: y + high * module });
    const size = (count: number): string => number(count * module * UNITS);
    this.out.push(`q ${size(wide)} 0 0 ${size(high)} ${left} ${bottom} cm`);
    this.out.push(`BI /W ${wide} /H ${high} /BPC 1 /IM true /D [1 0] /F /AHx ID`);
    this.out.push(`${rows.map(hexOf).join('\n')}>`, 'EI Q');
  }
}

const hexOf = (row: readonly boolean[]): string => {
  let hex = '';
  for (let i = 0; i < row.length; i += 8) {
    let byte = 0;
    for (let k = 0; k < 8; k += 1) byte = 2 * byte + (row[i + k] ? 1 : 0);
    hex += byte.toString(16).padStart(2, '0');
  }
  return hex;
};

/** The content of one page: `font` is the name of the font there, `numbers` the glyph of each character of each face in it. */
export const contentOf = (
  marks: readonly Mark[],
  height: number,
  font: string,
  numbers: ReadonlyMap<Face, Uint16Array>,
): string => new Content(height, font, numbers).write(marks);
