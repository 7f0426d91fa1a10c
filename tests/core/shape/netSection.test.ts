import { describe, expect, test } from 'vitest';
import { netModulus, netPlasticModulus } from '../../../core/shape/netSection.ts';
import { plainTeeModulus, plainTeePlasticModulus } from '../../../core/shape/plainTee.ts';
import { plasticModulus } from '../../../core/shape/plasticModulus.ts';
import { cutShape } from '../../../core/shape/shape.ts';

const none = { first: 0, pitch: 0, count: 0, diameter: 0 };

describe('a tee of plain rectangles', () => {
  // W18x50 less 2 in: AISC Design Examples v14, II.A-4, S_net 23.4 in3.
  const [b, tf, tw, depth] = [7.5, 0.57, 0.355, 16] as const;
  test('has the elastic modulus that the handbook tabulates', () => {
    expect(plainTeeModulus(b, tf, tw, depth)).toBeCloseTo(23.39, 2);
  });
  test.each([
    [16, 'axis in the stem'],
    [3, 'axis in the flange'],
  ])('is the shape without fillets: depth %f, %s', (deep) => {
    const shape = cutShape({ family: 'I', h: 18, b, tf, tw, r: 0 }, 18 - deep, 0);
    expect(plainTeeModulus(b, tf, tw, deep)).toBeCloseTo(shape.modulusTop, 9);
    expect(plainTeePlasticModulus(b, tf, tw, deep)).toBeCloseTo(plasticModulus(shape), 9);
  });
});

describe('a section with holes out', () => {
  const cut = { h: 18, b: 7.5, tf: 0.57, tw: 0.355, from: 2, to: 18 };
  test('without holes is the plain tee, or the plain rectangle', () => {
    expect(netModulus(cut, none)).toBeCloseTo(plainTeeModulus(7.5, 0.57, 0.355, 16), 9);
    expect(netModulus({ ...cut, from: 0, to: 16 }, none)).toBeCloseTo(plainTeeModulus(7.5, 0.57, 0.355, 16), 9);
    expect(netModulus({ ...cut, to: 14 }, none)).toBeCloseTo((0.355 * 12 ** 2) / 6, 9);
  });
  test('by hand: a rectangle 1 x 12 with two holes of 1 at 3 and 9', () => {
    // I = 12^3/12 - 2 (1/12 + 3^2) = 144 - 18.1667 = 125.8333; over 6.
    const holes = { first: 5, pitch: 6, count: 2, diameter: 1 };
    expect(netModulus({ h: 20, b: 5, tf: 0.5, tw: 1, from: 2, to: 14 }, holes)).toBeCloseTo(125.8333 / 6, 4);
  });
  test('plastic modulus by hand: plate 1/2 x 12, four holes of 7/8 at 3 in (AISC Design Examples v14, II.A-19: Z_net 12.8 in3)', () => {
    // 0.5 x 12^2/4 - 0.5 x 7/8 x 2 (1.5 + 4.5) = 18 - 5.25
    expect(netPlasticModulus(0.5, 12, { first: 1.5, pitch: 3, count: 4, diameter: 0.875 })).toBeCloseTo(12.75, 9);
  });
  test('holes at their own heights: an odd row takes d′²/4 at the axis, and an uneven edge moves the axis', () => {
    // 1 x 9 - one hole of 1 in the middle: 81/4 - 1/4
    expect(netPlasticModulus(1, 9, { first: 4.5, pitch: 0, count: 1, diameter: 1 })).toBeCloseTo(20, 9);
    // 1 x 10 with a hole of 2 at 2 (1 to 3): left 8, axis where 4 lie above: 1 + (5 - 3) + 1 = y 6; 5.5 x 1 + 1.5 x 3 + 2 x 4
    expect(netPlasticModulus(1, 10, { first: 2, pitch: 0, count: 1, diameter: 2 })).toBeCloseTo(5.5 + 4.5 + 8, 9);
  });
  test('holes that run together or leave nothing give no negative modulus', () => {
    expect(netPlasticModulus(1, 6, { first: 1, pitch: 1, count: 6, diameter: 3 })).toBe(0);
    expect(
      netModulus({ h: 20, b: 5, tf: 1, tw: 1, from: 2, to: 8 }, { first: 3, pitch: 2, count: 3, diameter: 4 }),
    ).toBe(0);
  });
});
