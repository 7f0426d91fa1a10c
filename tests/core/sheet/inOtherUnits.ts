import { INCH, KIP } from '../../../core/units/systems.ts';

const counts = new Set(['rows', 'columns', 'quantity', 'ofWebShear']);
const forces = new Set(['reaction', 'tie', 'otherReaction']);
const strengths = new Set(['fy', 'fu', 'electrode']);

/** Sixteenths of an inch and hundredths of kip and ksi; tenths of mm, kN and MPa. */
const converted = (key: string, value: number, toInches: boolean): number => {
  if (counts.has(key) || value === 0) return value;
  const size = forces.has(key) ? KIP / 1000 : strengths.has(key) ? KIP / INCH ** 2 : INCH;
  if (!toInches) return Number((value * size).toFixed(1));
  return size === INCH ? Math.max(1, Math.round((value / size) * 16)) / 16 : Number((value / size).toFixed(2));
};

const walked = (key: string, value: unknown, toInches: boolean): unknown => {
  if (typeof value === 'number') return converted(key, value, toInches);
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(Object.entries(value).map(([name, one]) => [name, walked(name, one, toInches)]));
};

/** Much the same end in the other units, its sizes as a shop there would set them out. */
export const inOtherUnits = (end: { units: string }): object => {
  const toInches = end.units === 'mm-kN';
  return { ...(walked('', end, toInches) as object), units: toInches ? 'in-kip' : 'mm-kN' };
};
