import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';
import { goodEnds } from '../support/published.ts';
import { sheetTurn } from './sheetTurn.ts';
import type { Figure } from './timing.ts';

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));

const middle = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1]!;

/** Time of the first sheet in each of several fresh processes, ms, from the code as it ships: bundled, not transpiled on the way. */
const cold = async (): Promise<{ ms: number; bytes: number }> => {
  const folder = mkdtempSync(here('../../node_modules/.cache-sheet-'));
  try {
    const outDir = join(folder, 'out');
    await build({
      configFile: false,
      logLevel: 'silent',
      build: { ssr: here('./sheetCold.ts'), outDir, emptyOutDir: true, target: 'node20' },
    });
    const runs = Array.from({ length: 5 }, () => {
      const example = here('../../fixtures/input/good/example.json');
      const { stdout } = spawnSync(process.execPath, [join(outDir, 'sheetCold.js'), example], { encoding: 'utf8' });
      const [ms, bytes] = stdout.trim().split(' ').map(Number) as [number, number];
      return { ms, bytes };
    });
    return { ms: middle(runs.map(({ ms }) => ms)), bytes: runs[0]!.bytes };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
};

const warm = async (): Promise<number> => {
  const { end } = goodEnds().find(({ name }) => name === 'example')!;
  const times: number[] = [];
  for (let turn = 0; turn < 60; turn += 1) {
    const start = performance.now();
    await sheetTurn({ ...end, reaction: 120 + turn / 2 });
    if (turn >= 30) times.push(performance.now() - start);
  }
  return middle(times);
};

/** The sheet from JSON to PDF: first in a fresh process, then warm; its size. */
export const sheetBench = async (): Promise<Figure[]> => {
  const first = await cold();
  return [
    {
      name: 'sheet: first of a fresh process, loading included',
      value: first.ms,
      unit: 'ms',
      target: 40,
      ceiling: 120,
    },
    { name: 'sheet: warm', value: await warm(), unit: 'ms', target: 10, ceiling: 30 },
    { name: 'sheet: size', value: first.bytes / 1000, unit: 'kB', target: 25, ceiling: 30 },
  ];
};
