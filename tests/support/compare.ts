import { checkEnd } from '../../core/check/checkEnd.ts';
import { examine } from '../../core/check/examine.ts';
import type { Check, Report } from '../../core/check/report.ts';
import type { StrengthName } from '../../core/end/checkNames.ts';
import { newRun, numberOf } from '../../core/formula/number.ts';
import { standards } from '../../core/standards/index.ts';
import { isNoRule } from '../../core/standards/standard.ts';
import { toSystem } from '../../core/units/systems.ts';
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

/** Resistance of one way of a check, whether it governs or not, in the end's own units. */
const resistanceOf = ({ end, standard }: PublishedFixture, id: string, of: string): number => {
  const outcome = examine(end);
  if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
  const { facts, report } = outcome.examined;
  const rule = standards[standard]!.strength[id as StrengthName];
  const resistance = isNoRule(rule) ? undefined : rule.ways.find((way) => way.of === of)?.resistance;
  if (!resistance) throw new Error(`${id} has no way called ${of}`);
  newRun();
  return toSystem(numberOf(resistance)(facts as never), resistance.dimension, report.units);
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
    ours: expectation.way
      ? resistanceOf(fixture, expectation.check, expectation.way)
      : (found(report, expectation) ?? Number.NaN),
    check: report.checks.find((one) => one.id === expectation.check) as Check,
  }));
};
