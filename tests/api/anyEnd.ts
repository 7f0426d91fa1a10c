import fc from 'fast-check';
import { exampleEnd } from './exampleEnd.ts';

type Path = readonly (string | number)[];

const pathsOf = (value: unknown, at: Path = []): Path[] =>
  typeof value === 'object' && value !== null
    ? Object.entries(value).flatMap(([key, one]) => [[...at, key], ...pathsOf(one, [...at, key])])
    : [];

/** An end that uses every field of the file. */
export const fullEnd = {
  ...exampleEnd,
  bottom: { length: 60, depth: 30, radius: 10 },
  joint: { ...exampleEnd.joint, bolts: { ...exampleEnd.joint.bolts, columns: 2, gauge: 60, hole: 22 } },
  support: {
    kind: 'beam-web',
    section: 'UB 457x191x67',
    thickness: 9,
    grade: 'S355JR',
    topOfSteel: 0,
    otherReaction: 0,
  },
  options: { 'elastic-shear': 'report' },
  piece: 'K-207',
  end: 'start',
  quantity: 2,
  sheet: { job: 'Invented store', drawing: 'S-1', date: '2031-01-31', revision: 'A', paper: 'Letter', decimal: ',' },
};

const paths = pathsOf(fullEnd);

/** Values that stand on the edges of what a field takes. */
const odd = fc.oneof(
  fc.constantFrom<unknown>(
    null,
    true,
    false,
    0,
    -0,
    -1,
    1,
    1e-300,
    1e300,
    1e21,
    0.1,
    30,
    '',
    ' ',
    [],
    {},
    'S355JR',
    'M20',
    'in',
  ),
  fc.double({ noNaN: true, noDefaultInfinity: true }),
  fc.integer({ min: -5, max: 2000 }),
  fc.string(),
  fc.constant('x'.repeat(300)),
  fc.constant({ fy: 355, fu: 470 }),
  fc.constant({ depth: 400, width: 180, flange: 13, web: 8, radius: 10 }),
  fc.constant({ ofWebShear: 0.5 }),
  fc.jsonValue(),
);

const changed = (value: unknown, [key, ...rest]: Path, to: unknown): unknown => {
  if (key === undefined) return to;
  if (typeof value !== 'object' || value === null) return value;
  const { [key]: inner, ...others } = value as Record<string, unknown>;
  const next = rest.length === 0 ? to : changed(inner, rest, to);
  return next === undefined ? others : { ...others, [key]: next };
};

const change = fc.record({
  path: fc.constantFrom(...paths),
  // Undefined takes the field away.
  to: fc.oneof({ weight: 3, arbitrary: odd }, { weight: 1, arbitrary: fc.constant(undefined) }),
  name: fc.option(fc.oneof(fc.string(), fc.constantFrom('slot', 'skew', 'constructor', 'toString', 'hole')), {
    freq: 6,
  }),
});

/** Ends as people and programs get them wrong: a full end with a few fields changed, taken away or added. */
export const anyEnd: fc.Arbitrary<unknown> = fc
  .array(change, { minLength: 1, maxLength: 3 })
  .map((changes) =>
    changes.reduce<unknown>(
      (end, { path, to, name }) => changed(end, name === null ? path : [...path.slice(0, -1), name], to),
      fullEnd,
    ),
  )
  .filter((end) => !JSON.stringify(end).includes('__proto__'));

const numeric = paths.filter((path) => {
  const value = path.reduce<unknown>((at, key) => (at as Record<string, unknown>)[key], fullEnd);
  return typeof value === 'number';
});

/** Ends of the right form whose numbers are anything at all. */
export const anyNumbers: fc.Arbitrary<unknown> = fc
  .array(
    fc.tuple(
      fc.constantFrom(...numeric),
      fc.oneof(
        fc.double({ min: 0, max: 1e308, noNaN: true }),
        fc.double({ min: 0, max: 2000, noNaN: true }),
        fc.integer({ min: 0, max: 30 }),
      ),
    ),
    { minLength: 1, maxLength: 4 },
  )
  .map((changes) => changes.reduce<unknown>((end, [path, to]) => changed(end, path, to), fullEnd));
