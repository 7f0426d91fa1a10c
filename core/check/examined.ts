import type { Facts } from '../end/facts.ts';
import type { End } from '../end/schema.ts';
import type { Numbers, Report, SaidFault } from './report.ts';

/** An end looked at: what was written, what is known of it, and the numbers that the standard gives. */
export interface ExaminedNumbers {
  readonly end: End;
  readonly facts: Facts;
  /** Designation of the section; empty for own sizes. */
  readonly designation: string;
  readonly report: Numbers;
}

/** The same with the whole report. */
export interface Examined extends ExaminedNumbers {
  readonly report: Report;
}

export type Examination = { readonly examined: Examined } | { readonly faults: readonly SaidFault[] };
