/** A number as it was read, or the readings between which the text leaves the choice open. */
export type NumberRead =
  | { readonly value: number; readonly fraction: boolean }
  | { readonly ambiguous: readonly [grouped: string, decimal: string] }
  | undefined;

const mixed = /^(\d+)(?:\s+|\s*-\s*)(\d+)\s*\/\s*(\d+)$/;
const fraction = /^(\d+)\s*\/\s*(\d+)$/;
const exponent = /^\d+(?:\.\d+)?e[+-]?\d{1,3}$/i;
const plain = /^(\d*)(?:[.,](\d*))?$/;
const spaced = /^(\d{1,3}(?: \d{3})+)(?:[.,](\d*))?$/;
const grouped = /^\d{1,3}([.,])\d{3}(?:\1\d{3})+$/;
const pointed = /^(\d{1,3}(?:,\d{3})+)\.(\d*)$/;
const comma = /^(\d{1,3}(?:\.\d{3})+),(\d*)$/;

/**
 * Reads a number without sign or unit, as people write it: `1234.5`, `1 234,5`, `1,234.5`, `3/4`, `1-1/2`, `1 1/2`, `1e3`. Three digits behind
 * a single point or comma may be a group of thousands: `1.234` stays open, unless `small` says that no such number is meant. Undefined for
 * what is no number.
 */
export const readNumber = (text: string, small = false): NumberRead => {
  const parts = mixed.exec(text) ?? fraction.exec(text);
  if (parts) return fractionOf(parts.slice(1).map(Number));
  if (exponent.test(text)) return decimal(text);
  if (grouped.test(text)) return decimal(text.replace(/[.,]/g, ''));
  const groups = spaced.exec(text) ?? pointed.exec(text) ?? comma.exec(text);
  if (groups) return decimal(`${groups[1]!.replace(/\D/g, '')}.${groups[2] ?? ''}`);
  const [, whole = '', behind] = plain.exec(text) ?? [];
  if (whole === '' && !behind) return undefined;
  if (behind?.length === 3 && /^[1-9]\d{0,2}$/.test(whole) && !(small && text.includes('.'))) {
    return { ambiguous: [`${whole}${behind}`, `${whole}.${behind}0`] };
  }
  return decimal(`${whole || '0'}.${behind ?? ''}`);
};

const decimal = (text: string): NumberRead => {
  const value = Number(text);
  return Number.isFinite(value) ? { value, fraction: false } : undefined;
};

const fractionOf = (numbers: readonly number[]): NumberRead => {
  const [whole, over, under] = numbers.length === 3 ? numbers : [0, ...numbers];
  if (!under || (whole! > 0 && over! >= under)) return undefined;
  return { value: whole! + over! / under, fraction: true };
};
