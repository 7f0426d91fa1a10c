import { describe, expect, test } from 'vitest';
import {
  type CopeAdvice,
  copeFromSupport,
  type ProposedCope,
  withCopes,
} from '../../../core/advice/copeFromSupport.ts';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import { adviceWordsFor } from '../../../core/words/adviceWords.ts';

type Json = Record<string, unknown>;

interface Told {
  readonly standard?: string;
  readonly beam?: string;
  readonly support?: Json | null;
  readonly firstRow?: number;
  readonly rows?: number;
  readonly columns?: number;
  readonly setback?: number;
  readonly gauge?: number;
}

/** UB 406x178x60, three M20 at 70, setback 10. */
const endOf = ({ standard, beam, support, firstRow, rows, columns, setback, gauge }: Told): Json => ({
  standard: standard ?? 'sans-10162-1',
  units: 'mm-kN',
  reaction: 150,
  beam: { section: beam ?? 'UB 406x178x60', grade: { fy: 355, fu: 470 } },
  top: { length: 300, depth: 20 },
  setback: setback ?? 10,
  joint: {
    kind: 'fin-plate',
    firstRow: firstRow ?? 100,
    endDistance: 45,
    bolts: { size: 'M20', grade: { fu: 830 }, rows: rows ?? 3, pitch: 70, columns: columns ?? 1, gauge: gauge ?? 60 },
    plate: { thickness: 10, grade: { fy: 355, fu: 470 }, topEdge: 40, bottomEdge: 40, edge: 50 },
    weld: { leg: 8 },
  },
  ...(support !== null && { support: { kind: 'beam-web', section: 'UB 533x210x92', ...support } }),
});

/** W18x50, three 3/4 in bolts at 3 in, setback 1/2 in, carried by a W21x62. */
const inchEnd: Json = {
  standard: 'aisc-360-lrfd',
  units: 'in-kip',
  reaction: 30,
  beam: { section: 'W18x50', grade: 'A992' },
  setback: 0.5,
  joint: {
    kind: 'fin-plate',
    firstRow: 3.25,
    endDistance: 1.75,
    bolts: { size: '3/4', grade: 'A325', rows: 3, pitch: 3 },
    plate: { thickness: 0.375, grade: 'A36', topEdge: 1.5, bottomEdge: 1.5, edge: 1.75 },
    weld: { leg: 0.25 },
  },
  support: { kind: 'beam-web', section: 'W21x62', topOfSteel: 0 },
};

const advised = (end: unknown, step?: number): CopeAdvice => {
  const found = copeFromSupport(end, step === undefined ? {} : { step });
  if ('faults' in found) throw new Error(found.faults.map(({ text }) => text).join(' '));
  return found.advice;
};
const rulesOf = (cope: ProposedCope | null) => cope?.sizes.map(({ rule }) => rule);

describe('a cope from the support', () => {
  test('the worked rule: past the flange by 10, 50 deep, corner 10', () => {
    // HE 200 B: b 200, t_w 9, t_f 15, r 18. Length (200 − 9)/2 − 10 + 10 = 95.5 -> 100. Depth max(50; 15 + 18; 12.8 + 10.2) = 50.
    const { top, unmet } = advised(endOf({ support: { section: 'HE 200 B' }, rows: 1 }));
    expect(top?.cope).toEqual({ length: 100, depth: 50, radius: 10 });
    expect(rulesOf(top)).toEqual(['past-flange', 'usual-depth', 'usual-radius']);
    expect(unmet.filter(({ id }) => id.startsWith('fit-cope'))).toEqual([]);
  });

  test('in North America: past the flange by 1/2 in, past the fillet to the next 1/4 in, corner 1/2 in', () => {
    // W21x62: b 8.24, t_w 0.4, k 1.12. Length (8.24 − 0.4)/2 − 0.5 + 0.5 = 3.92 -> 4. Depth max(1.12; 0.972) -> 1.25.
    const { top, bottom, unmet } = advised(inchEnd);
    expect(top?.cope).toEqual({ length: 4, depth: 1.25, radius: 0.5 });
    expect(rulesOf(top)).toEqual(['past-flange', 'past-girder-k', 'usual-radius']);
    expect([bottom, unmet]).toEqual([null, []]);
  });

  test('a shop in mm there rounds the half inch of its corner up to 13', () => {
    // (209.3 − 10.1)/2 − 10 + 12.7 = 102.3 -> 105; 15.6 + 12.7 = 28.3 -> 30
    const { top } = advised(endOf({ standard: 'csa-s16' }));
    expect(top?.cope).toEqual({ length: 105, depth: 30, radius: 13 });
  });

  test('the other copes of the end and its reaction play no part', () => {
    const end = endOf({});
    const other = { ...end, reaction: { ofWebShear: 0.5 }, top: null, bottom: { length: 3, depth: 2 } };
    expect(advised(other)).toEqual(advised(end));
    const { reaction: _, ...unsaid } = end;
    expect(advised(unsaid)).toEqual(advised(end));
  });

  test('a beam as deep as its support is cut below too, one that ends above the lower flange is not', () => {
    // UB 406x178x60 in itself: h 406.4, so 406.4 − 406.4 + 50 = 50. In a UB 356x171x51, h 355: 406.4 − 355 + 50 = 101.4 -> 105.
    expect(advised(endOf({ support: { section: 'UB 406x178x60' } })).bottom?.cope.depth).toBe(50);
    expect(advised(endOf({ support: { section: 'UB 356x171x51' } })).bottom?.cope.depth).toBe(105);
    expect(advised(endOf({})).bottom).toBeNull();
  });

  test('a support set higher needs less of the top and more of the foot; one set high enough needs nothing of the top', () => {
    // 15.6 + 12.7 − 10 = 18.3 in need, usual 50 − 10 = 40
    expect(advised(endOf({ support: { topOfSteel: 10 } })).top?.cope.depth).toBe(40);
    expect(advised(endOf({ support: { topOfSteel: 28.3 } })).top).toBeNull();
    // UB 533x210x92, h 533.1: lower root at 533.1 − 28.3 − 100 = 404.8 below the top, above the foot at 406.4; usual 406.4 + 100 − 533.1 + 50 = 23.3
    expect(advised(endOf({ support: { topOfSteel: 100 } })).bottom?.cope.depth).toBe(25);
  });

  test('an end that stands clear of the flanges needs no cope', () => {
    // (209.3 − 10.1)/2 + 10 = 109.6
    expect(advised(endOf({ setback: 109.6 }))).toMatchObject({ top: null, bottom: null });
    expect(advised(endOf({ setback: 105 })).top?.cope.length).toBe(60);
  });

  test('where the standard has copes go past the holes, the proposal does', () => {
    // 99.6 -> 100 clears the hole at 45 + 80; past it 45 + 80 + 11 = 136 -> 140
    const { top, unmet } = advised(endOf({ columns: 2, gauge: 80 }));
    expect(top?.cope.length).toBe(140);
    expect(rulesOf(top)?.[0]).toBe('past-last-column');
    expect(unmet).toEqual([]);
    // EN 1993 asks for no more than the flange does.
    expect(rulesOf(advised(endOf({ standard: 'en-1993', columns: 2, gauge: 80 })).top)?.[0]).toBe('past-flange');
  });

  test('elsewhere it goes past a hole that its face would cut', () => {
    // EN 1993: (209.3 − 10.1)/2 − 10 + 10 = 99.6 -> 100, in the hole at 105; 105 + 11 = 116 -> 120
    const { top, unmet } = advised(endOf({ standard: 'en-1993', columns: 2 }));
    expect(top?.cope.length).toBe(120);
    expect(rulesOf(top)?.[0]).toBe('clear-of-hole');
    expect(unmet).toEqual([]);
  });

  test('where the usual depth leaves too little web above the holes, the least does', () => {
    // Usual 50 leaves 70 − 50 = 20, below 26; least 28.3 -> 30 leaves 40
    const { top, unmet } = advised(endOf({ firstRow: 70 }));
    expect(top?.cope.depth).toBe(30);
    expect(rulesOf(top)?.[1]).toBe('past-fillets');
    expect(unmet).toEqual([]);
  });

  test('what no size can meet is said: holes in the way, a cope deeper than the method covers', () => {
    const low = advised(endOf({ support: { topOfSteel: -60 } }));
    expect(low.faults).toMatchObject([{ code: 'hole-outside-web', path: 'joint.firstRow' }]);
    expect(low.faults[0]?.text).toMatch(/First bolt row/);
    // In a W8x31 (h 8, k 0.829) the foot needs 18 − 8 + 0.829 = 10.829 -> 11, beyond 0.4 x 18.
    const joint = inchEnd.joint as { bolts: Json };
    const twoRows = { ...joint, bolts: { ...joint.bolts, rows: 2, pitch: 2.5 } };
    const deep = advised({ ...inchEnd, joint: twoRows, support: { kind: 'beam-web', section: 'W8x31' } });
    expect(deep.bottom?.cope.depth).toBe(11);
    expect(deep.unmet).toMatchObject([{ id: 'fit-cope-depth', reason: 'too-much', resistance: 11, demand: 7.2 }]);
  });

  test("the shop's step is a parameter, and must be one", () => {
    expect(advised(endOf({}), 1).top?.cope).toEqual({ length: 100, depth: 50, radius: 10 });
    expect(advised(endOf({ firstRow: 70 }), 1).top?.cope.depth).toBe(29);
    expect(advised(inchEnd, 1 / 16).top?.cope).toEqual({ length: 3.9375, depth: 1.125, radius: 0.5 });
    for (const step of [0, -5, Number.NaN, Number.POSITIVE_INFINITY])
      expect(copeFromSupport(endOf({}), { step })).toMatchObject({ faults: [{ code: 'step-not-positive' }] });
  });

  test('without a supporting beam of the library nothing is proposed', () => {
    const refused = { faults: [{ code: 'no-supporting-beam', path: 'support.section' }] };
    expect(copeFromSupport(endOf({ support: null }))).toMatchObject(refused);
    expect(copeFromSupport(endOf({ support: { kind: 'column-web', section: 'HE 200 B' } }))).toMatchObject(refused);
    expect(copeFromSupport({ ...endOf({}), support: { kind: 'beam-web', thickness: 10 } })).toMatchObject(refused);
    // UB 406x178x60 beside a UB 533x210x92, 533.1 deep
    for (const topOfSteel of [-406.4, 533.1]) {
      const found = copeFromSupport(endOf({ support: { topOfSteel } }));
      expect(found).toMatchObject({
        faults: [{ code: 'support-out-of-reach', limit: { above: -406.4, below: 533.1 } }],
      });
      expect('faults' in found && found.faults[0]?.text).toContain('more than -406.4, less than 533.1');
    }
    for (const odd of [null, 3, 'end', [], {}]) expect(copeFromSupport(odd)).toHaveProperty('faults');
  });

  test('every size says its rule in words and its numbers line by line, ending in the value', () => {
    for (const end of [endOf({}), endOf({ support: { section: 'UB 356x171x51' } }), inchEnd]) {
      const { top, bottom } = advised(end);
      for (const cope of [top, bottom]) {
        for (const { rule, value, working } of cope?.sizes ?? []) {
          expect(adviceWordsFor('commonwealth').rules[rule]).toMatch(/\.$/);
          expect(working.at(-1)?.value).toBeCloseTo(value, 9);
          expect(working.every(({ basis }) => basis === 'practice')).toBe(true);
        }
      }
    }
  });

  test('North America is told of copes, elsewhere of notches', () => {
    const { noneNeeded } = adviceWordsFor('north-america');
    expect(noneNeeded).toContain('cope');
    expect(JSON.stringify(adviceWordsFor('north-america'))).not.toMatch(/notch/i);
    expect(adviceWordsFor('commonwealth').noneNeeded).toContain('notch');
  });

  test('applied, the copes stand in place of those of the end', () => {
    const end = endOf({});
    const outcome = checkEnd(withCopes(end, advised(end)));
    expect('report' in outcome && outcome.report.checks.find(({ id }) => id === 'fit-cope-clearance')).toMatchObject({
      state: 'holds',
    });
  });
});
