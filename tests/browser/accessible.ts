import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { AxeResults } from 'axe-core';
import { expect } from 'vitest';
import type { Bench } from './bench.ts';

const axe = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** Serious and critical findings of the accessibility checker: its rule, and the parts of the page it is about. */
export const findings = async ({ page }: Bench): Promise<string[]> => {
  await page.evaluate(axe);
  const { passes, violations } = await page.evaluate<AxeResults>('axe.run(document, { resultTypes: ["violations"] })');
  expect(passes.length).toBeGreaterThan(20);
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .flatMap(({ id, nodes }) => nodes.map(({ target, failureSummary }) => `${id}: ${target} ${failureSummary}`));
};

/** How far the page scrolls sideways, px. */
export const sideways = ({ page }: Bench): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
