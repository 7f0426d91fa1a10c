import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { axisOf, closeUpOf, runsOff, shareOn } from '../../../web/ladder/axis.ts';

const positive = fc.double({ min: 0.1, max: 1e5, noNaN: true });

describe('axis of the ladder', () => {
  test('it reaches from 0 to three times the reaction, so that the line always stands at a third of it', () => {
    fc.assert(
      fc.property(positive, positive, (reaction, weakest) => {
        const axis = axisOf(reaction, weakest);
        expect([axis.from, axis.to, axis.line]).toEqual([0, 3 * reaction, reaction]);
        expect(shareOn(axis, reaction)).toBeCloseTo(1 / 3, 12);
      }),
    );
  });

  test('without a reaction it has no line and reaches half as far again as the weakest way', () => {
    expect(axisOf(0, 170)).toEqual({ from: 0, to: 255, line: null, ticks: [0, 170, 255] });
  });

  test('without any number at all it still is an axis', () => {
    for (const weakest of [null, 0]) {
      const axis = axisOf(0, weakest);
      expect(axis.to).toBeGreaterThan(0);
      expect(axis.ticks.every(Number.isFinite)).toBe(true);
    }
  });

  test('a bar that ends before the line stops short of it, one beyond the axis runs off at its end', () => {
    const axis = axisOf(100, 90);
    expect(shareOn(axis, 90)).toBeLessThan(shareOn(axis, 100));
    expect(shareOn(axis, 1e9)).toBe(1);
    expect(runsOff(axis, 300)).toBe(false);
    expect(runsOff(axis, 300.1)).toBe(true);
  });
});

describe('close-up of the weakest bar', () => {
  test('its line stands where the line of the ladder stands, and lengths are ten times as long', () => {
    fc.assert(
      fc.property(positive, fc.double({ min: 0.91, max: 1.19, noNaN: true }), (reaction, times) => {
        const axis = axisOf(reaction, reaction * times);
        const close = closeUpOf(reaction, reaction * times)!;
        expect(shareOn(close, reaction)).toBeCloseTo(1 / 3, 9);
        const margin = shareOn(axis, reaction * times) - 1 / 3;
        expect(shareOn(close, reaction * times) - 1 / 3).toBeCloseTo(10 * margin, 9);
      }),
    );
  });

  test('there is none where the ladder shows the margin plainly, nor without a reaction or a number', () => {
    expect(closeUpOf(100, 130)).toBeNull();
    expect(closeUpOf(100, 80)).toBeNull();
    expect(closeUpOf(0, 170)).toBeNull();
    expect(closeUpOf(100, null)).toBeNull();
  });
});
