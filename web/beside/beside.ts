import { computed, effect } from '@preact/signals';
import { type Beside, besideOf } from '../../core/check/besideOf.ts';
import type { ExaminedNumbers } from '../../core/check/examined.ts';
import type { SaidFault } from '../../core/check/report.ts';
import { faultSentences } from '../../core/words/faults.ts';
import { faultText } from '../../core/words/words.ts';
import { input, lastGood, words } from '../state/bench.ts';
import { listedAs, rulesOf, titled } from '../state/rules.ts';
import { secondFaults, secondId } from '../state/secondStandard.ts';

/** The same end under the second standard, or what stands in the way: faults, none while its rules are on their way. */
export type BesideFound = Beside | { readonly faults: readonly SaidFault[] };

/** The second speaks the words of the first. */
const inWordsOf = (examined: ExaminedNumbers): ExaminedNumbers => {
  const { end, report } = examined;
  return { ...examined, end: { ...end, sheet: { ...end.sheet, words: report.words } } };
};

const notLoaded = (id: string): SaidFault => ({
  code: 'not-loaded',
  path: 'sheet.beside.standard',
  given: id,
  limit: null,
  text: `The rules of ${titled(listedAs(id)!)} could not be loaded. Try again once there is a network.`,
});

/** The second standard beside the end examined last; null where none is asked for. Whatever is wrong with it, the first stands. */
export const beside = computed<BesideFound | null>(() => {
  if (secondId.value === '') return null;
  const misread = input.value.besideFaults;
  if (misread.length > 0) {
    return { faults: misread.map((one) => ({ ...one, text: faultText(words.value, faultSentences, one) })) };
  }
  const last = lastGood.value;
  const asked = last?.end.sheet?.beside;
  if (!last || !asked) return null;
  const rules = rulesOf(asked.standard);
  if (rules === 'missed') return { faults: [notLoaded(asked.standard)] };
  if (rules === 'coming') return { faults: [] };
  return besideOf(inWordsOf(last));
});

/** The second as it can be shown; null where there is none, or none yet. */
export const besideShown = computed<Beside | null>(() => {
  const found = beside.value;
  return found && 'examined' in found ? found : null;
});

effect(() => {
  const found = beside.value;
  secondFaults.value = found && 'faults' in found ? found.faults : [];
});
