import { spawn } from 'node:child_process';
import { loadavg } from 'node:os';
import { createInterface } from 'node:readline';
import { apiBench } from './apiBench.ts';
import { benchBench } from './benchBench.ts';
import { sheetBench } from './sheetBench.ts';
import { type Script, shipped } from './shipped.ts';
import type { Figure } from './timing.ts';

const kept = ({ value, ceiling, more }: Figure): boolean => (more ? value >= ceiling : value <= ceiling);

const show = (figure: Figure): string => {
  const { name, value, unit, target, ceiling, more } = figure;
  const digits = value >= 100 ? 0 : value >= 10 ? 1 : 2;
  const bound = more ? `at least ${target} (floor ${ceiling})` : `at most ${target} (ceiling ${ceiling})`;
  return `${kept(figure) ? ' ' : '!'} ${name.padEnd(84)} ${value.toFixed(digits).padStart(8)} ${unit.padEnd(6)} ${bound}`;
};

const figures: Figure[] = [];
const collect = (rows: readonly Figure[]) => {
  figures.push(...rows);
  for (const row of rows) process.stdout.write(`${show(row)}\n`);
};

/** Figures of the core as they come, a line for each standard. */
const core = async (script: Script): Promise<void> => {
  const child = spawn(process.execPath, [script('coreRun')], { stdio: ['ignore', 'pipe', 'inherit'] });
  for await (const line of createInterface({ input: child.stdout })) collect(JSON.parse(line));
};

process.stdout.write(`Node ${process.version}, load ${loadavg()[0]!.toFixed(2)}; medians of interleaved rounds\n`);
await shipped(['coreRun', 'sheetRun', 'apiServers'], async (script) => {
  await core(script);
  collect(sheetBench(script));
  collect(await apiBench(script));
});
collect(await benchBench());

process.stdout.write(`load ${loadavg()[0]!.toFixed(2)} at the end\n`);
const broken = figures.filter((figure) => !kept(figure));
process.exitCode = broken.length > 0 ? 1 : 0;
