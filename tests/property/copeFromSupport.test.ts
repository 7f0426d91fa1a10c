import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type CopeAdvice, copeFromSupport, withCopes } from '../../core/advice/copeFromSupport.ts';
import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Check } from '../../core/check/report.ts';
import { standards } from '../../core/standards/index.ts';
import { findSection } from '../../core/steel/findSection.ts';
import { INCH } from '../../core/units/systems.ts';

/** Beams and supports of every market, light and heavy, shallow and deep. */
const sections = [
  ...['UB 203x133x25', 'UB 305x165x40', 'UB 406x178x60', 'UB 533x210x92', 'UB 610x229x125', 'UB 914x305x201'],
  ...['IPE 200', 'IPE 300', 'IPE 450', 'IPE 600', 'HE 200 B', 'HE 300 A', 'HE 600 B'],
  ...['W10x22', 'W14x22', 'W16x36', 'W18x50', 'W21x62', 'W24x76', 'W30x99', 'W36x231'],
  ...['250UB31.4', '360UB56.7', '460UB67.1', '610UB101', 'ISMB 250', 'ISMB 400', 'ISMB 600'],
];
const sizesOf = (name: string) => {
  const found = findSection(name);
  if ('nearest' in found) throw new Error(name);
  return found.section;
};
const rules = ['fit-cope-length', 'fit-cope-depth', 'fit-cope-radius', 'fit-cope-clearance'];

const pair = fc.record({
  standard: fc.constantFrom(...Object.keys(standards)),
  beam: fc.constantFrom(...sections),
  support: fc.constantFrom(...sections),
  above: fc.oneof(fc.constant(0), fc.integer({ min: -80, max: 80 }), fc.integer({ min: -400, max: 400 })),
  setback: fc.integer({ min: 8, max: 20 }),
  size: fc.constantFrom('M16', 'M20', 'M24'),
  columns: fc.constantFrom(1, 1, 2, 3),
  endDistance: fc.integer({ min: 40, max: 60 }),
  gauge: fc.integer({ min: 65, max: 100 }),
  execution: fc.constantFrom('EXC2', 'EXC4'),
  step: fc.constantFrom(1, 5, 10),
  units: fc.constantFrom<'mm-kN' | 'in-kip'>('mm-kN', 'mm-kN', 'in-kip'),
});
type Pair = typeof pair extends fc.Arbitrary<infer T> ? T : never;

/** One bolt row, at this depth; every length in the end's own unit. */
const endOf = (x: Pair, firstRow: number) => {
  const k = x.units === 'mm-kN' ? 1 : INCH;
  const steel = x.units === 'mm-kN' ? { fy: 355, fu: 470 } : { fy: 50, fu: 65 };
  return {
    standard: x.standard,
    units: x.units,
    reaction: 10,
    beam: { section: x.beam, grade: steel },
    setback: x.setback / k,
    joint: {
      kind: 'fin-plate',
      firstRow: firstRow / k,
      endDistance: x.endDistance / k,
      bolts: {
        size: x.size,
        grade: { fu: x.units === 'mm-kN' ? 830 : 120 },
        rows: 1,
        columns: x.columns,
        gauge: x.gauge / k,
      },
      plate: { thickness: 10 / k, grade: steel, topEdge: 40 / k, bottomEdge: 40 / k, edge: 50 / k },
      weld: { leg: 8 / k },
    },
    support: { kind: 'beam-web', section: x.support, topOfSteel: x.above / k },
    ...(standards[x.standard]!.options.execution && { options: { execution: x.execution } }),
  };
};
const advised = (end: unknown, step: number): CopeAdvice | undefined => {
  const found = copeFromSupport(end, { step });
  return 'advice' in found ? found.advice : undefined;
};

/** The end with its row set 45 below the cut edge that is proposed, or in the middle of the web where it is not cut above. */
const settled = (x: Pair) => {
  const { h } = sizesOf(x.beam);
  const k = x.units === 'mm-kN' ? 1 : INCH;
  const step = x.step / (x.units === 'mm-kN' ? 1 : 20);
  const first = advised(endOf(x, h / 2), step);
  const depth = (first?.top?.cope.depth ?? 0) * k;
  const end = endOf(x, depth > 0 ? depth + 45 : h / 2);
  return { end, step, k, advice: advised(end, step) };
};

/** How far the supporting flanges with their fillets reach into the beam, from its top and from its foot; nothing where they miss it. */
const flanges = ({ beam, support, above, setback }: Pair) => {
  const { h } = sizesOf(beam);
  const s = sizesOf(support);
  const overhang = (s.b - s.tw) / 2;
  const root = s.tf + s.r;
  const room = overhang > setback;
  return {
    overhang,
    top: room && above < root && -above < h ? root - above : 0,
    bottom: room && h > s.h - above - root && s.h > above ? h - (s.h - above - root) : 0,
  };
};

/** What refuses the end once this cope is as long as asked; empty where nothing does. */
const lengthened = <E extends Partial<Record<'top' | 'bottom', object | null | undefined>>>(
  end: E,
  place: 'top' | 'bottom',
  length: number,
): string => {
  const outcome = checkEnd({ ...end, [place]: { ...end[place], length } });
  return 'faults' in outcome ? outcome.faults.map(({ code }) => code).join(' ') : '';
};

const broken = (checks: readonly Check[]): string[] =>
  checks.filter(({ id, state }) => rules.includes(id) && (state === 'fails' || state === 'refer')).map(({ id }) => id);

describe('copes proposed from the support', () => {
  test('clear its flanges by the usual room in whole steps, and stand only where a flange is', () => {
    let counted = 0;
    fc.assert(
      fc.property(pair, (x) => {
        const { advice, step, k } = settled(x);
        if (!advice) return;
        const found = flanges(x);
        for (const place of ['top', 'bottom'] as const) {
          const cope = advice[place]?.cope;
          expect(cope !== undefined, place).toBe(found[place] > 1e-6);
          if (!cope) continue;
          counted += 1;
          const room = standards[x.standard]!.region === 'north-america' ? INCH / 2 : 10;
          expect(x.setback + cope.length * k - found.overhang).toBeGreaterThanOrEqual(room - 1e-4);
          expect(cope.depth * k).toBeGreaterThanOrEqual(found[place] - 1e-4);
          for (const size of [cope.length, cope.depth]) expect(size / step).toBeCloseTo(Math.round(size / step), 6);
          const beam = sizesOf(x.beam);
          expect(cope.depth * k).toBeGreaterThanOrEqual(beam.tf + beam.r - 1e-4);
        }
      }),
      { numRuns: 300 },
    );
    expect(counted).toBeGreaterThan(150);
  });

  test("applied, they meet every rule on copes of the end's own standard, or say which they do not and why", () => {
    let [met, short] = [0, 0];
    fc.assert(
      fc.property(pair, (x) => {
        const { advice, end } = settled(x);
        if (!advice) return;
        const outcome = checkEnd(withCopes(end, advice));
        if ('faults' in outcome) {
          expect(advice.faults.map(({ code }) => code)).toEqual(outcome.faults.map(({ code }) => code));
          // Nothing of the web is left for the holes.
          for (const { code } of advice.faults) expect(code).toMatch(/^(hole-|cope-too-deep)/);
          short += 1;
          return;
        }
        expect(advice.faults).toEqual([]);
        const unmet = broken(outcome.report.checks);
        expect(broken(advice.unmet)).toEqual(unmet);
        // Only a method that covers no deeper or longer cope is ever left unmet, or a length that would cut into the holes.
        for (const { id, reason, of, demand } of advice.unmet.filter(({ id }) => rules.includes(id))) {
          if (`${id} ${reason}` === 'fit-cope-length too-little') {
            expect(lengthened(withCopes(end, advice), of as 'top' | 'bottom', demand!)).toContain('hole');
          } else expect(`${id} ${reason}`).toMatch(/^fit-cope-(depth|length) too-much$/);
        }
        if (unmet.length > 0) short += 1;
        else met += 1;
      }),
      { numRuns: 300 },
    );
    expect(met).toBeGreaterThan(2 * short);
  });

  test('a beam less deep than its support, tops level, is always let in', () => {
    fc.assert(
      fc.property(pair, (x) => {
        const level = { ...x, above: 0 };
        const [beam, support] = [sizesOf(x.beam), sizesOf(x.support)];
        if (beam.h > support.h - 60 || beam.h < 250 || support.tf + support.r > 0.25 * beam.h) return;
        const { advice, end } = settled(level);
        expect(advice?.faults).toEqual([]);
        expect(broken(advice?.unmet ?? [])).toEqual([]);
        expect(advice?.bottom).toBeNull();
        const outcome = checkEnd(withCopes(end, advice!));
        expect('report' in outcome && broken(outcome.report.checks)).toEqual([]);
      }),
      { numRuns: 300 },
    );
  });
});
