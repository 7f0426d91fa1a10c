import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check, Report } from '../../../core/check/report.ts';
import { standards } from '../../../core/standards/index.ts';
import { wordsFor } from '../../../core/words/wordsFor.ts';
import { changed } from '../../support/changed.ts';
import { goodEnds } from '../../support/published.ts';
import { underStandard } from '../../support/underStandard.ts';

type Json = Record<string, unknown>;

const endNamed = (name: string): Json => goodEnds().find((one) => one.name === name)!.end as Json;

/** Rows of M20 in holes of 22 at 100, 170 and 240 down, lines at 140; the plate 220 wide from 60 to 280, cleats 207.9 over both legs. */
const same = { firstRow: 100, rows: 3, pitch: 70, gauge: 140 };

const leastPitch: Readonly<Record<string, { readonly pitch: number; readonly sum: string }>> = {
  'sans-10162-1': { pitch: 54, sum: '2.7 × 20' },
  'csa-s16': { pitch: 54, sum: '2.7 × 20' },
  'aisc-360-lrfd': { pitch: 160 / 3, sum: '8/3 × 20' },
  'aisc-360-asd': { pitch: 160 / 3, sum: '8/3 × 20' },
  'en-1993': { pitch: 48.4, sum: '2.2 × 22' },
  'en-1993-uk': { pitch: 48.4, sum: '2.2 × 22' },
  'as-4100': { pitch: 50, sum: '2.5 × 20' },
  'is-800': { pitch: 50, sum: '2.5 × 20' },
};

describe.each(Object.values(standards))('a beam opposite through one web, $id', (standard) => {
  const reportOf = (opposite: Json | undefined, change: Json = {}, name = 'end-plate'): Report => {
    const base = changed(endNamed(name), {
      reaction: 20,
      support: {
        kind: 'beam-web',
        section: 'UB 610x229x125',
        grade: { fy: 345, fu: 450 },
        otherReaction: 30,
        opposite,
      },
    });
    const outcome = checkEnd(underStandard(changed(base, change), standard));
    if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
    return outcome.report;
  };
  const checkOf = (id: string, ...of: Parameters<typeof reportOf>): Check =>
    reportOf(...of).checks.find((one) => one.id === id)!;
  const codes = (report: Report) => [...report.assumptions, ...report.notes].map(({ code }) => code);

  test('that is not told is assumed to share the bolts, and that is printed; told, it is not', () => {
    expect(codes(reportOf(undefined))).toContain('opposite-shares-assumed');
    expect(codes(reportOf(same))).not.toContain('opposite-shares-assumed');
    for (const support of [{ otherReaction: 0 }, { kind: 'column-flange', topOfSteel: undefined }]) {
      expect(codes(reportOf(undefined, { support }))).not.toContain('opposite-shares-assumed');
    }
    expect(codes(reportOf(undefined, {}, 'double-cleat-support-welded'))).not.toContain('opposite-shares-assumed');
  });

  test('that shares bolts asks for the first beam to be held while the second is put up', () => {
    for (const opposite of [undefined, same, { ...same, rows: 4 }]) {
      expect(codes(reportOf(opposite))).toContain('opposite-erection');
    }
    expect(codes(reportOf({ ...same, firstRow: 400 }))).not.toContain('opposite-erection');
    expect(codes(reportOf(undefined, { support: { otherReaction: 0 } }))).not.toContain('opposite-erection');
  });

  test('with the same bolts leaves every check as it stands when nothing is told, half a millimetre off too', () => {
    const plain = reportOf(undefined).checks;
    for (const told of [same, { ...same, firstRow: 100.5 }, { ...same, gauge: 141 }]) {
      expect(reportOf(told).checks).toEqual(plain);
    }
  });

  test('with other bolts refers in bearing, as does one with fewer or more of the same, whatever the numbers', () => {
    const bearing = (opposite: Json, reaction = 20): string => {
      const { state, reason } = checkOf('support-bearing', opposite, { reaction });
      return `${state} ${reason ?? ''}`.trim();
    };
    expect(bearing(same)).toBe('holds');
    for (const rows of [2, 4]) {
      expect(bearing({ ...same, rows })).toBe('refer opposite-apart');
      expect(bearing({ ...same, rows }, 5000)).toMatch(/^(?:refer opposite-apart|fails)/);
    }
    // 140 against 141.2: 0.6 across and 0 down
    expect(bearing({ ...same, gauge: 141.2 })).toBe('refer opposite-apart');
  });

  test('with the bolts of a single cleat refers too: it has two lines', () => {
    const { state } = checkOf('support-bearing', { ...same, firstRow: 90 }, {}, 'single-cleat');
    expect(state).toBe('refer');
  });

  test('keeps its own bolts the least pitch from ours', () => {
    const { pitch } = leastPitch[standard.id]!;
    // Two rows below our last, at 240 + p.
    const below = (down: number) => checkOf('fit-pitch', { ...same, firstRow: 240 + down, rows: 1 });
    expect(below(pitch).state).toBe('holds');
    const near = below(pitch - 1);
    expect(near).toMatchObject({ state: 'fails', reason: 'too-little', of: 'to bolts opposite' });
    expect([near.demand, near.resistance]).toEqual([expect.closeTo(pitch, 9), expect.closeTo(pitch - 1, 9)]);
  });

  test('cannot have holes that run into ours: 21 apart, 22 wide', () => {
    const into = checkOf('fit-pitch', { ...same, firstRow: 261, rows: 1 });
    expect(into).toMatchObject({ state: 'fails', reason: 'clash', of: 'to bolts opposite', resistance: 21 });
    const beside = checkOf('fit-pitch', { ...same, firstRow: 262, rows: 1 });
    expect(beside).toMatchObject({ state: 'fails', reason: 'too-little', resistance: 22 });
  });

  test('has its heads clear of our plate by half the socket, 46/2, or refers; under the plate they have no place', () => {
    const wrench = (down: number, gauge = 140) => {
      const { state, of, reason, demand, resistance } = checkOf('fit-wrench', {
        firstRow: 280 + down,
        rows: 1,
        gauge,
      });
      return { state, of, reason, demand, resistance };
    };
    expect(wrench(23).state).toBe('holds');
    const part = { of: 'bolts opposite, beside the fitting', demand: 23 };
    expect(wrench(22)).toEqual({ ...part, state: 'refer', reason: 'too-little', resistance: 22 });
    // 15 below the plate and (230 − 220)/2 + 3 = 8 beside it: √(15² + 8²) = 17
    expect(wrench(15, 236)).toEqual({ ...part, state: 'refer', reason: 'too-little', resistance: 17 });
    expect(wrench(-15)).toMatchObject({ ...part, state: 'fails', reason: 'clash' });
    expect(wrench(-15).resistance).toBeCloseTo(-15, 9);
  });

  test('stands beside one cleat where a pair would cover it: that lies from 7.9/2 + 100 on its own side to the web', () => {
    // Rows at 90, 160 and 230: on the near side in our holes, on the far side 70 − 3.95 = 66.05 from the beam's web.
    const beside = checkOf('fit-wrench', { ...same, firstRow: 90 }, {}, 'single-cleat');
    expect(beside.state).toBe('holds');
    const low = checkOf('fit-wrench', { ...same, firstRow: 120 }, {}, 'single-cleat');
    expect(low).toMatchObject({ state: 'fails', reason: 'clash', of: 'bolts opposite, beside the fitting' });
  });
});

test('what is said of a beam opposite is there in both regions', () => {
  for (const region of ['commonwealth', 'north-america'] as const) {
    const words = wordsFor(region);
    expect(words.reasons['opposite-apart']).toMatch(/does not share every bolt/);
    expect(words.assumptions['opposite-shares-assumed']).toMatch(/row for row \(assumed\)/);
    expect(words.notes['opposite-erection']).toMatch(/the first beam stays held, by a bolt of its own or a seat/);
  }
});
