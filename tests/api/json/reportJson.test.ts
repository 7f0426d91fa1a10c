import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { JsonWriter } from '../../../api/json/jsonWriter.ts';
import { reportJson } from '../../../api/json/reportJson.ts';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Report } from '../../../core/check/report.ts';
import { listed } from '../../../core/standards/listed.ts';
import { goodEnds } from '../../support/published.ts';

const textOf = (report: Report): string => Buffer.from(reportJson(report)).toString();

/** What the engine writes of the same report. */
const expectSame = (report: Report): void => expect(textOf(report)).toBe(JSON.stringify(report));

const written = (write: (writer: JsonWriter) => void): string => {
  const writer = new JsonWriter();
  write(writer);
  return Buffer.from(writer.taken()).toString();
};

describe('the JSON of a report', () => {
  test.each(goodEnds())('is what JSON.stringify writes: $name', ({ end }) => {
    for (const working of [false, true]) {
      const outcome = checkEnd(end, { working });
      if ('faults' in outcome) throw new Error(JSON.stringify(outcome.faults));
      expectSame(outcome.report);
    }
  });

  test.each(listed.map(({ id }) => id))(
    'is what JSON.stringify writes under each standard, in both systems: %s',
    (standard) => {
      let reports = 0;
      for (const { end } of goodEnds()) {
        const { level: _, options: __, ...rest } = end as Record<string, unknown>;
        const outcome = checkEnd({ ...rest, standard });
        if ('faults' in outcome) continue;
        expectSame(outcome.report);
        reports += 1;
      }
      expect(reports).toBeGreaterThan(0);
    },
  );

  test('carries any mark: quotes, line ends, signs of all planes, halves of a pair', () => {
    const { end } = goodEnds()[0]!;
    for (const mark of ['', 'K"7\\L', 'a\nb\u0000', 'Träger ≤ 7', '梁-7', '\u2028', '🏗', '\ud83c', '\udfd7x']) {
      const outcome = checkEnd({ ...end, mark });
      if ('report' in outcome) expectSame(outcome.report);
      else throw new Error(mark);
    }
  });

  test('two reports one after the other share nothing', () => {
    const reports = goodEnds().flatMap(({ end }) => {
      const outcome = checkEnd(end);
      return 'report' in outcome ? [outcome.report] : [];
    });
    const bytes = reports.map(reportJson);
    for (const [at, one] of bytes.entries()) expect(Buffer.from(one).toString()).toBe(JSON.stringify(reports[at]));
  });
});

describe('numbers and texts, one by one', () => {
  const numberOf = (value: number): string => written((writer) => writer.number(value));

  test('any number as JSON.stringify writes it', () => {
    fc.assert(fc.property(fc.double(), (value) => numberOf(value) === JSON.stringify(value)));
  });

  test('numbers of few places, to the limits of what is put together by hand', () => {
    fc.assert(
      fc.property(fc.integer({ min: -2e9, max: 2e9 }), fc.nat(6), (digits, places) => {
        const value = digits / 10 ** places;
        return numberOf(value) === JSON.stringify(value);
      }),
    );
    for (const value of [0, -0, 0.1, 0.0001, 0.00001, 9, 10, 99.9999, 1e5, 100000.0001, 99999.9999, -1.5, 1e21]) {
      expect(numberOf(value)).toBe(JSON.stringify(value));
    }
    for (const value of [Number.NaN, Number.POSITIVE_INFINITY]) expect(numberOf(value)).toBe('null');
  });

  test('any text as JSON.stringify writes it', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        return written((writer) => writer.text(text)) === JSON.stringify(text);
      }),
    );
  });

  test('a run longer than the room it began with', () => {
    const text = '≤"'.repeat(30_000);
    const parts = written((writer) => {
      for (let turn = 0; turn < 3; turn += 1) writer.text(text);
    });
    expect(parts).toBe(JSON.stringify(text).repeat(3));
  });
});
