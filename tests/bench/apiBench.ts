import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { exampleEnd } from '../../api/exampleEnd.ts';
import { type Load, load, type Request } from './load.ts';
import type { Script } from './shipped.ts';
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

const middle = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1]!;

/** The servers in a process of their own, so that only the connections are shared. */
const servers = async (script: string) => {
  const child = spawn(process.execPath, [script], { stdio: ['ignore', 'pipe', 'inherit'] });
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

/** What the API answers to some of the bodies. */
const answers = (port: number, path: string): Promise<string[]> =>
  Promise.all(
    bodies.slice(0, 50).map(async (body) => {
      const headers = { 'Content-Type': 'application/json' };
      return (await fetch(`http://127.0.0.1:${port}${path}`, { method: 'POST', body, headers })).text();
    }),
  );

const CHECK = '/v1/check';
const WORKED = '/v1/check?working=1';

/**
 * Requests a second that the API answers over 32 connections, as a share of what a bare Hono echo of JSON answers in the same run. A report is
 * twenty times as long as the end it answers, so the echo is given both: JSON as long as the answer, which it reads and writes, and the end
 * alone.
 */
export const apiBench = async (script: Script): Promise<Figure[]> => {
  const { api, echo, stop } = await servers(script('apiServers'));
  try {
    const [plainBodies, workedBodies] = [await answers(api, CHECK), await answers(api, WORKED)];
    const [short = [], asLong = [], asLongWorked = [], plain = [], worked = []] = await interleaved([
      { port: echo, path: '/', bodies },
      { port: echo, path: '/', bodies: plainBodies },
      { port: echo, path: '/', bodies: workedBodies },
      { port: api, path: CHECK, bodies },
      { port: api, path: WORKED, bodies },
    ]);
    const told = (loads: readonly Load[]): string => {
      const rate = middle(loads.map(({ perSecond }) => perSecond));
      return `${rate.toFixed(0)}/s, ${loads[0]?.bytes} bytes`;
    };
    const share = (
      name: string,
      of: readonly Load[],
      over: readonly Load[],
      target: number,
      ceiling: number,
    ): Figure => ({
      name: `API: ${name} (${told(of)}) / ${told(over)}`,
      value: middle(of.map(({ perSecond }, at) => perSecond / over[at]!.perSecond)),
      unit: '',
      target,
      ceiling,
      more: true,
    });
    return [
      share('a check / bare echo of as many bytes', plain, asLong, 0.8, 0.27),
      share('a check with working / bare echo of as many bytes', worked, asLongWorked, 0.2, 0.067),
      share('a check / bare echo of the end', plain, short, 0.8, 0.05),
      share('a check with working / bare echo of the end', worked, short, 0.2, 0.015),
      {
        // Other work on the machine only ever adds to it.
        name: 'API: the slowest of a hundred checks, best of seven rounds',
        value: Math.min(...plain.map(({ p99 }) => p99)),
        unit: 'ms',
        target: 10,
        ceiling: 30,
      },
    ];
  } finally {
    stop();
  }
};
