import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { standards } from '../../../core/standards/index.ts';
import { wordsFor } from '../../../core/words/wordsFor.ts';
import { changed } from '../../support/changed.ts';
import { goodEnds } from '../../support/published.ts';
import { underStandard } from '../../support/underStandard.ts';

type Json = Record<string, unknown>;

/** UB 406x178x60, b 177.9, t_w 7.9, notched 110 × 45 at its top, M20 in holes of 22. Invented. */
const endNamed = (name: string): Json => goodEnds().find((one) => one.name.replace('.json', '') === name)!.end as Json;

const least: Readonly<Record<string, { readonly edge: number; readonly sum: string }>> = {
  'sans-10162-1': { edge: 26, sum: 'rolled edge of M20' },
  'csa-s16': { edge: 26, sum: 'rolled edge of M20' },
  'aisc-360-lrfd': { edge: 26, sum: 'Table J3.4M' },
  'aisc-360-asd': { edge: 26, sum: 'Table J3.4M' },
  'en-1993': { edge: 26.4, sum: '1.2 × 22' },
  'en-1993-uk': { edge: 26.4, sum: '1.2 × 22' },
  'as-4100': { edge: 25, sum: '1.25 × 20' },
  'is-800': { edge: 33, sum: '1.5 × 22' },
};

describe.each(Object.values(standards))('what the outline of the support leaves room for, $id', (standard) => {
  const checkOf = (name: string, change: Json, id: string): Check => {
    const end = changed(endNamed(name), { support: undefined, reaction: 20 });
    const outcome = checkEnd(underStandard(changed(end, change), standard));
    if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
    return outcome.report.checks.find((one) => one.id === id)!;
  };
  const said = ({ state, of, reason, demand, resistance }: Check) => ({ state, of, reason, demand, resistance });
  const on = (kind: string, section: string, more: Json = {}): Json => ({ support: { kind, section, ...more } });

  describe('the flange of a UC 203x203x46, 203.6 mm wide', () => {
    const flange = on('column-flange', 'UC 203x203x46');
    // A plate 240 mm wide overhangs it, and leaves the bolts enough of its own edge.
    const plate = (crossCentres: number): Json => ({
      ...flange,
      joint: { plate: { width: 240 }, supportBolts: { crossCentres } },
    });
    const { edge } = least[standard.id]!;
    const inFlange = { of: "in the column's flange", demand: edge };

    test('takes bolts as near its edge as a rolled edge may be, though the plate overhangs it', () => {
      const centres = 203.6 - 2 * edge;
      expect(checkOf('end-plate', plate(centres), 'fit-edge-plate').state).toBe('holds');
      const near = checkOf('end-plate', plate(centres + 1), 'fit-edge-plate');
      // Below its table one standard asks for proof; below the bolt's diameter it fails too.
      const breach = standard.id.startsWith('aisc') ? 'refer' : 'fails';
      expect(near).toMatchObject({ ...inFlange, state: breach, reason: 'too-little' });
      expect(near.resistance).toBeCloseTo(edge - 0.5, 9);
    });

    test('takes the one line of one cleat by its own place', () => {
      const cleat = (crossCentres: number): Json => ({
        ...flange,
        joint: { cleat: { legSupport: 130 }, supportBolts: { crossCentres } },
      });
      expect(checkOf('single-cleat', cleat(203.6 - 2 * edge), 'fit-edge-plate').state).toBe('holds');
      expect(checkOf('single-cleat', cleat(204.6 - 2 * edge), 'fit-edge-plate')).toMatchObject(inFlange);
    });

    test('cannot be drilled where a hole leaves it: (203.6 − 182)/2 = 10.8 mm from the edge, half the hole is 11', () => {
      const gone = checkOf('end-plate', plate(182), 'fit-edge-plate');
      expect(gone).toMatchObject({ ...inFlange, state: 'fails', reason: 'clash' });
      expect(gone.resistance).toBeCloseTo(10.8, 9);
    });

    test('carries a welded cleat that lies on it with its weld, and no wider one', () => {
      const cleat = (legSupport: number): Json => ({ ...flange, joint: { cleat: { legSupport } } });
      // 7.9/2 + 91 + 6 = 100.95, half the flange is 101.8
      expect(checkOf('double-cleat-support-welded', cleat(91), 'fit-edge-plate').state).toBe('holds');
      const wide = checkOf('double-cleat-support-welded', cleat(92), 'fit-edge-plate');
      expect(wide).toMatchObject({ state: 'fails', reason: 'clash', of: "on the column's flange" });
      expect([wide.resistance, wide.demand]).toEqual([expect.closeTo(101.95, 9), expect.closeTo(101.8, 9)]);
    });

    test('says nothing where only its thickness is told', () => {
      const told = checkOf(
        'end-plate',
        { ...plate(182), support: { kind: 'column-flange', thickness: 11 } },
        'fit-edge-plate',
      );
      expect(told.of).not.toBe(inFlange.of);
    });
  });

  test('a fin plate beside the web lies on a flange 46 mm wide, its far weld included, or cannot be welded', () => {
    // 7.9/2 + t + 8 ≤ 23: 21.95 with 10 mm, 23.95 with 12 mm
    const plate = (thickness: number): Json => ({
      ...on('column-flange', 'IPE 80'),
      joint: { plate: { thickness } },
    });
    expect(checkOf('example', plate(10), 'fit-edge-plate').state).toBe('holds');
    const thick = checkOf('example', plate(12), 'fit-edge-plate');
    expect(thick).toMatchObject({ state: 'fails', reason: 'clash', of: "on the column's flange", demand: 23 });
    expect(thick.resistance).toBeCloseTo(23.95, 9);
  });

  describe('the web of a UC 254x254x73: h 254.1, t_f 14.2, r 12.7', () => {
    const web = on('column-web', 'UC 254x254x73');
    const plate = (width: number, crossCentres = 110): Json => ({
      ...web,
      joint: { plate: { width }, supportBolts: { crossCentres } },
    });

    test('its flat, 2 × (127.05 − 14.2 − 12.7) = 200.3 mm, takes a plate of 200; one on the fillet refers, one over a flange cannot be', () => {
      expect(checkOf('end-plate', plate(200), 'fit-edge-plate').state).toBe('holds');
      const part = { of: "between the column's flanges", demand: expect.closeTo(100.15, 9) };
      const onFillet = said(checkOf('end-plate', plate(202), 'fit-edge-plate'));
      expect(onFillet).toEqual({ ...part, state: 'refer', reason: 'too-much', resistance: 101 });
      // 226/2 = 113 against 127.05 − 14.2 = 112.85
      const over = said(checkOf('end-plate', plate(226), 'fit-edge-plate'));
      expect(over).toEqual({ ...part, state: 'fails', reason: 'clash', resistance: 113 });
    });

    test('takes the legs of cleats from the middle of the web', () => {
      const cleat = (legSupport: number): Json => ({
        ...web,
        joint: { cleat: { legSupport }, supportBolts: { crossCentres: 110 } },
      });
      // 7.9/2 + 96 = 99.95, + 97 = 100.95
      expect(checkOf('double-cleat', cleat(96), 'fit-edge-plate').state).toBe('holds');
      expect(checkOf('double-cleat', cleat(97), 'fit-edge-plate').resistance).toBeCloseTo(100.95, 9);
    });

    test('leaves the wrench 25 mm to its flange: 112.85 − c_c/2', () => {
      expect(checkOf('end-plate', plate(220, 175), 'fit-wrench').state).toBe('holds');
      const near = said(checkOf('end-plate', plate(220, 176), 'fit-wrench'));
      expect(near).toMatchObject({ state: 'refer', of: "support bolts, column's flange", demand: 25 });
      expect(near.resistance).toBeCloseTo(24.85, 9);
    });
  });

  describe('a beam 177.9 mm wide between the flanges of a column', () => {
    const clearance = (section: string, change: Json = {}): Check =>
      checkOf('end-plate', changed(on('column-web', section), change), 'fit-cope-clearance');

    test('has 5 mm on either side, or refers; where it does not go in it cannot be built', () => {
      // 254.1/2 − 14.2 − 88.95 = 23.9
      expect(clearance('UC 254x254x73')).toMatchObject({ state: 'holds', demand: 5 });
      expect(clearance('UC 254x254x73').resistance).toBeCloseTo(23.9, 9);
      // 203.2/2 − 11 − 88.95 = 1.65
      expect(clearance('UC 203x203x46')).toMatchObject({ state: 'refer', reason: 'too-little', demand: 5 });
      expect(clearance('UC 203x203x46').resistance).toBeCloseTo(1.65, 9);
      // 157.6/2 − 9.4 − 88.95 = −19.55
      expect(clearance('UC 152x152x30')).toMatchObject({ state: 'fails', reason: 'clash' });
    });

    test('whose flanges are both cut back past those of the column goes in between them', () => {
      // The column's flanges reach (203.6 − 7.2)/2 = 98.2 from its web; the plate 10 and the notch 88.2.
      const cut = (length: number) => ({ top: { length }, bottom: { length: 110, depth: 45, radius: 10 } });
      expect(clearance('UC 203x203x46', cut(88.2)).state).toBe('notApplicable');
      expect(clearance('UC 203x203x46', cut(88)).state).toBe('refer');
      expect(clearance('UC 203x203x46', { top: { length: 110 } }).state).toBe('refer');
    });

    test('a channel reaches from the middle of its web to one side', () => {
      // PFC 300x100x46: t_w 9, so 100 − 4.5 = 95.5; 254.1/2 − 14.2 − 95.5 = 17.35
      const channel = { beam: { section: 'PFC 300x100x46' }, joint: { plate: { depth: 200 } } };
      expect(clearance('UC 254x254x73', channel).resistance).toBeCloseTo(17.35, 9);
    });
  });

  describe('the web of a supporting UB 610x229x125: h 612.2, t_f 19.6, r 12.7', () => {
    const level = (topOfSteel: number): Json => ({
      ...on('beam-web', 'UB 610x229x125', { topOfSteel }),
      joint: { plate: { depth: 250 } },
    });
    const placed = (topOfSteel: number) => said(checkOf('end-plate', level(topOfSteel), 'fit-plate-depth'));

    test('its flat begins 32.3 mm below its top: a plate 60 mm below the beam may stand 27.7 higher', () => {
      expect(placed(-27.7).state).toBe('holds');
      const part = { of: "top, on the support's web", demand: expect.closeTo(32.3, 9) };
      expect(placed(-28)).toEqual({ ...part, state: 'refer', reason: 'too-little', resistance: 32 });
      // Above the underside of the flange, 19.6, it lies off the web.
      expect(placed(-41)).toEqual({ ...part, state: 'fails', reason: 'clash', resistance: 19 });
    });

    test('it ends as far above its foot: 612.2 − 32.3 − 60 − 250 = 269.9 mm below a beam that hangs low', () => {
      expect(placed(269.9).state).toBe('holds');
      const part = { of: "bottom, on the support's web", demand: expect.closeTo(32.3, 9) };
      expect(placed(270)).toEqual({
        ...part,
        state: 'refer',
        reason: 'too-little',
        resistance: expect.closeTo(32.2, 9),
      });
      expect(placed(283)).toEqual({ ...part, state: 'fails', reason: 'clash', resistance: expect.closeTo(19.2, 9) });
    });

    test('a fin plate lies there as well', () => {
      const plate = (topOfSteel: number) =>
        said(checkOf('example', on('beam-web', 'UB 610x229x125', { topOfSteel }), 'fit-plate-depth'));
      // Its top stands 90 − 40 = 50 below the beam's.
      expect(plate(-31)).toMatchObject({ state: 'fails', reason: 'clash', resistance: 19 });
      expect(plate(0).state).toBe(checkOf('example', {}, 'fit-plate-depth').state);
    });

    test('leaves the wrench of the outer rows 25 mm to its root fillets', () => {
      const wrench = (topOfSteel: number) => said(checkOf('end-plate', level(topOfSteel), 'fit-wrench'));
      // 60 + 40 − 32.3 = 67.7 from the first row, less what the support lies lower
      expect(wrench(-42.7).state).toBe('holds');
      const top = wrench(-43);
      expect(top).toMatchObject({ state: 'refer', of: "support bolts, support's top flange", demand: 25 });
      expect(top.resistance).toBeCloseTo(24.7, 9);
      // 612.2 − 240 − 32.3 = 339.9 from the last row
      expect(wrench(314.9).state).toBe('holds');
      const foot = wrench(315);
      expect(foot).toMatchObject({ state: 'refer', of: "support bolts, support's bottom flange", demand: 25 });
      expect(foot.resistance).toBeCloseTo(24.9, 9);
    });
  });

  test('a web bolted to a ply of the support is not asked where that ply lies', () => {
    const low = on('beam-web', 'UB 610x229x125', { topOfSteel: -41 });
    expect(checkOf('web-bolts', low, 'fit-plate-depth').reason).not.toBe('clash');
  });
});

test('what lies off the support is said in both regions', () => {
  for (const region of ['commonwealth', 'north-america'] as const) {
    expect(wordsFor(region).reasons.clash).toBe('cannot be built so: parts clash, or lie off the support');
  }
});
