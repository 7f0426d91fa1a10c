import { examine } from './examine.ts';
import type { Outcome } from './report.ts';

/**
 * The one door: checks one beam end, given as parsed JSON, under the standard it names. Answers with a report, in the units of the end,
 * or with faults. `working` adds the working of every check.
 */
export const checkEnd = (input: unknown, { working = false } = {}): Outcome => {
  const found = examine(input, { working });
  return 'faults' in found ? found : { report: found.examined.report };
};
