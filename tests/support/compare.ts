import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Check, Report } from '../../core/check/report.ts';
import type { Expectation, PublishedFixture } from './published.ts';

export const reportOf = (end: unknown, working = true): Report => {
  const outcome = checkEnd(end, { working });
  if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
  return outcome.report;
};

/** The number of the report that an expectation speaks of. */
export const found = (
  report: Report,
  { check: id, field = 'resistance', row }: Expectation,
): number | null | undefined => {
  const check = report.checks.find((one) => one.id === id) as Check;
  if (row) return check.working?.find(({ symbol }) => symbol === row)?.value;
  return check[field];
};

export interface Compared {
  readonly fixture: PublishedFixture;
  readonly expectation: Expectation;
  readonly ours: number;
  readonly check: Check;
}

/** Every expectation of a fixture beside the program's own number. */
export const compared = (fixture: PublishedFixture): Compared[] => {
  const report = reportOf(fixture.end);
  return fixture.expect.map((expectation) => ({
    fixture,
    expectation,
    ours: found(report, expectation) ?? Number.NaN,
    check: report.checks.find((one) => one.id === expectation.check) as Check,
  }));
};
