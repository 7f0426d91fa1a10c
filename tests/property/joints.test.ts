import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Report } from '../../core/check/report.ts';
import type { Joint } from '../../core/end/schema.ts';
import { joints } from '../../core/joints/index.ts';
import { INCH, KIP } from '../../core/units/systems.ts';
import { jointEndOf, type PlausibleJoint, plausibleJoint } from '../support/arbitraryJoint.ts';

const runs = { numRuns: 300 };
const kinds = Object.keys(joints) as Joint['kind'][];

const report = (end: unknown): Report | undefined => {
  const outcome = checkEnd(end);
  return 'report' in outcome ? outcome.report : undefined;
};

const capacities = ({ checks }: Report): Readonly<Record<string, number | null | undefined>> =>
  Object.fromEntries(checks.map(({ id, reactionAtFailure }) => [id, reactionAtFailure]));

/** Ids whose reaction at failure the change lowered. */
const lowered = (before: Report, after: Report): string[] => {
  const then = capacities(after);
  return before.checks
    .filter(({ id, reactionAtFailure }) => {
      const other = then[id];
      return (
        typeof reactionAtFailure === 'number' && typeof other === 'number' && other < reactionAtFailure * (1 - 1e-9)
      );
    })
    .map(({ id }) => id);
};

const numbersIn = (value: unknown): number[] => {
  if (typeof value === 'number') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbersIn) : [];
};

describe.each(kinds)('any plausible end with %s', (kind) => {
  test('gives a report of finite numbers, or named faults, and never breaks', () => {
    let reports = 0;
    fc.assert(
      fc.property(plausibleJoint, (x) => {
        const outcome = checkEnd(jointEndOf(x, kind), { working: x.V % 5 === 0 });
        if ('faults' in outcome) {
          for (const { code, text } of outcome.faults) expect(text, code).toBeTruthy();
          return;
        }
        reports += 1;
        expect(numbersIn(outcome.report).every(Number.isFinite)).toBe(true);
        expect(JSON.stringify(outcome.report)).not.toMatch(/NaN|Infinity|undefined/);
      }),
      runs,
    );
    expect(reports).toBeGreaterThan(runs.numRuns / 6);
  });

  test('fails at the same reactions whatever it carries', () => {
    fc.assert(
      fc.property(plausibleJoint, fc.integer({ min: 0, max: 900 }), (x, V) => {
        const [one, other] = [x, { ...x, V }].map((each) => report(jointEndOf(each, kind)));
        if (one && other) expect(capacities(other)).toEqual(capacities(one));
      }),
      runs,
    );
  });

  test('is no weaker with a thicker support, and no stronger for a beam on its other side', () => {
    fc.assert(
      fc.property(plausibleJoint, fc.integer({ min: 1, max: 10 }), (x, more) => {
        const before = report(jointEndOf(x, kind));
        const thicker = report(jointEndOf({ ...x, ts: x.ts + more }, kind));
        const opposite = report(jointEndOf({ ...x, Vo: x.Vo + 10 * more }, kind));
        if (before && thicker) expect(lowered(before, thicker)).toEqual([]);
        if (before && opposite) expect(lowered(opposite, before)).toEqual([]);
      }),
      runs,
    );
  });

  test('holds as much in inches and kips', () => {
    const inches = (value: unknown, key = ''): unknown => {
      if (typeof value === 'number') {
        if (['rows', 'columns'].includes(key)) return value;
        if (['reaction', 'tie', 'otherReaction'].includes(key)) return (value * 1000) / KIP;
        if (['fy', 'fu', 'electrode'].includes(key)) return (value * INCH * INCH) / KIP;
        return value / INCH;
      }
      if (typeof value !== 'object' || value === null) return value;
      return Object.fromEntries(Object.entries(value).map(([name, one]) => [name, inches(one, name)]));
    };
    const there = (x: PlausibleJoint) => ({ ...(inches(jointEndOf(x, kind)) as object), units: 'in-kip' });
    fc.assert(
      fc.property(plausibleJoint, (x) => {
        const [metric, other] = [report(jointEndOf(x, kind)), report(there(x))];
        if (!metric || !other) return;
        const [mine, theirs] = [capacities(metric), capacities(other)];
        for (const id of Object.keys(mine)) {
          if (typeof mine[id] !== 'number' || mine[id] === 0) continue;
          expect(((theirs[id] ?? Number.NaN) * KIP) / 1000 / mine[id], id).toBeCloseTo(1, 9);
        }
      }),
      runs,
    );
  });
});
