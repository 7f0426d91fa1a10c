import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { sheetPdf } from '../../../core/sheet/sheet.ts';
import { goodEnds } from '../../support/published.ts';
import { end, examined, fullest, withSheet } from './ends.ts';

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));

const print = async (input: unknown): Promise<Buffer> =>
  Buffer.from(await sheetPdf(examined(input), { workings: 'all' }));

const printAlone = (input: unknown): Buffer => {
  const { stdout, status } = spawnSync(process.execPath, ['--import', 'tsx', here('printOnce.ts')], {
    cwd: here('../../..'),
    input: JSON.stringify(input),
    maxBuffer: 1e7,
  });
  expect(status).toBe(0);
  return stdout;
};

describe('a sheet', () => {
  it('is the same bytes whatever was printed before it, and in a program that has printed nothing', async () => {
    const alone = printAlone(end);
    const first = await print(end);
    for (const other of [fullest, withSheet({ paper: 'Letter', decimal: ',', job: 'Überführung Łódź (demo)' })]) {
      await print(other);
      expect(Buffer.compare(await print(end), first)).toBe(0);
    }
    expect(Buffer.compare(first, alone)).toBe(0);
  });

  it('is the same bytes when many are made at once', async () => {
    const ends = goodEnds().map((one) => one.end);
    const one: Buffer[] = [];
    for (const input of ends) one.push(await print(input));
    const together = await Promise.all(ends.map(print));
    expect(together.filter((bytes, i) => Buffer.compare(bytes, one[i]!) !== 0)).toEqual([]);
  });
});
