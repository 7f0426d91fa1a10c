import { canonicalJson } from '../../core/end/canonical.ts';
import type { Entry } from './entry.ts';

/** One named step of the work on an end, and the entry before it. */
export interface Step {
  readonly name: string;
  readonly before: Entry;
  readonly after: Entry;
  /** Typing in one field is one step: a step that is still open takes the next letter of the same field. */
  readonly field?: string;
}

export interface Timeline {
  readonly entry: Entry;
  readonly done: readonly Step[];
  readonly undone: readonly Step[];
  /** The last step is closed: the next letter begins another. */
  readonly sealed: boolean;
}

/** Steps kept; older ones fall off. */
export const STEPS_KEPT = 400;

export const newTimeline = (entry: Entry): Timeline => ({ entry, done: [], undone: [], sealed: true });

const same = (a: Entry, b: Entry): boolean => canonicalJson(a) === canonicalJson(b);

/** The timeline after a step. With `field`, it joins the step before if that is still open on the same field. */
export const advance = (
  timeline: Timeline,
  after: Entry,
  name: (before: Entry) => string,
  field?: string,
): Timeline => {
  const last = timeline.done.at(-1);
  const joins = field !== undefined && !timeline.sealed && last?.field === field;
  const before = joins ? last.before : timeline.entry;
  const earlier = joins ? timeline.done.slice(0, -1) : timeline.done;
  if (same(before, after)) return { entry: after, done: earlier, undone: joins ? [] : timeline.undone, sealed: true };
  const step: Step = { name: name(before), before, after, ...(field !== undefined && { field }) };
  return { entry: after, done: [...earlier, step].slice(-STEPS_KEPT), undone: [], sealed: field === undefined };
};

export const seal = (timeline: Timeline): Timeline => (timeline.sealed ? timeline : { ...timeline, sealed: true });

export const stepBack = ({ entry, done, undone }: Timeline): Timeline => {
  const last = done.at(-1);
  return {
    entry: last?.before ?? entry,
    done: done.slice(0, -1),
    undone: last ? [...undone, last] : undone,
    sealed: true,
  };
};

export const stepForward = ({ entry, done, undone }: Timeline): Timeline => {
  const next = undone.at(-1);
  return {
    entry: next?.after ?? entry,
    done: next ? [...done, next] : done,
    undone: undone.slice(0, -1),
    sealed: true,
  };
};
