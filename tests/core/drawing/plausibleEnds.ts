import fc from 'fast-check';
import { channel250, type Sample, section203, section406, section914 } from './sampleFacts.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const cope = (h: number) =>
  fc.option(fc.tuple(between(5, 500), between(1, 0.45 * h), fc.oneof(fc.constant(0), between(0, 60))), { nil: null });

/** Ends that a form may hold while it is filled in: sizes of the trade, and beyond what can be built. */
export const plausibleEnds: fc.Arbitrary<Sample> = fc
  .constantFrom(section203, section406, section914, channel250)
  .chain((section) =>
    fc.record({
      section: fc.constant(section),
      kind: fc.constantFrom('fin-plate', 'web-bolts'),
      V: fc.oneof(fc.constant(0), between(1, 2e6)),
      g: between(0, 40),
      top: cope(section.h),
      bottom: cope(section.h),
      n: fc.integer({ min: 1, max: 10 }),
      m: fc.integer({ min: 1, max: 3 }),
      p: between(30, 120),
      q: between(30, 120),
      y1: between(20, 0.6 * section.h),
      eEnd: between(20, 120),
      d0: between(14, 39),
      eTop: between(15, 100),
      eBot: between(15, 100),
      ex: between(15, 100),
      tp: between(5, 30),
      leg: between(3, 15),
    }),
  );
