import { fileURLToPath } from 'node:url';
import { build, type Rollup } from 'vite';
import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../core/check/checkEnd.ts';
import { examine } from '../../core/check/examine.ts';
import { failurePath } from '../../core/drawing/failurePath.ts';
import { commonwealth } from '../../core/words/commonwealth.ts';
import { workingLines } from '../../web/ladder/workingLines.ts';
import { drawingWords } from '../../web/piece/drawingWords.ts';
import { goodEnds } from '../support/published.ts';
import type { Bench } from './bench.ts';
import { demoEnd, linkOf, reportOf, rungsOf } from './demoEnd.ts';
import { eventually } from './eventually.ts';
import { onTheBench } from './onTheBench.ts';

const { site, visit } = onTheBench();

const report = reportOf(demoEnd);
const rungs = rungsOf(report).reverse();
const checkOf = (name: string) =>
  report.checks.find(({ id, title }) => (commonwealth.short[id] ?? title) === name && !id.startsWith('fit-'))!;

/** What is drawn for a check on the piece, in words, without the marks of subscripts. */
const captionOf = (name: string): string => {
  const found = examine(demoEnd);
  if ('faults' in found) throw new Error('the demo end is refused');
  const { id, of = '' } = checkOf(name);
  const words = drawingWords(found.examined, commonwealth);
  return failurePath(id, of, found.examined.facts, words)!.caption.replace(/_/g, '');
};

const workingOf = (bench: Bench, name: string) => bench.page.getByRole('group', { name: new RegExp(`^${name}[ ,]`) });
const isOpen = (bench: Bench, name: string) => bench.rung(name).getAttribute('aria-expanded');
/** The rung that has focus, of those named. */
const onRung = async (bench: Bench) => {
  const focused = await bench.focused;
  return rungs.find(({ name }) => focused.startsWith(`${name} `))?.name;
};
/** What is drawn on the piece, mark by mark. */
const marks = (bench: Bench): Promise<string[]> =>
  bench.drawing.locator('path, text').evaluateAll((all) => all.map((it) => it.outerHTML));

describe('a rung is opened without a mouse', () => {
  test('the Tab key comes to the weakest; Enter shows its working and draws its path on the piece; Escape closes it', async () => {
    const bench = await (await visit()).tab();
    const [weakest] = rungs;
    const plain = await marks(bench);
    await bench.rung('Buckling at notch').waitFor();
    while ((await onRung(bench)) !== weakest!.name) await bench.press('Tab');
    await bench.press('Enter');
    const working = workingOf(bench, weakest!.name);
    await working.waitFor();
    for (const { value, unit } of workingLines(checkOf(weakest!.name))) {
      expect(await working.textContent()).toContain(unit ? `${value} ${unit}` : value);
    }
    expect(await working.textContent()).toContain(`fails at V = ${weakest!.failsAt} kN`);
    await bench.page.getByText(captionOf(weakest!.name), { exact: true }).waitFor();
    const withPath = await marks(bench);
    expect(withPath).toEqual(expect.arrayContaining(plain));
    expect(withPath.length).toBeGreaterThan(plain.length);

    await bench.press('Escape');
    await working.waitFor({ state: 'detached' });
    expect(await isOpen(bench, weakest!.name)).toBe('false');
    expect(await onRung(bench)).toBe(weakest!.name);
    await eventually(() => marks(bench)).toEqual(plain);
  });

  test('arrow keys go from rung to rung, and each has its own working and its own path; one at a time is open', async () => {
    const bench = await (await visit()).tab();
    await bench.rung(rungs[0]!.name).focus();
    const seen = new Set<string>();
    for (const { name } of rungs) {
      expect(await onRung(bench)).toBe(name);
      await bench.press('Enter');
      await eventually(() => isOpen(bench, name)).toBe('true');
      const { value, unit } = workingLines(checkOf(name)).at(-1)!;
      expect(await workingOf(bench, name).textContent()).toContain(unit ? `${value} ${unit}` : value);
      await bench.page.getByText(captionOf(name), { exact: true }).waitFor();
      expect(await bench.ladder.getByRole('button', { expanded: true }).count()).toBe(1);
      seen.add((await marks(bench)).join());
      await bench.press('ArrowUp');
    }
    expect(seen.size).toBe(rungs.length);
    expect(await onRung(bench)).toBe(rungs.at(-1)!.name);
    await bench.press('End');
    expect(await onRung(bench)).toBe(rungs[0]!.name);
    await bench.press('Home');
    expect(await onRung(bench)).toBe(rungs.at(-1)!.name);
  });

  test('a rule of the footing opens in the same way', async () => {
    const bench = await (await visit()).tab();
    await bench.rung('Setback').focus();
    await bench.press('Enter');
    await workingOf(bench, 'Setback').waitFor();
    expect(await workingOf(bench, 'Setback').textContent()).toContain('8 / 12');
    await bench.press('Escape');
    await eventually(() => isOpen(bench, 'Setback')).toBe('false');
  });
});

const core = fileURLToPath(new URL('../../core/check/checkEnd.ts', import.meta.url));

/** The core as one module for the browser. */
const bundled = async (): Promise<string> => {
  const built = await build({
    configFile: false,
    logLevel: 'silent',
    build: { write: false, target: 'es2022', lib: { entry: core, formats: ['es'] } },
  });
  const [{ output }] = (Array.isArray(built) ? built : [built]) as Rollup.RollupOutput[] as [Rollup.RollupOutput];
  return output[0].code;
};

/** Engines may round a power differently in its last bit. */
const LAST_BITS = 1e-15;

/** Where two values of JSON are not the same: every text to the letter, every number to its last bits. */
const differences = (a: unknown, b: unknown, path: string): string[] => {
  if (typeof a === 'number' && typeof b === 'number') {
    return Math.abs(a - b) <= LAST_BITS * Math.abs(a) ? [] : [`${path}: ${a}, ${b}`];
  }
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) {
    return a === b ? [] : [`${path}: ${a}, ${b}`];
  }
  const [one, two] = [a, b] as Record<string, unknown>[];
  const keys = new Set([...Object.keys(one!), ...Object.keys(two!)]);
  return [...keys].flatMap((key) => differences(one![key], two![key], `${path}.${key}`));
};

describe('the browser computes what the server computes', () => {
  test('the same report with all its workings for every good end', async () => {
    const code = await bundled();
    const { context } = await visit();
    const page = await context.newPage();
    await page.route(`${site()}core.html`, (route) => route.fulfill({ contentType: 'text/html', body: '' }));
    await page.route(`${site()}core.js`, (route) => route.fulfill({ contentType: 'text/javascript', body: code }));
    await page.goto(`${site()}core.html`);
    const ends = goodEnds();
    const answers = await page.evaluate<string[]>(`import('./core.js').then(({ checkEnd }) =>
      ${JSON.stringify(ends.map(({ end }) => end))}.map((end) => JSON.stringify(checkEnd(end, { working: true }))))`);
    expect(answers.length).toBe(ends.length);
    const found = ends.flatMap(({ name, end }, at) =>
      differences(JSON.parse(JSON.stringify(checkEnd(end, { working: true }))), JSON.parse(answers[at]!), name),
    );
    expect(found).toEqual([]);
  });

  test('the bench shows the verdict and the ladder of the server’s report for every good end', async () => {
    const bench = await (await visit()).tab();
    for (const { name, end } of goodEnds()) {
      const report = reportOf(end);
      await bench.follow(linkOf(end));
      await eventually(() => bench.verdict).toMatch(new RegExp(`^${report.verdict.toUpperCase()}`));
      await eventually(async () => [name, await bench.rungs]).toEqual([name, rungsOf(report)]);
    }
  });
});
