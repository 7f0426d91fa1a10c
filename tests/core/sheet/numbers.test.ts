import { describe, expect, it } from 'vitest';
import { numbersOf } from '../../../core/sheet/numbers.ts';

const point = numbersOf('mm-kN', '.');
const comma = numbersOf('mm-kN', ',');
const inches = numbersOf('in-kip', '.');

describe('numbers on the sheet', () => {
  it('round reactions at failure down and never print a failing ratio as 1.00', () => {
    expect(point.failsAt(170.099)).toBe('170.0');
    expect(point.failsAt(299.9999)).toBe('299.9');
    expect(point.ratio(1.0001)).toBe('1.01');
    expect(point.ratio(0.999)).toBe('1.00');
    expect(point.ratio(0.494)).toBe('0.49');
  });

  it('show a dash where there is no number', () => {
    expect(point.amount(null, 'kN')).toBe('–');
    expect(point.failsAt(null)).toBe('–');
    expect(point.failsAt(undefined)).toBe('–');
    expect(point.ratio(null)).toBe('–');
  });

  it('take the comma in numbers and leave clauses, editions and bolt grades alone', () => {
    expect(comma.ratio(0.97)).toBe('0,97');
    expect(comma.amount(85.01, 'kN')).toBe('85,0');
    expect(comma.mm(406.4)).toBe('406,4');
    expect(comma.marked('0.6 × 355.5 / 10³ = 0.5')).toBe('0,6 × 355,5 / 10³ = 0,5');
    expect(comma.marked('cl. 22.3, and 13.13.2.2')).toBe('cl. 22.3, and 13.13.2.2');
    expect(comma.marked('3 × M20 8.8, web 7.9')).toBe('3 × M20 8.8, web 7,9');
    expect(point.marked('0.6')).toBe('0.6');
  });

  it('give lengths in sixteenths of an inch where they are', () => {
    expect(inches.mm(114.3).replace('\u00a0', ' ')).toBe('4 1/2');
    expect(inches.mm(22)).toBe('0.866');
    expect(inches.mpa(345)).toBe('50.0'.replace('.0', ''));
  });
});
