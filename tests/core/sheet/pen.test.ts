import { describe, expect, it } from 'vitest';
import { loadFaces } from '../../../core/sheet/faces.ts';
import { writePdf } from '../../../core/sheet/pdf.ts';
import { Pen } from '../../../core/sheet/pen.ts';
import { richText } from '../../../core/sheet/richText.ts';
import { pathsOf, textsOf, wholeText } from './readPdf.ts';

const about = {
  paper: [210, 297] as const,
  title: 'T',
  subject: 'S',
  keywords: 'K',
  creator: 'C',
  fingerprint: '0123abcd',
};

const newPen = async () => new Pen(await loadFaces());
const written = (pen: Pen, more: object = {}) => writePdf(pen.pages, { ...about, ...more });

describe('text set by the pen', () => {
  it('reads back as it was set: Greek, signs, small digits, accents', async () => {
    const pen = await newPen();
    const line = 'φ_b ≤ √(d′² + 10⁶) · Σy² × ½ − 3⁄4 Łódź “x” → ✓ 12\u202f345';
    pen.text(30, 50, line, { size: 9 });
    pen.text(30, 60, line, { size: 12, bold: true });
    pen.text(30, 70, [{ text: line, italic: true, sub: false }], { size: 10 });
    const [page] = await textsOf(await written(pen));
    const flat = (text: string) => text.replace(/\s/g, '');
    expect(flat(wholeText(page!))).toBe(flat(line).repeat(3));
  });

  it('reads back whatever character it holds, all faces on one page', async () => {
    const faces = await loadFaces();
    const cuts = [
      { family: 'narrow', bold: false },
      { family: 'narrow', bold: true },
      { family: 'wide', bold: true },
    ] as const;
    // A hyphen that shows only at the end of a line, and the micro sign: readers of PDF drop the one and take the other for μ.
    const kept = (one: string) => !/[\s\u00ad\u00b5]/.test(one);
    const pen = await newPen();
    let y = 10;
    const set: string[] = [];
    for (const cut of cuts) {
      const face = faces({ ...cut, italic: false });
      const codes = Array.from({ length: face.codes }, (_, code) => code).filter((code) => code > 0x20);
      const text = codes.map((code) => String.fromCharCode(code)).filter((one) => face.has(one) && kept(one));
      expect(text.length).toBeGreaterThan(200);
      for (let i = 0; i < text.length; i += 40) {
        const line = text.slice(i, i + 40).join('');
        set.push(line);
        pen.text(20, y, line, { size: 9, ...cut });
        y += 6;
      }
    }
    const [page] = await textsOf(await written(pen));
    expect(wholeText(page!).replace(/\s/g, '')).toBe(set.join(''));
  });

  it('stands where it was put and is as wide as the pen said, to a hundredth of a mm', async () => {
    const pen = await newPen();
    const text = 'Block tearing of the web 317.5 kN';
    const width = pen.width(text, { size: 9 });
    pen.text(30, 50, text, { size: 9 });
    pen.text(150, 80, text, { size: 9, anchor: 'end' });
    pen.text(100, 110, text, { size: 9, anchor: 'middle' });
    pen.text(60, 200, text, { size: 9, turned: true });
    const [page] = await textsOf(await written(pen));
    const near = (a: number, b: number) => expect(Math.abs(a - b)).toBeLessThan(0.03);
    near(page![0]!.x, 30);
    near(page![0]!.y, 50);
    near(page![0]!.width, width);
    near(page![1]!.x, 150 - width);
    near(page![2]!.x, 100 - width / 2);
    expect(page![3]!.turned).toBe(true);
    near(page![3]!.y, 200);
  });

  it('sets subscripts lower and small, but never below 6.5 pt', async () => {
    const pen = await newPen();
    pen.text(30, 50, richText('A_gv'), { size: 10 });
    pen.text(30, 60, richText('A_gv'), { size: 8 });
    const [page] = await textsOf(await written(pen));
    const subs = page!.filter(({ text }) => text === 'gv');
    expect(subs.map(({ size }) => Math.round(size * 10) / 10)).toEqual([7.8, 6.5]);
    expect(subs[0]!.y).toBeGreaterThan(50.3);
  });

  it('shows a square for what no face can draw, and keeps the rest', async () => {
    const pen = await newPen();
    pen.text(30, 50, 'Mill 漢字 Ж 👍 ok', { size: 9 });
    const [page] = await textsOf(await written(pen));
    expect(wholeText(page!)).toBe('Mill □□ □ □ ok');
  });
});

describe('marks drawn by the pen', () => {
  it('stand within a fortieth of a mm of where they were put', async () => {
    const pen = await newPen();
    pen.line(20.017, 33.333, 187.77, 33.333, 0.25);
    pen.box(50, 60, 31.4, 17.3, { width: 0.5 });
    const paths = pathsOf(await written(pen), 0, 297);
    const close = (a: { x: number; y: number }, x: number, y: number) => {
      expect(Math.abs(a.x - x)).toBeLessThan(0.0126);
      expect(Math.abs(a.y - y)).toBeLessThan(0.0126);
    };
    close(paths[0]!.points[0]!, 20.017, 33.333);
    close(paths[0]!.points[1]!, 187.77, 33.333);
    expect(paths[0]!.width).toBeCloseTo(0.25, 3);
    close(paths[1]!.points[0]!, 50, 60);
    close(paths[1]!.points[2]!, 81.4, 77.3);
  });

  it('make arcs that keep their radius, clockwise and against', async () => {
    const pen = await newPen();
    const arc = { radius: 10, clockwise: true };
    // A quarter from the top to the right of a circle about 100, 100; then the other way round about 110, 90.
    pen.path({ x: 100, y: 90 }, [{ x: 110, y: 100, ...arc }], { width: 0.25 });
    pen.path({ x: 100, y: 90 }, [{ x: 110, y: 100, radius: 10, clockwise: false }], { width: 0.25 });
    pen.circle(150, 150, 7, { width: 0.25 });
    const paths = pathsOf(await written(pen), 0, 297);
    expect(paths.every(({ curved }) => curved)).toBe(true);
    for (const { x, y } of paths[2]!.points) expect(Math.hypot(x - 150, y - 150)).toBeCloseTo(7, 1);
    expect(paths[0]!.points.at(-1)!.x).toBeCloseTo(110, 1);
  });

  it('draw black after white, and white on black', async () => {
    const pen = await newPen();
    pen.box(20, 20, 40, 10, { fill: 'black' });
    pen.text(22, 27, 'FAILS', { size: 12, bold: true, white: true });
    pen.text(22, 47, 'black', { size: 12 });
    const [page] = await textsOf(await written(pen));
    expect(wholeText(page!)).toBe('FAILS black');
  });
});

describe('the file', () => {
  it('is the same bytes for the same marks and date, and others for another date', async () => {
    const make = async (date?: string) => {
      const pen = await newPen();
      pen.text(30, 50, 'same', { size: 9 });
      return Buffer.from(await written(pen, date ? { date } : {}));
    };
    expect(Buffer.compare(await make(), await make())).toBe(0);
    expect(Buffer.compare(await make('2026-03-14'), await make('2026-03-14'))).toBe(0);
    expect(Buffer.compare(await make('2026-03-14'), await make('2026-03-15'))).not.toBe(0);
    expect((await make('2026-03-14')).toString('latin1')).toContain('/CreationDate (D:20260314');
  });

  it('takes a date beyond what its writer knows, and one that is none, as no date', async () => {
    const pen = await newPen();
    pen.text(30, 50, 'x', { size: 9 });
    for (const date of ['2099-01-01', 'soon', '0000-00-00']) {
      expect(Buffer.from(await written(pen, { date })).toString('latin1')).toContain('/CreationDate (D:20000101');
    }
  });

  it('has as many pages as the pen turned to', async () => {
    const pen = await newPen();
    pen.text(30, 50, 'one', { size: 9 });
    pen.turnTo(2);
    pen.text(30, 50, 'three', { size: 9 });
    const pages = await textsOf(await written(pen));
    expect(pages.map((page) => wholeText(page))).toEqual(['one', '', 'three']);
  });
});
