import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearest } from '../../../core/steel/nearest.ts';

describe('the nearest names', () => {
  it('are the next sizes of the same kind first', () => {
    expect(nearest('A 25', ['B 25', 'A 10', 'A 20', 'A 30'], 2)).toEqual(['A 30', 'A 20']);
  });

  it('forgive a slip of the finger in letters and in digits', () => {
    expect(nearest('lenght', ['depth', 'length', 'radius'], 1)).toEqual(['length']);
    expect(nearest('A 203', ['A 230', 'A 90', 'A 500'], 1)).toEqual(['A 230']);
  });

  it('read a fraction as one number', () => {
    expect(nearest('2/3', ['1/2', '5/8', '7/8'], 1)).toEqual(['5/8']);
    expect(nearest('1/0', ['1/2', '5/8'], 2)).toHaveLength(2);
  });

  it('are never more than asked for, all known, none twice, and none for a word without letter or number', () => {
    const known = ['UB 1', 'UB 2', 'UC 1'];
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.nat(5), (word, count) => {
        const names = nearest(word, known, count);
        expect(names.length).toBeLessThanOrEqual(Math.min(count, 3));
        expect(new Set(names).size).toBe(names.length);
        for (const name of names) expect(known).toContain(name);
      }),
    );
    expect(nearest('-', known, 3)).toEqual([]);
  });

  it('of a name that is known begin with itself', () => {
    const known = ['S235JR', 'S275JR', 'S355JR', '300WA', '350WA'];
    for (const name of known) expect(nearest(name, known, 1)).toEqual([name]);
  });
});
