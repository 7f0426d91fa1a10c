import { describe, expect, test } from 'vitest';
import type { Bench } from './bench.ts';
import { demoEnd, reportOf, rungsOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

/** An invented end, field by field in the order of the trade: where focus must stand, what is typed there, and the arrow pressed after it. */
const typed: readonly (readonly [field: string, text: string, arrow?: string])[] = [
  ['Beam: Section', 'ub 406x178x60'],
  ['Beam: Grade', 'S355JR'],
  ['Cut: Top notch', ''],
  ['Top notch: Length', '110'],
  ['Top notch: Depth', '45'],
  ['Top notch: Corner R', '10'],
  ['Cut: Bottom notch', ''],
  ['Cut: Setback', '10'],
  ['Bolts: Size', 'M20'],
  ['Bolts: Class', '8.8'],
  ['Bolts: Rows', '3'],
  ['Bolts: Pitch', '75'],
  ['Bolts: Columns', '1'],
  ['Bolts: First row', '90'],
  ['Bolts: End distance', '45'],
  ['Bolts: Holes', 'drilled'],
  ['Bolts: Hole diameter', ''],
  ['Bolts: Threads', '', 'ArrowDown'],
  ['Bolts: Wrench socket', ''],
  ['Joint: Kind', 'fin plate'],
  ['Joint: Thickness', '10'],
  ['Joint: Grade', 'S355JR'],
  ['Joint: Top edge', '40'],
  ['Joint: Bottom edge', '40'],
  ['Joint: Free edge', '50'],
  ['Joint: Weld leg', '8'],
  ['Joint: Weld metal', ''],
  ['Joint: Support', ' '],
  ['Support: Face', ''],
  ['Support: Section', 'UB 457x191x67'],
  ['Support: Thickness', ''],
  ['Support: Grade', ''],
  ['Support: Top above', '0'],
  ['Support: Beam opposite', ''],
  ['Load: Given as', ''],
  ['Load: Reaction', '164', 'ArrowUp'],
  ['Load: Level', 'factored'],
  ['Load: Tie force', ''],
];

const expected = {
  standard: 'sans-10162-1',
  units: 'mm-kN',
  reaction: 165,
  level: 'factored',
  beam: { section: 'ub 406x178x60', grade: 'S355JR' },
  top: { length: 110, depth: 45, radius: 10 },
  bottom: null,
  setback: 10,
  joint: {
    kind: 'fin-plate',
    firstRow: 90,
    endDistance: 45,
    bolts: { size: 'M20', grade: '8.8', threads: 'in', rows: 3, columns: 1, pitch: 75, holes: 'drilled' },
    plate: { thickness: 10, grade: 'S355JR', topEdge: 40, bottomEdge: 40, edge: 50 },
    weld: { leg: 8 },
  },
  support: { kind: 'beam-web', section: 'UB 457x191x67', topOfSteel: 0 },
};

describe('an end is typed without a mouse', () => {
  test('from an empty bench, in the order of the trade, Enter leading from field to field, until the verdict stands', async () => {
    const bench = await (await visit()).tab();
    await bench.tabTo('New');
    await bench.press('Enter');
    for (const [field, text, arrow] of typed) {
      await eventually(() => bench.focused).toBe(field);
      await bench.page.keyboard.type(text);
      if (arrow) await bench.press(arrow);
      await bench.press('Enter');
    }
    await eventually(() => bench.focused).toBe('Standard: Standard');

    const { bytes } = await bench.handed(() => bench.press('Control+s'));
    const end = JSON.parse(bytes.toString('utf8'));
    expect(end).toEqual(expected);
    const report = reportOf(end);
    await eventually(() => bench.verdict).toBe(`HOLDS ${rungsOf(report).at(-1)!.ratio}`);
    expect(await bench.rungs).toEqual(rungsOf(report));
  });
});

const joint = demoEnd.joint as { readonly bolts: Record<string, unknown> };
const withPitch = (pitch: number) => ({ ...demoEnd, joint: { ...joint, bolts: { ...joint.bolts, pitch } } });
const rungsAt = (pitch: number) => rungsOf(reportOf(withPitch(pitch)));
const orderOfBolts = (bench: Bench) => bench.line('Bolts').getByRole('paragraph').textContent();

describe('a size on the piece is a field', () => {
  test('typing a pitch changes ladder and order with the letter', async () => {
    const bench = await (await visit()).tab();
    const pitch = bench.size('Pitch, mm');
    await pitch.focus();
    await bench.page.keyboard.type('90');
    await eventually(() => bench.rungs).toEqual(rungsAt(90));
    expect(await orderOfBolts(bench)).toContain('at 90 in 1 column');
    expect(await bench.focused).toBe('Pitch, mm');
    expect(JSON.parse(await bench.saved())).toEqual(withPitch(90));
  });

  test('arrow keys step it by 5 mm, with Shift by 10 mm', async () => {
    const bench = await (await visit()).tab();
    await bench.size('Pitch, mm').focus();
    for (const [key, pitch] of [
      ['ArrowUp', 85],
      ['Shift+ArrowUp', 95],
      ['ArrowDown', 90],
      ['Shift+ArrowDown', 80],
    ] as const) {
      await bench.press(key);
      await eventually(() => bench.size('Pitch, mm').inputValue()).toBe(String(pitch));
      await eventually(() => bench.rungs).toEqual(rungsAt(pitch));
    }
  });

  test('a text with its own unit is read in that unit, and said so; a number that reads two ways is asked about, not guessed', async () => {
    const bench = await (await visit()).tab();
    const pitch = bench.size('Pitch, mm');
    await pitch.focus();
    await bench.page.keyboard.type('3-1/2 in');
    await eventually(() => bench.noteOf(pitch)).toBe('read as 88.9 mm');
    await eventually(() => bench.rungs).toEqual(rungsAt(88.9));
    await bench.type('Pitch, mm', '1.234');
    await eventually(() => bench.noteOf(pitch)).toContain('can be read two ways');
    await eventually(() => bench.verdict).toBe('INCOMPLETE');
    expect(await bench.rungs).toEqual(rungsAt(88.9));
  });
});

describe('what cannot be read', () => {
  test('keeps the last result, marked as such, names the fault beside the field, and loses nothing', async () => {
    const bench = await (await visit()).tab();
    const before = { saved: await bench.saved(), rungs: await bench.rungs };
    const pitch = bench.size('Pitch, mm');
    await pitch.focus();
    await bench.page.keyboard.type('8o');
    await eventually(() => bench.verdict).toBe('INCOMPLETE');
    await bench.page.getByRole('heading', { name: 'Ladder as last complete' }).waitFor();
    await bench.page.getByRole('heading', { name: 'Piece as last complete' }).waitFor();
    expect(await bench.rungs).toEqual(before.rungs);

    await bench.press('Tab');
    await eventually(() => bench.noteOf(pitch)).toContain('the unit in 8o is not known');
    expect(await pitch.getAttribute('aria-invalid')).toBe('true');
    expect(await pitch.inputValue()).toBe('8o');
    expect(await bench.size('End distance, mm').inputValue()).toBe('40');

    await bench.type('Pitch, mm', '80');
    await eventually(() => bench.verdict).toBe('HOLDS 0.81');
    expect(await bench.noteOf(pitch)).toBe('');
    expect(await bench.rungs).toEqual(before.rungs);
    expect(await bench.saved()).toBe(before.saved);
  });

  test('Escape takes back what was typed', async () => {
    const bench = await (await visit()).tab();
    await bench.size('Pitch, mm').focus();
    await bench.page.keyboard.type('8o');
    await eventually(() => bench.verdict).toBe('INCOMPLETE');
    await bench.press('Escape');
    await eventually(() => bench.verdict).toBe('HOLDS 0.81');
    expect(await bench.size('Pitch, mm').inputValue()).toBe('80');
  });

  test('no sheet is issued: what is missing is listed, with a link to its field', async () => {
    const bench = await (await visit()).tab();
    await bench.type('Pitch, mm', '8o');
    await bench.page.getByRole('button', { name: 'Issue sheet' }).click();
    const list = bench.page.getByRole('region', { name: 'Not complete' });
    await list.waitFor();
    await list.getByRole('link', { name: /the unit in 8o is not known/ }).press('Enter');
    await eventually(() => bench.focused).toBe('Bolts: Pitch');
  });
});
