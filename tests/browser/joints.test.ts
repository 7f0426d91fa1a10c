import type { Locator } from 'playwright-core';
import { describe, expect, test } from 'vitest';
import { sideways } from './accessible.ts';
import type { Bench } from './bench.ts';
import { endAt, linkOf, reportOf, rungsOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

/** The kinds in the order of their list, from the fin plate of the first visit down. */
const kinds = ['double-cleat', 'single-cleat', 'end-plate', 'full-end-plate', 'web-bolts'] as const;

const cleats = endAt('double-cleat');
const endPlate = endAt('end-plate');

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

  test('bolts of a beam opposite are typed where there is one, and count', async () => {
    const bench = await (await visit()).tab();
    await openJoint(bench);
    await bench.press('ArrowDown');
    for (const [field, text] of [
      ['Support: Beam opposite', '150'],
      ['Support: Its first row', '400'],
      ['Support: Its rows', '1'],
      ['Support: Its cross centres', '140'],
    ] as const) {
      await bench.tabTo(field);
      await write(bench, text);
    }
    const end = (await saved(bench)) as Saved & { readonly support: Readonly<Record<string, unknown>> };
    expect(end.support).toMatchObject({ otherReaction: 150, opposite: { firstRow: 400, rows: 1, gauge: 140 } });
    await agrees(bench);
  });
});

/** Where a view stands on the page. */
const boxOf = async (view: Locator) => {
  const box = await view.boundingBox();
  if (!box) throw new Error('the view is not on the page');
  return box;
};

/** Lines of a failure path in a view. */
const pathIn = (view: Locator): Locator => view.locator('.layer-path');

describe('what lies on the support', () => {
  test('is drawn beside the side view; a fin plate on edge has no such view', async () => {
    const bench = await (await visit()).tab();
    expect(await bench.onSupport.count()).toBe(0);
    await bench.follow(linkOf(cleats));
    await bench.onSupport.waitFor();
    await eventually(async () => {
      const [side, support] = [await boxOf(bench.drawing), await boxOf(bench.onSupport)];
      return support.x >= side.x + side.width;
    }).toBe(true);
  });

  test('carries its sizes as fields: typed over, they count in ladder, drawing and file', async () => {
    const bench = await (await visit()).tab(linkOf(cleats));
    await bench.onSupport.waitFor();
    await bench.type('Cross centres, mm', '150');
    await bench.type('Pitch of the support bolts, mm', '75');
    await bench.type('Leg on the support, mm', '110');
    const { cleat, supportBolts } = (await saved(bench)).joint;
    expect(supportBolts).toMatchObject({ crossCentres: 150, pitch: 75 });
    expect(cleat).toMatchObject({ legSupport: 110 });
    await agrees(bench);
  });

  test('shows the path of a rung that fails there, and the side view that of a rung in the web', async () => {
    const bench = await (await visit()).tab(linkOf(cleats));
    await bench.onSupport.waitFor();
    await bench.rung('Support bolts').click();
    await eventually(() => pathIn(bench.onSupport).count()).toBeGreaterThan(0);
    expect(await pathIn(bench.drawing).count()).toBe(0);
    await bench.rung('Block tearing, web').click();
    await eventually(() => pathIn(bench.drawing).count()).toBeGreaterThan(0);
    expect(await pathIn(bench.onSupport).count()).toBe(0);
  });

  test.each([390, 320])('stands below the side view on a page %i px wide, and nothing goes sideways', async (width) => {
    const bench = await (await visit({ viewport: { width, height: 844 } })).tab(linkOf(endPlate));
    await bench.onSupport.waitFor();
    const [side, support] = [await boxOf(bench.drawing), await boxOf(bench.onSupport)];
    expect(support.y).toBeGreaterThanOrEqual(side.y + side.height);
    expect(support.x + support.width).toBeLessThanOrEqual(width);
    expect(await sideways(bench)).toBe(0);
  });
});
