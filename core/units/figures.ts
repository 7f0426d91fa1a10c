/** Narrow no-break space: groups the digits of long numbers, as on a drawing. */
export const THIN = '\u202f';
export const MINUS = '\u2212';

/** Groups the whole digits in threes from five digits up. */
const grouped = (digits: string): string => {
  const point = digits.indexOf('.');
  const length = point < 0 ? digits.length : point;
  if (length < 5) return digits;
  return digits.slice(0, length).replace(/\B(?=(\d{3})+$)/g, THIN) + digits.slice(length);
};

const signed = (value: number, digits: string): string =>
  (value < 0 && Number(digits) !== 0 ? MINUS : '') + grouped(digits);

/** Closing zeros after the point dropped. */
const unpadded = (digits: string): string => {
  if (!digits.includes('.')) return digits;
  let end = digits.length;
  while (digits[end - 1] === '0') end -= 1;
  return digits.slice(0, digits[end - 1] === '.' ? end - 1 : end);
};

/** A value to so many significant digits, closing zeros dropped, without exponent. */
export const significant = (value: number, digits: number): string => {
  const figures = Math.abs(value).toPrecision(digits);
  // Most numbers need no way round by their value, which takes twice as long.
  if (!figures.includes('e') && value !== 0) return signed(value, unpadded(figures));
  const size = Number(figures);
  if (size === 0) return '0';
  const text = size >= 1e-6 && size < 1e21 ? String(size) : size.toFixed(20).replace(/\.?0+$/, '');
  return signed(value, text);
};

/** A value to a fixed number of places. */
export const fixed = (value: number, places: number): string => signed(value, Math.abs(value).toFixed(places));

/** A dimension as a drawing writes it: up to `places` places, closing zeros dropped. */
export const plain = (value: number, places = 2): string => {
  const text = Math.abs(value).toFixed(places);
  return signed(value, text.includes('.') ? text.replace(/\.?0+$/, '') : text);
};

/** A reaction at which something fails, to 0.1 and rounded down, so that print never promises more than was computed. */
export const roundedDown = (value: number, places = 1): string => {
  const step = 10 ** places;
  // Values that sit on a step up to rounding noise stay on it.
  return fixed(Math.floor(value * step + 1e-9) / step, places);
};

/** A ratio to the nearest 0.01; one above 1 never prints below 1.01, one that holds never above 1.00. */
export const ratio = (value: number): string => {
  if (value > 1) return fixed(Math.max(value, 1.01), 2);
  return fixed(value, 2);
};
