import { showQuantity, writeQuantity } from '../../core/units/printQuantity.ts';
import { unitOf } from '../../core/units/systems.ts';
import { demanded, editing, entry, faults, units } from './bench.ts';
import { textOf } from './entry.ts';
import { fieldAt } from './fields.ts';
import { isFault, readField } from './readField.ts';

/** Name of the unit behind a field; empty for counts and words. */
export const unitAt = (path: string): string => {
  const field = fieldAt(path);
  return field.kind === 'quantity' ? unitOf(field.dimension, units.value).name : '';
};

/** The text a field shows: what is being typed as it is; a number that was written with a unit of its own, in the unit of the end. */
export const shown = (path: string): string => {
  const text = textOf(entry.value, path);
  if (editing.value === path) return text;
  const field = fieldAt(path);
  const reading = readField(entry.value, path);
  if (field.kind !== 'quantity' || reading === undefined || isFault(reading) || reading.unit === '') return text;
  return showQuantity(reading.value, field.dimension, units.value);
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
  return value === textOf(entry.value, path) ? '' : `read as ${value} ${unitAt(path)}`.trim();
};

/** The value was put in by the bench and nobody has touched it. */
export const isAssumed = (path: string): boolean => entry.value.assumed.includes(path);

/** The fault beside a field, in words; empty while it is being typed in, and for an empty field until faults are asked for. */
export const faultAt = (path: string): string => {
  if (editing.value === path) return '';
  if (textOf(entry.value, path) === '' && !demanded.value) return '';
  return faults.value.find((one) => one.path === path)?.text ?? '';
};
