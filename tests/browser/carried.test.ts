import { describe, expect, test } from 'vitest';
import { demoEnd, linkOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { site, visit } = onTheBench();

describe('a file', () => {
  test('is saved, and opened again it puts the same end on the bench', async () => {
    const first = await (await visit()).tab();
    await first.type('Pitch, mm', '90');
    const { name, bytes } = await first.handed(() => first.tool('Save').click());
    expect(name).toBe('G3-14-R.json');

    const second = await (await visit()).tab();
    expect(await second.saved()).not.toBe(bytes.toString());
    await second.openFile(name, bytes);
    await eventually(() => second.size('Pitch, mm').inputValue()).toBe('90');
    expect(await second.verdict).toBe(await first.verdict);
    expect(await second.saved()).toBe(bytes.toString());
    expect(await second.next('Undo')).toBe('Opened G3-14-R.json');
    await second.press('Control+z');
    await eventually(() => second.size('Pitch, mm').inputValue()).toBe('80');
  });

  test('that cannot be opened is refused by name, with its fault, and the form is untouched', async () => {
    const bench = await (await visit()).tab();
    await bench.type('Pitch, mm', '90');
    const before = await bench.saved();
    const bad = [
      ['notes.txt', 'beam as before', 'This is not readable as JSON: beam as before'],
      ['list.json', '[]', 'This holds no beam end.'],
      ['text.json', JSON.stringify({ ...demoEnd, setback: '12 mm' }), 'Setback'],
      ['field.json', JSON.stringify({ ...demoEnd, camber: 12 }), 'is not a field of a beam end'],
      ['sheet.pdf', '%PDF-1.3 but no sheet', 'This holds no beam end.'],
    ] as const;
    for (const [name, text, said] of bad) {
      await bench.openFile(name, Buffer.from(text));
      const alert = bench.page.getByRole('alert').filter({ hasText: `Not opened: ${name}. The bench is as it was.` });
      await alert.waitFor();
      expect(await alert.getByRole('listitem').allTextContents()).toContainEqual(expect.stringContaining(said));
      expect(await bench.saved()).toBe(before);
    }
  });
});

describe('a link', () => {
  test('opened in a fresh page shows the same end, and leaves the address', async () => {
    const first = await (await visit({ permissions: ['clipboard-read', 'clipboard-write'] })).tab();
    await first.type('Pitch, mm', '90');
    const before = { saved: await first.saved(), verdict: await first.verdict };
    await first.tool('Link').click();
    await first.page.getByText('Link copied: it carries the whole end').waitFor();
    const link = await first.page.evaluate(() => navigator.clipboard.readText());
    expect(link.startsWith(`${site()}#1.`)).toBe(true);

    const second = await (await visit()).tab(link.slice(site().length + 1));
    await eventually(() => second.size('Pitch, mm').inputValue()).toBe('90');
    expect(await second.verdict).toBe(before.verdict);
    expect(await second.saved()).toBe(before.saved);
    expect(second.page.url()).toBe(site());
    expect(await second.next('Undo')).toBe('Opened the link');
    await second.press('Control+z');
    await eventually(() => second.size('Pitch, mm').inputValue()).toBe('80');
  });

  test('that is damaged is refused, and the bench is as it was', async () => {
    const [version, packed, print] = linkOf({ ...demoEnd, reaction: 171 }).split('.') as [string, string, string];
    const half = packed.slice(0, packed.length >> 1);
    const notWhole = 'This link is not whole; copy it again.';
    const bench = await (await visit()).tab(`${version}.${half}.${print}`);
    const alert = bench.page.getByRole('alert');
    await alert.waitFor();
    expect(await alert.textContent()).toContain('Not opened: the link. The bench is as it was.');
    for (const [link, said] of [
      [`${version}.${half}.${print}`, notWhole],
      [`${version}.${half}~~.${print}`, notWhole],
      [`${version}.${packed}.`, notWhole],
      [`9.${packed}.${print}`, 'This link is of version 9; this program reads version 1.'],
    ] as const) {
      await bench.follow(link);
      await eventually(() => alert.getByRole('listitem').allTextContents()).toEqual([said]);
      expect(JSON.parse(await bench.saved())).toEqual(demoEnd);
    }
  });

  test('that was cut short before its last dot is refused too', async () => {
    const link = linkOf({ ...demoEnd, reaction: 171 });
    const bench = await (await visit()).tab(link.slice(0, link.length >> 1));
    expect(await bench.page.getByRole('alert').textContent()).toContain('Not opened: the link.');
  });
});

describe('the sheet', () => {
  test('is a PDF, the same bytes each time, and dropped on a fresh bench it puts the same end there', async () => {
    const first = await (await visit()).tab();
    await first.type('Pitch, mm', '90');
    const saved = await first.saved();
    const { name, bytes } = await first.sheet();
    expect(name).toBe('G3-14-R.pdf');
    expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
    await first.page.getByText(/^Sheet written as G3-14-R\.pdf/).waitFor();
    expect((await first.sheet()).bytes.equals(bytes)).toBe(true);

    const second = await (await visit()).tab();
    await second.drop(name, bytes);
    await eventually(() => second.size('Pitch, mm').inputValue()).toBe('90');
    expect(await second.saved()).toBe(saved);
  });

  test('is issued only once what the bench put in is confirmed', async () => {
    const bench = await (await visit()).tab();
    await bench.turn('Cut');
    await bench.field('Cut', 'Bottom notch').check();
    await bench.page.getByRole('button', { name: 'Issue sheet' }).click();
    const dialog = bench.page.getByRole('dialog', { name: 'Confirm what the bench put in' });
    await dialog.waitFor();
    const assumed = bench.page.getByRole('region', { name: 'Assumed until you say otherwise' });
    expect(await assumed.textContent()).toContain('bottom notch');
    expect(await dialog.getByRole('listitem').allTextContents()).toEqual([
      expect.stringContaining('ength of the bottom notch'),
      expect.stringContaining('epth of the bottom notch'),
      expect.stringContaining('orner radius of the bottom notch'),
    ]);
    const { bytes } = await bench.handed(() => dialog.getByRole('button', { name: 'Confirm all' }).press('Enter'));
    expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
    expect(await assumed.textContent()).not.toContain('bottom notch');
  });

  test('a page printed from the browser shows the verdict and no controls', async () => {
    const bench = await (await visit()).tab();
    await bench.turn('Bolts');
    await bench.page.emulateMedia({ media: 'print' });
    const { page } = bench;
    for (const control of [
      bench.tools,
      page.getByRole('button', { name: 'Issue sheet' }),
      page.getByRole('button', { name: 'begin your own' }),
      page.getByRole('radio', { name: 'in · kip' }),
      page.getByRole('button', { name: 'Pitch more' }),
    ]) {
      await control.waitFor({ state: 'hidden' });
    }
    expect(
      await page
        .getByText(await bench.verdict)
        .first()
        .isVisible(),
    ).toBe(true);
    expect(await bench.drawing.isVisible()).toBe(true);
    const printed = await page.pdf({ format: 'A4' });
    expect(printed.subarray(0, 5).toString()).toBe('%PDF-');
  });
});
