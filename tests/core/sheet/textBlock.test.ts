import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { loadFaces } from '../../../core/sheet/faces.ts';
import { Pen, type SetRun } from '../../../core/sheet/pen.ts';
import { atMostLines, oneLine, plainRun, wrap } from '../../../core/sheet/textBlock.ts';

const style = { size: 9 };
const textOf = (line: readonly SetRun[]) => line.map(({ text }) => text).join('');
const pen = new Pen(await loadFaces());

describe('text broken into lines', () => {
  it('is never wider than its room and loses no letter, whatever it holds', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 120 }), fc.integer({ min: 8, max: 120 }), (text, width) => {
        const lines = wrap(pen, [plainRun(text)], style, width);
        for (const line of lines) expect(pen.width(line, style)).toBeLessThan(width + 1e-6);
        expect(lines.map(textOf).join('').replaceAll(' ', '')).toBe(text.replaceAll(' ', ''));
      }),
    );
  });

  it('breaks at blanks and keeps digits grouped by a narrow space together', () => {
    const lines = wrap(pen, [plainRun('one 12\u202f345\u202f678 two')], style, 18).map(textOf);
    expect(lines).toEqual(['one', '12\u202f345\u202f678', 'two']);
  });

  it('keeps a symbol and its subscript on one line', () => {
    const symbol: SetRun[] = [
      plainRun('about '),
      { text: 'A', italic: true, sub: false },
      { text: 'gv', italic: false, sub: true },
    ];
    expect(wrap(pen, symbol, style, 10).map(textOf)).toEqual(['about', 'Agv']);
  });
});

describe('text cut to its room', () => {
  it('ends in an ellipsis and fits', () => {
    const line = oneLine(pen, 'W'.repeat(80), style, 30);
    expect(textOf(line)).toMatch(/^W+…$/);
    expect(pen.width(line, style)).toBeLessThanOrEqual(30);
    expect(textOf(oneLine(pen, 'short', style, 30))).toBe('short');
  });

  it('of several lines keeps the first ones', () => {
    const lines = wrap(pen, [plainRun('word '.repeat(40))], style, 30);
    const kept = atMostLines(pen, lines, 2, style, 30);
    expect(kept.length).toBe(2);
    expect(textOf(kept[1]!).endsWith('…')).toBe(true);
    expect(atMostLines(pen, lines.slice(0, 2), 2, style, 30)).toEqual(lines.slice(0, 2));
  });
});
