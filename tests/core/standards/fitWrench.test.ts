import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { standards } from '../../../core/standards/index.ts';
import { boltSizeNames } from '../../../core/steel/bolts.ts';

interface Sizes {
  readonly standard?: string;
  readonly size?: string;
  readonly firstRow?: number;
  readonly endDistance?: number;
  readonly pitch?: number;
  readonly rows?: number;
  readonly top?: { length: number; depth: number; radius: number } | null;
  readonly kind?: 'fin-plate' | 'web-bolts';
  readonly leg?: number;
}

/** I 400 deep, flange 15, root radius 15, uncoped but where said; M20, setback 10. */
const checksOf = (x: Sizes, working = false): readonly Check[] => {
  const ply = { thickness: 10, grade: { fy: 355, fu: 470 }, topEdge: 50, bottomEdge: 50, edge: 50 };
  const kind = x.kind ?? 'fin-plate';
  const end = {
    standard: x.standard ?? 'sans-10162-1',
    units: 'mm-kN',
    reaction: 100,
    beam: {
      section: { depth: 400, width: 180, flange: 15, web: 8, radius: 15 },
      grade: { fy: 355, fu: 470 },
    },
    top: x.top ?? null,
    setback: 10,
    joint: {
      kind,
      firstRow: x.firstRow ?? 100,
      endDistance: x.endDistance ?? 45,
      bolts: { size: x.size ?? 'M20', grade: { fu: 830 }, rows: x.rows ?? 3, pitch: x.pitch ?? 70 },
      ...(kind === 'fin-plate' ? { plate: ply, weld: { leg: x.leg ?? 8 } } : { ply }),
    },
  };
  const outcome = checkEnd(end, { working });
  if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
  return outcome.report.checks;
};
const wrenchOf = (x: Sizes, working = false): Check => checksOf(x, working).find(({ id }) => id === 'fit-wrench')!;

describe('room for the wrench', () => {
  test('a bolt too near a whole flange refers, with what is there and what is needed', () => {
    // 50 − 15 − 15 = 20 against 46/2 + 2 = 25
    const near = { state: 'refer', of: 'top flange', reason: 'too-little', resistance: 20, demand: 25, unit: 'mm' };
    expect(wrenchOf({ firstRow: 50 })).toMatchObject(near);
    expect(wrenchOf({ firstRow: 55 }).state).toBe('holds');
  });

  test('a cope that takes the flange away past the wrench makes room; one that ends within it does not', () => {
    // 45 + 25 = 70 along the beam
    const cope = (length: number, depth = 32) => wrenchOf({ firstRow: 54, top: { length, depth, radius: 10 } });
    expect(cope(70)).toMatchObject({ state: 'holds' });
    expect(cope(69)).toMatchObject({ state: 'refer', of: 'top flange', resistance: 24 });
    expect(cope(70, 29)).toMatchObject({ state: 'refer', of: 'top flange' });
  });

  test('the foot of the web is looked at as its top is', () => {
    // 400 − 346 − 30 = 24
    expect(wrenchOf({ firstRow: 206 })).toMatchObject({ state: 'refer', of: 'bottom flange', resistance: 24 });
  });

  test("beside the support the weld of a fin plate takes its leg from the plate's side; a ply takes nothing", () => {
    // 10 + 22 − 8 = 24
    expect(wrenchOf({ endDistance: 22 })).toMatchObject({ state: 'refer', of: 'support, plate side', resistance: 24 });
    expect(wrenchOf({ endDistance: 22, kind: 'web-bolts' })).toMatchObject({ state: 'holds' });
    expect(wrenchOf({ endDistance: 14, kind: 'web-bolts' })).toMatchObject({
      state: 'refer',
      of: 'support, web side',
      resistance: 24,
    });
  });

  test('a weld as wide as the way to the bolts leaves no room at all, and still only refers', () => {
    expect(wrenchOf({ endDistance: 22, leg: 40 })).toMatchObject({ state: 'refer', utilisation: null });
  });

  test('rows too near for a socket beside the next nut refer', () => {
    // 25 + 32/(2 cos 30°) = 43.475
    expect(wrenchOf({ pitch: 43 })).toMatchObject({ state: 'refer', of: 'rows', resistance: 43 });
    expect(wrenchOf({ pitch: 44 })).toMatchObject({ state: 'holds' });
  });

  test('it never fails an end, and is practice under every standard', () => {
    for (const { id } of Object.values(standards)) {
      const check = wrenchOf({ standard: id, firstRow: 30, endDistance: 14, pitch: 30 });
      expect(check, id).toMatchObject({ state: 'refer', basis: 'practice' });
    }
  });

  test('from M16 up rows as near as a standard allows leave room for the wrench; inch bolts from 5/8 in up do in North America', () => {
    for (const { id, region } of Object.values(standards)) {
      const usual = (name: string) =>
        name !== 'M12' && name !== '1/2' && (name.startsWith('M') || region === 'north-america');
      for (const size of boltSizeNames.filter(usual)) {
        const told = { standard: id, size, rows: 2, firstRow: 150, endDistance: 80 };
        // Just above the hole, the least pitch is what is asked.
        const least = checksOf({ ...told, pitch: 41 }).find((one) => one.id === 'fit-pitch')!.demand!;
        expect(wrenchOf({ ...told, pitch: least }).state, `${id} ${size} at ${least}`).toBe('holds');
      }
    }
  });
});

describe('its working', () => {
  test('takes flange and root as one from the way to the bolts', () => {
    const rows = wrenchOf({ firstRow: 50 }, true).working ?? [];
    expect(rows.map(({ symbol, expression, numbers }) => `${symbol} = ${expression} = ${numbers}`)).toEqual([
      'y_w = y_1 − (t_f + r) = 50 − (15 + 15)',
      'R_w = D_w / 2 + s_w = 46 / 2 + 2',
    ]);
  });
});
