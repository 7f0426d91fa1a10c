import { describe, expect, test } from 'vitest';
import { listed } from '../../core/standards/listed.ts';
import { publishedFixtures } from '../support/published.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

describe('the proof', () => {
  test("shows every number from outside beside the program's own, none further apart than its source allows", async () => {
    const { faults, tab } = await visit();
    const { page } = await tab();
    await page.getByRole('link', { name: 'Proof' }).click();
    await page.getByRole('heading', { level: 1, name: 'Proof' }).waitFor();
    for (const { id } of listed) {
      await page.getByRole('combobox', { name: 'Standard' }).selectOption(id);
      const own = publishedFixtures().filter(({ standard }) => standard === id);
      const rows = own.reduce((sum, { expect: all }) => sum + all.length, 0);
      await eventually(() => page.locator('tbody tr').count()).toBe(rows);
      expect(await page.getByText('OUTSIDE').count()).toBe(0);
      for (const source of new Set(own.map((one) => one.source))) {
        expect(await page.getByText(source, { exact: true }).count(), source).toBeGreaterThan(0);
      }
    }
    expect(faults).toEqual([]);
  });
});
