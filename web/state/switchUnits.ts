import { type UnitSystem, unitOf } from '../../core/units/systems.ts';
import type { Entry } from './entry.ts';
import { numberFields } from './fields.ts';
import { isFault, readField } from './readField.ts';

/**
 * The same end in the other units. Every bare number gets the unit that was meant when it was typed, so nothing is converted in what is kept,
 * and the way back gives the same end to the last digit. Only for entries whose fields can all be read.
 */
export const switchUnits = (entry: Entry, units: UnitSystem): Entry => {
  if (units === entry.units) return entry;
  const texts = { ...entry.texts };
  for (const [path, field] of Object.entries(numberFields)) {
    if (field.kind !== 'quantity' || field.dimension === '0,0') continue;
    const reading = readField(entry, path);
    if (reading === undefined || isFault(reading) || reading.unit !== '') continue;
    texts[path] = `${texts[path]!.trim()} ${unitOf(field.dimension, entry.units).name}`;
  }
  return { ...entry, units, texts };
};
