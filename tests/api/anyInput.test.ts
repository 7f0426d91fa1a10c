import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { reportSchema } from '../../api/http/reportSchema.ts';
import { problemSchema } from '../../api/http/schemas.ts';
import { anyEnd, anyNumbers, fullEnd } from './anyEnd.ts';
import { post, postJson } from './ask.ts';

/** An answer is a report whose every number is one, or a problem that says why there is none. */
const answers = async (body: BodyInit): Promise<number> => {
  const response = await post('/v1/check?working=1', body);
  const text = await response.text();
  expect(text).not.toMatch(/\b(?:NaN|Infinity|undefined)\b/);
  if (response.status === 200) reportSchema.parse(JSON.parse(text));
  else {
    expect([400, 413, 422]).toContain(response.status);
    const { faults = [] } = problemSchema.parse(JSON.parse(text));
    expect(faults).not.toHaveLength(0);
    // A bound that is no number would leave as null.
    for (const { limit } of faults) expect(JSON.stringify(limit ?? '')).not.toContain('null');
  }
  return response.status;
};

describe('whatever is sent to be checked', () => {
  test('the end that uses every field is read', async () => {
    expect(await answers(JSON.stringify(fullEnd))).toBe(200);
  });

  test('any JSON is answered', async () => {
    await fc.assert(
      fc.asyncProperty(fc.json({ maxDepth: 6 }), async (text) => void (await answers(text))),
      { numRuns: 500 },
    );
  });

  test('any bytes are answered', async () => {
    await fc.assert(fc.asyncProperty(fc.uint8Array(), async (bytes) => void (await answers(new Uint8Array(bytes)))));
  });

  test('an end with fields changed, taken away or added is answered', async () => {
    const seen = new Set<number>();
    await fc.assert(
      fc.asyncProperty(anyEnd, async (end) => {
        seen.add(await answers(JSON.stringify(end)));
      }),
      { numRuns: 1500 },
    );
    expect([...seen].sort()).toEqual([200, 422]);
  });

  test('an end of any numbers gives numbers or faults, never a number without bounds', async () => {
    const seen = new Set<number>();
    await fc.assert(
      fc.asyncProperty(anyNumbers, async (end) => {
        seen.add(await answers(JSON.stringify(end)));
      }),
      { numRuns: 1500 },
    );
    expect([...seen].sort()).toEqual([200, 422]);
  });

  test('numbers past what a computer holds are faults', async () => {
    const text = JSON.stringify(fullEnd);
    for (const number of ['1e999', '-1e999', '1'.repeat(400)]) {
      expect(await answers(text.replace('"reaction":165', `"reaction":${number}`))).toBe(422);
    }
  });

  test('nesting as deep as a body can be is answered', async () => {
    for (const [open, close] of [
      ['[', ']'],
      ['{"a":', '}'],
    ] as const) {
      const depth = 100_000;
      expect(await answers(`${open.repeat(depth)}1${close.repeat(depth)}`)).toBe(422);
      expect(await answers(open.repeat(depth))).toBe(400);
    }
    const options = `{"options":${'['.repeat(100_000)}${']'.repeat(100_000)},`;
    expect(await answers(JSON.stringify(fullEnd).replace('{', options))).toBe(422);
  });

  test('names that reach into the program are unknown fields', async () => {
    for (const name of ['__proto__', 'constructor', 'toString', 'hasOwnProperty']) {
      for (const at of ['{', '"joint":{', '"options":{', '"sheet":{', '"beam":{']) {
        const body = JSON.stringify(fullEnd).replace(at, `${at}${JSON.stringify(name)}:"x",`);
        expect(await answers(body), `${at}${name}`).toBe(422);
      }
    }
  });
});

test('whatever end is sent for a sheet is answered by one exactly when its check is answered by a report', async () => {
  const seen = new Set<number>();
  await fc.assert(
    fc.asyncProperty(fc.oneof(anyEnd, anyNumbers), fc.constantFrom('', '?workings=all'), async (end, query) => {
      const [sheet, check] = [await postJson(`/v1/sheet${query}`, end), await postJson('/v1/check', end)];
      expect(sheet.status).toBe(check.status);
      expect(sheet.headers.get('content-type')).toBe(
        sheet.status === 200 ? 'application/pdf' : 'application/problem+json',
      );
      seen.add(sheet.status);
    }),
    { numRuns: 150 },
  );
  expect([...seen].sort()).toEqual([200, 422]);
});
