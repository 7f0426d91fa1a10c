import { type Fault, fault } from '../../core/end/fault.ts';
import type { Dimension } from '../../core/units/dimension.ts';
import { isRead, readQuantity } from '../../core/units/readQuantity.ts';
import { type Entry, textOf } from './entry.ts';
import { fieldAt } from './fields.ts';

/** A number read from a field. */
export interface FieldReading {
  readonly value: number;
  /** The unit written with it, if any. */
  readonly unit: string;
  /** Say how it was read. */
  readonly unusual: boolean;
}

/** What stands in the number field at a path: its value in the entry's units, nothing, or why it cannot be read. */
export const readField = (entry: Entry, path: string): FieldReading | undefined | Fault => {
  const field = fieldAt(path);
  const text = textOf(entry, path);
  if (field.kind === 'words' || text.trim() === '') return undefined;
  const dimension: Dimension = field.kind === 'count' ? '0,0' : field.dimension;
  const reading = readQuantity(text, dimension, entry.units);
  return isRead(reading) ? reading : fault(reading.code, path, reading.given, reading.limit);
};

export const isFault = (reading: FieldReading | undefined | Fault): reading is Fault =>
  reading !== undefined && 'code' in reading;
