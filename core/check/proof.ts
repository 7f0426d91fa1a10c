import type { StrengthName } from '../end/checkNames.ts';
import { numberOf } from '../formula/number.ts';
import { standards } from '../standards/known.ts';
import { isNoRule } from '../standards/standard.ts';
import { toSystem } from '../units/systems.ts';
import { examine } from './examine.ts';
import type { Examined } from './examined.ts';
import type { Check } from './report.ts';

/** One number that the program did not make, in the unit named. */
export interface Expectation {
  readonly check: string;
  /** Part of the check, where it has several. */
  readonly of?: string;
  /** A way that need not govern, by name: the resistance of that way is compared. */
  readonly way?: string;
  /** Number of the check compared: `resistance` where absent. */
  readonly field?: 'demand' | 'resistance' | 'reactionAtFailure' | 'utilisation';
  /** Or the value of a row of its working, by symbol. */
  readonly row?: string;
  readonly value: number;
  readonly unit: string;
  /** Greatest difference allowed, and why. */
  readonly within: number;
  readonly why: string;
  /** The sum by hand. */
  readonly sum?: string;
}

/** An example with numbers from outside: `published` in the source named, exact by `theory`, or summed by `hand`. */
export interface Example {
  readonly id: string;
  readonly standard: string;
  readonly standing: 'published' | 'theory' | 'hand';
  readonly source: string;
  readonly says: string;
  readonly end: unknown;
  readonly expect: readonly Expectation[];
}

/** A number from outside beside the program's own; NaN where the program gives none. */
export interface Compared {
  readonly fixture: Example;
  readonly expectation: Expectation;
  readonly ours: number;
  readonly check: Check;
}

/** Resistance of one way of a check, whether it governs or not, in the end's own units. */
const resistanceOf = ({ facts, report }: Examined, id: string, of: string): number => {
  const rule = standards[report.standard.id]!.strength[id as StrengthName];
  const resistance = isNoRule(rule) ? undefined : rule.ways.find((way) => way.of === of)?.resistance;
  if (!resistance) return Number.NaN;
  return toSystem(numberOf(resistance, facts), resistance.dimension, report.units);
};

const oursOf = (examined: Examined, { check: id, way, row, field = 'resistance' }: Expectation): number => {
  if (way) return resistanceOf(examined, id, way);
  const check = examined.report.checks.find((one) => one.id === id);
  const value = row ? check?.working?.find(({ symbol }) => symbol === row)?.value : check?.[field];
  return value ?? Number.NaN;
};

/** Every number of an example beside the program's own; none where the end is refused. */
export const comparedIn = (fixture: Example): Compared[] => {
  const outcome = examine(fixture.end);
  if ('faults' in outcome) return [];
  const { examined } = outcome;
  return fixture.expect.map((expectation) => ({
    fixture,
    expectation,
    ours: oursOf(examined, expectation),
    check: examined.report.checks.find((one) => one.id === expectation.check) as Check,
  }));
};
