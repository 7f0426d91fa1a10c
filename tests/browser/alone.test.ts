import { describe, expect, test } from 'vitest';
import { australianEnd, demoEnd, linkOf, reportOf, rungsOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { site, stopServing, visit } = onTheBench();

describe('the content policy', () => {
  test('allows own files alone: no code and no styles in the text of the page', async () => {
    const html = await (await fetch(site())).text();
    const written = /http-equiv="Content-Security-Policy"\s+content="([^"]+)"/.exec(html)?.[1] ?? '';
    const policy = written.replaceAll('&#39;', "'");
    const rules = Object.fromEntries(policy.split('; ').map((rule) => rule.split(/ (.*)/).slice(0, 2)));
    expect(rules['default-src']).toBe("'none'");
    expect(rules['script-src']).toBe("'self'");
    expect(rules['style-src']).toBe("'self'");
    expect(rules['connect-src']).toBe("'self'");
    expect(html).not.toMatch(/<style/i);
    expect(html).not.toMatch(/\s(?:style|on[a-z]+)=/i);
    expect(html.match(/<script[^>]*>/gi)?.every((tag) => /\ssrc="\.\//.test(tag))).toBe(true);
    expect(html.match(/(?:src|href)="(?!\.\/)/g)).toBeNull();
  });

  test('is in force: a script put into the page does not run', async () => {
    const { faults, tab } = await visit();
    const { page } = await tab();
    await page.evaluate(() => {
      document.body.append(Object.assign(document.createElement('script'), { textContent: 'document.title = "run"' }));
    });
    await eventually(() => faults.some((fault) => fault.startsWith('error: policy: script-src'))).toBe(true);
    expect(await page.title()).not.toBe('run');
    faults.length = 0;
  });

  test('is never broken by the bench itself, which asks no other place for anything', async () => {
    const { faults, tab } = await visit();
    const bench = await tab();
    await bench.type('Pitch, mm', '90');
    await bench.rung('Bolt shear').click();
    await bench.turn('Bolts');
    await bench.tool('Keys').click();
    await bench.page.getByRole('dialog', { name: 'Keys' }).getByRole('button', { name: 'Close' }).click();
    await bench.page.getByText('The piece in words').click();
    await bench.page.getByRole('radio', { name: 'in · kip' }).check();
    await bench.saved();
    await bench.sheet();
    expect(faults).toEqual([]);
  });
});

// The last of this file: nothing is served after it.
test('after one load the bench works without a network: it loads, checks, opens a rung and issues a sheet', async () => {
  const { context, tab } = await visit();
  const bench = await tab();
  await bench.page.getByText('All checks run without a network').waitFor();
  await context.setOffline(true);
  await stopServing();
  await expect(fetch(site())).rejects.toThrow();

  await bench.page.reload();
  await bench.drawing.waitFor();
  // Some browsers forget over a reload that they were put off the network; the server is gone either way.
  await context.setOffline(false);
  await context.setOffline(true);
  await bench.page.getByText('No network: all checks still work').waitFor();
  await bench.size('Reaction, kN').focus();
  await bench.page.keyboard.type('175');
  await eventually(() => bench.rungs).toEqual(rungsOf(reportOf({ ...demoEnd, reaction: 175 })));
  await bench.rung('Bolt shear').click();
  await bench.page.getByRole('group', { name: /^Bolt shear/ }).waitFor();
  const { bytes } = await bench.sheet();
  expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');

  const another = await tab();
  await eventually(() => another.verdict).toBe(await bench.verdict);
  await another.drop('sheet.pdf', bytes);
  await another.page.getByText(/^Opened sheet\.pdf/).waitFor();
  // Rules and sections that no page has asked for yet are there too.
  const fresh = await tab(linkOf(australianEnd));
  await eventually(() => fresh.verdict).toMatch(/^(?:HOLDS|FAILS|REFER) [\d.]+$/);
  expect(await fresh.page.getByText('AS 4100:2020').count()).toBeGreaterThan(0);
});
