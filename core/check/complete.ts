import { standards } from '../standards/known.ts';
import type { Examined, ExaminedNumbers } from './examined.ts';
import { fingerprintOf } from './fingerprint.ts';
import { withWorkings } from './workings.ts';

/** An end that was examined with all that belongs to what is issued: the fingerprint, and the workings where they are asked for. */
export const complete = (numbers: ExaminedNumbers, { working }: { readonly working: boolean }): Examined => {
  const found = working ? withWorkings(numbers) : numbers;
  const { end, report } = found;
  return { ...found, report: { ...report, fingerprint: fingerprintOf(end, standards[end.standard]!) } };
};
