import { describe, expect, test } from 'vitest';
import { findings, sideways } from './accessible.ts';
import type { Bench } from './bench.ts';
import { demoEnd, endAt, linkOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

/** An end with everything that takes room: it fails in several ways, and refers, with a second standard beside the first. */
const crowded = linkOf({
  ...demoEnd,
  reaction: 480,
  top: { length: 95, depth: 35, radius: 0 },
  sheet: { job: 'A job with a name', beside: { standard: 'aisc-360-asd', reaction: 320 } },
});

/** The verdict where it can be seen without scrolling. */
const inSight = async (bench: Bench) => {
  const { width, height } = bench.page.viewportSize()!;
  const all = bench.page.getByText(await bench.verdict, { exact: true });
  for (const one of await all.all()) {
    const box = (await one.isVisible()) && (await one.boundingBox());
    if (box && box.x >= 0 && box.y >= 0 && box.x + box.width <= width && box.y + box.height <= height) return true;
  }
  return false;
};

/** What has focus, if any of it is out of sight or lies under something else; empty where it can be seen whole. */
const hidden = (bench: Bench) =>
  bench.page.evaluate(() => {
    const it = document.activeElement;
    if (!it || it === document.body) return '';
    const name = `${it.id || it.getAttribute('aria-label') || it.textContent}`.slice(0, 40);
    for (const { left, right, top, bottom } of it.getClientRects()) {
      if (top < 0 || left < 0 || bottom > innerHeight || right > innerWidth) return `${name}: out of sight`;
      const over = document.elementFromPoint((left + right) / 2, (top + bottom) / 2);
      if (!over || !(it.contains(over) || over.contains(it))) return `${name}: under ${over?.className}`;
    }
    return '';
  });

const lines = ['Beam', 'Cut', 'Bolts', 'Joint', 'Load', 'Standard', 'Sheet'];

/** Goes through the page by the Tab key, and gives back how often focus moved and what was hidden. */
const tabThrough = async (bench: Bench): Promise<{ readonly stops: number; readonly hidden: readonly string[] }> => {
  const found: string[] = [];
  await bench.page.getByRole('link', { name: 'To the order' }).focus();
  for (let stops = 1; stops < 250; stops += 1) {
    const it = await hidden(bench);
    if (it) found.push(it);
    await bench.press('Tab');
    if (await bench.page.evaluate(() => document.activeElement === document.body)) return { stops, hidden: found };
  }
  throw new Error('the Tab key never leaves the page');
};

describe('from 320 to 1440 px wide', () => {
  test('the page never scrolls sideways, whatever is open, and the verdict is in sight', async () => {
    const bench = await (await visit()).tab(crowded);
    await bench.rung('Bolt shear').click();
    for (const width of [320, 390, 768, 1440]) {
      await bench.page.setViewportSize({ width, height: 844 });
      await bench.page.evaluate(() => scrollTo(0, 0));
      await eventually(() => bench.verdict).toMatch(/^FAILS/);
      await eventually(() => inSight(bench)).toBe(true);
      for (const line of lines) {
        await bench.turn(line);
        await eventually(async () => [width, line, await sideways(bench)]).toEqual([width, line, 0]);
      }
      await bench.turn('Sheet');
    }
  });
});

describe('on a telephone', () => {
  test('focus is never hidden: Enter through every field of the order, Tab through the whole page', async () => {
    const bench = await (await visit({ viewport: { width: 390, height: 844 } })).tab(crowded);
    await bench.turn('Beam');
    await bench.field('Beam', 'Sizes').focus();
    const found: string[] = [];
    let before = '';
    for (let field = await bench.focused; field !== before; field = await bench.focused) {
      before = field;
      const it = await hidden(bench);
      if (it) found.push(it);
      await bench.press('Enter');
    }
    expect(before).toBe('Sheet: Number off');
    expect(found).toEqual([]);

    await bench.turn('Bolts');
    await bench.rung('Bolt shear').click();
    const through = await tabThrough(bench);
    expect(through.stops).toBeGreaterThan(50);
    expect(through.hidden).toEqual([]);
  });

  test('the verdict stays in sight at the foot wherever one scrolls, and leads to the ladder', async () => {
    const bench = await (await visit({ viewport: { width: 390, height: 844 } })).tab();
    await bench.turn('Sheet');
    await bench.field('Sheet', 'Number off').focus();
    expect(await inSight(bench)).toBe(true);
    await bench.page.getByRole('button', { name: /^HOLDS/ }).click();
    await eventually(() =>
      bench.page.getByRole('heading', { name: /^Ladder/ }).evaluate((it) => {
        const { top, bottom } = it.getBoundingClientRect();
        return top >= 0 && bottom <= innerHeight;
      }),
    ).toBe(true);
  });
});

describe('at 400 % zoom', () => {
  test('a value can be typed, its effect read and its working opened, with focus in sight and nothing sideways', async () => {
    const bench = await (await visit({ viewport: { width: 320, height: 256 }, deviceScaleFactor: 4 })).tab();
    await bench.turn('Load');
    await bench.field('Load', 'Reaction').focus();
    await bench.page.keyboard.type('200');
    await eventually(() => bench.verdict).toBe('FAILS 1.06');
    expect(await inSight(bench)).toBe(true);
    await bench.rung('Bolt shear').press('Enter');
    await bench.page.getByRole('group', { name: /^Bolt shear/ }).waitFor();
    expect(await sideways(bench)).toBe(0);
    expect((await tabThrough(bench)).hidden).toEqual([]);
  });
});

const ends = [
  [{ ...demoEnd, mark: 'H-1' }, /^HOLDS/],
  [{ ...demoEnd, mark: 'F-1', reaction: 480 }, /^FAILS/],
  [{ ...demoEnd, mark: 'R-1', top: { length: 95, depth: 35, radius: 0 } }, /^REFER/],
  [{ ...demoEnd, mark: 'B-1', sheet: { beside: { standard: 'csa-s16' } } }, /^HOLDS/],
] as const;

describe('the accessibility checker has no serious and no critical finding', () => {
  test.each([1440, 390])(
    'for an end that holds, fails, refers or stands under two standards, with a line and a rung open, %i px wide',
    async (width) => {
      const bench = await (await visit({ viewport: { width, height: 900 } })).tab();
      await bench.turn('Bolts');
      for (const [end, verdict] of ends) {
        await bench.follow(linkOf(end));
        await bench.page.getByRole('heading', { level: 1, name: end.mark }).waitFor();
        await eventually(() => bench.verdict).toMatch(verdict);
        await bench.rung('Bolt shear').click();
        await bench.ladder.getByRole('button', { expanded: true }).waitFor();
        await bench.page
          .getByRole('group', { name: /^Bolt shear/ })
          .first()
          .waitFor();
        expect(await findings(bench)).toEqual([]);
      }
    },
  );

  test.each([
    [1440, 'end-plate'],
    [390, 'end-plate'],
    [1440, 'double-cleat'],
  ])('for an end with two views, its bolts and joint open, %i px wide: %s', async (width, name) => {
    const bench = await (await visit({ viewport: { width, height: 900 } })).tab(linkOf(endAt(name)));
    await bench.onSupport.waitFor();
    await bench.turn('Bolts');
    expect(await findings(bench)).toEqual([]);
    await bench.turn('Joint');
    await bench.rung('Support bolts').click();
    await bench.page
      .getByRole('group', { name: /^Support bolts|^Shear of the support bolts/ })
      .first()
      .waitFor();
    expect(await findings(bench)).toEqual([]);
  });

  test('for an end that is not complete, with its list of faults, and for the dialogs', async () => {
    const bench = await (await visit()).tab();
    await bench.tool('New').click();
    await bench.page.getByRole('button', { name: 'Issue sheet' }).click();
    await bench.page.getByRole('region', { name: 'Not complete' }).waitFor();
    expect(await findings(bench)).toEqual([]);
    await bench.tool('Keys').click();
    await bench.page.getByRole('dialog', { name: 'Keys' }).waitFor();
    expect(await findings(bench)).toEqual([]);
    await bench.press('Escape');
    await bench.page.getByRole('dialog').waitFor({ state: 'detached' });
    await bench.page.getByRole('heading', { name: /^Ladder/ }).click();
    await bench.press('/');
    await bench.page.getByRole('dialog', { name: 'Go to a field' }).waitFor();
    expect(await findings(bench)).toEqual([]);
  });
});
