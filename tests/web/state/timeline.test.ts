import { describe, expect, test } from 'vitest';
import { commonwealth } from '../../../core/words/commonwealth.ts';
import { emptyEntry, withText } from '../../../web/state/entry.ts';
import { stepName } from '../../../web/state/stepName.ts';
import { advance, newTimeline, seal, stepBack, stepForward, type Timeline } from '../../../web/state/timeline.ts';

const start = newTimeline(emptyEntry('sans-10162-1', 'mm-kN'));

const typed = (timeline: Timeline, path: string, text: string): Timeline => {
  const after = withText(timeline.entry, path, text);
  return advance(timeline, after, (before) => stepName(commonwealth, before, after, path), path);
};

const names = ({ done }: Timeline): string[] => done.map(({ name }) => name);

describe('the timeline', () => {
  test('typing in one field is one step, named by what changed', () => {
    const first = seal(typed(start, 'top.length', '120'));
    const letters = ['1', '15', '150'].reduce((it, text) => typed(it, 'top.length', text), first);
    expect(names(letters)).toEqual(['Length of the top notch empty → 120', 'Length of the top notch 120 → 150']);
    expect(stepBack(letters).entry.texts['top.length']).toBe('120');
  });

  test('another field, or the same one after it was left, begins another step', () => {
    const two = typed(typed(start, 'setback', '10'), 'joint.firstRow', '90');
    expect(names(two)).toHaveLength(2);
    expect(names(typed(seal(typed(start, 'setback', '10')), 'setback', '12'))).toHaveLength(2);
  });

  test('typing a value and typing it back leaves no step', () => {
    const first = seal(typed(start, 'setback', '10'));
    expect(names(typed(typed(first, 'setback', '1'), 'setback', '10'))).toEqual(names(first));
  });

  test('undone to the beginning and redone, three hundred steps give the same entry', () => {
    const done = Array.from({ length: 300 }, (_, i) => i + 1).reduce(
      (it, i) => seal(typed(it, i % 2 ? 'setback' : 'joint.firstRow', String(i))),
      start,
    );
    expect(names(done)).toHaveLength(300);
    let undone = done;
    while (undone.done.length > 0) undone = stepBack(undone);
    expect(undone.entry).toEqual(start.entry);
    let redone = undone;
    while (redone.undone.length > 0) redone = stepForward(redone);
    expect(redone.entry).toEqual(done.entry);
  });

  test('a new step after undoing drops what was undone', () => {
    const two = seal(typed(seal(typed(start, 'setback', '10')), 'setback', '12'));
    expect(typed(stepBack(two), 'setback', '15').undone).toEqual([]);
  });

  test('undoing nothing and redoing nothing change nothing', () => {
    expect(stepBack(start).entry).toBe(start.entry);
    expect(stepForward(start).entry).toBe(start.entry);
  });
});
