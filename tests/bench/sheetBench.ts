import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import type { Script } from './shipped.ts';
import type { Figure } from './timing.ts';

/** Sheets of a short-lived process; of a long-running one, and how many of those are printed before it is taken to be warm. */
const SHORT = 12;
const LONG = 440;
const WARMED = 200;
/** Short-lived processes looked at, and sheets of the long-running one that are looked at together. */
const PROCESSES = 9;
const BLOCK = 40;

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));

const middle = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1]!;

/** What one process says of the sheets that it printed: see `sheetRun.ts`. */
interface Run {
  readonly first: number;
  readonly later: readonly number[];
  readonly bytes: number;
}

/** Prints so many sheets in a fresh process. */
const printing = (script: string, count: number): Run => {
  const args = [script, here('../../fixtures/input/good/example.json'), String(count)];
  const { stdout, status } = spawnSync(process.execPath, args, { encoding: 'utf8' });
  if (status !== 0) throw new Error('the sheets were not printed');
  return JSON.parse(stdout) as Run;
};

const runs = (script: string): { short: Run[]; long: Run } => {
  // The first process of all reads the files from the disk.
  printing(script, 1);
  return { short: Array.from({ length: PROCESSES }, () => printing(script, SHORT)), long: printing(script, LONG) };
};

/** Values in their order, so many at a time. */
const blocks = (values: readonly number[], size: number): number[][] =>
  Array.from({ length: Math.floor(values.length / size) }, (_, i) => [...values.slice(i * size, (i + 1) * size)]);

/**
 * The sheet from JSON to PDF: in a short-lived process and in a long-running one, from the start of a process to its first, and its size.
 * Other work on the machine only ever adds to the time, so the best of several processes stands, and of the medians of several blocks.
 */
export const sheetBench = (script: Script): Figure[] => {
  const { short, long } = runs(script('sheetRun'));
  const cold = Math.min(...short.map(({ later }) => middle(later)));
  const warm = Math.min(...blocks(long.later.slice(WARMED - 1), BLOCK).map(middle));
  const start = Math.min(...short.map(({ first }) => first));
  const figure = (name: string, value: number, unit: string, target: number, ceiling: number): Figure => ({
    name: `sheet: ${name}`,
    value,
    unit,
    target,
    ceiling,
  });
  return [
    figure('cold median of the later of twelve in a fresh process, best of nine processes', cold, 'ms', 40, 120),
    figure('warm median of forty in a long-running process, best of six', warm, 'ms', 10, 30),
    figure('process start to first PDF, best of nine', start, 'ms', 600, 1800),
    figure('size', long.bytes / 1000, 'kB', 25, 30),
  ];
};
