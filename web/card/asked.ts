import { computed, signal } from '@preact/signals';
import type { MadeCard } from '../../core/card/card.ts';
import { cardOf } from '../../core/card/cardOf.ts';
import { findSection, listSections } from '../../core/steel/knownSections.ts';
import { faultSentences } from '../../core/words/faults.ts';
import { faultText } from '../../core/words/words.ts';
import { awaited, entry, input, words } from '../state/bench.ts';
import { textOf } from '../state/entry.ts';
import '../state/reader.ts';
import { otherFamilies } from '../state/sections.ts';

/** How the sections of a card are named: a family of the library, or a list. */
export type By = 'family' | 'list';
export type Paper = 'A4' | 'Letter';

/** What people chose for the card; null where they have not, and it follows the end on the bench. */
export const by = signal<By>('family');
export const chosenFamily = signal<string | null>(null);
export const list = signal('');
export const from = signal(2);
export const to = signal(8);
export const chosenPaper = signal<Paper | null>(null);

export const families = computed<readonly string[]>(() =>
  otherFamilies.value || otherFamilies.failed ? listSections().map(({ family }) => family) : [],
);

/** The family that the section on the bench is of. */
const ownFamily = (): string | undefined => {
  const found = findSection(textOf(entry.value, 'beam.section'));
  if (!('designation' in found)) return undefined;
  return listSections().find(({ designations }) => designations.includes(found.designation))?.family;
};

export const family = computed<string>(
  () => chosenFamily.value ?? ((families.value.length > 0 && ownFamily()) || 'UB'),
);

export const paper = computed<Paper>(
  () => chosenPaper.value ?? (textOf(entry.value, 'sheet.paper') === 'Letter' ? 'Letter' : 'A4'),
);

const sections = (): readonly string[] =>
  list.value
    .split(/[\n,;]/)
    .map((one) => one.trim())
    .filter(Boolean);

const rows = (): readonly number[] =>
  Array.from({ length: Math.max(0, to.value - from.value + 1) }, (_, at) => from.value + at);

/** Fields of the end that a card does not read: it has its own. */
const isCards = (path: string): boolean => /^(?:reaction|beam\.section|joint\.bolts\.rows)(?:\.|$)/.test(path);

/** What stands in the way of any card, in sentences: fields of the template that cannot be read. */
const unread = (): readonly string[] =>
  input.value.faults.filter(({ path }) => !isCards(path)).map((one) => faultText(words.value, faultSentences, one));

/** What a card is asked for, as JSON; `coming` while rules or sections are on their way, else why it cannot be. */
export type Asked = { readonly json: string } | 'coming' | { readonly sentences: readonly string[] };

export const asked = computed<Asked>(() => {
  const waits = awaited.value;
  if (waits === 'coming' || (!otherFamilies.value && !otherFamilies.failed)) return 'coming';
  if (waits) return { sentences: [waits.text] };
  const misread = unread();
  if (misread.length > 0) return { sentences: misread };
  const end = input.value.input;
  const sheet = { ...(end.sheet as object | undefined), paper: paper.value };
  const of = by.value === 'family' ? { family: family.value } : { sections: sections() };
  return { json: JSON.stringify({ end: { ...end, sheet }, ...of, rows: rows() }) };
});

export type Answer = { readonly made: MadeCard } | { readonly sentences: readonly string[] };

/** The card of the end on the bench, or why there is none, in sentences. Takes a second for a large family. */
export const answerTo = (json: string): Answer => {
  const found = cardOf(JSON.parse(json));
  return 'made' in found ? found : { sentences: found.faults.map(({ text }) => text) };
};
