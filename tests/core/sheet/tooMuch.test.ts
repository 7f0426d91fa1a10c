import { describe, expect, it } from 'vitest';
import type { Examined } from '../../../core/check/examine.ts';
import type { Check } from '../../../core/check/report.ts';
import { closingLines } from '../../../core/sheet/closing.ts';
import { numbersOf } from '../../../core/sheet/numbers.ts';
import { sheetPages } from '../../../core/sheet/sheet.ts';
import { blockHeight } from '../../../core/sheet/titleBlock.ts';
import { wordsFor } from '../../../core/words/wordsFor.ts';
import { end, examined, fullest } from './ends.ts';
import { A4, covering, LETTER, outside, pagesOf, windowOf } from './onPage.ts';
import { wholeText } from './readPdf.ts';

describe('what is too much for one page', () => {
  const longest = {
    ...end,
    mark: 'WWWWWWWWWW-MMMMMMMMMM-XXXXXXXXXX-YYYYYYY',
    piece: 'P'.repeat(40),
    end: 'far',
    quantity: 99999,
    support: { kind: 'beam-web', section: 'UB 610x229x125', topOfSteel: 0 },
    sheet: {
      job: 'W'.repeat(200),
      drawing: 'D'.repeat(200),
      number: 'N'.repeat(200),
      revision: 'R2345678',
      reason: `because ${'reason '.repeat(27)}`.slice(0, 200),
      loadCase: 'L'.repeat(200),
      date: '2031-12-31',
      prepared: 'P'.repeat(200),
      checked: 'C'.repeat(200),
      approved: `${'Name '.repeat(40)}`.trim(),
    },
  };

  it('the longest names do not leave their places', async () => {
    for (const paper of ['A4', 'Letter'] as const) {
      const pages = await pagesOf(examined({ ...longest, sheet: { ...longest.sheet, paper } }));
      for (const page of pages) {
        expect(outside(page, windowOf(paper === 'A4' ? A4 : LETTER))).toEqual([]);
        expect(covering(page)).toEqual([]);
      }
      expect(wholeText(pages[0]!)).toContain('…');
    }
  });

  /** A report with so many rows as no joint of ours has yet: the checks of the fullest end with longer names and reasons. */
  const withRows = (count: number): Examined => {
    const whole = examined(fullest);
    const { checks } = whole.report;
    const model = checks.filter(({ id, state }) => state === 'holds' && !id.startsWith('fit-'));
    const rows = Array.from({ length: count }, (_, i): Check => {
      const one = model[i % model.length]!;
      return {
        ...one,
        title: `${one.title} of a part with a name that is long`,
        state: i % 5 === 4 ? 'refer' : 'holds',
        reasonText: 'a reason that fills its line',
        verified: 'none',
      };
    });
    const others = checks.filter(({ id, state }) => id.startsWith('fit-') || state !== 'holds');
    return { ...whole, report: { ...whole.report, checks: [...rows, ...others] } };
  };

  it.each([24, 40, 90])('%i rows go on further sheets in the same type, and none is lost', async (count) => {
    const pages = await pagesOf(withRows(count));
    pages.forEach((page, i) => {
      expect(outside(page, windowOf(A4))).toEqual([]);
      expect(covering(page)).toEqual([]);
      expect(wholeText(page)).toContain(`${i + 1} of ${pages.length}`);
    });
    const bases = pages.flat().filter(({ text }) => ['memory', 'practice', 'research', 'seen'].includes(text));
    expect(bases.filter(({ size }) => Math.abs(size - 8) < 0.05).length).toBe(count);
    expect(wholeText(pages[0]!)).toContain('on sheet 2');
  });

  it('numbers of six digits take no room of their neighbours: the columns are as wide as they', async () => {
    const whole = examined(fullest);
    const checks = whole.report.checks.map((one) => ({
      ...one,
      demand: one.demand === null ? null : 1000 * one.demand,
      resistance: one.resistance === null ? null : 1000 * one.resistance,
    }));
    const pages = await pagesOf({ ...whole, report: { ...whole.report, checks } });
    expect(wholeText(pages[0]!)).toMatch(/\d{3}\s\d{3}\.\d/);
    for (const page of pages) expect(covering(page)).toEqual([]);
  });

  it('cautions of several lines are set in full, above what else stands at the foot', async () => {
    const whole = examined({ ...fullest, sheet: { paper: 'Letter' } });
    const pen = await sheetPages(whole, { workings: 'all' });
    const under = { pen, input: whole, numbers: numbersOf('mm-kN', '.'), words: wordsFor(whole.report.words) };
    const context = { ...under, second: null, fault: '' };
    const long = {
      ...context,
      words: { ...context.words, cautions: Array.from({ length: 9 }, () => 'Ask the designer first.') },
    };
    const block = { code: null, lost: true };
    const lines = closingLines(long, 180, true);
    expect(lines.length).toBeGreaterThan(1);
    expect(lines.map((line) => line.map(({ text }) => text).join('')).join(' ')).toBe(
      `${'Ask the designer first. '.repeat(9)}No square code: the file has the data.`,
    );
    // 3.65 mm for each line more than one.
    const more = blockHeight(long, block) - blockHeight(context, { code: null, lost: false });
    expect(more).toBeCloseTo(3.65 * (lines.length - 1), 6);
  });

  it('a formula that no number from outside has confirmed is marked, and the mark explained', async () => {
    const text = wholeText((await pagesOf(withRows(6)))[0]!);
    expect(text).toContain('*');
    expect(text).toContain('* not yet compared with numbers from outside the program.');
    const checked = examined(end);
    const all = {
      ...checked.report,
      checks: checked.report.checks.map((one) => ({ ...one, verified: 'hand' as const })),
    };
    expect(wholeText((await pagesOf({ ...checked, report: all }))[0]!)).not.toContain('*');
  });
});
