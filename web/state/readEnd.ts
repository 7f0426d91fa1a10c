import { computed, signal } from '@preact/signals';
import type * as geometry from '../../core/end/geometryFaults.ts';
import type * as holes from '../../core/end/holeFaults.ts';
import type { readEnd as read } from '../../core/end/readEnd.ts';
import { isDemo } from './demo.ts';

/** What reads an end, and what finds faults in its sizes. */
export type Reader = { readonly readEnd: typeof read } & Pick<
  typeof geometry & typeof holes,
  'sectionFaults' | 'copeFaults' | 'patternFaults' | 'holeFaults' | 'fittingFaults'
>;

const reader = signal<Reader | null>(null);

/** Any end can be read; before that only the demo stands. */
export const canRead = computed<boolean>(() => reader.value !== null);

/** Sentences of faults, by code; they come with the reader that finds them. */
export const faultSentences: Record<string, string> = {};

/** Puts the reader of ends at hand, and the sentences of the faults it finds. */
export const admitReader = (it: Reader, sentences: Readonly<Record<string, string>>): void => {
  Object.assign(faultSentences, sentences);
  reader.value = it;
};

/**
 * Stands in the built bench for what the core's checks have of `core/end/readEnd.ts` and `core/words/faults.ts`, which are no part of the
 * first view: until they come the demo, which is known to be well formed, is the one end that is read. Others wait (`awaited.ts`).
 */
export const readEnd: Reader['readEnd'] = (input) => {
  if (reader.value) return reader.value.readEnd(input);
  return isDemo(input) ? { end: input } : { faults: [] };
};

/** Stand in likewise for what `core/end/geometryFaults.ts` and `core/end/holeFaults.ts` find in an end's sizes; the demo has no fault. */
export const sectionFaults: Reader['sectionFaults'] = (...it) => reader.value?.sectionFaults(...it) ?? [];
export const copeFaults: Reader['copeFaults'] = (...it) => reader.value?.copeFaults(...it) ?? [];
export const patternFaults: Reader['patternFaults'] = (...it) => reader.value?.patternFaults(...it) ?? [];
export const holeFaults: Reader['holeFaults'] = (...it) => reader.value?.holeFaults(...it) ?? [];
export const fittingFaults: Reader['fittingFaults'] = (...it) => reader.value?.fittingFaults(...it) ?? [];
