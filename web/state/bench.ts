import { computed, effect, signal } from '@preact/signals';
import { type Examination, type Examined, examine, wordsOf } from '../../core/check/examine.ts';
import type { SaidFault } from '../../core/check/report.ts';
import type { CheckName } from '../../core/end/checkNames.ts';
import type { End } from '../../core/end/schema.ts';
import { standards } from '../../core/standards/index.ts';
import type { Standard } from '../../core/standards/standard.ts';
import { showQuantity, writeQuantity } from '../../core/units/printQuantity.ts';
import { type UnitSystem, unitOf } from '../../core/units/systems.ts';
import { commonwealth } from '../../core/words/commonwealth.ts';
import { faultText, type Words } from '../../core/words/words.ts';
import { endOf } from './endOf.ts';
import { type Entry, emptyEntry, textOf, withProposals, withText } from './entry.ts';
import { fieldAt } from './fields.ts';
import { sentences } from './misreadSentences.ts';
import { refuse } from './notice.ts';
import { proposalsFor } from './proposals.ts';
import { isFault, readField } from './readField.ts';
import { stepName } from './stepName.ts';
import { steppedValue } from './steppedValue.ts';
import { switchUnits } from './switchUnits.ts';
import { advance, newTimeline, seal, stepBack, stepForward, type Timeline } from './timeline.ts';

/** The state of the bench: one timeline of entries, and everything that follows from the entry in force. */
export const timeline = signal<Timeline>(newTimeline(emptyEntry('sans-10162-1', 'mm-kN')));

/** What stands in the fields. */
export const entry = computed<Entry>(() => timeline.value.entry);

/** The unit system of the whole end. */
export const units = computed<UnitSystem>(() => entry.value.units);

/** The design standard in force; undefined where the entry names one that this version does not have. */
export const standard = computed<Standard | undefined>(() => {
  const id = textOf(entry.value, 'standard');
  return Object.hasOwn(standards, id) ? standards[id] : undefined;
});

/** Words of the standard's market. */
export const words = computed<Words>(() => (standard.value ? wordsOf(standard.value) : commonwealth));

/** The end as the JSON of a file, as far as its fields can be read. */
export const input = computed(() => endOf(entry.value));

/**
 * The end looked at in full, or the faults that stand in the way: texts that cannot be read first, then what the core finds, each with its
 * path and its sentence.
 */
export const examination = computed<Examination>(() => {
  const { input: end, faults } = input.value;
  const found = examine(end);
  if (faults.length === 0) return found;
  const unread = faults.map((one) => ({ ...one, text: faultText(words.value, sentences, one) }));
  const paths = new Set(unread.map(({ path }) => path));
  return { faults: [...unread, ...('faults' in found ? found.faults.filter(({ path }) => !paths.has(path)) : [])] };
});

/** Faults of the end in force; empty where it could be examined. */
export const faults = computed<readonly SaidFault[]>(() =>
  'faults' in examination.value ? examination.value.faults : [],
);

/** The last end that could be examined, so that drawing and ladder stay while a field is half typed; null before the first. */
export const lastGood = signal<Examined | null>(null);

effect(() => {
  if ('examined' in examination.value) lastGood.value = examination.value.examined;
});

/** Drawing and ladder show the end as it stands; false while they show the last one that could be examined. */
export const isCurrent = computed<boolean>(() => 'examined' in examination.value);

/** The rung that is open: its path lies on the piece and its working is unfolded. */
export const chosen = signal<CheckName | null>(null);
/** The rung, and the field, under the pointer. */
export const hovered = signal<string | null>(null);
/** Path of the field that has focus. */
export const focused = signal<string | null>(null);
/** Path of the field that is being typed in: its text is shown as it is, and it is not complained of. */
export const editing = signal<string | null>(null);
/** True once faults were asked for (issuing a sheet): then empty fields are complained of too. */
export const demanded = signal(false);

const make = (after: Entry, path: string, typing: boolean): void => {
  timeline.value = advance(timeline.value, after, (before) => stepName(before, after, path), typing ? path : undefined);
};

const proposed = (after: Entry, path: string, text: string): Entry =>
  withProposals(after, proposalsFor({ entry: after, last: lastGood.value }, path, text));

/** Puts what is typed at a path; all typing in one field until `leave` is one step of the timeline. */
export const write = (path: string, text: string): void => make(withText(entry.value, path, text), path, true);

/**
 * Chooses a value from a list, as one step; `also` holds what goes with it, by path. Parts that are switched on get proposed values, marked as
 * assumed. A standard that works at the other level of load empties the reaction: it must be asked for again.
 */
export const choose = (path: string, value: string, also: Readonly<Record<string, string>> = {}): void => {
  const level = (id: string) => (Object.hasOwn(standards, id) ? standards[id]?.level : undefined);
  const turned = path === 'standard' && level(value) !== level(textOf(entry.value, path));
  const others = turned ? { reaction: '', 'reaction.ofWebShear': '', level: '' } : also;
  const after = Object.entries({ ...others, [path]: value }).reduce(
    (it, [one, text]) => withText(it, one, text),
    entry.value,
  );
  make(proposed(after, path, value), path, false);
};

/** Closes the step of typing in a field. What a new row or column needs is proposed here, not while its number is half typed. */
export const leave = (path: string): void => {
  editing.value = null;
  const completed = proposed(entry.value, path, textOf(entry.value, path));
  const joined = advance(timeline.value, completed, (before) => stepName(before, completed, path), path);
  timeline.value = seal(completed.assumed.length === entry.value.assumed.length ? timeline.value : joined);
};

/** Takes back what was typed in a field since it was entered. */
export const revert = (path: string): void => {
  editing.value = null;
  const { sealed, done } = timeline.value;
  if (!sealed && done.at(-1)?.field === path) timeline.value = { ...stepBack(timeline.value), undone: [] };
};

/** Moves a size by one step up or down: 1 or 5 mm (1/16 or 1/4 in), `big` 10 mm (1/2 in). Nothing happens where no number stands. */
export const step = (path: string, direction: 1 | -1, big = false): void => {
  const text = steppedValue(entry.value, path, direction, big);
  if (text === undefined) return;
  editing.value = null;
  make(proposed(withText(entry.value, path, text), path, text), path, true);
};

export const undo = (): void => {
  timeline.value = stepBack(timeline.value);
};
export const redo = (): void => {
  timeline.value = stepForward(timeline.value);
};

/**
 * Turns the whole end to the other units; what was typed is kept, so the way back changes nothing. Not while a field cannot be read: its
 * number could read differently there.
 */
export const setUnits = (system: UnitSystem): void => {
  const unread = input.value.faults;
  if (unread.length > 0) {
    demanded.value = true;
    const lines = faults.value.filter(({ path }) => unread.some((one) => one.path === path)).map(({ text }) => text);
    refuse('The units stay as they are while a field cannot be read', lines);
    return;
  }
  const after = switchUnits(entry.value, system);
  timeline.value = advance(timeline.value, after, ({ units: from }) => `Units ${from} → ${system}`);
};

/** Puts another end on the bench, as one step that can be undone. */
export const replace = (after: Entry, name: string): void => {
  lastGood.value = null;
  chosen.value = null;
  demanded.value = false;
  timeline.value = advance(timeline.value, after, () => name);
};

/** Begins with an entry and an empty timeline. */
export const begin = (first: Entry): void => {
  lastGood.value = null;
  timeline.value = newTimeline(first);
};

/** The end as it stands, where it can be examined; for files, links and sheets. */
export const endInForce = (): End | undefined =>
  'examined' in examination.value ? examination.value.examined.end : undefined;

/** Name of the unit behind a field; empty for counts and words. */
export const unitAt = (path: string): string => {
  const field = fieldAt(path);
  return field.kind === 'quantity' ? unitOf(field.dimension, units.value).name : '';
};

/** The text a field shows: what is being typed as it is; a number that was written with a unit of its own, in the unit of the end. */
export const shown = (path: string): string => {
  const text = textOf(entry.value, path);
  if (editing.value === path) return text;
  const field = fieldAt(path);
  const reading = readField(entry.value, path);
  if (field.kind !== 'quantity' || reading === undefined || isFault(reading) || reading.unit === '') return text;
  return showQuantity(reading.value, field.dimension, units.value);
};

/** How the text of a field was read, where that is worth saying: `read as 19.05 mm`; else empty. */
export const readAs = (path: string): string => {
  const field = fieldAt(path);
  const reading = readField(entry.value, path);
  if (field.kind === 'words' || reading === undefined || isFault(reading) || !reading.unusual) return '';
  const dimension = field.kind === 'count' ? '0,0' : field.dimension;
  if (editing.value !== path && reading.unit !== '') return '';
  const value =
    reading.unit === ''
      ? writeQuantity(reading.value, dimension, units.value)
      : showQuantity(reading.value, dimension, units.value);
  return value === textOf(entry.value, path) ? '' : `read as ${value} ${unitAt(path)}`.trim();
};

/** The value was put in by the bench and nobody has touched it. */
export const isAssumed = (path: string): boolean => entry.value.assumed.includes(path);

/** The fault beside a field, in words; empty while it is being typed in, and for an empty field until faults are asked for. */
export const faultAt = (path: string): string => {
  if (editing.value === path) return '';
  if (textOf(entry.value, path) === '' && !demanded.value) return '';
  return faults.value.find((one) => one.path === path)?.text ?? '';
};
