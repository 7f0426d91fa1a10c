import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import { badEnds, goodEnds } from '../../support/published.ts';

const faultsOf = (input: unknown) => {
  const outcome = checkEnd(input);
  return 'faults' in outcome ? outcome.faults : [];
};

describe('an end that cannot be computed is refused by name', () => {
  test.each(badEnds())('$name', ({ end, faults }) => {
    const given = faultsOf(end);
    expect(given.map(({ code, path }) => ({ code, path }))).toEqual(faults);
    for (const { text } of given) {
      expect(text).toMatch(/^[A-Z].+\.$/);
      expect(text).not.toMatch(/undefined|\[object|NaN|\{/);
    }
  });

  test('numbers that are not finite are refused, whichever field they stand in', () => {
    const end = goodEnds().find(({ name }) => name === 'example')!.end;
    for (const value of [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]) {
      expect(faultsOf({ ...end, setback: value })[0]).toMatchObject({ code: 'not-a-number', path: 'setback' });
      expect(faultsOf({ ...end, reaction: value })[0]).toMatchObject({ path: 'reaction' });
    }
  });

  test('a misspelt name brings the nearest known ones', () => {
    const end = goodEnds().find(({ name }) => name === 'example')!.end;
    expect(faultsOf({ ...end, beam: { section: 'UB 406x178x61', grade: 'S355JR' } })[0]!.limit).toContain(
      'UB 406x178x60',
    );
    expect(faultsOf({ ...end, setbak: 1 })[0]).toMatchObject({
      code: 'unknown-field',
      limit: expect.arrayContaining(['setback']),
    });
    expect(faultsOf({ ...end, beam: { section: 'IPE 300', grade: 'S355' } })[0]!.limit).toContain('S355JR');
  });

  test('any JSON at all is answered, and never by an exception', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (input) => {
        expect(faultsOf(input).length).toBeGreaterThan(0);
      }),
    );
  });

  test('a good end with one value replaced by anything gives a report or named faults', () => {
    const ends = goodEnds();
    fc.assert(
      fc.property(fc.constantFrom(...ends), fc.jsonValue(), fc.nat(), ({ end }, value, pick) => {
        const copy = structuredClone(end);
        const places: [Record<string, unknown>, string][] = [];
        const walk = (object: Record<string, unknown>) => {
          for (const [key, inner] of Object.entries(object)) {
            places.push([object, key]);
            if (typeof inner === 'object' && inner !== null) walk(inner as Record<string, unknown>);
          }
        };
        walk(copy);
        const [object, key] = places[pick % places.length]!;
        object[key] = value;
        const outcome = checkEnd(copy, { working: true });
        if ('faults' in outcome) expect(outcome.faults.length).toBeGreaterThan(0);
        else expect(JSON.stringify(outcome.report)).not.toMatch(/NaN|Infinity/);
      }),
      { numRuns: 600 },
    );
  });
});

describe('every value that was not given is said to be assumed', () => {
  test('an end that says as little as it may', () => {
    const outcome = checkEnd(goodEnds().find(({ name }) => name === 'nothing-said')!.end);
    if ('faults' in outcome) throw new Error(outcome.faults[0]!.text);
    const codes = outcome.report.assumptions.map(({ code }) => code);
    for (const code of ['level', 'threads', 'holes', 'columns', 'tie', 'radius', 'electrode']) {
      expect(codes).toContain(`${code}-assumed`);
    }
  });
});
