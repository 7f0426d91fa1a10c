import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';
import { exampleEnd } from '../../api/exampleEnd.ts';
import { type Load, load, type Request } from './load.ts';
import type { Figure } from './timing.ts';

const CONNECTIONS = 32;
const ROUNDS = 7;
const WARM_UP = 6;
/** Of one contestant in one round, ms. */
const TURN = 300;

/** No two alike, so that no answer is ready before it is asked for: sections, copes and reactions of a job. */
const bodies = Array.from({ length: 500 }, (_, at) => {
  const section = ['UB 406x178x60', 'UB 457x191x67', 'UB 533x210x92'][at % 3]!;
  const depth = 30 + (at % 32) / 2;
  const end = { ...exampleEnd, reaction: 100 + at / 7, beam: { ...exampleEnd.beam, section } };
  return JSON.stringify({ ...end, top: { ...exampleEnd.top, depth } });
});

/**
 * Floors lie far below the targets: to write a report of 12 kB as JSON, or of 25 kB with its workings, costs more than the whole echo of half
 * a kB, so what is held here is that it gets no worse.
 */
const REPORT_FLOOR = 0.05;
const WORKING_FLOOR = 0.015;

const middle = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1]!;

/** The servers in a process of their own, so that only the connections are shared. */
const servers = async () => {
  const args = ['--import', 'tsx', fileURLToPath(new URL('apiServers.ts', import.meta.url))];
  const child = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'inherit'] });
  const [line] = await once(child.stdout, 'data');
  const [api = 0, echo = 0] = String(line).trim().split(' ').map(Number);
  return { api, echo, stop: () => child.kill() };
};

/** Contestants one after the other, round by round. */
const interleaved = async (requests: readonly Request[]): Promise<Load[][]> => {
  const loads = requests.map(() => [] as Load[]);
  for (let round = -WARM_UP; round < ROUNDS; round += 1) {
    for (const [at, request] of requests.entries()) {
      const one = await load(request, CONNECTIONS, TURN);
      if (round >= 0) loads[at]!.push(one);
    }
  }
  return loads;
};

/**
 * Requests a second that the API answers over 32 connections, as a share of what a bare Hono echo of the same JSON answers in the same
 * run.
 */
export const apiBench = async (): Promise<Figure[]> => {
  const { api, echo, stop } = await servers();
  try {
    const [bare = [], plain = [], worked = []] = await interleaved([
      { port: echo, path: '/', bodies },
      { port: api, path: '/v1/check', bodies },
      { port: api, path: '/v1/check?working=1', bodies },
    ]);
    const rate = (loads: readonly Load[]): number => middle(loads.map(({ perSecond }) => perSecond));
    const share = (loads: readonly Load[]): number =>
      middle(loads.map(({ perSecond }, at) => perSecond / bare[at]!.perSecond));
    const shape = { unit: '', more: true } as const;
    const told = (loads: readonly Load[]): string => `${rate(loads).toFixed(0)}/s, ${loads[0]?.bytes} bytes`;
    return [
      {
        name: `API: a check (${told(plain)}) / bare echo (${told(bare)})`,
        value: share(plain),
        target: 0.8,
        ceiling: REPORT_FLOOR,
        ...shape,
      },
      {
        name: `API: a check with working (${told(worked)}) / bare echo`,
        value: share(worked),
        target: 0.2,
        ceiling: WORKING_FLOOR,
        ...shape,
      },
      {
        name: 'API: the slowest of a hundred checks',
        value: middle(plain.map(({ p99 }) => p99)),
        unit: 'ms',
        target: 10,
        ceiling: 30,
      },
    ];
  } finally {
    stop();
  }
};
