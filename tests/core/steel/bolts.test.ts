import { describe, expect, it } from 'vitest';
import { boltSizeNames, boltStrength, findBoltSize } from '../../../core/steel/bolts.ts';

describe('a bolt size', () => {
  it.each([
    ['M20', 'M20', 20],
    ['m20', 'M20', 20],
    ['m 20', 'M20', 20],
    [' M 36 ', 'M36', 36],
    ['1/2', '1/2', 12.7],
    ['5/8', '5/8', 15.875],
    ['3/4', '3/4', 19.05],
    ['3/4"', '3/4', 19.05],
    ['3 / 4 in', '3/4', 19.05],
    ['7/8 inch', '7/8', 22.225],
    ['1', '1', 25.4],
    ['1"', '1', 25.4],
    ['1 1/8', '1-1/8', 28.575],
    ['1-1/8', '1-1/8', 28.575],
    ['1 - 1/4 in.', '1-1/4', 31.75],
  ])('%s is %s, %d mm', (written, name, diameter) => {
    expect(findBoltSize(written)).toMatchObject({ name, diameter });
  });

  it('runs from M12 to M36 and from 1/2 to 1-1/4 inch', () => {
    expect(boltSizeNames).toEqual(
      ['M12', 'M16', 'M20', 'M22', 'M24', 'M27', 'M30', 'M36'].concat([
        '1/2',
        '5/8',
        '3/4',
        '7/8',
        '1',
        '1-1/8',
        '1-1/4',
      ]),
    );
  });

  it.each([
    ['M19', 'M20'],
    ['M21', 'M22'],
    ['20', 'M20'],
    ['1 3/16', '1-1/4'],
    ['M10', 'M12'],
  ])('%s is not known; the nearest is %s', (written, neighbour) => {
    const answer = findBoltSize(written);
    expect('nearest' in answer && answer.nearest[0]).toBe(neighbour);
  });

  it.each(['', ' ', 'M', '-', '1/', '3/4 1/8', `3/4${' '.repeat(100_000)}x`])(
    'is not read out of junk (%#)',
    (written) => {
      expect('nearest' in findBoltSize(written)).toBe(true);
    },
  );
});

describe('the tensile strength of ISO 898-1 property classes', () => {
  it('is 400 MPa for 4.6, 420 MPa for 4.8 and 1040 MPa for 10.9 at every size', () => {
    for (const diameter of [12, 16, 20, 22, 24, 27, 30, 36]) {
      expect(boltStrength('4.6', diameter)).toBe(400);
      expect(boltStrength('4.8', diameter)).toBe(420);
      expect(boltStrength('10.9', diameter)).toBe(1040);
    }
  });

  it('is 800 MPa for 8.8 to M16 and 830 MPa above', () => {
    expect([12, 16].map((diameter) => boltStrength('8.8', diameter))).toEqual([800, 800]);
    expect([20, 22, 24, 27, 30, 36].map((diameter) => boltStrength('8.8', diameter))).toEqual(Array(6).fill(830));
  });

  it('is not given for inch bolts, other diameters or other classes', () => {
    expect(boltStrength('8.8', 19.05)).toBeUndefined();
    expect(boltStrength('8.8', 21)).toBeUndefined();
    expect(boltStrength('8.8', Number.NaN)).toBeUndefined();
    expect(boltStrength('12.9', 20)).toBeUndefined();
    expect(boltStrength('constructor', 20)).toBeUndefined();
  });
});
