import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { complete } from '../../../core/check/complete.ts';
import { examine } from '../../../core/check/examine.ts';
import type { Examined, ExaminedNumbers } from '../../../core/check/examined.ts';
import { examineNumbers } from '../../../core/check/examineNumbers.ts';
import { workingOfCheck } from '../../../core/check/workings.ts';
import { endOf, plausibleEnd } from '../../support/arbitraryEnd.ts';
import { goodEnds } from '../../support/published.ts';

const both = (end: unknown): readonly [numbers: ExaminedNumbers, full: Examined] | null => {
  const [numbers, full] = [examineNumbers(end), examine(end)];
  return 'examined' in numbers && 'examined' in full ? [numbers.examined, full.examined] : null;
};

describe('a working that is asked for later', () => {
  test.each(goodEnds())('$name: every check has the very working that it has in the full report', ({ end }) => {
    const [numbers, full] = both(end)!;
    for (const { id, working = [] } of full.report.checks) expect(workingOfCheck(numbers, id)).toEqual(working);
    expect(JSON.stringify(complete(numbers, { working: true }).report)).toBe(JSON.stringify(full.report));
  });

  test('so has any end that can be drawn, in whichever order its workings are asked for', () => {
    fc.assert(
      fc.property(plausibleEnd, (plan) => {
        const found = both(endOf(plan));
        fc.pre(found !== null);
        const [numbers, full] = found!;
        for (const { id, working = [] } of [...full.report.checks].reverse()) {
          expect(workingOfCheck(numbers, id)).toEqual(working);
        }
      }),
      { numRuns: 40 },
    );
  });

  test('another end examined in between changes nothing', () => {
    const [one, other] = goodEnds().map(({ end }) => both(end)!);
    const id = one![1].report.governing;
    examineNumbers(other![0].end);
    const working = one![1].report.checks.find((check) => check.id === id)!.working!;
    expect(working.length).toBeGreaterThan(0);
    expect(workingOfCheck(one![0], id)).toEqual(working);
  });

  test('numbers alone carry no working and no fingerprint, and are otherwise the full report', () => {
    const [numbers, full] = both(goodEnds()[0]!.end)!;
    expect(numbers.report.checks.some(({ working }) => working !== undefined)).toBe(false);
    const bare = full.report.checks.map(({ working: _, ...check }) => check);
    const { fingerprint, ...rest } = full.report;
    expect(fingerprint).toMatch(/^[0-9a-f]{8}$/);
    expect(numbers.report).toEqual({ ...rest, checks: bare });
  });
});
