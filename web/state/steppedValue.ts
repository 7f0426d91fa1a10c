import type { Dimension } from '../../core/units/dimension.ts';
import { writeQuantity } from '../../core/units/printQuantity.ts';
import type { UnitSystem } from '../../core/units/systems.ts';
import type { Entry } from './entry.ts';
import { fieldAt, type QuantityField } from './fields.ts';
import { isFault, readField } from './readField.ts';

/** Steps in the unit of the system: a size's small, usual and big one. */
const sizes: Readonly<Record<UnitSystem, readonly [small: number, usual: number, big: number]>> = {
  'mm-kN': [1, 5, 10],
  'in-kip': [1 / 16, 1 / 4, 1 / 2],
};

const stepOf = ({ dimension, step }: QuantityField, units: UnitSystem, big: boolean): number => {
  const [small, usual, large] = sizes[units];
  if (dimension === '1,0') return big ? large : step === 1 ? small : usual;
  if (dimension === '0,0') return big ? 0.1 : 0.01;
  return big ? 10 * step : step;
};

/** The text of a field one step up or down; undefined where no number stands, or where the step would leave what the field can hold. */
export const steppedValue = (entry: Entry, path: string, direction: 1 | -1, big: boolean): string | undefined => {
  const field = fieldAt(path);
  const reading = readField(entry, path);
  if (field.kind === 'words' || reading === undefined || isFault(reading)) return undefined;
  if (field.kind === 'count') {
    const next = Math.round(reading.value) + direction;
    return next < field.least || next > field.most ? undefined : String(next);
  }
  const next = Number((reading.value + direction * stepOf(field, entry.units, big)).toPrecision(10));
  if (field.least === undefined ? next <= 0 : next < field.least) return undefined;
  const dimension: Dimension = field.dimension;
  return writeQuantity(next, dimension, entry.units);
};
