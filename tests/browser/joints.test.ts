import { describe, expect, test } from 'vitest';
import type { Bench } from './bench.ts';
import { reportOf, rungsOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

/** What is typed into the list of kinds, and what the end then is. */
const kinds = [
  { typed: 'two cleats', kind: 'double-cleat' },
  { typed: 'one cleat', kind: 'single-cleat' },
  { typed: 'end plate', kind: 'end-plate' },
  { typed: 'end plate of', kind: 'full-end-plate' },
  { typed: 'web bolted', kind: 'web-bolts' },
  { typed: 'fin plate', kind: 'fin-plate' },
] as const;

interface Saved {
  readonly joint: Readonly<Record<string, unknown>>;
}

const saved = async (bench: Bench): Promise<Saved> => JSON.parse(await bench.saved()) as Saved;

/** Writes into the list that has the focus, and goes on. */
const write = async (bench: Bench, text: string): Promise<void> => {
  await bench.page.keyboard.type(text);
  await bench.press('Enter');
};

/** The ladder says what the core says of the end that stands on the bench. */
const agrees = async (bench: Bench): Promise<void> => {
  const end = await saved(bench);
  const report = reportOf(end);
  await eventually(() => bench.rungs).toEqual(rungsOf(report));
  expect(await bench.verdict).not.toBe('INCOMPLETE');
};

const openJoint = async (bench: Bench): Promise<void> => {
  await bench.tabTo('Joint');
  await bench.press('Enter');
  await bench.tabTo('Joint: Kind');
};

describe('every kind of joint without a mouse', () => {
  test('is chosen from the list; the bench proposes what it needs, and ladder and file follow', async () => {
    const bench = await (await visit()).tab();
    await openJoint(bench);
    for (const { typed, kind } of kinds) {
      await bench.tabTo('Joint: Kind');
      await write(bench, typed);
      await eventually(async () => (await saved(bench)).joint.kind).toBe(kind);
      await agrees(bench);
      await bench.press('Shift+Tab');
    }
  });

  test('a leg of a cleat is welded in place of its bolts, and one undo brings them back', async () => {
    const bench = await (await visit()).tab();
    await openJoint(bench);
    await write(bench, 'two cleats');
    await eventually(() => bench.focused).toBe('Joint: Legs');
    const bolted = await bench.saved();
    for (const [typed, weld, without] of [
      ['web leg', 'webWeld', 'bolts'],
      ['support leg', 'supportWeld', 'supportBolts'],
    ] as const) {
      await bench.tabTo('Joint: Legs');
      await write(bench, typed);
      await eventually(async () => Object.keys((await saved(bench)).joint.cleat as object)).toContain(weld);
      expect((await saved(bench)).joint).not.toHaveProperty(without);
      await agrees(bench);
      await bench.press('Shift+Tab');
    }
    await bench.press('Control+z');
    await bench.press('Control+z');
    await eventually(() => bench.saved()).toBe(bolted);
  });

  test('a beam opposite and a support by thickness are typed, and count', async () => {
    const bench = await (await visit()).tab();
    await openJoint(bench);
    await write(bench, 'two cleats');
    for (const [field, text] of [
      ['Support: Thickness', '8'],
      ['Support: Grade', 'S355JR'],
      ['Support: Beam opposite', '150'],
    ] as const) {
      await bench.tabTo(field);
      await write(bench, text);
    }
    const end = (await saved(bench)) as Saved & { readonly support: Readonly<Record<string, unknown>> };
    expect(end.support).toMatchObject({ thickness: 8, grade: 'S355JR', otherReaction: 150 });
    await agrees(bench);
    expect((await bench.rungs).map(({ name }) => name)).toContain('Bearing, support bolts');
  });
});
