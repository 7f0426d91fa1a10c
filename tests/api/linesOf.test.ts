import fc from 'fast-check';
import { expect, test } from 'vitest';
import { linesOf } from '../../api/linesOf.ts';

const collected = async (chunks: readonly Uint8Array[], most: number): Promise<string[]> => {
  const lines: string[] = [];
  for await (const batch of linesOf(chunks, most)) for (const line of batch) lines.push(Buffer.from(line).toString());
  return lines;
};

test('the lines of a text are the same, however the text is cut into pieces', async () => {
  const text = fc.array(fc.constantFrom('a', 'bc', '\n', '\n\n', 'é')).map((parts) => parts.join(''));
  await fc.assert(
    fc.asyncProperty(text, fc.array(fc.nat({ max: 20 })), async (whole, cuts) => {
      const bytes = Buffer.from(whole);
      const ends = [...new Set([...cuts, bytes.length])].sort((a, b) => a - b);
      const pieces = ends.map((end, at) => bytes.subarray(ends[at - 1] ?? 0, end));
      const wanted = whole.endsWith('\n') || whole === '' ? whole.split('\n').slice(0, -1) : whole.split('\n');
      expect(await collected(pieces, 100)).toEqual(wanted);
    }),
  );
});

test('of a line that is too long one byte too many is kept, and the next line is whole', async () => {
  const bytes = Buffer.from(`${'x'.repeat(50)}\nabc\n${'y'.repeat(50)}`);
  const pieces = Array.from({ length: bytes.length }, (_, at) => bytes.subarray(at, at + 1));
  for (const chunks of [pieces, [bytes]]) {
    expect((await collected(chunks, 10)).map(({ length }) => length)).toEqual([11, 3, 11]);
  }
});

test('many lines come in small batches, so that nothing else waits long', async () => {
  const sizes: number[] = [];
  for await (const batch of linesOf([Buffer.from('\n'.repeat(1000))], 10)) sizes.push(batch.length);
  expect(Math.max(...sizes)).toBeLessThanOrEqual(32);
  expect(sizes.reduce((sum, one) => sum + one, 0)).toBe(1000);
});

test('a buffer that the stream uses again does not change a line already begun', async () => {
  const shared = new Uint8Array(3);
  const reused = function* () {
    for (const piece of ['abc', 'de\n']) {
      shared.set(Buffer.from(piece));
      yield shared;
    }
  };
  const lines: string[] = [];
  for await (const batch of linesOf(reused(), 10)) lines.push(...batch.map((line) => Buffer.from(line).toString()));
  expect(lines).toEqual(['abcde']);
});
