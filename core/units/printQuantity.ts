import type { Dimension } from './dimension.ts';
import { plain } from './figures.ts';
import type { UnitSystem } from './systems.ts';

const SIXTEENTHS = 16;

/** A whole number of sixteenths as a fraction, `4-1/2`; undefined for a value that is none. */
const sixteenths = (value: number, between: string): string | undefined => {
  const parts = Math.abs(value) * SIXTEENTHS;
  if (!Number.isInteger(parts) || parts > 1e6) return undefined;
  const whole = Math.trunc(parts / SIXTEENTHS);
  let over = parts % SIXTEENTHS;
  let under = SIXTEENTHS;
  while (over > 0 && over % 2 === 0) {
    over /= 2;
    under /= 2;
  }
  const size = over === 0 ? String(whole) : `${whole === 0 ? '' : `${whole}${between}`}${over}/${under}`;
  return value < 0 ? `-${size}` : size;
};

const inInches = (dimension: Dimension, system: UnitSystem): boolean => dimension === '1,0' && system === 'in-kip';

/**
 * A value as text for a field: inches in sixteenths where they are exact, else the shortest decimal. `readQuantity` reads it back as the very
 * same value, so a closing zero stands where three digits behind the point could be taken for thousands.
 */
export const writeQuantity = (value: number, dimension: Dimension, system: UnitSystem): string => {
  const fraction = inInches(dimension, system) ? sixteenths(value, '-') : undefined;
  if (fraction !== undefined) return fraction;
  const text = String(value);
  return /^-?[1-9]\d{0,2}\.\d{3}$/.test(text) ? `${text}0` : text;
};

/** A value for reading: two places in mm and kN, fractions or three places in inches. */
export const showQuantity = (value: number, dimension: Dimension, system: UnitSystem): string => {
  if (!inInches(dimension, system)) return plain(value, dimension === '0,0' ? 4 : 2);
  return sixteenths(Number(value.toPrecision(9)), ' ') ?? plain(value, 3);
};
