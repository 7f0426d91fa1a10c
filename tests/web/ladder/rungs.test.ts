import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { examine } from '../../../core/check/examine.ts';
import type { Check } from '../../../core/check/report.ts';
import { webBoltsOf } from '../../../core/end/jointParts.ts';
import { rungsOf } from '../../../web/ladder/rungs.ts';
import { endOf, plausibleEnd } from '../../support/arbitraryEnd.ts';
import { demo, demoJoint } from './demoEnds.ts';

const ids = (checks: readonly Check[]): string[] => checks.map(({ id }) => id);

describe('rungs', () => {
  test('every check of a report stands once on the bench: rung, tie, refer, footing, not applicable, or stress for information', () => {
    fc.assert(
      fc.property(plausibleEnd, (plan) => {
        const found = examine(endOf(plan), { working: false });
        fc.pre('examined' in found);
        const { report } = found.examined;
        const { rungs, unmeasured, alone, footing, notApplicable } = rungsOf(report);
        const information = report.checks.filter(({ state }) => state === 'information');
        const placed = [...rungs, ...unmeasured, ...alone, ...footing, ...notApplicable, ...information];
        expect(ids(placed).sort()).toEqual(ids(report.checks).sort());
      }),
    );
  });

  test('the weakest way of failing stands at the foot, and every rung above is at least as strong', () => {
    fc.assert(
      fc.property(plausibleEnd, (plan) => {
        const found = examine(endOf(plan), { working: false });
        fc.pre('examined' in found);
        const { report } = found.examined;
        const { rungs } = rungsOf(report);
        const at = rungs.map(({ reactionAtFailure }) => reactionAtFailure ?? Number.POSITIVE_INFINITY);
        expect(at).toEqual([...at].sort((a, b) => b - a));
        if (report.capacity !== null) expect(rungs.at(-1)?.reactionAtFailure).toBe(report.capacity);
      }),
    );
  });

  test('the elastic stress is no rung, unless an option makes it a way of failing', () => {
    expect(ids(rungsOf(demo().report).rungs).filter((id) => id.startsWith('stress-'))).toEqual([]);
    const judged = demo({ options: { 'elastic-shear': 'verdict' } });
    expect(ids(rungsOf(judged.report).rungs)).toEqual(expect.arrayContaining(['stress-full', 'stress-cope']));
  });

  test('a tie force, which no end reaction uses up, stands apart from the ladder', () => {
    const { rungs, alone } = rungsOf(demo({ tie: 90 }).report);
    expect(ids(alone)).toEqual(['web-tie']);
    expect(ids(rungs)).not.toContain('web-tie');
  });

  test('a way that refers without a number stands apart, with its reason', () => {
    // What is left of a notched channel bends about no principal axis.
    const section = { depth: 380, width: 100, flange: 17.5, web: 9.5, radius: 15, family: 'channel' };
    const { rungs, unmeasured } = rungsOf(demo({ beam: { section, grade: 'S355JR' } }).report);
    expect(ids(unmeasured)).toEqual(expect.arrayContaining(['cope-shear', 'cope-bending', 'cope-buckling']));
    for (const { id, state, reasonText } of unmeasured) {
      expect(state).toBe('refer');
      expect(reasonText).toBeTruthy();
      expect(ids(rungs)).not.toContain(id);
    }
  });

  test('a single bolt, which holds no moment, leaves black bars of no length at the foot', () => {
    const { joint } = demo().end;
    const { report } = demoJoint({ bolts: { ...webBoltsOf(joint)!.bolts, rows: 1 } });
    const foot = rungsOf(report).rungs.at(-1)!;
    expect([foot.state, foot.reactionAtFailure]).toEqual(['fails', 0]);
  });

  test('in the footing what fails or refers comes first', () => {
    const { footing } = rungsOf(demo({ setback: 25 }).report);
    expect(footing[0]).toMatchObject({ id: 'fit-setback', state: 'refer' });
    expect(footing.slice(1).every(({ state }) => state === 'holds')).toBe(true);
  });
});
