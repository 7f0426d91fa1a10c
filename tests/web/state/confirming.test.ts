import { beforeEach, describe, expect, test } from 'vitest';
import { assumedValues } from '../../../web/state/assumedValues.ts';
import { entry, lastGood } from '../../../web/state/bench.ts';
import { choose } from '../../../web/state/choose.ts';
import { confirmAll, confirmShown, onceConfirmed } from '../../../web/state/confirming.ts';
import { demoEntry } from '../../../web/state/demo.ts';
import * as edits from '../../../web/state/edits.ts';
import { emptyEntry } from '../../../web/state/entry.ts';

const said = () => assumedValues().map(({ text }) => text);

beforeEach(() => {
  edits.begin(demoEntry());
  confirmShown.value = false;
});

describe('what the bench puts in', () => {
  test('it is named with its value and unit until it is touched or confirmed', () => {
    expect(said()).toEqual([]);
    choose('bottom', 'on');
    expect(said()).toEqual([
      'Length of the bottom notch 90 mm',
      'Depth of the bottom notch 25 mm',
      'Corner radius of the bottom notch 12 mm',
    ]);
    edits.write('bottom.depth', '30');
    edits.confirm(['bottom.radius']);
    expect(said()).toEqual(['Length of the bottom notch 90 mm']);
  });

  test('a part that is off, or of another joint, is not spoken of', () => {
    choose('bottom', 'on');
    choose('bottom', 'none');
    expect(said()).toEqual([]);
    choose('joint.kind', 'web-bolts');
    expect(said()).toContain('Thickness of the ply 10 mm');
    choose('joint.kind', 'fin-plate');
    expect(said()).toEqual([]);
  });

  test('the joint and the notches of a new end are put in by the bench too', () => {
    edits.begin(emptyEntry('sans-10162-1', 'mm-kN'));
    expect(said()).toEqual(['Kind of joint fin plate', 'Bottom notch none']);
  });

  test('sheet and link wait until it is confirmed; then it counts as given, with the same numbers', () => {
    let done = 0;
    const act = () => {
      done += 1;
    };
    onceConfirmed(act);
    expect([done, confirmShown.value]).toEqual([1, false]);

    choose('bottom', 'on');
    const { report } = lastGood.value!;
    onceConfirmed(act);
    expect([done, confirmShown.value]).toEqual([1, true]);
    confirmAll();
    expect(done).toBe(2);
    expect(said()).toEqual([]);
    expect(entry.value.texts['bottom.length']).toBe('90');
    expect(lastGood.value!.report).toEqual(report);
  });

  test('undoing what put it in and doing it again asks again', () => {
    choose('bottom', 'on');
    edits.confirm(['bottom.length', 'bottom.depth', 'bottom.radius']);
    edits.undo();
    edits.redo();
    expect(said()).toHaveLength(3);
  });
});
