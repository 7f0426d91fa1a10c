import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { spareOf, spareText } from '../../../web/ladder/spare.ts';

describe('what is to spare', () => {
  test('it is never promised more than there is, nor said to be short of less', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 5e3, noNaN: true }),
        fc.double({ min: 0, max: 5e3, noNaN: true }),
        (reaction, failsAt) => {
          const { short, amount } = spareOf(reaction, failsAt);
          const kN = Number(amount.replaceAll('\u202f', ''));
          if (short) expect(reaction - kN).toBeLessThanOrEqual(failsAt + 1e-6);
          else expect(reaction + kN).toBeLessThanOrEqual(failsAt + 1e-6);
        },
      ),
    );
  });

  test('tenths that are whole stay whole', () => {
    expect(spareText(165, 170.0503929511659, 'kN')).toBe('5.0 kN to spare');
    expect(spareText(0.3, 0.1, 'kip')).toBe('0.2 kip short');
    expect(spareText(100, 100, 'kN')).toBe('0.0 kN to spare');
  });
});
