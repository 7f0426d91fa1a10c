import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { canonicalJson } from '../../../core/end/canonical.ts';
import { webBoltsOf } from '../../../core/end/jointParts.ts';
import { readEnd } from '../../../core/end/readEnd.ts';
import type { End } from '../../../core/end/schema.ts';
import demo from '../../../fixtures/demo/citrus-packhouse.json' with { type: 'json' };
import endPlate from '../../../fixtures/input/good/end-plate.json' with { type: 'json' };
import { endOf } from '../../../web/state/endOf.ts';
import { type Entry, textOf, withText } from '../../../web/state/entry.ts';
import { entryOf } from '../../../web/state/entryOf.ts';
import { numberFields } from '../../../web/state/fields.ts';
import { fileText } from '../../../web/state/fileText.ts';
import { switchUnits } from '../../../web/state/switchUnits.ts';

const read = (input: unknown): End => {
  const found = readEnd(input);
  if ('faults' in found) throw new Error(JSON.stringify(found.faults));
  return found.end;
};

const fileOf = (entry: Entry): string => fileText(read(endOf(entry).input));

const lengths = fc.oneof(fc.double({ min: 0.001, max: 2000, noNaN: true }), fc.integer({ min: 1, max: 1200 }));
const maybe = <T>(it: fc.Arbitrary<T>) => fc.option(it, { nil: undefined });
const word = fc.string({ minLength: 1, maxLength: 12 }).filter((text) => text.trim() === text && text !== '');
const strengths = fc.record({ fy: lengths, fu: lengths });
const cope = fc.option(fc.record({ length: lengths, depth: lengths, radius: maybe(lengths) }), { nil: null });
const bolts = fc.record({
  size: fc.constantFrom('M20', '3/4'),
  grade: fc.oneof(fc.constantFrom('8.8'), fc.record({ fu: lengths })),
  threads: maybe(fc.constantFrom('in', 'out')),
  rows: fc.integer({ min: 1, max: 30 }),
  columns: maybe(fc.integer({ min: 1, max: 6 })),
  pitch: maybe(lengths),
  gauge: maybe(lengths),
  holes: maybe(fc.constantFrom('drilled', 'punched')),
  hole: maybe(lengths),
});
const ply = fc.record({
  thickness: lengths,
  grade: fc.oneof(word, strengths),
  topEdge: lengths,
  bottomEdge: lengths,
  edge: lengths,
});
const place = { firstRow: lengths, endDistance: lengths, bolts };
const joint = fc.oneof(
  fc.record({
    kind: fc.constant('fin-plate'),
    ...place,
    plate: ply,
    weld: fc.record({ leg: lengths, electrode: maybe(lengths) }),
  }),
  fc.record({ kind: fc.constant('web-bolts'), ...place, ply }),
);
const sizes = fc.record({
  depth: lengths,
  width: lengths,
  flange: lengths,
  web: lengths,
  radius: lengths,
  family: maybe(fc.constantFrom('I', 'channel')),
});
const ends = fc.record({
  mark: maybe(word),
  standard: fc.constant('sans-10162-1'),
  units: fc.constantFrom('mm-kN', 'in-kip'),
  reaction: fc.oneof(lengths, fc.record({ ofWebShear: fc.double({ min: 0, max: 2, noNaN: true }) })),
  level: maybe(fc.constantFrom('factored', 'service')),
  tie: maybe(lengths),
  beam: fc.record({ section: fc.oneof(word, sizes), grade: fc.oneof(word, strengths) }),
  top: maybe(cope),
  bottom: maybe(cope),
  setback: lengths,
  joint,
  support: maybe(
    fc.record({
      kind: fc.constantFrom('beam-web', 'column-flange'),
      section: maybe(word),
      topOfSteel: maybe(fc.double({ min: -500, max: 500, noNaN: true })),
    }),
  ),
  options: maybe(fc.record({ 'bolt-group': fc.constantFrom('elastic', 'instantaneous-centre') })),
  quantity: maybe(fc.integer({ min: 1, max: 500 })),
  sheet: maybe(
    fc.record({
      job: word,
      decimal: maybe(fc.constantFrom('.', ',')),
      words: maybe(fc.constantFrom('north-america', 'commonwealth')),
      beside: maybe(fc.record({ standard: word, reaction: maybe(lengths) })),
    }),
  ),
});

describe('an end and the fields of the bench', () => {
  test('an end that is opened and saved again is the same end, value for value', () => {
    fc.assert(
      fc.property(ends, (given) => {
        const end = read(JSON.parse(JSON.stringify(given)));
        const { input, faults } = endOf(entryOf(end));
        expect(faults).toEqual([]);
        expect(canonicalJson(input)).toBe(canonicalJson(end));
      }),
      { numRuns: 500 },
    );
  });

  test('the other units and back give the very same file, byte for byte', () => {
    fc.assert(
      fc.property(ends, (given) => {
        const entry = entryOf(read(JSON.parse(JSON.stringify(given))));
        const other = entry.units === 'mm-kN' ? 'in-kip' : 'mm-kN';
        const there = switchUnits(entry, other);
        expect(endOf(there).faults).toEqual([]);
        expect(fileOf(switchUnits(there, entry.units))).toBe(fileOf(entry));
      }),
      { numRuns: 500 },
    );
  });

  test('in the other units every size stands for the same length', () => {
    const entry = entryOf(read(demo));
    const there = endOf(switchUnits(entry, 'in-kip')).input as unknown as End;
    expect(there.units).toBe('in-kip');
    expect(there.setback * 25.4).toBe(12);
    expect(webBoltsOf(there.joint)!.firstRow * 25.4).toBe(85);
    expect(there.top!.length * 25.4).toBe(95);
  });

  test('a value typed with a unit of its own is converted alone, and survives the change of units exactly', () => {
    const entry = withText(entryOf(read(demo)), 'setback', '1/2"');
    expect(endOf(entry).input).toMatchObject({ setback: 12.7, joint: { firstRow: 85 } });
    expect(endOf(switchUnits(entry, 'in-kip')).input).toMatchObject({ setback: 0.5 });
  });

  test('changing any number changes that number and no other field', () => {
    const entry = entryOf(read(demo));
    const without = (of: Entry, path: string) => {
      const { [path]: _, ...others } = of.texts;
      return others;
    };
    for (const path of Object.keys(numberFields)) {
      const changed = withText(entry, path, '77');
      expect(without(changed, path)).toEqual(without(entry, path));
      expect(textOf(changed, path)).toBe('77');
    }
  });

  test('a text that cannot be read stays in its field, and is a fault there', () => {
    const entry = withText(entryOf(read(demo)), 'joint.bolts.pitch', 'seventy');
    expect(textOf(entry, 'joint.bolts.pitch')).toBe('seventy');
    expect(endOf(entry).faults).toEqual([
      { code: 'not-a-quantity', path: 'joint.bolts.pitch', given: 'seventy', limit: [] },
    ]);
    expect(endOf(entry).input).not.toHaveProperty('joint.bolts.pitch');
  });

  test('sizes of a part that is off, and of the other joint, are kept but not in the end', () => {
    const entry = entryOf(read(demo));
    const off = withText(withText(entry, 'top', 'none'), 'joint.kind', 'web-bolts');
    expect(endOf(off).input).toMatchObject({ top: null });
    expect(endOf(off).input).not.toHaveProperty('joint.plate');
    expect(endOf(off).input).not.toHaveProperty('joint.weld');
    const on = withText(withText(off, 'top', 'on'), 'joint.kind', 'fin-plate');
    expect(endOf(on).input).toEqual(endOf(entry).input);
  });

  test('bolts of a beam opposite are in the end once one of their sizes is there, while the joint is bolted to a web with a beam on its other side', () => {
    const bare = { kind: 'beam-web', thickness: 10, otherReaction: 90 } as const;
    const opposite = { firstRow: 100, rows: 3, pitch: 70, gauge: 140 };
    const entry = entryOf(read({ ...endPlate, support: { ...bare, opposite } }));
    const inEnd = (of: Entry) => (endOf(of).input.support as Record<string, unknown>).opposite;
    expect(inEnd(entry)).toEqual(opposite);
    expect(inEnd(entryOf(read({ ...endPlate, support: bare })))).toBeUndefined();
    for (const [path, text] of [
      ['support.otherReaction', ''],
      ['support.kind', 'column-flange'],
      ['joint.kind', 'fin-plate'],
    ] as const) {
      expect(inEnd(withText(entry, path, text)), path).toBeUndefined();
      expect(textOf(withText(entry, path, text), 'support.opposite.firstRow')).toBe('100');
    }
    const inches = endOf(switchUnits(entry, 'in-kip')).input.support as { opposite: typeof opposite };
    expect(inches.opposite).toMatchObject({ rows: 3, firstRow: 100 / 25.4 });
  });

  test('the file is readable JSON in the order of the trade', () => {
    const text = fileOf(entryOf(read(demo)));
    expect(JSON.parse(text)).toEqual(demo);
    expect(text.split('\n').map((line) => line.trim().split(':')[0])).toEqual([
      '{',
      '"mark"',
      '"standard"',
      '"units"',
      '"reaction"',
      '"beam"',
      '"top"',
      '"bottom"',
      '"setback"',
      '"joint"',
      '"kind"',
      '"firstRow"',
      '"endDistance"',
      '"bolts"',
      '"plate"',
      '"weld"',
      '},',
      '"support"',
      '"sheet"',
      '"job"',
      '"drawing"',
      '"loadCase"',
      '}',
      '}',
      '',
    ]);
  });
});
