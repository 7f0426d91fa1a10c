import { describe, expect, test } from 'vitest';
import type { Check } from '../../../core/check/report.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { publishedFixtures } from '../../support/published.ts';

type Json = Record<string, unknown>;

const endOf = (id: string): Json => publishedFixtures().find((one) => one.id === `is-800-${id}-hand`)!.end as Json;
const pair = endOf('double-cleat');
const single = endOf('single-cleat');
const webWelded = endOf('double-cleat-web-welded');
const supportWelded = endOf('double-cleat-support-welded');
const endPlate = endOf('end-plate');
/** The same plate over the depth of a beam that is not notched. */
const fullDepth: Json = {
  ...endPlate,
  top: null,
  joint: {
    ...(endPlate.joint as Json),
    kind: 'full-end-plate',
    plate: { thickness: 10, width: 220, depth: 398, grade: 'E250', top: 1 },
  },
};

const checkOf = (end: Json, change: Json, id: string): Check =>
  reportOf(changed(end, change), false).checks.find((one) => one.id === id)!;
const stateOf = (end: Json, change: Json, id: string) => {
  const { state, reason } = checkOf(end, change, id);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const inSupport = (more: Json): Json => ({ joint: { supportBolts: more } });
const opposite = (otherReaction: number, more: Json = {}): Json => ({ support: { otherReaction, ...more } });

describe('legs of cleats under IS 800', () => {
  test('a welded leg has no net section and no block: the other one stands', () => {
    for (const id of ['cleat-net-shear', 'cleat-block']) {
      expect(checkOf(webWelded, {}, id).of).toBe('support leg');
      expect(checkOf(supportWelded, {}, id).of).toBe('web leg');
    }
    expect(stateOf(webWelded, {}, 'cleat-bearing')).toBe('notApplicable, no-web-holes');
    for (const id of ['support-bolt-shear', 'support-bearing']) {
      expect(stateOf(supportWelded, {}, id)).toBe('notApplicable, no-support-bolts');
    }
  });

  test('punched holes in the support leg count 2 mm wider in its net section', () => {
    const punched = checkOf(pair, inSupport({ holes: 'punched' }), 'cleat-net-shear');
    expect(punched.of).toBe('support leg');
    expect(punched.resistance).toBeCloseTo((2 * 0.9 * 410 * 10 * (220 - 3 * 24)) / (Math.sqrt(3) * 1.25) / 1000, 9);
  });

  test('option plate-bending: plastic takes the lesser of Z_p and 1.2 Z_e of both cleats', () => {
    const slender = { joint: { cleat: { topEdge: 30, bottomEdge: 30 } }, reaction: 10 };
    const bending = (options: Json) => checkOf(single, { ...slender, options }, 'cleat-bending').resistance!;
    expect(bending({})).toBeCloseTo((10 * 200 ** 2 * 250) / 6 / 1.1 / 1e6, 9);
    expect(bending({ 'plate-bending': 'plastic' })).toBeGreaterThan(bending({}));
  });

  test('one bolt of one cleat in the support refers without a number; two, one on either side of the web, do not', () => {
    const oneRow = inSupport({ rows: 1, topEdge: 110 });
    for (const id of ['support-bolt-shear', 'support-bearing']) {
      expect(stateOf(single, oneRow, id)).toBe('refer, one-bolt');
      expect(checkOf(single, oneRow, id).resistance).toBeNull();
      expect(stateOf(pair, { ...oneRow, reaction: 100 }, id)).toBe('holds');
    }
  });
});

describe('welds of cleats and end plates under IS 800', () => {
  test('along the web the weaker of weld metal, plate and web counts', () => {
    const weak = { beam: { grade: { fy: 230, fu: 380 } } };
    expect(checkOf(endPlate, weak, 'weld-web').resistance).toBeCloseTo((0.7 * 6 * 380) / (Math.sqrt(3) * 1.25), 9);
  });

  test('weld: site takes 1.50 in place of 1.25', () => {
    const shop = checkOf(endPlate, {}, 'weld-web').resistance!;
    expect(checkOf(endPlate, { options: { weld: 'site' } }, 'weld-web').resistance).toBeCloseTo((shop * 1.25) / 1.5, 9);
  });

  test('a leg below the least, or a throat below 3 mm, refers where the weld would hold', () => {
    const leg = (leg: number, reaction = 60) =>
      stateOf(endPlate, { reaction, joint: { webWeld: { leg } } }, 'weld-web');
    expect(leg(2.9)).toBe('refer, weld-leg-below-least');
    expect(leg(4.2)).toBe('refer, thin-throat');
    expect(leg(4.3)).toBe('holds');
    expect(leg(2.9, 300)).toBe('fails');
  });
});

describe('bolts into the support under IS 800', () => {
  test("the grip counts leg or plate and the support's ply, and says where that is not told", () => {
    const thick = { support: { section: undefined, thickness: 95 } };
    // Grip 105 > 5 d: 8 × 20/(3 × 20 + 105)
    expect(checkOf(endPlate, thick, 'support-bolt-shear').resistance).toBeCloseTo(93.923 * (160 / 165), 2);
    expect(
      stateOf(
        endPlate,
        { support: { section: undefined, thickness: 151, grade: { fy: 230, fu: 410 } } },
        'support-bolt-shear',
      ),
    ).toBe('refer, grip-too-long');
    const codes = (change: Json) => reportOf(changed(endPlate, change), false).notes.map(({ code }) => code);
    expect(codes({ support: undefined })).toContain('support-grip');
    expect(codes({})).not.toContain('support-grip');
  });

  test('the grip of the web bolts counts both cleats', () => {
    const thick = {
      joint: { cleat: { thickness: 80, legWeb: 200, legSupport: 220 }, supportBolts: { crossCentres: 220 } },
    };
    expect(stateOf(pair, thick, 'bolt-shear')).toBe('refer, grip-too-long');
  });

  test('bear towards the nearer of upper and lower edge', () => {
    const low = checkOf(pair, inSupport({ topEdge: 46 }), 'support-bearing');
    // Below the last row 34 remain: k_b = 34/66.
    expect(low.resistance).toBeCloseTo((2.5 * (34 / 66) * 20 * 10 * 410) / 1.25 / 1000, 9);
  });

  test('holes wider than the standard ones refer in bearing there, and there alone', () => {
    expect(stateOf(pair, inSupport({ hole: 24 }), 'support-bearing')).toBe('refer, hole-above-standard');
    expect(stateOf(pair, inSupport({ hole: 24 }), 'cleat-bearing')).toBe('holds');
  });

  test('a size without a tensile area refers', () => {
    const inch = { size: '3/4', grade: { fu: 830 } };
    expect(stateOf(pair, inSupport(inch), 'support-bolt-shear')).toBe('refer, bolt-not-listed');
    expect(checkOf(pair, inSupport(inch), 'support-bolt-shear').resistance).toBeNull();
  });
});

describe('a beam on the other side under IS 800', () => {
  const thin = { section: undefined, thickness: 6 };

  test("adds its reaction on a shared web, not on a column's flange", () => {
    expect(checkOf(pair, opposite(120, thin), 'support-bearing').demand).toBe(240);
    const flange = checkOf(pair, opposite(120, { ...thin, kind: 'column-flange' }), 'support-bearing');
    expect(flange.reactionAtFailure).toBeCloseTo(478.58, 2);
  });

  test('that uses the web up leaves nothing: it fails at every reaction', () => {
    expect(stateOf(pair, opposite(500, thin), 'support-bearing')).toBe('fails, nothing-left');
  });

  test('refers with the one line of one cleat', () => {
    expect(stateOf(single, opposite(20), 'support-bearing')).toBe('refer, one-line-opposite');
    expect(stateOf(single, opposite(0), 'support-bearing')).toBe('holds');
  });
});

describe('end plates under IS 800', () => {
  const rows = ['gross-shear', 'net-shear', 'block', 'web-shear'].map((name) => `endplate-${name}`);
  const joint = [...rows, 'weld-web', 'support-bolt-shear', 'support-bearing', 'support-shear'];

  test('of the full depth refer in every row of the joint that would hold, and fail where it fails', () => {
    for (const id of joint) {
      expect(stateOf(fullDepth, {}, id), id).toBe('refer, full-depth-plate');
      expect(checkOf(fullDepth, {}, id).resistance, id).not.toBeNull();
      expect(stateOf(endPlate, {}, id), id).toBe('holds');
    }
    expect(stateOf(fullDepth, { reaction: 600 }, 'support-bolt-shear')).toBe('fails');
  });

  test('leave the web without holes: its net shear, block, tear-out and bearing do not apply', () => {
    for (const id of ['web-net-shear', 'web-block', 'web-tearout', 'web-bearing']) {
      expect(stateOf(endPlate, {}, id)).toBe('notApplicable, no-web-holes');
    }
  });
});

describe('a tie force under IS 800', () => {
  test.each([
    ['an end plate', endPlate],
    ['a welded web leg', webWelded],
  ])('through %s refers without a number', (_, end) => {
    expect(stateOf(end, { tie: 0 }, 'web-tie')).toBe('notApplicable, no-tie');
    expect(stateOf(end, { tie: 20 }, 'web-tie')).toBe('refer, tie-not-covered');
    expect(checkOf(end, { tie: 20 }, 'web-tie').resistance).toBeNull();
    const notes = reportOf(changed(end, { tie: 20 }), false).notes.map(({ code }) => code);
    expect(notes).not.toContain('tie-in-web-only');
  });

  test('bends the support legs of cleats: it refers where bolts and web would hold, and fails where they do not', () => {
    for (const end of [pair, single, supportWelded]) {
      expect(stateOf(end, { tie: 20 }, 'web-tie')).toBe('refer, tie-bends-legs');
      expect(checkOf(end, { tie: 20 }, 'web-tie').resistance).not.toBeNull();
    }
    expect(stateOf(pair, { tie: 500 }, 'web-tie')).toBe('fails');
  });
});

describe('fit of cleats and end plates under IS 800', () => {
  test("1.5 d_0 to a cleat's rolled toes, 1.7 d_0 to the cut edges of an end plate", () => {
    const centres = (crossCentres: number) => inSupport({ crossCentres });
    // 100 − (142.9 − 8.9)/2 = 33
    expect(stateOf(pair, centres(142.9), 'fit-edge-plate')).toBe('holds');
    expect(stateOf(pair, centres(143), 'fit-edge-plate')).toBe('fails, too-little');
    expect(stateOf(endPlate, centres(145.2), 'fit-edge-plate')).toBe('holds');
    expect(stateOf(endPlate, centres(145.3), 'fit-edge-plate')).toBe('fails, too-little');
  });

  test('pitch of the support bolts from 2.5 d, their lines 2.5 d apart', () => {
    expect(stateOf(endPlate, inSupport({ pitch: 49 }), 'fit-pitch')).toBe('fails, too-little');
    expect(stateOf(endPlate, inSupport({ crossCentres: 48 }), 'fit-gauge')).toBe('fails, too-little');
    expect(stateOf(single, {}, 'fit-gauge')).toBe('notApplicable, single-column');
  });

  test('cleat and end plate turn by bending: no thicker than half the support bolt and 2 mm', () => {
    const thick = { joint: { plate: { thickness: 13 } } };
    expect(stateOf(endPlate, thick, 'fit-rotation')).toBe('refer, too-much');
    expect(stateOf(endPlate, changed(thick, inSupport({ size: 'M24' })), 'fit-rotation')).toBe('holds');
  });
});
