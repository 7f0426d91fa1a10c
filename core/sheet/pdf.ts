import type { jsPDF } from 'jspdf';
import type { ArcTo, CircleMark, HatchMark, Mark, PathMark, Spot, SquaresMark, TextMark } from './pen.ts';
import type { Face } from './trueType.ts';

/** What the file says of itself; no clock is read. */
export interface About {
  /** mm */
  readonly paper: readonly [width: number, height: number];
  readonly title: string;
  readonly subject: string;
  readonly keywords: string;
  readonly creator: string;
  /** yyyy-mm-dd, or absent. */
  readonly date?: string;
  /** Hex digits from which the file's identity is made. */
  readonly fingerprint: string;
}

const EPOCH = '20000101';

/** A date as PDF writes it; the years that the writer accepts, else a constant. */
const stampOf = (date: string | undefined): string => {
  const digits = /^(20[0-2]\d|203[0-7]|19[7-9]\d)-(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/.test(date ?? '')
    ? date!.replaceAll('-', '')
    : EPOCH;
  return `D:${digits}000000+00'00'`;
};

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

/** Plays marks to the PDF library. */
class Writer {
  private width = -1;
  private dash = '';
  private fill = '';
  private face = '';
  private size = 0;
  private white = false;

  constructor(private readonly doc: jsPDF) {}

  /** State does not carry over to a new page. */
  fresh(): void {
    this.width = -1;
    this.dash = '';
    this.fill = '';
    this.face = '';
    this.size = 0;
  }

  draw(mark: Mark): void {
    switch (mark.kind) {
      case 'text':
        return this.text(mark);
      case 'path':
        return this.path(mark);
      case 'circle':
        return this.circle(mark);
      case 'hatch':
        return this.hatch(mark);
      case 'squares':
        return this.squares(mark);
    }
  }

  private stroke(width: number, dash: readonly number[] = []): void {
    if (width !== this.width) this.doc.setLineWidth(width);
    const key = dash.join();
    if (key !== this.dash) this.doc.setLineDashPattern([...dash], 0);
    this.width = width;
    this.dash = key;
  }

  private ink(colour: 'black' | 'white'): void {
    if (colour !== this.fill) this.doc.setFillColor(colour === 'black' ? '#000' : '#fff');
    this.fill = colour;
  }

  private finish({ width, fill, closed, evenOdd }: PathMark): void {
    if (closed) this.doc.close();
    if (fill && width !== undefined) this.doc.fillStroke();
    else if (fill) evenOdd ? this.doc.fillEvenOdd() : this.doc.fill();
    else this.doc.stroke();
  }

  private text({ face, size, text, x, y, turned, white }: TextMark): void {
    if (white !== this.white) this.doc.setTextColor(white ? '#fff' : '#000');
    this.white = white;
    if (face.name !== this.face) this.doc.setFont(face.name, 'normal');
    if (size !== this.size) this.doc.setFontSize(size);
    this.face = face.name;
    this.size = size;
    this.doc.text(text, x, y, turned ? { angle: 90 } : {});
    // The library writes the text's colour into the fill.
    this.fill = '';
  }

  private path(mark: PathMark): void {
    const { doc } = this;
    // Widths stand before the path begins: PDF allows no change of state within it.
    if (mark.width !== undefined) this.stroke(mark.width, mark.dash);
    if (mark.fill) this.ink(mark.fill);
    doc.moveTo(mark.from.x, mark.from.y);
    let last = mark.from;
    for (const to of mark.to) {
      if ('radius' in to) for (const [a, b, c] of curvesOf(last, to)) doc.curveTo(a.x, a.y, b.x, b.y, c.x, c.y);
      else doc.lineTo(to.x, to.y);
      last = to;
    }
    this.finish(mark);
  }

  private circle(mark: CircleMark): void {
    const { centre, radius } = mark;
    const right = { x: centre.x + radius, y: centre.y };
    const left = { x: centre.x - radius, y: centre.y };
    const arc = { radius, clockwise: true };
    this.path({
      ...mark,
      kind: 'path',
      from: right,
      to: [
        { ...left, ...arc },
        { ...right, ...arc },
      ],
      closed: true,
    });
  }

  private hatch({ outline, lines, width }: HatchMark): void {
    const { doc } = this;
    this.stroke(width);
    doc.saveGraphicsState();
    doc.moveTo(outline[0]!.x, outline[0]!.y);
    for (const spot of outline.slice(1)) doc.lineTo(spot.x, spot.y);
    doc.close();
    doc.clip();
    doc.discardPath();
    for (const [a, b] of lines) {
      doc.moveTo(a.x, a.y);
      doc.lineTo(b.x, b.y);
    }
    doc.stroke();
    doc.restoreGraphicsState();
    this.fresh();
  }

  private squares({ rows }: SquaresMark): void {
    this.ink('black');
    for (const { x, y, width, height } of rows) {
      this.doc.moveTo(x, y);
      this.doc.lineTo(x + width, y);
      this.doc.lineTo(x + width, y + height);
      this.doc.lineTo(x, y + height);
      this.doc.close();
    }
    this.doc.fill();
  }
}

const base64Of = (bytes: Uint8Array): string => {
  let text = '';
  for (const byte of bytes) text += String.fromCharCode(byte);
  return btoa(text);
};

/** Puts the faces into the document, each cut down to the characters that stand on its pages. */
const embed = (doc: jsPDF, pages: readonly (readonly Mark[])[]): void => {
  const used = new Map<Face, Set<string>>();
  for (const mark of pages.flat()) {
    if (mark.kind !== 'text') continue;
    const characters = used.get(mark.face) ?? new Set();
    for (const one of mark.text) characters.add(one);
    used.set(mark.face, characters);
  }
  for (const [face, characters] of used) {
    doc.addFileToVFS(`${face.name}.ttf`, base64Of(face.cutOut(characters)));
    doc.addFont(`${face.name}.ttf`, face.name, 'normal');
  }
};

/** Writes the pages as a PDF. Same pages and same `about`: same bytes. */
export const writePdf = async (pages: readonly (readonly Mark[])[], about: About): Promise<Uint8Array> => {
  const { jsPDF } = await import('jspdf');
  const doc = new jsPDF({ unit: 'mm', format: [...about.paper], compress: true, putOnlyUsedFonts: true, precision: 3 });
  const { title, subject, keywords, creator } = about;
  doc.setProperties({ title, subject, keywords, creator });
  doc.setCreationDate(stampOf(about.date) as unknown as Date);
  doc.setFileId(about.fingerprint.padEnd(32, '0').slice(0, 32).toUpperCase());
  embed(doc, pages);
  const writer = new Writer(doc);
  pages.forEach((marks, i) => {
    if (i > 0) doc.addPage([...about.paper]);
    writer.fresh();
    for (const mark of marks) writer.draw(mark);
  });
  return new Uint8Array(doc.output('arraybuffer'));
};
