import { convertExactly } from './convertExactly.ts';
import type { Dimension } from './dimension.ts';
import { unitNames, type WrittenUnit, writtenUnit } from './quantityUnits.ts';
import { readNumber } from './readNumber.ts';
import { type UnitSystem, unitOf } from './systems.ts';

/** A quantity read from text. */
export interface QuantityRead {
  /** In the unit of the system asked for. */
  readonly value: number;
  /** The unit that was written with it; empty where the system's own was meant. */
  readonly unit: string;
  /** The text is more than digits with a decimal point: say how it was read. */
  readonly unusual: boolean;
}

/** Why a text is no quantity, as data. */
export interface Misread {
  readonly code:
    | 'empty'
    | 'not-a-quantity'
    | 'ambiguous-number'
    | 'fraction-without-unit'
    | 'unknown-unit'
    | 'wrong-unit';
  readonly given: string;
  /** Spellings that would be understood, or names of units. */
  readonly limit: readonly string[];
}

const LONGEST = 40;
const vulgar: Readonly<Record<string, string>> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/**
 * Reads a quantity as people write it, in the unit that `system` has for `dimension` unless another is written with it: `1 234,5`, `12.5`,
 * `3/4"`, `1-1/2 in`, `180kN`, `50 ksi`. Refused are texts that are no quantity, units of another dimension, and what can be read two ways:
 * `1.234` or `1,234` (thousand or decimal), and in a metric file a length such as `3/4` without its unit. Never throws.
 */
export const readQuantity = (text: string, dimension: Dimension, system: UnitSystem): QuantityRead | Misread => {
  const given = text.trim().slice(0, LONGEST + 1);
  const refuse = (code: Misread['code'], limit: readonly string[] = []): Misread => ({ code, given, limit });
  if (given === '') return refuse('empty');
  if (given.length > LONGEST) return refuse('not-a-quantity');
  const [sign, digits, spelling] = taken(given);
  const written = spelling === '' ? undefined : writtenUnit(spelling);
  if (digits === '') return refuse('not-a-quantity');
  if (spelling !== '' && !written) return refuse('unknown-unit', unitNames(dimension));
  if (written && written.dimension !== dimension) return refuse('wrong-unit', unitNames(dimension));
  const own = unitOf(dimension, system);
  const number = readNumber(digits, (written ?? writtenUnit(own.name))?.small ?? dimension === '0,0');
  if (!number) return refuse('not-a-quantity');
  if ('ambiguous' in number)
    return refuse(
      'ambiguous-number',
      number.ambiguous.map((it) => withUnit(it, spelling)),
    );
  if (number.fraction && !written && dimension === '1,0' && system === 'mm-kN') {
    return refuse('fraction-without-unit', [`${digits} in`, `${number.value} mm`]);
  }
  const value = sign * convertedTo(own.size, number.value, written);
  if (!Number.isFinite(value)) return refuse('not-a-quantity');
  return { value: value === 0 ? 0 : value, unit: written?.name ?? '', unusual: !/^-?\d+(\.\d+)?$/.test(given) };
};

/** Whether a reading is a value. */
export const isRead = (reading: QuantityRead | Misread): reading is QuantityRead => 'value' in reading;

const withUnit = (number: string, spelling: string): string => (spelling === '' ? number : `${number} ${spelling}`);

const convertedTo = (size: number, value: number, written: WrittenUnit | undefined): number =>
  written ? convertExactly(value, written.size, size) : value;

/** Sign, digits and unit of a text with all spaces alike. */
const taken = (given: string): [sign: 1 | -1, digits: string, spelling: string] => {
  const text = given
    .replace(/[½¼¾⅛⅜⅝⅞]/g, (it) => ` ${vulgar[it]}`)
    .replace(/⁄/g, '/')
    .replace(/\s+/g, ' ')
    .trim();
  const [, mark = '', rest = ''] = /^([-+\u2212\u2013]?) ?(.*)$/.exec(text) ?? [];
  const [, digits = '', spelling = ''] = /^([\d.,/ -]*\d[.,]?(?:e[+-]?\d+)?|[\d.,/ -]*) ?(.*)$/i.exec(rest) ?? [];
  return [mark === '' || mark === '+' ? 1 : -1, digits.trim(), spelling.trim()];
};
