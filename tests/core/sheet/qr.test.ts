import fc from 'fast-check';
import { encode } from 'uqr';
import { describe, expect, it } from 'vitest';
import { encodeLink } from '../../../core/exchange/link.ts';
import { codeOf, sideOf } from '../../../core/sheet/qr.ts';
import { sheetPages } from '../../../core/sheet/sheet.ts';
import { goodEnds } from '../../support/published.ts';
import { end, examined, fullest } from './ends.ts';

const linkOf = (length: number) => `1.${'aZ09-_bQ'.repeat(400)}`.slice(0, length);
const pageWith = async (input: unknown, length: number) => {
  const { pages } = await sheetPages({ ...examined(input), link: linkOf(length) }, { workings: 'governing' });
  const grid = pages[0]!.find((mark) => mark.kind === 'grid');
  const texts = pages[0]!.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : [])).join(' ');
  return { grid: grid?.kind === 'grid' ? grid : undefined, texts };
};

describe('the square code of the sheet', () => {
  it('holds the text it was given, at error level M', () => {
    const text = linkOf(300);
    const { data } = encode(text, { ecc: 'M', border: 0, boostEcc: false });
    expect(codeOf(text, 24)!.rows).toEqual(data);
  });

  const itself = (text: string) => encode(text, { ecc: 'M', border: 0, boostEcc: false });

  it('has the mask that the library itself would choose, for whatever text', () => {
    fc.assert(
      fc.property(fc.string({ minLength: 1, maxLength: 300 }), (text) => {
        expect(codeOf(text, 24)!.rows).toEqual(itself(text).data);
      }),
    );
  });

  it('has the mask that the library itself would choose, be it any of the eight', () => {
    const texts = Array.from({ length: 150 }, (_, i) => `${i}${'aZ09-_bQ'.repeat(i % 20)}`);
    expect(new Set(texts.map((text) => itself(text).maskPattern)).size).toBe(8);
    for (const text of texts) expect(codeOf(text, 24)!.rows).toEqual(itself(text).data);
  });

  it('has modules of 0.33 mm at least, and no code where the text is too long for any', () => {
    for (const length of [20, 200, 450, 900]) expect(codeOf(linkOf(length), 24)!.module).toBeGreaterThanOrEqual(0.33);
    expect(codeOf(linkOf(3000), 24)).toBeNull();
  });

  it('stands in the title block when it is small', async () => {
    const { grid, texts } = await pageWith(end, 200);
    expect(grid!.x).toBe(20);
    expect(grid!.y).toBeGreaterThan(260);
    expect(grid!.y + sideOf(grid!)).toBeLessThan(287);
    expect(texts).not.toContain('too long');
  });

  it('stands beside the piece when it is larger and there is room, clear of all words', async () => {
    const { grid } = await pageWith(end, 450);
    expect(grid!.y).toBeLessThan(150);
    const { pages } = await sheetPages({ ...examined(end), link: linkOf(450) }, { workings: 'governing' });
    const side = sideOf(grid!);
    for (const mark of pages[0]!) {
      if (mark.kind !== 'text') continue;
      const inside =
        mark.x > grid!.x - 1 && mark.x < grid!.x + side + 1 && mark.y > grid!.y - 1 && mark.y < grid!.y + side + 1;
      expect(inside, mark.text).toBe(false);
    }
  });

  it('keeps its place beside words that stand on the beam: no good end is without it but those with two views, and two whose pieces are as wide or as high as their room', async () => {
    for (const one of goodEnds().filter(({ name }) => !['long-cope', 'slender-web'].includes(name))) {
      const input = examined(one.end);
      const link = encodeLink(input.end, input.report.fingerprint);
      const { pages } = await sheetPages({ ...input, link }, { workings: 'governing' });
      const views = pages[0]!.some((mark) => mark.kind === 'text' && mark.text === 'on the support') ? 2 : 1;
      expect(pages[0]!.filter((mark) => mark.kind === 'grid').length, one.name).toBe(2 - views);
    }
  });

  it('is left out, and this is said, where it has no room', async () => {
    const { grid, texts } = await pageWith(fullest, 2000);
    expect(grid).toBeUndefined();
    expect(texts).toContain('No square code: the file has the data.');
  });

  it('is drawn as it is: dark where the code is dark', async () => {
    const { grid } = await pageWith(end, 200);
    expect(grid!.rows).toEqual(encode(linkOf(200), { ecc: 'M', border: 0, boostEcc: false }).data);
  });
});
