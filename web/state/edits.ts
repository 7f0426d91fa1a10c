import type { UnitSystem } from '../../core/units/systems.ts';
import { chosen, demanded, editing, entry, faults, input, lastGood, timeline, words } from './bench.ts';
import { type Entry, withText } from './entry.ts';
import { notice, refuse } from './notice.ts';
import { secondFaults } from './secondStandard.ts';
import { stepName } from './stepName.ts';
import { steppedValue } from './steppedValue.ts';
import { switchUnits } from './switchUnits.ts';
import { advance, newTimeline, seal, stepBack, stepForward } from './timeline.ts';
import { withSpacing } from './withSpacing.ts';

/** Puts another entry in force, as a step named by what it did at a path; while `typing`, as part of the step before on the same field. */
export const make = (after: Entry, path: string, typing: boolean): void => {
  notice.value = null;
  timeline.value = advance(
    timeline.value,
    after,
    (before) => stepName(words.value, before, after, path),
    typing ? path : undefined,
  );
};

/** Puts what is typed at a path; all typing in one field until `leave` is one step of the timeline. */
export const write = (path: string, text: string): void => make(withText(entry.value, path, text), path, true);

/** Closes the step of typing in a field. What a new row or column needs is proposed here, not while its number is half typed. */
export const leave = (path: string): void => {
  if (editing.value === path) editing.value = null;
  const completed = withSpacing(entry.value, path);
  const joined = advance(timeline.value, completed, (before) => stepName(words.value, before, completed, path), path);
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
  make(withSpacing(withText(entry.value, path, text), path), path, true);
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
  const unread = [...input.value.faults, ...input.value.besideFaults];
  if (unread.length > 0) {
    demanded.value = true;
    const lines = [...faults.value, ...secondFaults.value]
      .filter(({ path }) => unread.some((one) => one.path === path))
      .map(({ text }) => text);
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
