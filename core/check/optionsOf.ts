import type { Facts } from '../end/facts.ts';
import { type Fault, fault } from '../end/fault.ts';
import type { End } from '../end/schema.ts';
import type { Standard } from '../standards/standard.ts';

const defaultsOf = new WeakMap<Standard, Facts['options']>();

/** Every option of a standard at its default. */
const defaultOptions = (standard: Standard): Facts['options'] => {
  const known = defaultsOf.get(standard);
  if (known) return known;
  const made = Object.fromEntries(Object.entries(standard.options).map(([key, values]) => [key, values[0]]));
  defaultsOf.set(standard, made);
  return made;
};

/** The options in force: those given, the others at their defaults. What is not known is added to `faults`. */
export const optionsOf = (given: End['options'], standard: Standard, faults: Fault[]): Facts['options'] => {
  const known = standard.options;
  const defaults = defaultOptions(standard);
  if (!given) return defaults;
  const inForce = { ...defaults };
  for (const [key, value] of Object.entries(given)) {
    const values = Object.hasOwn(known, key) ? known[key] : undefined;
    if (!values) faults.push(fault('unknown-option', `options.${key}`, key, Object.keys(known)));
    else if (!values.includes(value)) {
      faults.push(fault('unknown-option-value', `options.${key}`, value, values));
    } else inForce[key] = value;
  }
  return inForce;
};
