import { describe, expect, test } from 'vitest';
import { australianEnd, demoEnd, linkOf, reportOf, rungsOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { visit } = onTheBench();

const csa = 'CSA S16:2019';
const second = 'sheet' in demoEnd ? { ...(demoEnd.sheet as object), beside: { standard: 'csa-s16' } } : {};

describe('two standards side by side', () => {
  test('a second one is chosen in the order: every rung says what both say, the first stays as it was, and one undo takes it away', async () => {
    const bench = await (await visit()).tab();
    await bench.turn('Standard');
    await bench.field('Standard', 'Beside it').selectOption(csa);
    const rung = bench.rung('Bolt shear');
    await eventually(() => rung.textContent()).toMatch(
      /^Bolt shear holds, the weakest, fails at 188\.1 kN, ratio 0\.81 and by CSA S16:2019 holds, fails at [\d.]+ kN, ratio 0\.\d\d$/,
    );
    const ladder = bench.page.getByRole('region', { name: `Beside it ${csa}` });
    expect(await ladder.textContent()).toMatch(/HOLDS 0\.\d\d.*Strengths carried over from SANS 10162-1/);
    await eventually(() => bench.rungs).toEqual(rungsOf(reportOf(demoEnd)));
    await bench.press('Escape', 'Control+z');
    await ladder.waitFor({ state: 'detached' });
    expect(await rung.textContent()).not.toContain(csa);
  });

  test('an opened rung shows the working of both', async () => {
    const bench = await (await visit()).tab(linkOf({ ...demoEnd, sheet: second }));
    await bench.rung('Block tearing, web').click();
    await bench.page.getByRole('group', { name: /^Block tearing, web holds/ }).waitFor();
    const other = bench.page.getByRole('group', { name: `${csa}: Block tearing of the web` });
    expect(await other.textContent()).toMatch(/fails at V = [\d.]+ kN/);
  });

  test('at the other level it gives strengths alone until its own reaction is typed', async () => {
    const bench = await (await visit()).tab();
    await bench.turn('Standard');
    await bench.field('Standard', 'Beside it').selectOption('ANSI/AISC 360, ASD:2022');
    const ladder = bench.page.getByRole('region', { name: /^Beside it ANSI/ });
    await eventually(() => ladder.textContent()).toContain('Strengths alone');
    const reaction = bench.field('Standard', 'Its reaction, service');
    await reaction.fill('ten');
    await bench.press('Tab');
    await eventually(() => bench.noteOf(reaction)).toMatch(/must be a number/);
    expect(await bench.verdict).toBe('HOLDS 0.81');
    await reaction.fill('105');
    await eventually(() => ladder.textContent()).toMatch(/at 105 kN service/);
  });
});

describe('another standard', () => {
  test('that an end names is fetched, from a link as from the list, with no fault on the way', async () => {
    const { tab } = await visit();
    const bench = await tab(linkOf(australianEnd));
    const { verdict, governing, checks } = reportOf(australianEnd);
    const ratio = checks.find(({ id }) => id === governing)!.utilisation!.toFixed(2);
    await eventually(() => bench.verdict).toBe(`${verdict.toUpperCase()} ${ratio}`);
    await bench.turn('Standard');
    await bench.field('Standard', 'Standard').selectOption('ANSI/AISC 360, ASD:2022');
    await eventually(() => bench.verdict).toBe('INCOMPLETE');
    await bench.turn('Load');
    expect(await bench.field('Load', 'Reaction').inputValue()).toBe('');
    expect(await bench.field('Load', 'Tie force').count()).toBe(1);
  });
});

describe('in inches', () => {
  test('bolts in inches are offered first, and sizes on the piece stand in sixteenths', async () => {
    const bench = await (await visit()).tab();
    await bench.page.getByRole('radio', { name: 'in · kip' }).check();
    await bench.type('Pitch, in', '3.25');
    await eventually(() => bench.size('Pitch, in').inputValue()).toBe('3 1/4');
    await bench.turn('Bolts');
    await bench.field('Bolts', 'Size').waitFor();
    const sizes = await bench.field('Bolts', 'Size').getByRole('option').allTextContents();
    expect(sizes.slice(0, 3)).toEqual(['1/2 in', '5/8 in', '3/4 in']);
    expect(sizes.at(-1)).toBe('M36');
  });
});
