import { describe, expect, test } from 'vitest';
import { fixed, plain, ratio, roundedDown, significant } from '../../../core/units/figures.ts';
import { fromSystem, toSystem, unitOf } from '../../../core/units/systems.ts';

describe('printed figures', () => {
  test.each([
    [1461.5, 6, '1461.5'],
    [314.1592653589793, 6, '314.159'],
    [68_980_586.95, 6, '68\u202f980\u202f600'],
    [0.000123456789, 4, '0.0001235'],
    [165_000, 6, '165\u202f000'],
    [-0.486, 6, '\u22120.486'],
    [0, 4, '0'],
    [99.9999, 4, '100'],
  ])('%f to %i significant figures is %s', (value, digits, text) => {
    expect(significant(value, digits)).toBe(text);
  });

  test('dimensions drop closing zeros, fixed places keep them', () => {
    expect(plain(45)).toBe('45');
    expect(plain(406.4)).toBe('406.4');
    expect(plain(12.345)).toBe('12.35');
    expect(fixed(87.6, 2)).toBe('87.60');
  });

  test('a ratio above 1 never prints below 1.01, one that holds never above 1.00', () => {
    expect(ratio(0.9703)).toBe('0.97');
    expect(ratio(0.9999)).toBe('1.00');
    expect(ratio(1)).toBe('1.00');
    expect(ratio(1.0000001)).toBe('1.01');
    expect(ratio(1.014)).toBe('1.01');
    expect(ratio(1.25)).toBe('1.25');
  });

  test('a failing reaction is rounded down, yet a whole tenth stays', () => {
    expect(roundedDown(170.0999)).toBe('170.0');
    expect(roundedDown(170.1)).toBe('170.1');
    expect(roundedDown(441.6)).toBe('441.6');
    expect(roundedDown(0.3 * 3)).toBe('0.9');
  });
});

describe('unit systems', () => {
  test('kip, inch and ksi are the exact ones', () => {
    expect(fromSystem(1, '1,0', 'in-kip')).toBe(25.4);
    expect(fromSystem(1, '0,1', 'in-kip')).toBeCloseTo(4448.2216152605, 9);
    expect(fromSystem(50, '-2,1', 'in-kip')).toBeCloseTo(344.738, 3);
    expect(toSystem(85_796_000, '1,1', 'mm-kN')).toBeCloseTo(85.796, 9);
    expect(unitOf('-1,1', 'in-kip').name).toBe('kip/in');
  });
});
