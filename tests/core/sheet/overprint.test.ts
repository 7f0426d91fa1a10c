import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { encodeLink } from '../../../core/exchange/link.ts';
import type { Mark, PathMark, Spot } from '../../../core/sheet/pen.ts';
import { sheetPages } from '../../../core/sheet/sheet.ts';
import { goodEnds } from '../../support/published.ts';
import { examined } from './ends.ts';
import { inOtherUnits } from './inOtherUnits.ts';
import { boxOfText, overprints } from './overprints.ts';
import type { FoundBox } from './readPdf.ts';
import { pairs } from './twoStandards.ts';

const demo = JSON.parse(readFileSync(new URL('../../../fixtures/demo/citrus-packhouse.json', import.meta.url), 'utf8'));
const alone = [{ name: 'citrus-packhouse', end: demo }, ...goodEnds()].map(({ name, end }) => [name, end] as const);

const pagesOf = async (end: object, paper: string): Promise<Mark[][]> => {
  const input = examined({ ...end, sheet: { ...(end as { sheet?: object }).sheet, paper } });
  const link = encodeLink(input.end, input.report.fingerprint);
  return (await sheetPages({ ...input, link }, { workings: 'all' })).pages;
};

/** The part of the line from a to b that lies in the box is not empty. */
const runsThrough = (a: Spot, b: Spot, box: FoundBox): boolean => {
  const spans = [
    [a.x, b.x, box.left, box.right],
    [a.y, b.y, box.top, box.bottom],
  ] as const;
  let [from, to] = [0, 1];
  for (const [start, end, low, high] of spans) {
    if (start === end && (start < low || start > high)) return false;
    if (start === end) continue;
    const [p, q] = [(low - start) / (end - start), (high - start) / (end - start)];
    [from, to] = [Math.max(from, Math.min(p, q)), Math.min(to, Math.max(p, q))];
  }
  return from <= to;
};

const crosses = ({ from, to, closed }: PathMark, box: FoundBox): boolean => {
  const points = [from, ...to, ...(closed ? [from] : [])];
  return points.slice(1).some((point, i) => runsThrough(points[i]!, point, box));
};

/** A little smaller: a line may touch. */
const core = ({ left, top, right, bottom }: FoundBox): FoundBox => ({
  left: left + 0.15,
  top: top + 0.15,
  right: right - 0.15,
  bottom: bottom - 0.15,
});

/** The drawing's words: each has white ground under it. `struck`: lines that run there, drawn before the ground or after. */
const drawingWords = (page: readonly Mark[]) =>
  page.flatMap((mark) => {
    if (mark.kind !== 'text') return [];
    const box = core(boxOfText(mark));
    const ground = page.findLastIndex(
      (one) =>
        one.kind === 'path' &&
        one.fill === 'white' &&
        one.from.x <= box.left &&
        one.from.y <= box.top &&
        one.to[1]!.x >= box.right &&
        one.to[1]!.y >= box.bottom,
    );
    if (ground < 0) return [];
    const struck = page.flatMap((one, i) =>
      one.kind === 'path' && one.fill !== 'white' && crosses(one, box) ? [i] : [],
    );
    return [{ text: mark.text, bold: mark.face.name.includes('Bold'), ground, struck }];
  });

describe.each([...alone, ...pairs])('the sheet of %s', (_, end) => {
  it.each(['A4', 'Letter'])(
    'on %s prints no text on another nor on the square code, in its own units and the other',
    async (paper) => {
      for (const given of [end, inOtherUnits(end as { units: string })]) {
        for (const page of await pagesOf(given, paper)) expect(overprints(page)).toEqual([]);
      }
    },
  );
});

describe.each(alone)('the drawing on the sheet of %s', (_, end) => {
  it.each(['A4', 'Letter'])(
    'on %s draws no line over a word of the drawing, and no line under a force',
    async (paper) => {
      const words = drawingWords((await pagesOf(end, paper))[0]!);
      expect(words.length).toBeGreaterThan(8);
      for (const { text, bold, ground, struck } of words) {
        expect(
          struck.filter((i) => bold || i > ground),
          text,
        ).toEqual([]);
      }
    },
  );
});
