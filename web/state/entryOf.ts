import type { End } from '../../core/end/schema.ts';
import { writeQuantity } from '../../core/units/printQuantity.ts';
import type { UnitSystem } from '../../core/units/systems.ts';
import type { Entry } from './entry.ts';
import { fieldAt } from './fields.ts';
import { LEGS, type Legs } from './joined.ts';

/** Objects that stand where a name or a number could, and what the bench calls that way of giving the value. */
const otherWay: readonly (readonly [pattern: RegExp, by: string])[] = [
  [/^beam\.section$/, 'sizes'],
  [/\.grade$/, 'strength'],
  [/^reaction$/, 'share'],
];

const isPart = (path: string): boolean => path === 'top' || path === 'bottom' || path === 'support';

const written = (path: string, value: number, units: UnitSystem): string => {
  const field = fieldAt(path);
  return writeQuantity(value, field.kind === 'quantity' ? field.dimension : '0,0', units);
};

const collect = (value: unknown, path: string, units: UnitSystem, texts: Record<string, string>): void => {
  if (value === null) texts[path] = 'none';
  else if (typeof value === 'number') texts[path] = written(path, value, units);
  else if (typeof value === 'string') texts[path] = value;
  else if (typeof value === 'object') {
    if (isPart(path)) texts[path] = 'on';
    const by = otherWay.find(([pattern]) => pattern.test(path))?.[1];
    if (by) texts[`${path}.by`] = by;
    for (const [key, one] of Object.entries(value)) collect(one, path === '' ? key : `${path}.${key}`, units, texts);
  }
};

const legsOf = ({ webWeld, supportWeld }: Extract<End['joint'], { cleat: unknown }>['cleat']): Legs => {
  if (webWeld) return 'web-welded';
  return supportWeld ? 'support-welded' : 'bolted';
};

/** The entry from which `endOf` makes this end again, value for value. */
export const entryOf = (end: End): Entry => {
  const { units, ...rest } = end;
  const texts: Record<string, string> = {};
  collect(rest, '', units, texts);
  if ('cleat' in end.joint) texts[LEGS] = legsOf(end.joint.cleat);
  for (const [path, text] of Object.entries(texts)) if (text === '') delete texts[path];
  return { units, texts, assumed: [] };
};
