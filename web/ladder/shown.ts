import { computed } from '@preact/signals';
import type { ExaminedNumbers } from '../../core/check/examined.ts';
import type { Check, SaidFault } from '../../core/check/report.ts';
import { commonwealth } from '../../core/words/commonwealth.ts';
import type { Words } from '../../core/words/words.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import { chosen, faults, isCurrent, lastGood } from '../state/bench.ts';

/** What the bench shows: the end examined last without a fault; null before there is one. */
export const shown = computed<ExaminedNumbers | null>(() => lastGood.value);

/** Why the end as it stands in the fields cannot be examined. */
export const missing = computed<readonly SaidFault[]>(() => faults.value);

/** True while what is shown is the result of before. */
export const stale = computed(() => !isCurrent.value);

/** The words that the report speaks. */
export const words = computed<Words>(() => {
  const report = shown.value?.report;
  return report ? wordsFor(report.words) : commonwealth;
});

/** The check whose rung is touched, where the report has it and it says something. */
export const chosenCheck = computed<Check | null>(() => {
  const found = shown.value?.report.checks.find(({ id }) => id === chosen.value);
  return found && found.state !== 'notApplicable' ? found : null;
});
