import { describe, expect, test } from 'vitest';
import type { Check } from '../../../core/check/report.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';

type Json = Record<string, unknown>;

const endOf = (name: string): Json => goodEnds().find((one) => one.name === name)!.end;
const pair = endOf('double-cleat');
const opposite = endOf('double-cleat-other-beam');
const single = endOf('single-cleat');
const webWelded = endOf('double-cleat-web-welded');
const supportWelded = endOf('double-cleat-support-welded');
const endPlate = endOf('end-plate');
const fullDepth = endOf('full-end-plate');
const finPlate = endOf('example');

const checkOf = (end: Json, id: string, change: Json = {}): Check =>
  reportOf(changed(end, change)).checks.find((one) => one.id === id)!;
const stateOf = (end: Json, id: string, change: Json = {}): string => {
  const { state, reason } = checkOf(end, id, change);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const supportBolts = (more: Json): Json => ({ joint: { supportBolts: more } });

describe('cleats under SANS 10162-1', () => {
  test('a pair shears its web bolts in two planes and shares bearing, block and bending; the web bears the whole force', () => {
    // R_max 0.515216 × 165; a bolt 0.6 × 0.8 × 314.16 × 830 × 0.7 in one plane
    expect(checkOf(pair, 'bolt-shear').resistance).toBeCloseTo(2 * 87.613, 2);
    expect(checkOf(pair, 'cleat-bearing').demand).toBeCloseTo((165 * 0.515216) / 2, 3);
    expect(checkOf(pair, 'web-bearing').demand).toBeCloseTo(165 * 0.515216, 3);
    const notes = checkOf(pair, 'support-bolt-shear').working!.map(({ note }) => note);
    expect(notes).toContain('shared evenly: the eccentricities of the two sides balance');
  });

  test('one cleat alone hangs at an arm: its bolts into the support take more than their even share, and its leg tears along', () => {
    expect(checkOf(single, 'support-bolt-shear').demand).toBeGreaterThan(70 / 3);
    expect(checkOf(single, 'cleat-tearout').of).toBe('support leg, along');
    expect(checkOf(pair, 'cleat-tearout').of).toBe('web leg, along');
  });

  test('one bolt alone in the support leg of one cleat holds no moment: it fails at no reaction at all; a pair has two', () => {
    const oneRow = supportBolts({ rows: 1, topEdge: 110 });
    for (const id of ['support-bolt-shear', 'support-bearing']) {
      expect(checkOf(single, id, oneRow)).toMatchObject({ state: 'fails', reason: 'one-bolt', reactionAtFailure: 0 });
      expect(stateOf(pair, id, oneRow)).toBe('holds');
    }
  });

  test('a pair does not buckle, a short leg neither; the leg of one cleat whose bolts stand beyond t/0.15 may', () => {
    expect(stateOf(pair, 'cleat-buckling')).toBe('notApplicable, pair-of-cleats');
    expect(stateOf(single, 'cleat-buckling')).toBe('notApplicable, short-plate');
    const long = { joint: { endDistance: 60, cleat: { legWeb: 120, thickness: 8 } } };
    expect(stateOf(single, 'cleat-buckling', long)).toBe('holds');
  });

  test('a welded leg of one cleat is free from the heel to the ends of its weld: returns too short leave it long', () => {
    const { bolts: _, firstRow: __, endDistance: ___, ...joint } = single.joint as Json;
    const leg = (weldReturn: number): Json => ({
      ...single,
      joint: {
        ...joint,
        cleat: { ...(webWelded.joint as { cleat: Json }).cleat, thickness: 8, webWeld: { leg: 6, return: weldReturn } },
      },
    });
    expect(stateOf(leg(80), 'cleat-buckling')).toBe('notApplicable, short-plate');
    // 90 − 20 = 70 > 8/0.15
    expect(checkOf(leg(20), 'cleat-buckling').demand).toBeCloseTo(70 * 0.07, 9);
  });

  test('a welded leg has no block and no net section: the other one stands', () => {
    for (const id of ['cleat-block', 'cleat-net-shear']) {
      expect(checkOf(webWelded, id).of).toBe('support leg');
      expect(checkOf(supportWelded, id).of).toBe('web leg');
    }
    expect(stateOf(webWelded, 'cleat-bearing')).toBe('notApplicable, no-web-holes');
    expect(stateOf(supportWelded, 'support-bearing')).toBe('notApplicable, no-support-bolts');
  });

  test('the welds of a pair pull on the same web: a thin web gives before the weld metal', () => {
    expect(checkOf(webWelded, 'weld-web').of).toBe('web');
    const thick = { beam: { section: { depth: 406, width: 178, flange: 13, web: 20, radius: 10 } } };
    expect(checkOf(webWelded, 'weld-web', thick).of).toBe('web leg');
  });

  test('a weld leg below the least for the thicker part refers', () => {
    const thin = (end: Json, name: string) =>
      changed(end, { reaction: 50, joint: { cleat: { [name]: { leg: 4.9 } } } });
    expect(stateOf(thin(webWelded, 'webWeld'), 'weld-web')).toBe('refer, weld-leg-below-least');
    expect(stateOf(thin(supportWelded, 'supportWeld'), 'weld')).toBe('refer, weld-leg-below-least');
    expect(stateOf(supportWelded, 'weld', { reaction: 100 })).toBe('holds');
  });
});

describe('end plates under SANS 10162-1', () => {
  test('the weld counts without a leg at each end; a leg that leaves nothing of it fails at no reaction at all', () => {
    const working = checkOf(endPlate, 'weld-web').working!;
    expect(working.find(({ symbol }) => symbol === 'L_w')!.value).toBe(220 - 12);
    const huge = { joint: { webWeld: { leg: 110 } } };
    for (const id of ['weld-web', 'endplate-web-shear']) {
      expect(checkOf(endPlate, id, huge)).toMatchObject({ state: 'fails', reactionAtFailure: 0 });
    }
  });

  test('the web beside the weld is sheared once for both fillets', () => {
    // 0.54 × 355 × 7.9 × 208
    expect(checkOf(endPlate, 'endplate-web-shear').resistance).toBeCloseTo(315.001, 2);
  });

  test('nothing is drilled in the web, and the plate fills the setback', () => {
    for (const id of ['web-net-shear', 'web-block', 'web-tearout', 'web-bearing', 'fit-edge-web', 'fit-cope-length']) {
      expect(stateOf(endPlate, id)).toBe('notApplicable, no-web-holes');
    }
    expect(stateOf(endPlate, 'fit-setback')).toBe('notApplicable, fills-setback');
    expect(stateOf(endPlate, 'endplate-bearing')).toBe('notApplicable, covered');
  });

  test('of the full depth it is no simple joint: whatever would hold refers, whatever fails fails', () => {
    const rows = [
      'endplate-gross-shear',
      'endplate-net-shear',
      'endplate-block',
      'endplate-tearout',
      'endplate-web-shear',
      'weld-web',
      'support-bolt-shear',
      'support-bearing',
    ];
    for (const id of rows) {
      expect(stateOf(fullDepth, id)).toBe('refer, full-depth-plate');
      expect(stateOf(fullDepth, id, { reaction: 5000 })).toBe('fails');
    }
    expect(stateOf(fullDepth, 'fit-rotation')).toBe('refer, too-much');
    expect(stateOf(endPlate, 'fit-rotation')).toBe('holds');
  });
});

describe('a support and a beam on its other side', () => {
  test('the web of the support shears beside fin plates, cleats and end plates, where its grade is told', () => {
    // 2 × 0.54 × 355 × 11.9 × 220
    const told = { support: { kind: 'beam-web', section: 'UB 610x229x125', grade: 'S355JR' } };
    for (const end of [pair, endPlate, { ...finPlate, ...told }]) {
      expect(checkOf(end, 'support-shear').resistance).toBeCloseTo(1003.741, 2);
    }
    const untold = { support: { kind: 'beam-web', section: 'UB 610x229x125' } };
    expect(stateOf({ ...finPlate, ...untold }, 'support-shear')).toBe('notApplicable, support-not-told');
    expect(stateOf(single, 'support-shear')).toBe('notApplicable, no-support');
  });

  test('a beam opposite takes its share of a shared web; what it leaves is what V may grow to', () => {
    const alone = checkOf(pair, 'support-shear');
    const shared = checkOf(opposite, 'support-shear');
    expect(shared.reactionAtFailure).toBeCloseTo(alone.reactionAtFailure! - 120, 9);
    expect(shared.demand).toBeCloseTo(165 + 120, 9);
    const all = { support: { otherReaction: 1100 } };
    expect(checkOf(opposite, 'support-shear', all)).toMatchObject({ state: 'fails', reactionAtFailure: 0 });
  });

  test("it is another flange that a column's other beam hangs on", () => {
    const flange = { kind: 'column-flange', thickness: 12, grade: 'S355JR', otherReaction: 500 };
    const end = { ...pair, support: flange };
    expect(stateOf(end, 'support-shear')).toBe('notApplicable, support-flange');
    expect(stateOf(end, 'support-bearing')).toBe('holds');
    expect(stateOf({ ...pair, support: { ...flange, kind: 'column-web' } }, 'support-bearing')).toBe('holds');
  });

  test('how a beam opposite shares in the line of one cleat is not known: it refers', () => {
    const support = { kind: 'column-web', thickness: 12, grade: 'S355JR', otherReaction: 50 };
    expect(stateOf({ ...single, support }, 'support-bearing')).toBe('refer, one-line-opposite');
    expect(stateOf({ ...single, support: { ...support, otherReaction: 0 } }, 'support-bearing')).toBe('holds');
  });

  test('support holes wider than the standard ones refer in bearing', () => {
    expect(stateOf(pair, 'support-bearing', supportBolts({ hole: 24 }))).toBe('refer, hole-above-standard');
  });
});

describe('a tie force', () => {
  test('through cleats has its number in web and web legs, and refers: their support legs bend and pull at the bolts', () => {
    expect(checkOf(opposite, 'web-tie')).toMatchObject({ state: 'refer', reason: 'tie-bends-legs', of: 'rows, web' });
    expect(stateOf(opposite, 'web-tie', { tie: 600 })).toBe('fails');
  });

  test('through a welded leg or an end plate has no formula: it never passes by silence', () => {
    for (const end of [webWelded, endPlate, fullDepth]) {
      expect(checkOf(end, 'web-tie', { tie: 1 })).toMatchObject({ state: 'refer', reason: 'tie-not-covered' });
      expect(stateOf(end, 'web-tie')).toBe('notApplicable, no-tie');
    }
    expect(checkOf(supportWelded, 'web-tie', { tie: 1 }).state).toBe('refer');
  });
});

describe('fit of cleats and end plates', () => {
  test('the bolts into the support keep the same spacing and edges as others, by their own size', () => {
    expect(stateOf(pair, 'fit-pitch', supportBolts({ pitch: 53 }))).toBe('fails, too-little');
    expect(stateOf(pair, 'fit-edge-plate', supportBolts({ topEdge: 33 }))).toBe('fails, too-little');
    // M24 sheared: 42
    expect(stateOf(pair, 'fit-edge-plate', supportBolts({ size: 'M24' }))).toBe('fails, too-little');
  });

  test('the toe of a cleat is rolled, 26 for M20; the side of an end plate is sheared, 34', () => {
    // 100 − (146 − 7.9)/2 = 30.95; (200 − 140)/2 = 30
    expect(stateOf(pair, 'fit-edge-plate', supportBolts({ crossCentres: 146 }))).toBe('holds');
    const narrow = { joint: { plate: { width: 200 } } };
    expect(checkOf(endPlate, 'fit-edge-plate', narrow)).toMatchObject({ state: 'fails', of: 'side, support bolts' });
    const cut = { ...narrow, options: { 'plate-edges': 'cut' } };
    expect(stateOf(endPlate, 'fit-edge-plate', cut)).toBe('holds');
  });

  test('cleat and end plate bend with the end while they are at most d/2 + 2 thick, d the smaller bolt', () => {
    expect(stateOf(single, 'fit-rotation')).toBe('holds');
    expect(stateOf(single, 'fit-rotation', { joint: { cleat: { thickness: 12.5 } } })).toBe('refer, too-much');
    expect(stateOf(single, 'fit-rotation', supportBolts({ size: 'M16' }))).toBe('refer, too-much');
    expect(stateOf(single, 'fit-rotation', supportBolts({ size: 'M24' }))).toBe('holds');
  });

  test('a cleat whose top stands above the cut edge refers', () => {
    const high = { joint: { cleat: { top: 44 } } };
    expect(checkOf(webWelded, 'fit-plate-depth', high)).toMatchObject({ state: 'refer', of: 'top' });
  });
});
