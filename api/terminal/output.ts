import { once } from 'node:events';
import type { Verdict } from '../../core/check/report.ts';

export const HOLDS = 0;
export const NOT_HELD = 1;
export const NOT_UNDERSTOOD = 2;

export const statusOf = (verdict: Verdict): number => (verdict === 'holds' ? HOLDS : NOT_HELD);

/** Writes to standard output no faster than it is read. */
export const print = async (text: string | Uint8Array): Promise<void> => {
  if (!process.stdout.write(text)) await once(process.stdout, 'drain');
};

/** Says a sentence beside the output, and gives the status of what was not understood. */
export const complain = (sentence: string): number => {
  process.stderr.write(`${sentence}\n`);
  return NOT_UNDERSTOOD;
};

/** A reader that closes the pipe has seen enough: the run ends there, and quietly. */
export const endWithReader = (): void => {
  process.stdout.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
    process.exit();
  });
};
