import fc from 'fast-check';
import type { Section } from '../../../core/shape/section.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

/** Invented sections of any likely proportion: I and channel, with and without root radius, parallel and tapered flanges. */
export const anySection: fc.Arbitrary<Section> = fc
  .record({
    family: fc.constantFrom('I' as const, 'channel' as const),
    tw: between(3, 40),
    tf: between(4, 60),
    r: fc.oneof(fc.constant(0), between(1, 30)),
    outstand: between(20, 200),
    clearWeb: between(20, 900),
    slope: fc.oneof(fc.constant(0), between(0.02, 0.16)),
  })
  .map(({ family, tw, tf, r, outstand, clearWeb, slope }) => {
    const sides = family === 'I' ? 2 : 1;
    const reach = r + outstand;
    const root = tf + reach * slope;
    return {
      family,
      b: tw + sides * reach,
      h: 2 * (root + r + reach * slope) + clearWeb,
      tf: root,
      tw,
      r,
      ...(slope > 0 && { slope, toe: Math.min(r, outstand, tf) / 2 }),
    };
  });

/** A share of the depth to cut away from each side, at least a tenth of it being left. */
export const anyCut = fc
  .record({ top: between(0, 0.9), share: between(0, 1), one: fc.boolean() })
  .map(({ top, share, one }) => ({ top, bottom: one ? 0 : (0.9 - top) * share }));
