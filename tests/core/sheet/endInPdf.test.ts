import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '../../../core/end/canonical.ts';
import { endInPdf, endKeywords } from '../../../core/sheet/endInPdf.ts';
import { sheetPdf } from '../../../core/sheet/sheet.ts';
import { end, examined, withSheet } from './ends.ts';

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);

describe('the end inside the file of its sheet', () => {
  it('comes back as it went in, sheet fields and all', async () => {
    const input = withSheet({ ...end.sheet, job: 'Überführung Łódź (漢字) \\ ) demo' });
    const found = endInPdf(await sheetPdf(examined(input), { workings: 'governing' }));
    expect(found).toEqual(JSON.parse(JSON.stringify(input)));
    expect(examined(found).report).toEqual(examined(input).report);
  });

  it('comes back from a sheet that is one of several, the first found', async () => {
    const pdf = await sheetPdf(examined(end), { workings: 'all' });
    expect(canonicalJson(endInPdf(pdf))).toBe(canonicalJson(end));
  });

  it('is not found where there is none, or where it was damaged', async () => {
    expect(endInPdf(bytes('%PDF-1.3 nothing of ours'))).toBeUndefined();
    expect(endInPdf(bytes('copewright-end:'))).toBeUndefined();
    expect(endInPdf(bytes('copewright-end:####'))).toBeUndefined();
    const words = endKeywords(end);
    expect(endInPdf(bytes(words.slice(0, -7)))).toBeUndefined();
    expect(endInPdf(bytes(words))).toEqual(JSON.parse(JSON.stringify(end)));
  });

  it('is refused when it is larger than any sheet would carry', () => {
    const large = endKeywords({ mark: 'x'.repeat(80_000) });
    expect(endInPdf(bytes(large))).toBeUndefined();
    expect(endInPdf(bytes(endKeywords({ mark: 'x'.repeat(60_000) })))).toBeDefined();
  });

  it('survives any bytes, with the marker in them and without', () => {
    fc.assert(
      fc.property(
        fc.uint8Array({ maxLength: 400 }),
        fc.boolean(),
        fc.uint8Array({ maxLength: 400 }),
        (a, marked, b) => {
          const file = new Uint8Array([...a, ...bytes(marked ? 'copewright-end:' : ''), ...b]);
          expect(() => endInPdf(file)).not.toThrow();
        },
      ),
    );
  });

  it('carries any JSON through', () => {
    fc.assert(
      fc.property(fc.jsonValue({ maxDepth: 3 }), (value) => {
        expect(canonicalJson(endInPdf(bytes(`x${endKeywords(value)})y`)))).toBe(canonicalJson(value));
      }),
    );
  });
});
