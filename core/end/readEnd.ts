import type * as z from 'zod/mini';
import { nearest } from '../steel/nearest.ts';
import { type Fault, fault } from './fault.ts';
import { jointFaults } from './jointFaults.ts';
import { knownKeys } from './knownKeys.ts';
import { type End, endSchema } from './schema.ts';

/** Words by which people ask for what this version does not cover; each is refused by name. */
const notCovered: ReadonlySet<string> = new Set([
  'slot',
  'slots',
  'flush-flange',
  'flushFlange',
  'one-sided-trim',
  'oneSidedTrim',
  'skew',
  'slope',
  'uplift',
]);

type Issue = z.core.$ZodIssue;

const pathOf = (path: readonly PropertyKey[]): string => path.map(String).join('.');

const valueAt = (input: unknown, path: readonly PropertyKey[]): unknown => {
  let value = input;
  for (const key of path) {
    if (typeof value !== 'object' || value === null) return undefined;
    value = (value as Record<PropertyKey, unknown>)[key];
  }
  return value;
};

/** What was given, short enough to be repeated in a sentence. */
const shown = (value: unknown): unknown => {
  if (typeof value === 'number') return Number.isFinite(value) ? value : String(value);
  if (typeof value === 'string') return value.length > 60 ? `${value.slice(0, 60)}…` : value;
  if (typeof value === 'boolean' || value === null || value === undefined) return value ?? null;
  return Array.isArray(value) ? 'a list' : 'an object';
};

/** What a size must pass: more than nothing, or the least that is read. */
const lowerBound = (minimum: number, value: unknown): unknown =>
  minimum < 1 && typeof value === 'number' && value <= 0 && minimum > 0 ? { above: 0 } : { least: minimum };

/** The branch of a union that the writer most likely meant. */
const likelyBranch = (branches: readonly (readonly Issue[])[]): readonly Issue[] => {
  const depth = (issues: readonly Issue[]) => Math.max(0, ...issues.map(({ path }) => path.length));
  return [...branches].sort((a, b) => depth(b) - depth(a) || b.length - a.length)[0] ?? [];
};

const unknownKeys = (
  issue: Issue & { code: 'unrecognized_keys' },
  path: readonly PropertyKey[],
  input: unknown,
): Fault[] =>
  issue.keys.slice(0, 20).map((key) => {
    const at = pathOf([...path, key]);
    const given = shown(valueAt(input, [...path, key]));
    if (notCovered.has(key)) return fault('not-covered', at, given, key);
    return fault('unknown-field', at, given, nearest(key, knownKeys(path), 3));
  });

const faultsOf = (issue: Issue, input: unknown, above: readonly PropertyKey[] = []): Fault[] => {
  const path = [...above, ...issue.path];
  const value = valueAt(input, path);
  const at = pathOf(path);
  switch (issue.code) {
    case 'unrecognized_keys':
      return unknownKeys(issue, path, input);
    case 'invalid_union': {
      if (value === undefined) return [fault('missing', at, null, null)];
      const branch = likelyBranch(issue.errors);
      if (branch.length > 0) return branch.flatMap((one) => faultsOf(one, input, path));
      return [fault('not-one-of', at, shown(value), 'options' in issue ? issue.options : null)];
    }
    case 'invalid_type': {
      if (value === undefined) return [fault('missing', at, null, issue.expected)];
      const numeric = issue.expected === 'number' || issue.expected === 'int';
      return [fault(numeric ? 'not-a-number' : 'wrong-kind', at, shown(value), issue.expected)];
    }
    case 'invalid_value':
      return [fault(value === undefined ? 'missing' : 'not-one-of', at, shown(value), issue.values)];
    case 'too_small':
      return [fault('too-small', at, shown(value), lowerBound(Number(issue.minimum), value))];
    case 'too_big':
      return [fault('too-big', at, shown(value), { most: Number(issue.maximum) })];
    default:
      return [fault('not-understood', at, shown(value), null)];
  }
};

/** Deepest nesting and longest list of faults that a reply will carry. */
const MOST_FAULTS = 50;

/** Reads an end from parsed JSON: the end, or every fault in its form. Never throws, whatever it is given. */
export const readEnd = (input: unknown): { readonly end: End } | { readonly faults: readonly Fault[] } => {
  const parsed = endSchema.safeParse(input);
  if (!parsed.success) {
    return { faults: parsed.error.issues.flatMap((issue) => faultsOf(issue, input)).slice(0, MOST_FAULTS) };
  }
  // The schema library passes over this one key; an option of that name is as unknown as any other.
  if (parsed.data.options && Object.hasOwn((input as End).options ?? {}, '__proto__')) {
    return { faults: [fault('unknown-option', 'options.__proto__', '__proto__', null)] };
  }
  const { reaction } = parsed.data;
  if (typeof reaction === 'number' && reaction < 0) {
    return { faults: [fault('uplift', 'reaction', reaction, { least: 0 })] };
  }
  const faults = jointFaults(parsed.data);
  return faults.length > 0 ? { faults } : { end: parsed.data };
};
