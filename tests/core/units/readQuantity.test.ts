import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Dimension } from '../../../core/units/dimension.ts';
import { showQuantity, writeQuantity } from '../../../core/units/printQuantity.ts';
import { isRead, readQuantity } from '../../../core/units/readQuantity.ts';
import { INCH, KIP, type UnitSystem } from '../../../core/units/systems.ts';

const length: Dimension = '1,0';
const force: Dimension = '0,1';
const stress: Dimension = '-2,1';
const pure: Dimension = '0,0';

const value = (text: string, dimension: Dimension = length, system: UnitSystem = 'mm-kN'): number => {
  const reading = readQuantity(text, dimension, system);
  if (!isRead(reading)) throw new Error(`${text}: ${reading.code}`);
  return reading.value;
};

const refusal = (text: string, dimension: Dimension = length, system: UnitSystem = 'mm-kN'): string => {
  const reading = readQuantity(text, dimension, system);
  return isRead(reading) ? `read as ${reading.value}` : reading.code;
};

describe('a number is read as people write it', () => {
  test.each([
    ['12.5', 12.5],
    ['12,5', 12.5],
    ['1234.5', 1234.5],
    ['1 234,5', 1234.5],
    ['1 234.5', 1234.5],
    ['1\u202f234,5', 1234.5],
    ['1\u2009234.5', 1234.5],
    ['1\u00a0234', 1234],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['1.234.567', 1234567],
    ['1,234,567.25', 1234567.25],
    ['0.375', 0.375],
    ['0,375', 0.375],
    ['1234.567', 1234.567],
    ['.5', 0.5],
    ['12.', 12],
    ['1.2340', 1.234],
    ['  90  ', 90],
    ['-20', -20],
    ['\u221220', -20],
    ['+15', 15],
    ['1e3', 1000],
    ['2.5e-7', 2.5e-7],
  ])('%j is %d', (text, expected) => {
    expect(value(text)).toBe(expected);
  });

  test.each([
    ['3/4', 0.75],
    ['1-1/2', 1.5],
    ['1 1/2', 1.5],
    ['1 - 1/2', 1.5],
    ['13/16', 0.8125],
    ['1½', 1.5],
    ['¾', 0.75],
    ['2⅜"', 2.375],
    ['3⁄4', 0.75],
    ['-1-1/2', -1.5],
  ])('in a file of inches %j is %d', (text, expected) => {
    expect(value(text, length, 'in-kip')).toBe(expected);
  });

  test('in inches a point is the decimal sign whatever follows: 1.125 is an eighth over one', () => {
    expect(value('1.125', length, 'in-kip')).toBe(1.125);
    expect(refusal('1,125', length, 'in-kip')).toBe('ambiguous-number');
  });
});

describe('a unit written with the number converts that number only', () => {
  test.each<[string, Dimension, UnitSystem, number]>([
    ['20 mm', length, 'mm-kN', 20],
    ['20mm', length, 'mm-kN', 20],
    ['2 cm', length, 'mm-kN', 20],
    ['0.12 m', length, 'mm-kN', 120],
    ['3/4"', length, 'mm-kN', 19.05],
    ['3/4 in', length, 'mm-kN', 19.05],
    ['1-1/2 in.', length, 'mm-kN', 38.1],
    ['7 in', length, 'mm-kN', 177.8],
    ['7 inches', length, 'mm-kN', 177.8],
    ['19.05 mm', length, 'in-kip', 0.75],
    ['180kN', force, 'mm-kN', 180],
    ['180 KN', force, 'mm-kN', 180],
    ['180000 N', force, 'mm-kN', 180],
    ['40 kip', force, 'mm-kN', 177.92886461042],
    ['40 kips', force, 'in-kip', 40],
    ['40k', force, 'in-kip', 40],
    ['500 lb', force, 'in-kip', 0.5],
    ['355 MPa', stress, 'mm-kN', 355],
    ['355 N/mm²', stress, 'mm-kN', 355],
    ['355N/mm2', stress, 'mm-kN', 355],
    ['50 ksi', stress, 'mm-kN', 344.73786465841806],
    ['50 ksi', stress, 'in-kip', 50],
    ['50 %', pure, 'mm-kN', 0.5],
    ['0.5', pure, 'in-kip', 0.5],
  ])('%j as %s in %s', (text, dimension, system, expected) => {
    expect(value(text, dimension, system)).toBe(expected);
  });

  test('a kip is 1000 lb of 0.453 592 37 kg under 9.806 65 m/s²: 40 kip = 177.928 864 6 kN', () => {
    expect(40 * 0.45359237 * 9.80665).toBeCloseTo(177.9288646, 6);
    expect(value('40 kip', force)).toBeCloseTo(177.9288646, 6);
  });

  test('the reading names the unit that was written, and says whether the text needs explaining', () => {
    expect(readQuantity('3/4"', length, 'mm-kN')).toEqual({ value: 19.05, unit: 'in', unusual: true });
    expect(readQuantity('120', length, 'mm-kN')).toEqual({ value: 120, unit: '', unusual: false });
    expect(readQuantity('1 234,5', length, 'mm-kN')).toMatchObject({ unit: '', unusual: true });
  });
});

describe('what cannot be read is refused by name', () => {
  test.each([
    ['', 'empty'],
    ['   ', 'empty'],
    ['M20', 'not-a-quantity'],
    ['abc', 'not-a-quantity'],
    ['12 34', 'not-a-quantity'],
    ['1.2.3', 'not-a-quantity'],
    ['1,23,456', 'not-a-quantity'],
    ['3/0 in', 'not-a-quantity'],
    ['1 5/4 in', 'not-a-quantity'],
    ['--5', 'not-a-quantity'],
    ['.', 'not-a-quantity'],
    ['-', 'not-a-quantity'],
    ['1e999', 'not-a-quantity'],
    ['9'.repeat(60), 'not-a-quantity'],
    ['20 foo', 'unknown-unit'],
    ["7'", 'unknown-unit'],
    ['20 M', 'unknown-unit'],
    ['20 kN', 'wrong-unit'],
    ['20 MPa', 'wrong-unit'],
    ['1.234', 'ambiguous-number'],
    ['1,234', 'ambiguous-number'],
    ['123.456', 'ambiguous-number'],
    ['12,345 mm', 'ambiguous-number'],
    ['3/4', 'fraction-without-unit'],
  ])('%j is %s', (text, code) => {
    expect(refusal(text)).toBe(code);
  });

  test('an ambiguous number asks with the two spellings that would be understood', () => {
    const asked = readQuantity('1.234', force, 'mm-kN');
    expect(asked).toEqual({ code: 'ambiguous-number', given: '1.234', limit: ['1234', '1.2340'] });
    if (isRead(asked)) return;
    expect(asked.limit.map((text) => value(text, force))).toEqual([1234, 1.234]);
  });

  test('a fraction without a unit in a metric file asks of what', () => {
    const asked = readQuantity('3/4', length, 'mm-kN');
    expect(asked).toEqual({ code: 'fraction-without-unit', given: '3/4', limit: ['3/4 in', '0.75 mm'] });
    if (!isRead(asked)) expect(asked.limit.map((text) => value(text))).toEqual([19.05, 0.75]);
  });

  test('a wrong unit is answered with those that fit', () => {
    expect(readQuantity('20 kN', length, 'mm-kN')).toMatchObject({ limit: ['mm', 'cm', 'in', 'm'] });
    expect(readQuantity('20 mm', stress, 'in-kip')).toMatchObject({ limit: ['MPa', 'ksi', 'psi'] });
  });
});

const systems = fc.constantFrom<UnitSystem>('mm-kN', 'in-kip');
const dimensions = fc.constantFrom<Dimension>('1,0', '0,1', '-2,1', '0,0');

describe('whatever is typed', () => {
  test('no text throws, and every value read is finite', () => {
    const letters = fc.string({
      unit: fc.constantFrom(...'0123456789.,/- +eEmMkKiNn"\'½⅛\u2212\u202f%MPa'),
      maxLength: 50,
    });
    fc.assert(
      fc.property(fc.oneof(fc.string({ unit: 'binary' }), letters), dimensions, systems, (text, dimension, system) => {
        const reading = readQuantity(text, dimension, system);
        if (isRead(reading)) expect(Number.isFinite(reading.value)).toBe(true);
        else expect(reading.given.length).toBeLessThanOrEqual(41);
      }),
      { numRuns: 3000 },
    );
  });

  test('a value written into a field is read back as the very same value', () => {
    const values = fc.oneof(
      fc.double({ noNaN: true, noDefaultInfinity: true }),
      fc.integer({ min: -100000, max: 100000 }).map((n) => n / 16),
      fc.integer({ min: 0, max: 9999999 }).map((n) => n / 1000),
    );
    fc.assert(
      fc.property(values, dimensions, systems, (number, dimension, system) => {
        expect(value(writeQuantity(number, dimension, system), dimension, system)).toBe(number === 0 ? 0 : number);
      }),
      { numRuns: 3000 },
    );
  });

  test('a metric size read in inches stands for the same size in mm, to the last digit', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 20000 }), (tenths) => {
        const mm = tenths / 10;
        expect(value(`${mm} mm`, length, 'in-kip') * INCH).toBeCloseTo(mm, 9);
        expect(value(`${value(`${mm} mm`, length, 'in-kip')} in`, length)).toBe(mm);
      }),
    );
    expect(value('1000 kN', force, 'in-kip') * KIP).toBeCloseTo(1e6, 6);
  });
});

describe('a value is shown', () => {
  test.each<[number, Dimension, UnitSystem, string]>([
    [120, length, 'mm-kN', '120'],
    [19.05, length, 'mm-kN', '19.05'],
    [0.75, length, 'in-kip', '3/4'],
    [4.5, length, 'in-kip', '4 1/2'],
    [120 / INCH, length, 'in-kip', '4.724'],
    [165, force, 'in-kip', '165'],
    [0.525, pure, 'mm-kN', '0.525'],
  ])('%d as %s in %s reads %j', (number, dimension, system, text) => {
    expect(showQuantity(number, dimension, system)).toBe(text);
  });
});
