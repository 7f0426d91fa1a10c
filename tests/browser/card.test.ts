import { describe, expect, test } from 'vitest';
import { findings, sideways } from './accessible.ts';
import type { Bench } from './bench.ts';
import { demoEnd, linkOf, reportOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

const table = ({ page }: Bench) => page.getByRole('table', { name: /^Reaction that each section carries/ });
const legend = ({ page }: Bench) => page.getByRole('region', { name: 'What the table means' });
const issue = ({ page }: Bench) => page.getByRole('button', { name: 'Issue card' });

/** Text of the cells in the row of a section, after its name. */
const cellsOf = (bench: Bench, section: string): Promise<string[]> =>
  table(bench)
    .getByRole('row')
    .filter({ has: bench.page.getByRole('rowheader', { name: section, exact: true }) })
    .getByRole('cell')
    .allTextContents();

const toCard = async (bench: Bench): Promise<void> => {
  await bench.page.getByRole('link', { name: 'Card' }).click();
  await bench.page.getByRole('heading', { level: 1, name: 'Shop card' }).waitFor();
};

describe('the shop card', () => {
  test("of the end on the bench carries in that end's own cell what the bench says it carries, in whole kN rounded down", async () => {
    const bench = await (await visit()).tab();
    await bench.type('Pitch, mm', '75');
    await bench.current();
    const weakest = (await bench.rungs).find((one) => one.weakest)!;
    await toCard(bench);
    await table(bench).waitFor();
    const heads = await table(bench).getByRole('columnheader').allTextContents();
    expect(heads.map((text) => /^(?:Section|\d+)/.exec(text)?.[0])).toEqual([
      'Section',
      '2',
      '3',
      '4',
      '5',
      '6',
      '7',
      '8',
    ]);
    const cells = await cellsOf(bench, 'UB 356 × 171 × 51');
    const end = structuredClone(demoEnd) as { joint: { bolts: Record<string, unknown> } };
    end.joint.bolts.pitch = 75;
    const { capacity, governing } = reportOf(end);
    expect(governing).toBe('bolt-shear');
    expect(cells[1]).toBe(`${Math.floor(capacity!)} M`);
    expect(Number.parseInt(cells[1]!, 10)).toBe(Math.floor(weakest.failsAt!));
    expect(heads[2]).toContain('230 mm');
    expect(await findings(bench)).toEqual([]);
  });

  test('says what its letters, REFER and blanks mean and what it does not promise', async () => {
    const bench = await (await visit()).tab();
    await toCard(bench);
    await legend(bench).waitFor();
    const text = await legend(bench).textContent();
    for (const said of [
      'Strength and listed rules only.',
      'outside the limits of method or practice, where a licensed engineer decides',
      'does not fit, or holds at no reaction',
      'For a competent person and for the data shown only.',
      'Local codes govern; licensed practice decides.',
      'Assumed, and limits.',
    ]) {
      expect(text).toContain(said);
    }
    expect(await legend(bench).getByText('M', { exact: true }).count()).toBe(1);
    expect(await table(bench).getByText('REFER').count()).toBeGreaterThan(0);
    expect(await table(bench).getByText('blank').count()).toBeGreaterThan(0);
  });

  test('is issued as a PDF, the same bytes each time, on the paper that is chosen', async () => {
    const bench = await (await visit()).tab();
    await toCard(bench);
    await issue(bench).waitFor();
    const { name, bytes } = await bench.handed(() => issue(bench).click());
    expect(name).toMatch(/^shop-card-[0-9a-f]{8}\.pdf$/);
    expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
    expect(bytes.toString('latin1')).toContain('/MediaBox [0 0 595.');
    await bench.page.getByText(`Shop card written as ${name}`).waitFor();
    expect((await bench.handed(() => issue(bench).click())).bytes.equals(bytes)).toBe(true);
    await bench.page.getByRole('radio', { name: 'Letter' }).check();
    await issue(bench).waitFor();
    const letter = await bench.handed(() => issue(bench).click());
    expect(letter.bytes.toString('latin1')).toContain('/MediaBox [0 0 612. 792.]');
  });

  test('is of a list of sections and the counts of rows that are asked for; an unknown name is refused', async () => {
    const bench = await (await visit()).tab();
    await toCard(bench);
    await bench.page.getByRole('radio', { name: 'A list' }).check();
    const sections = bench.page.getByRole('textbox', { name: /^Sections/ });
    await sections.fill('UB 406x178x60, UB 457x191x67');
    await bench.press('Tab');
    await bench.page.getByRole('combobox', { name: 'Bolt rows from' }).selectOption('3');
    await bench.page.getByRole('combobox', { name: 'to', exact: true }).selectOption('4');
    await eventually(() => table(bench).getByRole('rowheader').count()).toBe(1);
    await table(bench).getByRole('rowheader', { name: 'UB 406 × 178 × 60', exact: true }).waitFor();
    // Three or four rows do not hold in the deeper section: its plate is too shallow in the web.
    const rest = bench.page.getByRole('paragraph').filter({ hasText: 'in every column' });
    expect((await rest.textContent())?.replaceAll('\u00a0', ' ')).toContain(': UB 457 × 191 × 67.');
    expect(await table(bench).getByRole('columnheader').count()).toBe(3);
    await sections.fill('UB 406x178x61');
    await bench.press('Tab');
    const refused = bench.page.getByRole('region', { name: 'No card can be made' });
    await refused.waitFor();
    expect(await refused.textContent()).toContain('UB 406x178x60');
    expect(await issue(bench).count()).toBe(0);
    expect(await findings(bench)).toEqual([]);
  });

  test('is refused while a field of its template cannot be read, and issued only once what the bench put in is confirmed', async () => {
    const bench = await (await visit()).tab();
    await bench.turn('Cut');
    await bench.field('Cut', 'Setback').fill('12 nails');
    await toCard(bench);
    const refused = bench.page.getByRole('region', { name: 'No card can be made' });
    await refused.waitFor();
    expect(await refused.textContent()).toContain('12 nails');
    await bench.page.getByRole('link', { name: 'Bench' }).click();
    await bench.drawing.waitFor();
    await bench.field('Cut', 'Setback').fill('12');
    await bench.field('Cut', 'Bottom notch').check();
    await toCard(bench);
    await issue(bench).click();
    const dialog = bench.page.getByRole('dialog', { name: 'Confirm what the bench put in' });
    await dialog.waitFor();
    const { name } = await bench.handed(() => dialog.getByRole('button', { name: 'Confirm all' }).click());
    expect(name).toMatch(/^shop-card-/);
  });

  test('reads on a page 320 px wide, which never scrolls sideways, with coped ends in inches too', async () => {
    const inches = {
      standard: 'aisc-360-lrfd',
      units: 'in-kip',
      reaction: 30,
      beam: { section: 'W18x50', grade: 'A992' },
      top: { length: 4, depth: 1.5, radius: 0.5 },
      setback: 0.5,
      joint: {
        kind: 'fin-plate',
        firstRow: 3.25,
        endDistance: 1.75,
        bolts: { size: '3/4', grade: 'A325', rows: 3, pitch: 3 },
        plate: { thickness: 0.375, grade: 'A36', topEdge: 1.5, bottomEdge: 1.5, edge: 1.75 },
        weld: { leg: 0.25 },
      },
    };
    const bench = await (await visit({ viewport: { width: 320, height: 800 } })).tab(linkOf(inches));
    expect(await sideways(bench)).toBe(0);
    await toCard(bench);
    await table(bench).waitFor();
    const { capacity } = reportOf(inches);
    const [, three] = await cellsOf(bench, 'W18 × 50');
    expect(Number.parseFloat(three!)).toBeCloseTo(Math.floor(capacity! * 10) / 10, 9);
    expect(await legend(bench).textContent()).not.toMatch(/notch/i);
    expect(await sideways(bench)).toBe(0);
    expect(await findings(bench)).toEqual([]);
  });
});
