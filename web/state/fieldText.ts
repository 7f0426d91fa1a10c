import { showQuantity, writeQuantity } from '../../core/units/printQuantity.ts';
import { unitOf } from '../../core/units/systems.ts';
import { demanded, editing, entry, faults, units } from './bench.ts';
import { textOf } from './entry.ts';
import { fieldAt, type QuantityField } from './fields.ts';
import { isFault, readField } from './readField.ts';
import { secondFaults } from './secondStandard.ts';

/** Name of the unit behind a field; empty for counts and words. */
export const unitAt = (path: string): string => {
  const field = fieldAt(path);
  return field.kind === 'quantity' ? unitOf(field.dimension, units.value).name : '';
};

/** A whole number of sixteenths of an inch is written as a fraction, as on the drawing. */
const isFraction = ({ dimension }: QuantityField, value: number): boolean =>
  dimension === '1,0' && units.value === 'in-kip' && Number.isInteger(value * 16);

/**
 * The text a field shows: what is being typed as it is; sixteenths of an inch as a fraction; a number that was written with a unit of its
 * own, in the unit of the end.
 */
export const shown = (path: string): string => {
  const text = textOf(entry.value, path);
  if (editing.value === path) return text;
  const field = fieldAt(path);
  const reading = readField(entry.value, path);
  if (field.kind !== 'quantity' || reading === undefined || isFault(reading)) return text;
  if (reading.unit === '' && !isFraction(field, reading.value)) return text;
  return showQuantity(reading.value, field.dimension, units.value);
};

/** The same number, but for what stands between an inch and its fraction. */
const isSame = (one: string, other: string): boolean => {
  const plain = (text: string): string => text.trim().replace(/(\d)-(\d)/, '$1 $2');
  return plain(one) === plain(other);
};

/** How the text of a field was read, where that is worth saying: `read as 19.05 mm`; else empty. */
export const readAs = (path: string): string => {
  const field = fieldAt(path);
  const reading = readField(entry.value, path);
  if (field.kind === 'words' || reading === undefined || isFault(reading) || !reading.unusual) return '';
  const dimension = field.kind === 'count' ? '0,0' : field.dimension;
  if (editing.value !== path && reading.unit !== '') return '';
  const value =
    reading.unit === ''
      ? writeQuantity(reading.value, dimension, units.value)
      : showQuantity(reading.value, dimension, units.value);
  return isSame(value, textOf(entry.value, path)) ? '' : `read as ${value} ${unitAt(path)}`.trim();
};

/** The value was put in by the bench and nobody has touched it. */
export const isAssumed = (path: string): boolean => entry.value.assumed.includes(path);

/** The fault beside a field, in words; empty while it is being typed in, and for an empty field until faults are asked for. */
export const faultAt = (path: string): string => {
  if (editing.value === path) return '';
  if (textOf(entry.value, path) === '' && !demanded.value) return '';
  const all = path.startsWith('sheet.beside.') ? secondFaults.value : faults.value;
  return all.find((one) => one.path === path)?.text ?? '';
};
