import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Check, Report } from '../../core/check/report.ts';
import { webBoltsOf } from '../../core/end/jointParts.ts';
import type { End } from '../../core/end/schema.ts';
import { INCH, KIP } from '../../core/units/systems.ts';
import { endOf, type PlausibleEnd, plausibleEnd } from '../support/arbitraryEnd.ts';

const runs = { numRuns: 400 };

const report = (end: unknown): Report | undefined => {
  const outcome = checkEnd(end);
  return 'report' in outcome ? outcome.report : undefined;
};

const capacityOf = (one: Report, id: string): number | undefined => {
  const check = one.checks.find((c) => c.id === id) as Check;
  return check.reactionAtFailure ?? undefined;
};

const demandOf = (one: Report, id: string): number => one.checks.find((c) => c.id === id)!.demand!;

/** Ids whose reaction at failure the change lowered, beyond `slack`. */
const lowered = (before: Report, after: Report, slack = 1e-9): string[] =>
  before.checks
    .filter(({ id, reactionAtFailure }) => {
      const other = capacityOf(after, id);
      if (reactionAtFailure === undefined || reactionAtFailure === null || other === undefined) return false;
      return other < reactionAtFailure * (1 - slack);
    })
    .map(({ id }) => id);

const changed = (x: PlausibleEnd, change: Partial<PlausibleEnd>): [Report, Report] | undefined => {
  const before = report(endOf(x));
  const after = report(endOf({ ...x, ...change }));
  return before && after ? [before, after] : undefined;
};

const isEn1993 = ({ standard }: PlausibleEnd): boolean => standard.startsWith('en-1993');

/** EN 1993 takes a throat off either end of a fillet: one too short for its throat refers, and more throat can then weaken it. */
const shortForItsThroat = (x: PlausibleEnd, id: string): boolean => {
  const throat = x.leg / Math.SQRT2;
  return isEn1993(x) && id === 'weld' && 2 * x.e + (x.rows - 1) * x.pitch - 2 * throat < Math.max(30, 6 * throat);
};

/**
 * Under AISC 360 a thicker ply can turn a conventional plate into an extended one: other rules, whose arm is longer and whose group is as
 * strong as its weakest bolt. By the standard's own rule that weakens the bolts, so such pairs are left out.
 */
const otherKindOfPlate = (pair: readonly Report[]): boolean =>
  new Set(pair.map((one) => one.checks.find(({ id }) => id === 'plate-bending')?.reason === 'conventional-plate'))
    .size > 1;

/** AISC 360: a thicker web moves the middle planes of web and plate apart, so that the lap twists more (Manual 10-7). */
const twists = (one: Report, id: string): boolean => one.standard.id.startsWith('aisc-360') && id === 'plate-buckling';

/**
 * IS 800 8.4.2.2: where the inelastic branch ends, at λ_w 1.2, it lies at 0.68 and the elastic one at 0.694, so that a web that grows past it
 * loses 2.1 % of its shear stress.
 */
const branchesApart = (one: Report, id: string): boolean => one.standard.id === 'is-800' && id === 'web-gross-shear';

/** IS 800 10.5: the length of a weld is without a leg at each end, so that on a plate less than six legs deep a larger leg weakens. */
const legsTaken = ({ standard, e, rows, pitch, leg }: PlausibleEnd, id: string): boolean =>
  standard === 'is-800' && id === 'weld' && 2 * e + (rows - 1) * pitch < 6 * leg;

describe('more steel at the same fy and fu never weakens', () => {
  test('a thicker web', () => {
    fc.assert(
      fc.property(plausibleEnd, fc.integer({ min: 1, max: 40 }), (x, tenths) => {
        const pair = changed(x, { tw: x.tw + tenths / 10 });
        // Slack: the branches of the shear stress meet with rounded constants, a step of at most 0.2 % where a web passes from elastic to
        // inelastic buckling.
        if (!pair || otherKindOfPlate(pair)) return;
        expect(lowered(...pair, 0.002).filter((id) => !twists(pair[0], id) && !branchesApart(pair[0], id))).toEqual([]);
        expect(lowered(...pair, 0.021).filter((id) => branchesApart(pair[0], id))).toEqual([]);
      }),
      runs,
    );
  });

  test('a thicker plate', () => {
    fc.assert(
      fc.property(plausibleEnd, fc.integer({ min: 1, max: 10 }), (x, more) => {
        const pair = changed(x, { tp: x.tp + more });
        if (pair && !otherKindOfPlate(pair)) expect(lowered(...pair)).toEqual([]);
      }),
      runs,
    );
  });

  test('larger edges of the plate, a larger weld', () => {
    fc.assert(
      fc.property(plausibleEnd, fc.integer({ min: 1, max: 30 }), (x, more) => {
        for (const change of [{ e: x.e + more }, { ex: x.ex + more }, { leg: x.leg + more }]) {
          const pair = changed(x, change);
          if (!pair) continue;
          const then = { ...x, ...change };
          const weaker = lowered(...pair).filter((id) => !legsTaken(then, id) && !shortForItsThroat(then, id));
          expect(weaker).toEqual([]);
        }
      }),
      runs,
    );
  });

  test('a stronger bolt and a stronger electrode', () => {
    fc.assert(
      fc.property(plausibleEnd, (x) => {
        const end = endOf(x);
        const joint = {
          ...end.joint,
          bolts: { ...webBoltsOf(end.joint)!.bolts, grade: { fu: 1000 } },
          weld: { leg: x.leg, electrode: 550 },
        };
        const [before, after] = [report(end), report({ ...end, joint })];
        if (before && after) expect(lowered(before, after)).toEqual([]);
      }),
      runs,
    );
  });
});

describe('a longer cope never strengthens', () => {
  /** A column that comes to stand inside the cope joins the block and the tear-out: a different path, which may be the stronger one. */
  const anotherPath = new Set(['web-block', 'web-tearout']);
  /**
   * EN 1993, two columns or more: a face less than 2 d past the last hole is taken as one section with it, with the block's shear; once the
   * face stands clear, or another column joins the block, the lesser shear counts no more.
   */
  const anotherSection = (x: PlausibleEnd, id: string) => isEn1993(x) && x.columns > 1 && id === 'cope-bending';

  test('the checks it touches; others stay as they are', () => {
    fc.assert(
      fc.property(plausibleEnd, fc.integer({ min: 1, max: 200 }), (x, more) => {
        const pair = changed({ ...x, copes: 'top' }, { ct: x.ct + more, copes: 'top' });
        if (!pair) return;
        const [before, after] = pair;
        const raised = lowered(after, before).filter((id) => !anotherPath.has(id) && !anotherSection(x, id));
        expect(raised).toEqual([]);
      }),
      runs,
    );
  });
});

/** IS 800 and EN 1993 take another shear area of a coped web than of the whole section, however shallow the cope. */
const otherShearArea = (one: Report): boolean => /^(is-800|en-1993)/.test(one.standard.id);

describe('what changes nothing', () => {
  test('the unit system: the same end in inches and kips has the same numbers', () => {
    fc.assert(
      fc.property(plausibleEnd, (x) => {
        const metric = endOf(x);
        const inch = inInches(metric);
        const [a, b] = [report(metric), report(inch)];
        expect(a === undefined).toBe(b === undefined);
        if (!a || !b) return;
        expect(b.verdict).toBe(a.verdict);
        for (const check of a.checks) {
          const other = b.checks.find(({ id }) => id === check.id)!;
          expect(other.state, check.id).toBe(check.state);
          if (check.utilisation) expect(other.utilisation! / check.utilisation, check.id).toBeCloseTo(1, 9);
          if (check.reactionAtFailure)
            expect((other.reactionAtFailure! * KIP) / 1000 / check.reactionAtFailure).toBeCloseTo(1, 9);
        }
      }),
      runs,
    );
  });

  test('a cope that shrinks to nothing leaves the stress of the full section', () => {
    fc.assert(
      fc.property(plausibleEnd, (x) => {
        const [found, none] = [
          report(endOf({ ...x, copes: 'top', dt: 1e-5, V: 100 })),
          report(endOf({ ...x, copes: 'none', V: 100 })),
        ];
        expect(found === undefined).toBe(none === undefined);
        if (!found || !none) return;
        expect(demandOf(found, 'stress-cope') / demandOf(found, 'stress-full')).toBeCloseTo(1, 6);
        const [cut, whole] = [capacityOf(found, 'web-net-shear'), capacityOf(none, 'web-net-shear')];
        if (cut && whole && !otherShearArea(found)) expect(cut / whole).toBeCloseTo(1, 6);
        expect(capacityOf(found, 'web-gross-shear')).toBe(capacityOf(none, 'web-gross-shear'));
      }),
      runs,
    );
  });

  test('what fails at a reaction does not depend on the reaction', () => {
    fc.assert(
      fc.property(plausibleEnd, fc.integer({ min: 0, max: 2000 }), (x, V) => {
        const [a, b] = [report(endOf(x)), report(endOf({ ...x, V }))];
        expect(b?.capacity).toBe(a?.capacity);
      }),
      runs,
    );
  });
});

/** The same end with every length in inches, every force in kips. */
const inInches = (end: End): unknown => {
  const lengths = new Set([
    'depth',
    'width',
    'flange',
    'web',
    'radius',
    'length',
    'setback',
    'firstRow',
    'endDistance',
    'pitch',
    'gauge',
    'thickness',
    'topEdge',
    'bottomEdge',
    'edge',
    'leg',
  ]);
  const stresses = new Set(['fy', 'fu', 'electrode']);
  const turn = (value: unknown, key: string): unknown => {
    if (typeof value === 'number') {
      if (lengths.has(key)) return value / INCH;
      if (stresses.has(key)) return (value * INCH ** 2) / KIP;
      if (key === 'reaction') return (value * 1000) / KIP;
      return value;
    }
    if (typeof value === 'object' && value !== null) {
      return Object.fromEntries(Object.entries(value).map(([k, v]) => [k, turn(v, k)]));
    }
    return value;
  };
  return { ...(turn(end, '') as object), units: 'in-kip' };
};
