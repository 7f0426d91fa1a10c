import '../standards/index.ts';
import '../steel/findSection.ts';
import { complete } from './complete.ts';
import type { Examination } from './examined.ts';
import { examineNumbers } from './examineNumbers.ts';

export type { Examination, Examined } from './examined.ts';
export { said } from './examineNumbers.ts';

/**
 * Checks an end in full, every standard and section at hand; `working` adds the working of every check. Never throws for what a user wrote: what cannot be computed comes back
 * as faults.
 */
export const examine = (input: unknown, { working = true } = {}): Examination => {
  const found = examineNumbers(input);
  return 'faults' in found ? found : { examined: complete(found.examined, { working }) };
};
