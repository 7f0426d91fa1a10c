import { standards } from '../../core/standards/known.ts';
import type { UnitSystem } from '../../core/units/systems.ts';
import { chosen, demanded, editing, entry, faults, input, lastGood, timeline } from './bench.ts';
import { type Entry, textOf, withProposals, withText } from './entry.ts';
import { notice, refuse } from './notice.ts';
import { proposalsFor } from './proposals.ts';
import { stepName } from './stepName.ts';
import { steppedValue } from './steppedValue.ts';
import { switchUnits } from './switchUnits.ts';
import { advance, newTimeline, seal, stepBack, stepForward } from './timeline.ts';

const make = (after: Entry, path: string, typing: boolean): void => {
  notice.value = null;
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
  if (editing.value === path) editing.value = null;
  const completed = proposed(entry.value, path, textOf(entry.value, path));
  const joined = advance(timeline.value, completed, (before) => stepName(before, completed, path), path);
  timeline.value = seal(completed.assumed.length === entry.value.assumed.length ? timeline.value : joined);
};

/** Takes over values that the bench put in: they count as given. No step of the timeline, since no value changes. */
export const confirm = (paths: readonly string[]): void => {
  const { assumed } = entry.value;
  if (!assumed.some((one) => paths.includes(one))) return;
  const kept = assumed.filter((one) => !paths.includes(one));
  timeline.value = { ...timeline.value, entry: { ...entry.value, assumed: kept } };
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
