import { describe, expect, it } from 'vitest';
import { loadFaces } from '../../../core/sheet/faces.ts';
import { richText } from '../../../core/sheet/richText.ts';
import { sheetPages } from '../../../core/sheet/sheet.ts';
import { sheetWords } from '../../../core/sheet/sheetWords.ts';
import { UNKNOWN } from '../../../core/sheet/trueType.ts';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import '../../../core/words/furtherWords.ts';
import { end, examined, fullest } from './ends.ts';

/** Every string in a tree of words; functions are called with letters in their places. */
const stringsIn = (words: unknown): string[] => {
  if (typeof words === 'string') return [words];
  if (typeof words === 'function') return stringsIn((words as (...any: string[]) => unknown)('x', 'y', 'z'));
  return typeof words === 'object' && words !== null ? Object.values(words).flatMap(stringsIn) : [];
};

const faces = await loadFaces();
const cuts = [
  { family: 'narrow', bold: false, italic: false },
  { family: 'narrow', bold: true, italic: false },
  { family: 'narrow', bold: false, italic: true },
  { family: 'wide', bold: true, italic: false },
] as const;

describe('the faces cover', () => {
  it('every character of the sheet and of the words of a region', () => {
    const texts = [...stringsIn(sheetWords), ...stringsIn(commonwealth)];
    expect(texts.length).toBeGreaterThan(200);
    for (const cut of cuts) {
      const face = faces(cut);
      expect([...new Set(texts.join(''))].filter((one) => !face.has(one))).toEqual([]);
    }
  });

  it('every symbol, formula and number of the workings', () => {
    const rows = [end, fullest].flatMap((one) => examined(one).report.checks.flatMap(({ working = [] }) => working));
    expect(rows.length).toBeGreaterThan(60);
    for (const row of rows) {
      for (const text of [row.symbol, row.expression, row.numbers, row.unit, row.clause, row.note ?? '']) {
        for (const { text: run, italic } of richText(text)) {
          const face = faces({ family: 'narrow', bold: false, italic });
          expect(
            [...run].filter((one) => !face.has(one)),
            text,
          ).toEqual([]);
        }
      }
    }
  });

  it('all that stands on a sheet: no square takes the place of a character', async () => {
    for (const one of [end, fullest]) {
      const { pages } = await sheetPages(examined(one), { workings: 'all' });
      const texts = pages.flat().flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []));
      expect(texts.filter((text) => text.includes(UNKNOWN))).toEqual([]);
    }
  });
});
