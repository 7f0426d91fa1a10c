import { computed, effect } from '@preact/signals';
import { announce } from '../state/announce.ts';
import { besideParts } from './besideParts.ts';
import { missing, shown, stale } from './shown.ts';
import { incompleteLine, type VerdictLine, verdictLine } from './verdict.ts';

/** The verdict on what stands in the fields; null before anything does, and while rules or tables that it names are on their way. */
export const verdictShown = computed<VerdictLine | null>(() => {
  if (missing.value.length > 0) return incompleteLine(missing.value);
  return shown.value && !stale.value ? verdictLine(shown.value.report) : null;
});

/** The verdict in sentences. */
export const verdictSaid = computed<string>(() => {
  const verdict = verdictShown.value;
  if (!verdict) return '';
  return [
    `${verdict.word} ${verdict.ratio}`.trim(),
    verdict.lead + verdict.first,
    verdict.spare,
    verdict.others,
    besideParts()?.verdictSaid(),
  ]
    .filter(Boolean)
    .join('. ');
});

/** Says each new verdict to those who listen; gives back what ends it. */
export const sayVerdict = (): (() => void) =>
  effect(() => {
    if (verdictSaid.value) announce(verdictSaid.value);
  });
