import { said } from '../../core/check/examine.ts';
import type { SaidFault } from '../../core/check/report.ts';
import { fault } from '../../core/end/fault.ts';
import { reply } from './reply.ts';

const titles = {
  400: 'Bad Request',
  404: 'Not Found',
  405: 'Method Not Allowed',
  413: 'Content Too Large',
  415: 'Unsupported Media Type',
  422: 'Unprocessable Content',
  500: 'Internal Server Error',
} as const;

export type ProblemStatus = keyof typeof titles;

/** Says what stands in the way of an answer, as RFC 9457 problem details. */
export const problem = (
  status: ProblemStatus,
  detail: string,
  { faults, headers = {} }: { faults?: readonly SaidFault[]; headers?: Readonly<Record<string, string>> } = {},
): Response =>
  reply(
    status,
    JSON.stringify({ type: 'about:blank', title: titles[status], status, detail, ...(faults && { faults }) }),
    'application/problem+json',
    { 'Cache-Control': 'no-store', ...headers },
  );

const statuses: Readonly<Record<string, ProblemStatus>> = { 'not-json': 400, 'not-an-end': 400, 'too-large': 413 };

/** The problem that faults are: unreadable, too large, or an end that cannot be checked. */
export const faulty = (faults: readonly SaidFault[]): Response =>
  problem(statuses[faults[0]?.code ?? ''] ?? 422, faults.map(({ text }) => text).join(' '), { faults });

export const tooLarge = (most: number): Response => faulty(said([fault('too-large', '', null, most)]).faults);
