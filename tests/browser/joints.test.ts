import { describe, expect, test } from 'vitest';
import type { Bench } from './bench.ts';
import { reportOf, rungsOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

/** The kinds in the order of their list, from the fin plate of the first visit down. */
const kinds = ['double-cleat', 'single-cleat', 'end-plate', 'full-end-plate', 'web-bolts'] as const;

interface Saved {
  readonly joint: Readonly<Record<string, unknown>>;
}

/** Text of the end's file, saved without leaving the field. */
const fileOf = async (bench: Bench): Promise<string> => {
  const { bytes } = await bench.handed(() => bench.press('Control+s'));
  return bytes.toString('utf8');
};
const saved = async (bench: Bench): Promise<Saved> => JSON.parse(await fileOf(bench)) as Saved;

/** Writes into the field that has the focus, and goes on. */
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
    for (const kind of kinds) {
      await bench.press('ArrowDown');
      await eventually(async () => (await saved(bench)).joint.kind).toBe(kind);
      await agrees(bench);
    }
    await bench.press('Home');
    await eventually(async () => (await saved(bench)).joint.kind).toBe('fin-plate');
    await agrees(bench);
  });

  test('a leg of a cleat is welded in place of its bolts, and one undo brings them back', async () => {
    const bench = await (await visit()).tab();
    await openJoint(bench);
    await bench.press('ArrowDown');
    await bench.press('Enter');
    await eventually(() => bench.focused).toBe('Joint: Legs');
    await agrees(bench);
    const bolted = await fileOf(bench);
    for (const [weld, without] of [
      ['webWeld', 'bolts'],
      ['supportWeld', 'supportBolts'],
    ] as const) {
      await bench.press('ArrowDown');
      await eventually(async () => Object.keys((await saved(bench)).joint.cleat as object)).toContain(weld);
      expect((await saved(bench)).joint).not.toHaveProperty(without);
      await agrees(bench);
    }
    await bench.press('Control+z');
    await bench.press('Control+z');
    await eventually(() => fileOf(bench)).toBe(bolted);
  });

  test('a beam opposite and a support by thickness are typed, and count', async () => {
    const bench = await (await visit()).tab();
    await openJoint(bench);
    await bench.press('ArrowDown');
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
