import { describe, expect, test } from 'vitest';
import { numberOf } from '../../../core/formula/number.ts';
import {
  atMost,
  constant,
  cubed,
  givenOf,
  inMPa,
  least,
  megapascals,
  minus,
  most,
  over,
  pick,
  plus,
  power,
  root,
  squared,
  step,
  times,
} from '../../../core/formula/tree.ts';
import { workingOf } from '../../../core/formula/working.ts';
import { calculate } from '../../support/calculator.ts';
import { dimensionFromLeaves } from '../../support/dimensions.ts';

interface Plate {
  t: number;
  w: number;
  fy: number;
  V: number;
}
const given = givenOf<Plate>();
const t = given('t', '1,0', (f) => f.t);
const w = given('w', '1,0', (f) => f.w);
const fy = given('f_y', '-2,1', (f) => f.fy);
const V = given('V', '0,1', (f) => f.V);
const plate: Plate = { t: 10, w: 200, fy: 355, V: 150_000 };
const read = (tree: Parameters<typeof numberOf>[0], facts: Plate = plate) => numberOf(tree, facts);

describe('the compiler refuses what no dimension allows', () => {
  test('stress + area, force against stress, a length taken as a ratio', () => {
    // @ts-expect-error a stress and an area have no sum
    plus(fy, times(t, w));
    // @ts-expect-error an area and a force have no sum
    plus(times(t, w), times(fy, t, w));
    // @ts-expect-error a force has no least with a stress
    least(V, fy);
    // @ts-expect-error a length is no pure number
    minus(1, t);
    // @ts-expect-error a length and a stress do not compare
    atMost(t, fy);
    // @ts-expect-error only a stress is MPa
    inMPa(t);
    // @ts-expect-error a broken power needs a pure ratio
    power(t, 1.65);
    expect(true).toBe(true);
  });

  test('what the compiler lets pass works out from the leaves too', () => {
    const area = times(t, w);
    const trees = [
      step('F', times(0.9, fy, area)),
      over(times(fy, t, squared(w)), 6),
      root(plus(squared(over(V, w)), squared(over(times(6, V, t), squared(w))))),
      megapascals(times(290, root(over(5.34, inMPa(fy))))),
      cubed(w),
      most(over(t, w), 0.1),
    ];
    for (const tree of trees) expect(() => dimensionFromLeaves(tree)).not.toThrow();
  });

  test('a tree whose declared dimension is wrong is found out', () => {
    const liar = { ...times(t, w), dimension: '3,0' as const };
    expect(() => dimensionFromLeaves(liar)).toThrow('works out to');
    const mixed = { op: 'plus', of: [t, fy], dimension: '1,0' } as unknown as Parameters<typeof dimensionFromLeaves>[0];
    expect(() => dimensionFromLeaves(mixed)).toThrow('against');
  });
});

describe('numbers', () => {
  test('come out of the same tree as the working, to the last bit', () => {
    const R = step('R', times(constant('φ', 0.9), fy, step('A', times(t, w))));
    expect(read(R)).toBe(0.9 * 355 * (10 * 200));
    const rows = workingOf([R], plate, 'mm-kN');
    expect(rows.map(({ symbol }) => symbol)).toEqual(['A', 'R']);
    expect(rows[1]!.value).toBe(read(R) / 1000);
  });

  test('a step used twice is computed once, and afresh from other facts', () => {
    let reads = 0;
    const counted = givenOf<Plate>()('t', '1,0', (f) => {
      reads += 1;
      return f.t;
    });
    const shared = step('s', times(2, counted));
    const both = plus(shared, times(3, shared));
    expect(read(both)).toBe(80);
    expect(reads).toBe(1);
    expect(read(both, { ...plate, t: 20 })).toBe(160);
    expect(reads).toBe(2);
  });

  test('a choice follows the input and names the side it took', () => {
    const k = step('k', pick([[atMost(over(w, t), 15), constant('1', 1)]], over(15, over(w, t))));
    expect(read(k)).toBe(0.75);
    expect(workingOf([k], plate, 'mm-kN')[0]).toMatchObject({ expression: '15 / (w / t)', note: 'w / t = 20 > 15' });
    expect(read(k, { ...plate, t: 20 })).toBe(1);
  });
});

describe('number lines', () => {
  const cases = [
    step('a', over(t, times(w, t))),
    step('b', over(over(t, w), over(w, t))),
    step('c', minus(t, minus(w, t))),
    step('d', minus(t, plus(w, t))),
    step('e', times(V, root(plus(squared(over(t, w)), squared(over(1, 3)))))),
    step('f', times(over(V, t), over(w, t))),
    step('g', least(times(0.6, fy, times(t, w)), V)),
    step('h', squared(plus(t, w))),
    step('i', power(over(w, t), 1.65)),
    step('j', over(times(V, plus(t, w)), 7)),
    step('k', over(V, times(2, w))),
    step('l', times(plus(t, w), minus(w, t), fy)),
    step('m', plus(V, times(fy, squared(t)))),
    step('n', root(over(inMPa(fy), 6.895))),
    step('o', megapascals(over(inMPa(fy), root(2)))),
  ];

  test.each(cases)('$symbol gives its value when worked out by itself, metric and inch', (tree) => {
    for (const system of ['mm-kN', 'in-kip'] as const) {
      const rows = workingOf([tree], plate, system);
      for (const { numbers, value } of rows) {
        expect(Math.abs(calculate(numbers) - value), numbers).toBeLessThanOrEqual(2e-5 * Math.abs(value));
      }
    }
  });

  test('brackets stand where a pencil needs them', () => {
    const [row] = workingOf([step('q', over(times(6, V, t), times(2, squared(w))))], plate, 'mm-kN');
    expect(row).toMatchObject({ expression: '6 V t / (2 w²)', unit: 'N/mm' });
    expect(calculate(row!.numbers)).toBeCloseTo(112.5, 6);
  });
});
