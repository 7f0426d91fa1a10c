import { describe, expect, test } from 'vitest';
import type { Bench } from './bench.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

/** Steps of every kind, each with its name on the timeline. */
const steps: readonly (readonly [name: string, act: (bench: Bench) => Promise<unknown>, open?: string])[] = [
  ['Pitch 80 → 70', (bench) => bench.type('Pitch, mm', '70')],
  ['Hole diameter empty → 24', (bench) => bench.field('Bolts', 'Hole diameter').fill('24'), 'Bolts'],
  ['Holes drilled → punched', (bench) => bench.field('Bolts', 'Holes').selectOption('punched')],
  ['Bottom notch added', (bench) => bench.field('Cut', 'Bottom notch').check(), 'Cut'],
  ['Bottom notch removed', (bench) => bench.field('Cut', 'Bottom notch').uncheck()],
  ['Support removed', (bench) => bench.field('Joint', 'Support').uncheck(), 'Joint'],
  ['Units mm-kN → in-kip', (bench) => bench.page.getByRole('radio', { name: 'in · kip' }).check()],
  ['New end', (bench) => bench.tool('New').click()],
  ['Section empty → UB 305x165x40', (bench) => bench.field('Beam', 'Section').fill('UB 305x165x40')],
];

describe('everything that is done can be undone', () => {
  test('undo to the beginning and redo to the end give the same files, byte for byte; every step has its name', async () => {
    const bench = await (await visit()).tab();
    const first = await bench.saved();
    const names: string[] = [];
    const files = [first];
    for (const [name, act, open] of steps) {
      if (open) await bench.turn(open);
      await act(bench);
      await eventually(() => bench.next('Undo')).toBe(name);
      names.unshift(name);
      if (!names.includes('New end')) files.push(await bench.saved());
    }
    for (const name of names) {
      await eventually(() => bench.next('Undo')).toBe(name);
      await bench.press('Control+z');
      await eventually(() => bench.next('Redo')).toBe(name);
    }
    expect(await bench.tool('Undo').isDisabled()).toBe(true);
    expect(await bench.saved()).toBe(first);
    for (const file of files) {
      expect(await bench.saved()).toBe(file);
      await bench.press('Control+y');
    }
    await bench.press('Control+y');
    expect(await bench.tool('Redo').isDisabled()).toBe(true);
    expect(await bench.field('Beam', 'Section').inputValue()).toBe('UB 305x165x40');
    await eventually(() => bench.verdict).toMatch(/^INCOMPLETE/);
  });

  test('typing in one field is one step', async () => {
    const bench = await (await visit()).tab();
    await bench.type('First bolt row, mm', '100');
    await eventually(() => bench.next('Undo')).toMatch(/ 85 → 100$/);
    await bench.tool(/^Undo/).click();
    await eventually(() => bench.tool('Undo').isDisabled()).toBe(true);
    expect(await bench.size('First bolt row, mm').inputValue()).toBe('85');
  });
});

describe('units', () => {
  test('there and back the saved file is the same, byte for byte, and the verdict in between is too', async () => {
    const bench = await (await visit()).tab();
    await bench.type('Setback, mm', '1/2 in');
    await bench.type('Pitch, mm', '77,7');
    await bench.current();
    const before = { saved: await bench.saved(), verdict: await bench.verdict, rungs: await bench.rungs };
    await bench.page.getByRole('radio', { name: 'in · kip' }).check();
    await bench.size('Pitch, in').waitFor();
    await eventually(() => bench.verdict).toBe(before.verdict);
    expect((await bench.rungs).map(({ name, ratio }) => [name, ratio])).toEqual(
      before.rungs.map(({ name, ratio }) => [name, ratio]),
    );
    expect(JSON.parse(await bench.saved()).units).toBe('in-kip');
    await bench.page.getByRole('radio', { name: 'mm · kN' }).check();
    await bench.size('Pitch, mm').waitFor();
    expect(await bench.saved()).toBe(before.saved);
    expect(await bench.verdict).toBe(before.verdict);
    expect(await bench.rungs).toEqual(before.rungs);
  });
});

describe('the end is kept on this device', () => {
  test('the foot says when; loading the page again gives the same end, and its file byte for byte', async () => {
    const bench = await (await visit()).tab();
    await bench.type('Pitch, mm', '90');
    await bench.type('Setback, mm', '1/2 in');
    await bench.current();
    const before = { saved: await bench.saved(), verdict: await bench.verdict };
    await bench.page
      .getByRole('contentinfo')
      .getByText(/^Kept on this device \d\d:\d\d$/)
      .waitFor();
    await bench.page.reload();
    await bench.drawing.waitFor();
    expect(await bench.size('Pitch, mm').inputValue()).toBe('90');
    expect(await bench.verdict).toBe(before.verdict);
    expect(await bench.saved()).toBe(before.saved);
  });

  test('a text that cannot be read is kept too', async () => {
    const bench = await (await visit()).tab();
    await bench.type('Pitch, mm', '8o');
    await eventually(() => bench.verdict).toMatch(/^INCOMPLETE/);
    await bench.page.reload();
    await eventually(() => bench.verdict).toMatch(/^INCOMPLETE/);
    await bench.turn('Bolts');
    expect(await bench.field('Bolts', 'Pitch').inputValue()).toBe('8o');
  });

  test('a second tab is warned of the first, and the first of the second until that is closed', async () => {
    const { tab } = await visit();
    const warning = /^The bench is open in another tab too/;
    const first = await tab();
    expect(await first.page.getByText(warning).count()).toBe(0);
    const second = await tab();
    await second.page.getByText(warning).waitFor();
    await first.page.getByText(warning).waitFor();
    await second.page.close();
    await first.page.getByText(warning).waitFor({ state: 'detached' });
  });
});
