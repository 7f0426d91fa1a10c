import type { ArcTo, CircleMark, Mark, PathMark, PathStyle, Spot, SquaresMark, TextMark } from './pen.ts';
import { POINT } from './pen.ts';
import type { Face } from './trueType.ts';

/** Units of the content in a mm: whole numbers then place every mark within 0.013 mm. */
const UNITS = 40;
const POINTS = 72 / 25.4;

type Corner = readonly [x: number, y: number];

/** A number as PDF writes it: no exponent, no closing zeros. */
const number = (value: number): string => String(Math.round(value * 1000) / 1000);

/** Control points of the cubic curve that follows an arc of at most a quarter circle within 0.03 %. */
const quarter = (centre: Spot, radius: number, from: number, to: number): [Spot, Spot, Spot] => {
  const k = (4 / 3) * Math.tan((to - from) / 4) * radius;
  const on = (angle: number): Spot => ({
    x: centre.x + radius * Math.cos(angle),
    y: centre.y + radius * Math.sin(angle),
  });
  const [a, b] = [on(from), on(to)];
  return [
    { x: a.x - k * Math.sin(from), y: a.y + k * Math.cos(from) },
    { x: b.x + k * Math.sin(to), y: b.y - k * Math.cos(to) },
    b,
  ];
};

/** An arc as cubic curves. With y down, clockwise as seen means growing angles. */
const curvesOf = (from: Spot, arc: ArcTo): [Spot, Spot, Spot][] => {
  const [dx, dy] = [arc.x - from.x, arc.y - from.y];
  const chord = Math.hypot(dx, dy);
  if (chord === 0) return [];
  const radius = Math.max(arc.radius, chord / 2);
  const side = (arc.clockwise ? 1 : -1) * Math.sqrt(Math.max(0, radius ** 2 - chord ** 2 / 4));
  const centre = { x: from.x + dx / 2 - (side * dy) / chord, y: from.y + dy / 2 + (side * dx) / chord };
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  let turn = Math.atan2(arc.y - centre.y, arc.x - centre.x) - start;
  if (arc.clockwise && turn < 0) turn += 2 * Math.PI;
  if (!arc.clockwise && turn > 0) turn -= 2 * Math.PI;
  const parts = Math.max(1, Math.ceil(Math.abs(turn) / (Math.PI / 2) - 1e-9));
  return Array.from({ length: parts }, (_, i) =>
    quarter(centre, radius, start + (turn * i) / parts, start + (turn * (i + 1)) / parts),
  );
};

/** Writes the marks of one page as the drawing operators of PDF, telling the state only where it changes. */
class Content {
  private readonly out: string[] = [];
  private width = '';
  private dash = '';
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
    private readonly glyphs: ReadonlyMap<Face, ReadonlyMap<string, number>>,
  ) {
    this.out.push(`${number(POINTS / UNITS)} 0 0 ${number(POINTS / UNITS)} 0 0 cm`);
  }

  write(marks: readonly Mark[]): string {
    for (const mark of marks) {
      if (mark.kind === 'text') this.text(mark);
      else if (mark.kind === 'path') this.path(mark);
      else if (mark.kind === 'circle') this.circle(mark);
      else this.squares(mark);
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
    const glyphs = this.glyphs.get(face)!;
    const set = `/${this.font} ${number(size * POINT * UNITS)} Tf`;
    if (set !== this.face) this.out.push(set);
    this.face = set;
    const hex = [...text].map((one) => glyphs.get(one)!.toString(16).padStart(4, '0')).join('');
    this.out.push(`${this.move(this.corner({ x, y }), turned)} <${hex}>Tj`);
  }

  /** Turned text, and what follows it, is placed anew; all else from the text before. */
  private move([x, y]: Corner, turned: boolean): string {
    const last = this.at;
    this.at = turned ? null : [x, y];
    if (turned) return `0 1 -1 0 ${x} ${y} Tm`;
    return last ? `${x - last[0]} ${y - last[1]} Td` : `1 0 0 1 ${x} ${y} Tm`;
  }

  private style({ width = 0, dash = [] }: PathStyle): string {
    return `${number(width * UNITS)} w [${dash.map((one) => number(one * UNITS)).join(' ')}]`;
  }

  /** State stands before a path begins: PDF allows no change within it. */
  private begin(style: PathStyle): void {
    const key = this.style(style);
    const lines = style.fill === undefined;
    if (!lines || this.open !== key) this.endLines();
    this.endText();
    if (style.fill) this.colour(style.fill === 'black' ? '0 g' : '1 g');
    if (style.width !== undefined) this.stroke(style.width, style.dash ?? []);
    if (lines) this.open = key;
  }

  private stroke(width: number, dash: readonly number[]): void {
    const w = `${number(width * UNITS)} w`;
    const d = `[${dash.map((one) => number(one * UNITS)).join(' ')}] 0 d`;
    if (w !== this.width) this.out.push(w);
    if (d !== this.dash && !(this.dash === '' && dash.length === 0)) this.out.push(d);
    this.width = w;
    this.dash = d;
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

  private circle({ centre, radius, ...style }: CircleMark): void {
    const right = { x: centre.x + radius, y: centre.y };
    const left = { x: centre.x - radius, y: centre.y };
    const arc = { radius, clockwise: true };
    this.path({
      ...style,
      kind: 'path',
      from: right,
      to: [
        { ...left, ...arc },
        { ...right, ...arc },
      ],
      closed: true,
    });
  }

  private squares({ rows }: SquaresMark): void {
    this.begin({ fill: 'black' });
    for (const { x, y, width, height } of rows) {
      const [left, top] = this.corner({ x, y });
      const [right, bottom] = this.corner({ x: x + width, y: y + height });
      this.out.push(`${left} ${bottom} ${right - left} ${top - bottom} re`);
    }
    this.end({ fill: 'black' });
  }
}

/** The content of one page: `font` is the name of the font there, `glyphs` the number of each character of each face in it. */
export const contentOf = (
  marks: readonly Mark[],
  height: number,
  font: string,
  glyphs: ReadonlyMap<Face, ReadonlyMap<string, number>>,
): string => new Content(height, font, glyphs).write(marks);
