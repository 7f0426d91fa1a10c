import { beforeEach, describe, expect, test, vi } from 'vitest';
import type { Check } from '../../../core/check/report.ts';
import { listed } from '../../../core/standards/listed.ts';
import { verdictSaid } from '../../../web/beside/BesideVerdict.tsx';
import { besideShown } from '../../../web/beside/beside.ts';
import { pairedRungs } from '../../../web/beside/pairedRungs.ts';
import { secondChecks } from '../../../web/beside/second.ts';
import * as bench from '../../../web/state/bench.ts';
import { choose } from '../../../web/state/choose.ts';
import { demoEntry } from '../../../web/state/demo.ts';
import * as edits from '../../../web/state/edits.ts';
import { textOf } from '../../../web/state/entry.ts';
import { faultAt } from '../../../web/state/fieldText.ts';
import { otherLevel, secondFaults } from '../../../web/state/secondStandard.ts';
import { setRegion } from '../../../web/state/setRegion.ts';

const SECOND = 'sheet.beside.standard';
const REACTION = 'sheet.beside.reaction';

const put = async (id: string): Promise<void> => {
  choose(SECOND, id);
  await vi.waitFor(() => expect(besideShown.value?.examined.report.standard.id).toBe(id));
};
const report = () => bench.lastGood.value!.report;
const second = () => besideShown.value!.examined.report;
const ids = (checks: readonly Check[]): string[] => checks.map(({ id }) => id).sort();

beforeEach(() => edits.begin(demoEntry()));

describe('a second standard beside the first', () => {
  test.each(listed.filter(({ id }) => id !== 'sans-10162-1').map(({ id }) => id))(
    'every check that %s or the first makes has one rung or one line of the footing',
    async (id) => {
      await put(id);
      const { rungs, alone, unmeasured, footing } = pairedRungs(report());
      const judged = report().checks.filter(({ state }) => /^(?:holds|fails|refer)$/.test(state));
      const all = [...rungs, ...alone, ...unmeasured, ...footing];
      expect(ids(all)).toEqual([...new Set([...ids(judged), ...ids(secondChecks())])].sort());
    },
  );

  test('rungs stand by the reaction of the first standard, those that only the second has by its own', async () => {
    await put('aisc-360-lrfd');
    const { rungs } = pairedRungs(report());
    const heights = rungs.map(({ id, state, reactionAtFailure }) =>
      state === 'notApplicable'
        ? secondChecks().find((one) => one.id === id)!.reactionAtFailure!
        : (reactionAtFailure ?? Number.POSITIVE_INFINITY),
    );
    expect(heights).toEqual([...heights].sort((a, b) => b - a));
  });

  test('is part of the end: a step that can be undone, and it stands in the file', async () => {
    await put('csa-s16');
    expect(bench.timeline.value.done.at(-1)?.name).toBe('Second standard empty → csa-s16');
    expect(bench.input.value.input).toMatchObject({ sheet: { beside: { standard: 'csa-s16' } } });
    edits.undo();
    expect(besideShown.value).toBeNull();
    expect(bench.input.value.input).not.toHaveProperty('sheet.beside');
  });

  test('speaks the trade words of the first', async () => {
    await put('csa-s16');
    expect(second().words).toBe('commonwealth');
    setRegion('north-america');
    expect(second().words).toBe('north-america');
  });

  test('is said aloud behind the first', async () => {
    await put('csa-s16');
    expect(verdictSaid()).toMatch(/^Beside it CSA S16:2019: HOLDS 0\.\d\d$/);
  });

  test('gives way when it is made the first', async () => {
    await put('csa-s16');
    choose('standard', 'csa-s16');
    expect(textOf(bench.entry.value, SECOND)).toBe('');
  });
});

describe('a second standard at the other level', () => {
  test('asks for its own reaction; until then it gives strengths alone, without a line and without states', async () => {
    await put('aisc-360-asd');
    expect(otherLevel.value).toBe('service');
    expect(besideShown.value?.stated).toBe(false);
    const byReaction = secondChecks().filter(({ reactionAtFailure }) => typeof reactionAtFailure === 'number');
    expect(byReaction.length).toBeGreaterThan(8);
    expect(
      byReaction.filter(({ state, utilisation }) => state === 'holds' || state === 'fails' || utilisation),
    ).toEqual([]);
    expect(verdictSaid()).toBe('');
    edits.write(REACTION, '105');
    expect(besideShown.value?.stated).toBe(true);
    expect(second().reaction).toBe(105);
    expect(report().reaction).toBe(152);
  });

  test('its reaction goes when another level is chosen', async () => {
    await put('aisc-360-asd');
    edits.write(REACTION, '105');
    choose(SECOND, 'csa-s16');
    expect(textOf(bench.entry.value, REACTION)).toBe('');
  });
});

describe('what is wrong with the second never blocks the first', () => {
  test('a reaction that cannot be read or cannot be is said beside its field, and the first stands', async () => {
    await put('aisc-360-asd');
    for (const [text, said] of [
      ['ten', /must be a number/],
      ['-5', /must be at least 0/],
    ] as const) {
      edits.write(REACTION, text);
      expect(bench.isCurrent.value).toBe(true);
      expect(faultAt(REACTION)).toMatch(said);
      expect(besideShown.value).toBeNull();
      expect(secondFaults.value).toHaveLength(1);
    }
  });

  test('the units of the end stay as they are while its reaction cannot be read: it could read otherwise there', async () => {
    await put('aisc-360-asd');
    edits.write(REACTION, '1.234');
    edits.setUnits('in-kip');
    expect(bench.units.value).toBe('mm-kN');
    edits.write(REACTION, '123.4');
    edits.setUnits('in-kip');
    expect(second().units).toBe('in-kip');
    expect(second().reaction).toBeCloseTo(27.74, 2);
  });

  test('a standard that this version does not have is told with the nearest, and stays in the end', () => {
    edits.write(SECOND, 'csa-s15');
    expect(bench.isCurrent.value).toBe(true);
    expect(secondFaults.value).toMatchObject([{ code: 'unknown-standard', path: SECOND }]);
    expect(secondFaults.value[0]?.limit).toContain('csa-s16');
    expect(bench.lastGood.value?.end.sheet?.beside).toEqual({ standard: 'csa-s15' });
  });
});

describe('trade words', () => {
  test('are those of the market until they are chosen; choosing them back leaves nothing in the file', () => {
    expect(report().words).toBe('commonwealth');
    setRegion('north-america');
    expect(report().words).toBe('north-america');
    expect(bench.words.value).toMatchObject({ cope: 'cope', finPlate: 'single plate', gauge: 'gage' });
    expect(bench.timeline.value.done.at(-1)?.name).toBe('Words notch → cope');
    expect(bench.input.value.input).toMatchObject({ sheet: { words: 'north-america' } });
    setRegion('commonwealth');
    expect(bench.input.value.input).not.toHaveProperty('sheet.words');
  });
});
