import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import { examine } from '../../../core/check/examine.ts';
import { sheetPages, sheetPdf } from '../../../core/sheet/sheet.ts';
import { endOf, plausibleEnd } from '../../support/arbitraryEnd.ts';
import { end, examined, fullest, withSheet } from './ends.ts';
import { A4, covering, EDGE, LETTER, outside, pagesOf, windowOf } from './onPage.ts';
import { type FoundText, pathsOf, textsOf, wholeText } from './readPdf.ts';
import { onPaper, pairs } from './twoStandards.ts';

const ends: readonly (readonly [name: string, input: object])[] = [
  ['holds', end],
  ['fails', { ...end, reaction: 300 }],
  ['refers', { ...end, reaction: 60, top: { length: 900, depth: 45, radius: 10 } }],
  ['without a reaction', { ...end, reaction: 0 }],
  ['with notches above and below, two columns and a tie', fullest],
  ['on Letter', withSheet({ ...end.sheet, paper: 'Letter' })],
  ['with a decimal comma', withSheet({ ...end.sheet, decimal: ',' })],
  ['with a notch of three metres', { ...end, top: { length: 3000, depth: 45, radius: 10 } }],
  ...pairs.flatMap(([name, input]) =>
    (['A4', 'Letter'] as const).map((paper) => [`${name}, on ${paper}`, onPaper(input, paper)] as const),
  ),
];

describe.each(ends)('the sheet of an end that %s', (_, input) => {
  const paper = JSON.stringify(input).includes('Letter') ? LETTER : A4;
  let page: FoundText[];
  let further: FoundText[][];
  beforeAll(async () => {
    [page = [], ...further] = await pagesOf(examined(input), 'all');
  });

  it('keeps all text within the window that A4 and Letter share in width', () => {
    for (const one of [page, ...further]) expect(outside(one, windowOf(paper))).toEqual([]);
  });

  it('lets no text cover another', () => {
    for (const one of [page, ...further]) expect(covering(one)).toEqual([]);
  });

  it('is set no smaller than 8 pt, subscripts no smaller than 6.5 pt', () => {
    for (const { text, size } of [page, ...further].flat()) {
      expect(size, text).toBeGreaterThan(/^[A-Za-z0-9,.(−_ρ)]{1,8}$/.test(text) ? 6.45 : 7.95);
    }
  });

  it('draws no line thinner than 0.18 mm', async () => {
    const pdf = await sheetPdf(examined(input), { workings: 'governing' });
    const lines = pathsOf(pdf, 0, paper.height).filter(({ filled }) => !filled);
    expect(lines.length).toBeGreaterThan(100);
    expect(Math.min(...lines.map(({ width }) => width))).toBeGreaterThan(0.175);
  });

  it('keeps all lines within the window', async () => {
    const pdf = await sheetPdf(examined(input), { workings: 'governing' });
    const points = pathsOf(pdf, 0, paper.height).flatMap((path) => path.points);
    const { left, right, top, bottom } = windowOf(paper);
    expect(
      points.filter(({ x, y }) => x < left - EDGE || x > right + EDGE || y < top - EDGE || y > bottom + EDGE),
    ).toEqual([]);
  });
});

describe('the figure', () => {
  const bodyOf = (pdf: Uint8Array) =>
    pathsOf(pdf, 0, A4.height).filter(({ points }) => points.every(({ x }) => x < 133));

  it('measures what its scale says, within 0.2 mm: depth, notch, bolt pitch', async () => {
    const pdf = await sheetPdf(examined(end), { workings: 'governing' });
    const text = wholeText((await textsOf(pdf))[0]!);
    const scale = Number(/scale 1:(\d+)/.exec(text)![1]);
    expect([1, 2, 5, 10, 20]).toContain(scale);
    // The outline: the longest wide run of lines with the notch's arc in it.
    const outline = bodyOf(pdf)
      .filter(({ curved, filled, width }) => curved && !filled && Math.abs(width - 0.5) < 0.02)
      .toSorted((a, b) => b.points.length - a.points.length)[0]!;
    const xs = outline.points.map(({ x }) => x);
    const ys = outline.points.map(({ y }) => y);
    const [top, bottom, left] = [Math.min(...ys), Math.max(...ys), Math.min(...xs)];
    expect(Math.abs((bottom - top) * scale - 406.4)).toBeLessThan(0.2 * scale);
    const cutEdge = Math.min(...outline.points.filter(({ x }) => x < left + 0.5).map(({ y }) => y));
    expect(Math.abs((cutEdge - top) * scale - 45)).toBeLessThan(0.2 * scale);
    const upper = outline.points.filter(({ y }) => y < top + 0.1).map(({ x }) => x);
    expect(Math.abs((Math.min(...upper) - left) * scale - 110)).toBeLessThan(0.2 * scale);
    // Bolts sheared: black circles of the bolt's or the hole's size.
    const bolts = bodyOf(pdf)
      .filter(({ curved, filled, points }) => curved && filled && points.length === 5)
      .map(({ points }) => (Math.max(...points.map(({ y }) => y)) + Math.min(...points.map(({ y }) => y))) / 2)
      .filter((y, i, all) => all.findIndex((one) => Math.abs(one - y) < 0.3) === i)
      .filter((y) => y > cutEdge && y < bottom)
      .toSorted((a, b) => a - b);
    const apart = bolts.flatMap((a) => bolts.map((b) => (b - a) * scale));
    expect(apart.filter((one) => Math.abs(one - 70) < 0.2 * scale).length).toBeGreaterThanOrEqual(2);
  });

  it('carries a bar as long as it says, since printers shrink', async () => {
    const pdf = await sheetPdf(examined(end), { workings: 'governing' });
    const text = wholeText((await textsOf(pdf))[0]!);
    const [, scale, length] = /scale 1:(\d+); (\d+) mm/.exec(text)!;
    const level = bodyOf(pdf).filter(({ points }) => points.length === 2 && points[0]!.y === points[1]!.y);
    const wanted = Number(length) / Number(scale);
    expect(level.some(({ points }) => Math.abs(points[1]!.x - points[0]!.x - wanted) < 0.03)).toBe(true);
  });

  it('at 1:10 names bolts and plate on the beam or right above it, not across the piece', async () => {
    const deep = { ...end, top: { length: 110, depth: 8, radius: 10 } };
    const [page = []] = await pagesOf(examined(deep));
    expect(wholeText(page)).toContain('scale 1:10');
    const x = (text: string) => page.find((one) => one.text.startsWith(text) && one.x < 132)!.x;
    const face = page.find(({ text }) => text === 'support face')!;
    for (const text of ['3 × M20', 'holes 22', 'fin plate 10', 'far side']) {
      expect(x(text), text).toBeGreaterThan(face.x + face.width);
    }
  });

  it('of a 406 deep beam is 1:5 on A4 and a standard scale on Letter', async () => {
    expect(wholeText((await pagesOf(examined(end)))[0]!)).toContain('scale 1:5');
    const letter = await pagesOf(examined(withSheet({ ...end.sheet, paper: 'Letter' })));
    expect(letter.length).toBe(1);
    expect(wholeText(letter[0]!)).toMatch(/scale 1:(5|10);/);
  });
});

const paperAndSecond = fc.record({
  paper: fc.constantFrom('A4', 'Letter'),
  beside: fc.record({ standard: fc.constantFrom('csa-s16', 'aisc-360-asd', 'as-4100', 'en-1993', 'none') }),
});

describe('any plausible end', () => {
  it('gets a sheet whose text stays in the window and whose numbers are all finite', async () => {
    await fc.assert(
      fc.asyncProperty(plausibleEnd, paperAndSecond, async (drawn, sheet) => {
        const { paper } = sheet;
        const found = examine({ ...endOf(drawn), mark: 'X-1', sheet });
        fc.pre('examined' in found);
        if (!('examined' in found)) return;
        const { pages } = await sheetPages(found.examined, { workings: 'all' });
        const bottom = (paper === 'A4' ? A4 : LETTER).height - 10 + EDGE;
        const table = pages[0]!.find((one) => one.kind === 'text' && one.text.startsWith('Check, weakest first'))!;
        expect(table.kind === 'text' && table.y).toBeGreaterThan(60);
        for (const mark of pages.flat()) {
          if (mark.kind !== 'text') continue;
          expect(Number.isFinite(mark.x) && Number.isFinite(mark.y)).toBe(true);
          expect(mark.text).not.toMatch(/NaN|Infinity|undefined|null/);
          const wide = mark.turned ? 0 : (mark.face.width(mark.text) * mark.size * 0.3528) / 1000;
          expect(mark.x, mark.text).toBeGreaterThan(20 - EDGE - 1);
          expect(mark.x + wide, mark.text).toBeLessThan(200 + EDGE);
          expect(mark.y, mark.text).toBeLessThan(bottom);
        }
      }),
      { numRuns: 40 },
    );
  }, 60_000);
});
