import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';
import { describe, expect, test } from 'vitest';
import { listed } from '../../core/standards/listed.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();
const axe = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

const serious = async (page: Page): Promise<string[]> => {
  const { violations } = await page.evaluate<AxeResults>(`${axe}; axe.run()`);
  return violations.filter(({ impact }) => impact === 'serious' || impact === 'critical').map(({ id }) => id);
};

const rule = (page: Page, title: string) => page.getByRole('region', { name: title, exact: true });

describe('the page of a standard', () => {
  test('opens from the bench for the standard of the end, and leads back to the end as it was', async () => {
    const { faults, tab } = await visit();
    const bench = await tab();
    await bench.type('Pitch, mm', '75');
    await bench.page.getByRole('link', { name: 'Standards' }).click();
    await bench.page.getByRole('heading', { level: 1, name: 'SANS 10162-1:2011' }).waitFor();
    const shear = rule(bench.page, 'Shear of the full section');
    await eventually(() => shear.textContent()).toMatch(/13\.4\.1\.1; memory; held against published/);
    expect(((await shear.textContent()) ?? '').replace(/\s+/g, ' ')).toMatch(
      /= 0\.66 f ?y where λ ?w ≤ 440 √\(5\.34 \/ f ?y\)/,
    );
    await bench.page.goBack();
    await bench.drawing.waitFor();
    expect(await bench.size('Pitch, mm').inputValue()).toBe('75');
    expect(faults).toEqual([]);
  });

  test.each(listed.map(({ id, title }) => ({ id, title })))('$id is there in full', async ({ id }) => {
    const { faults, tab } = await visit();
    const { page } = await tab();
    await page.evaluate((hash) => {
      location.hash = hash;
    }, `#standard=${id}`);
    await rule(page, 'Wrench room').waitFor();
    expect(await page.getByRole('region').count()).toBeGreaterThan(30);
    expect(faults).toEqual([]);
  });

  test('a working leads to its rule in full', async () => {
    const { tab } = await visit();
    const bench = await tab();
    await bench.rung('Bolt shear').click();
    await bench.page.getByRole('link', { name: 'the rule in full' }).click();
    const shown = rule(bench.page, 'Bolt shear');
    await shown.waitFor();
    await eventually(async () => (await shown.boundingBox())?.y).toBeLessThan(200);
  });

  test('an unknown standard is said, and another can be chosen', async () => {
    const { tab } = await visit();
    const { page } = await tab();
    await page.evaluate(() => {
      location.hash = '#standard=no-such';
    });
    await page.getByText('This version does not have the standard no-such').waitFor();
    await page.getByRole('combobox', { name: 'Standard' }).selectOption('en-1993');
    await rule(page, 'Bolt shear').waitFor();
  });

  test('has no serious finding of the accessibility checker, and does not scroll sideways at 320 px', async () => {
    const { tab } = await visit({ viewport: { width: 320, height: 700 } });
    const { page } = await tab();
    await page.evaluate(() => {
      location.hash = '#standard=aisc-360-lrfd';
    });
    await rule(page, 'Bolt shear').waitFor();
    expect(await serious(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0);
  });
});
