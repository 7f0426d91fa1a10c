import { describe, expect, test } from 'vitest';
import { copeFromSupport, withCopes } from '../../core/advice/copeFromSupport.ts';
import type { End } from '../../core/end/schema.ts';
import { findings, sideways } from './accessible.ts';
import type { Bench } from './bench.ts';
import { demoEnd, linkOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

const { support: _, ...alone } = demoEnd;
const besideBeam = { ...alone, support: { kind: 'beam-web', section: 'UB 533x210x92', topOfSteel: 0 } };

/** The end as the program's own advice would have it. */
const advised = (end: unknown): unknown => {
  const found = copeFromSupport(end);
  if ('faults' in found) throw new Error('no advice');
  return withCopes(end as End, found.advice);
};

const proposed = ({ page }: Bench) => page.getByRole('region', { name: 'Cut that the support asks for' });
const take = (bench: Bench) => proposed(bench).getByRole('button', { name: 'Take this cut' });
const savedEnd = async (bench: Bench): Promise<unknown> => JSON.parse(await bench.saved());

describe('the cut that the support asks for', () => {
  test('once a support is named, one key takes it as one step, and one undo brings back the cut before', async () => {
    const bench = await (await visit()).tab(linkOf(alone));
    await bench.turn('Cut');
    await bench.field('Cut', 'Setback').waitFor();
    expect(await proposed(bench).count()).toBe(0);

    await bench.turn('Joint');
    await bench.field('Joint', 'Support').check();
    await bench.field('Joint', 'Section').fill('UB 533x210x92');
    await bench.press('Tab');
    await bench.field('Joint', 'Top above').fill('0');
    await bench.press('Tab');
    await bench.turn('Cut');
    await proposed(bench).waitFor();
    const before = await savedEnd(bench);
    expect(before).toEqual(besideBeam);

    await bench.field('Cut', 'Setback').focus();
    await bench.press('End', 'c');
    await eventually(() => bench.field('Cut', 'Setback').inputValue()).toBe('12c');
    await bench.press('Escape');
    expect(await savedEnd(bench)).toEqual(before);

    await bench.page.getByRole('heading', { name: /^Ladder/ }).click();
    await bench.press('c');
    await eventually(() => bench.next('Undo')).toBe('Cut taken from the support');
    await proposed(bench).getByText('The end has this cut.').waitFor();
    expect(await savedEnd(bench)).toEqual(advised(before));
    await bench.press('Control+z');
    expect(await savedEnd(bench)).toEqual(before);
  });

  test('stands with each rule and its numbers, and says where no cope is needed', async () => {
    const bench = await (await visit()).tab(linkOf(besideBeam));
    await bench.turn('Cut');
    const found = copeFromSupport(besideBeam);
    const { top, bottom } = 'advice' in found ? found.advice : { top: null, bottom: null };
    expect(bottom).toBeNull();
    const text = await proposed(bench).textContent();
    for (const { value, working } of top!.sizes) {
      expect(text).toContain(`${value} mm`);
      expect(text).toContain(working.at(-1)!.numbers);
    }
    expect(text).toContain('Past the tip of the supporting flange, with the usual room.');
    expect(text).toContain('no notch is needed');
    await take(bench).press('Enter');
    await eventually(() => bench.field('Cut', 'Length').inputValue()).toBe(String(top!.cope.length));
    expect(await take(bench).getAttribute('aria-disabled')).toBe('true');
    expect(await findings(bench)).toEqual([]);
  });

  test('speaks of copes in North America, and fits a page 320 px wide', async () => {
    const bench = await (await visit({ viewport: { width: 320, height: 800 } })).tab(
      linkOf({ ...besideBeam, sheet: { words: 'north-america' } }),
    );
    await bench.turn('Cut');
    await proposed(bench).waitFor();
    const text = await proposed(bench).textContent();
    expect(text).toContain('no cope is needed');
    expect(text).not.toMatch(/notch/i);
    expect(await findings(bench)).toEqual([]);
    expect(await sideways(bench)).toBe(0);
  });

  test('says which rules no size can meet', async () => {
    const end = {
      ...besideBeam,
      support: { ...besideBeam.support, section: 'UB 914x419x388' },
      standard: 'sans-10162-1',
    };
    const found = copeFromSupport(end);
    const unmet = 'advice' in found ? found.advice.unmet : [];
    expect(unmet.length).toBeGreaterThan(0);
    const bench = await (await visit()).tab(linkOf(end));
    await bench.turn('Cut');
    await proposed(bench).waitFor();
    for (const { title } of unmet) expect(await proposed(bench).textContent()).toContain(title);
  });

  test('is not proposed while a field elsewhere cannot be read, and the key says so', async () => {
    const bench = await (await visit()).tab(linkOf(besideBeam));
    await bench.turn('Cut');
    await proposed(bench).waitFor();
    await bench.field('Cut', 'Setback').fill('12 nails');
    await bench.press('Tab');
    await proposed(bench).waitFor({ state: 'detached' });
    await bench.page.getByRole('heading', { name: /^Ladder/ }).click();
    await bench.press('c');
    const alert = bench.page.getByRole('alert').filter({ hasText: 'No cut is proposed' });
    await alert.waitFor();
    expect(await bench.next('Undo')).toContain('Setback');
  });
});
