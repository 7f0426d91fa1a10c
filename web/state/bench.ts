import { computed, effect, signal } from '@preact/signals';
import type { ExaminedNumbers } from '../../core/check/examined.ts';
import { examineNumbers } from '../../core/check/examineNumbers.ts';
import type { SaidFault } from '../../core/check/report.ts';
import type { CheckName } from '../../core/end/checkNames.ts';
import type { Listed } from '../../core/standards/listed.ts';
import type { Standard } from '../../core/standards/standard.ts';
import type { UnitSystem } from '../../core/units/systems.ts';
import { type Region, regions } from '../../core/words/regions.ts';
import { faultText, type Words } from '../../core/words/words.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import { type Awaited, awaitedOf } from './awaited.ts';
import { demoEntry } from './demo.ts';
import { endOf } from './endOf.ts';
import { type Entry, textOf } from './entry.ts';
import { filledFrom } from './filledFrom.ts';
import { faultSentences } from './readEnd.ts';
import { listedAs, rulesOf } from './rules.ts';
import { newTimeline, type Timeline } from './timeline.ts';
import { inTradeOrder } from './tradeOrder.ts';

/** The state of the bench: one timeline of entries, and everything that follows from the entry in force. The demo stands first. */
export const timeline = signal<Timeline>(newTimeline(demoEntry()));

/** What stands in the fields. */
export const entry = computed<Entry>(() => timeline.value.entry);

/** The unit system of the whole end. */
export const units = computed<UnitSystem>(() => entry.value.units);

/** What is listed of the standard that the entry names; undefined where this version does not have it. */
export const listing = computed<Listed | undefined>(() => listedAs(textOf(entry.value, 'standard')));

/** The rules of the standard in force; undefined while they are on their way, and where there are none. */
export const standard = computed<Standard | undefined>(() => {
  const rules = rulesOf(textOf(entry.value, 'standard'));
  return typeof rules === 'object' ? rules : undefined;
});

/** Whose trade words are spoken where the end does not say. */
export const marketRegion = computed<Region>(() => listing.value?.region ?? 'commonwealth');

/** Whose trade words are spoken. */
export const region = computed<Region>(() => {
  const said = textOf(entry.value, 'sheet.words');
  return regions.find((one) => one === said) ?? marketRegion.value;
});

/** Everything that is said to people, in those words. */
export const words = computed<Words>(() => wordsFor(region.value));

/** The end as the JSON of a file, as far as its fields can be read. */
export const input = computed(() => endOf(entry.value));

/** What the end names and the bench has not yet; null where everything is at hand. */
export const awaited = computed<Awaited | null>(() => awaitedOf(input.value.input));

/** The last end that could be examined, so that drawing and ladder stay while a field is half typed; null before the first. */
export const lastGood = signal<ExaminedNumbers | null>(null);

/** Codes of faults of names: not known, or without a strength for the size they are of. */
const NAME = /^(?:unknown|grade|bolt-grade)-/;

/**
 * Names that are not known, in an end that has gaps: the core looks names up only once an end is whole, so the gaps are filled from the last
 * end for that alone.
 */
const unknownNames = (end: Readonly<Record<string, unknown>>, gaps: readonly string[]): readonly SaidFault[] => {
  const last = lastGood.peek();
  if (!last) return [];
  const found = examineNumbers(filledFrom(end, last.end, gaps));
  if (!('faults' in found)) return [];
  return found.faults.filter(({ code, path }) => NAME.test(code) && !gaps.includes(path));
};

/**
 * The end looked at in full, or the faults that stand in the way, in the order of the trade: texts that cannot be read and what the core
 * finds, each with its path and its sentence. None while something that the end names is on its way.
 */
export const examination = computed<ReturnType<typeof examineNumbers>>(() => {
  const waits = awaited.value;
  if (waits) return { faults: waits === 'coming' ? [] : [waits] };
  const { input: end, faults: misread } = input.value;
  const found = examineNumbers(end);
  if (misread.length === 0 && 'examined' in found) return found;
  const unread = misread.map((one) => ({ ...one, text: faultText(words.value, faultSentences, one) }));
  const known = new Set(unread.map(({ path }) => path));
  const others = 'faults' in found ? found.faults.filter(({ path }) => !known.has(path)) : [];
  const gaps = [...unread, ...others.filter(({ code }) => code === 'missing')].map(({ path }) => path);
  const names = gaps.length > 0 ? unknownNames(end, gaps) : [];
  return {
    faults: inTradeOrder([
      ...unread,
      ...others,
      ...names.filter(({ path }) => !others.some((one) => one.path === path)),
    ]),
  };
});

/** Faults of the end in force; empty where it could be examined, and while something that it names is on its way. */
export const faults = computed<readonly SaidFault[]>(() =>
  'faults' in examination.value ? examination.value.faults : [],
);

/** True once faults were asked for (issuing a sheet): then empty fields are complained of too, until the end is complete. */
export const demanded = signal(false);

effect(() => {
  if (!('examined' in examination.value)) return;
  lastGood.value = examination.value.examined;
  demanded.value = false;
});

/** Drawing and ladder show the end as it stands; false while they show the last one that could be examined. */
export const isCurrent = computed<boolean>(() => 'examined' in examination.value);

/** The rung that is open: its path lies on the piece and its working is unfolded. */
export const chosen = signal<CheckName | null>(null);
/** Path of the field that has focus. */
export const focused = signal<string | null>(null);
/** Path of the field that is being typed in: its text is shown as it is, and it is not complained of. */
export const editing = signal<string | null>(null);
