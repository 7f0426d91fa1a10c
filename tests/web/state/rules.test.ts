import { beforeEach, describe, expect, test, vi } from 'vitest';
import { sans10162 } from '../../../core/standards/sans10162/index.ts';
import type { Standard } from '../../../core/standards/standard.ts';
import * as bench from '../../../web/state/bench.ts';
import { choose } from '../../../web/state/choose.ts';
import { demoEntry } from '../../../web/state/demo.ts';
import * as edits from '../../../web/state/edits.ts';
import { type Entry, withText } from '../../../web/state/entry.ts';
import { faultAt } from '../../../web/state/fieldText.ts';
import { tryAgain } from '../../../web/state/later.ts';
import '../../../web/state/reader.ts';

/** Two invented standards whose rules are those of the first view under other names; each is loaded when the test lets it. */
const { invented, loads } = vi.hoisted(() => ({
  invented: {
    'service-code': { title: 'Service code', edition: '1', level: 'service', region: 'north-america' },
    'other-code': { title: 'Other code', edition: '2', level: 'factored', region: 'commonwealth' },
  } as const,
  loads: new Map<string, { come: () => void; fail: () => void }>(),
}));

const rulesAs = (id: keyof typeof invented): Standard => {
  const none = { ...sans10162.materials.sections, grades: ['G300'], named: () => undefined };
  const { materials } = sans10162;
  const own = id === 'other-code' ? { ...materials, sections: none, boltGrades: ['9.9'] } : materials;
  return { ...sans10162, id, ...invented[id], materials: own, options: {} };
};

vi.mock('../../../core/standards/listed.ts', async (original) => {
  const { listed, ...others } = await original<typeof import('../../../core/standards/listed.ts')>();
  return { ...others, listed: [...listed, ...Object.entries(invented).map(([id, one]) => ({ id, ...one }))] };
});

vi.mock('../../../web/state/standardFolders.ts', () => ({
  standardFolders: Object.fromEntries(
    (['service-code', 'other-code'] as const).map((id) => [
      id,
      () =>
        new Promise((resolve, reject) => {
          loads.set(id, { come: () => resolve(rulesAs(id)), fail: () => reject(new Error('no network')) });
        }),
    ]),
  ),
}));

const text = (path: string): string => bench.entry.value.texts[path] ?? '';
const codes = () => bench.faults.value.map(({ path, code }) => `${path} ${code}`);

/** Lets the rules of a standard come, or fail to, once they were asked for. */
const settle = async (id: keyof typeof invented, how: 'come' | 'fail'): Promise<void> => {
  await vi.waitFor(() => expect(loads.has(id)).toBe(true));
  loads.get(id)?.[how]();
  loads.delete(id);
  await new Promise((resolve) => setTimeout(resolve));
};
const demoUnder = (id: string): Entry => withText(demoEntry(), 'standard', id);

beforeEach(() => edits.begin(demoEntry()));

describe('the rules of a standard that is not at hand', () => {
  test('are asked for when an end names it: no fault shows, nothing of the form is lost, and the last result stays as one of before', async () => {
    const before = bench.lastGood.value;
    edits.make(demoUnder('service-code'), 'standard', false);
    expect(bench.awaited.value).toBe('coming');
    expect(bench.faults.value).toEqual([]);
    expect(bench.isCurrent.value).toBe(false);
    expect(bench.lastGood.value).toBe(before);
    expect(text('joint.bolts.pitch')).toBe('80');
    edits.write('joint.bolts.pitch', '85');
    await settle('service-code', 'come');
    expect(bench.awaited.value).toBeNull();
    expect(bench.isCurrent.value).toBe(true);
    expect(bench.lastGood.value?.report.standard.title).toBe('Service code');
    expect(text('joint.bolts.pitch')).toBe('85');
  });

  test('where they cannot be loaded that is said beside the standard, and they are asked for again once there is a network', async () => {
    edits.begin(demoUnder('other-code'));
    expect(bench.awaited.value).toBe('coming');
    await settle('other-code', 'fail');
    expect(codes()).toEqual(['standard not-loaded']);
    expect(faultAt('standard')).toBe(
      'The rules of Other code:2 could not be loaded. Try again once there is a network.',
    );
    tryAgain();
    expect(bench.awaited.value).toBe('coming');
    await settle('other-code', 'come');
    expect(codes()).toEqual(['beam.grade unknown-grade', 'joint.bolts.grade unknown-bolt-grade']);
  });

  test('a standard that this version does not have is said at once, with the nearest that it has', () => {
    edits.write('standard', 'service-cod');
    expect(bench.faults.value).toMatchObject([{ path: 'standard', code: 'unknown-standard' }]);
    expect(bench.faults.value[0]?.limit).toContain('service-code');
  });
});

describe('another standard', () => {
  test('at the other level empties the reaction and asks for it; the way back by undo brings it again', () => {
    choose('standard', 'service-code');
    expect(text('reaction')).toBe('');
    expect(codes()).toEqual(['reaction missing']);
    edits.undo();
    expect(text('reaction')).toBe('152');
  });

  test('at the same level keeps all that can stay; what it does not know is said beside its field, with the nearest that it does', () => {
    choose('standard', 'other-code');
    expect(text('reaction')).toBe('152');
    expect(text('beam.grade')).toBe('S355JR');
    expect(faultAt('beam.grade')).toMatch(/known: G300/);
    expect(faultAt('joint.bolts.grade')).toMatch(/known: 9.9/);
  });

  test('the level as it was given goes with the reaction, grades that are not known are said even while the reaction is missing', () => {
    choose('level', 'factored');
    choose('standard', 'service-code');
    expect(text('level')).toBe('');
    edits.write('reaction', '100');
    choose('standard', 'other-code');
    expect(codes()).toEqual(['beam.grade unknown-grade', 'joint.bolts.grade unknown-bolt-grade', 'reaction missing']);
  });

  test('takes the options of the old one away', () => {
    choose('options.elastic-shear', 'verdict');
    choose('standard', 'service-code');
    expect(Object.keys(bench.entry.value.texts).filter((path) => path.startsWith('options.'))).toEqual([]);
  });

  test('speaks the words of its market', () => {
    expect(bench.words.value.cope).toBe('notch');
    choose('standard', 'service-code');
    expect(bench.words.value.cope).toBe('cope');
  });
});
