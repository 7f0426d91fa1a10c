import { computed, signal } from '@preact/signals';
import type { readEnd as read } from '../../core/end/readEnd.ts';
import { isDemo } from './demo.ts';

type ReadEnd = typeof read;

const reader = signal<ReadEnd | null>(null);

/** Any end can be read; before that only the demo stands. */
export const canRead = computed<boolean>(() => reader.value !== null);

/** Sentences of faults, by code; they come with the reader that finds them. */
export const faultSentences: Record<string, string> = {};

/** Puts the reader of ends at hand, and the sentences of the faults it finds. */
export const admitReader = (it: ReadEnd, sentences: Readonly<Record<string, string>>): void => {
  Object.assign(faultSentences, sentences);
  reader.value = it;
};

/**
 * Stands in the built bench for what the core's checks have of `core/end/readEnd.ts` and `core/words/faults.ts`, which are no part of the
 * first view: until they come the demo, which is known to be well formed, is the one end that is read. Others wait (`awaited.ts`).
 */
export const readEnd: ReadEnd = (input) => {
  if (reader.value) return reader.value(input);
  return isDemo(input) ? { end: input } : { faults: [] };
};
