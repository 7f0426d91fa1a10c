import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { as4100 } from '../../../core/standards/as4100/index.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { publishedFixtures } from '../../support/published.ts';

type Json = Record<string, unknown>;

const endOf = (id: string): Json => publishedFixtures().find((one) => one.id === `as-4100-${id}-hand`)!.end as Json;
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
    plate: { thickness: 10, width: 220, depth: 401, grade: '250', top: 1 },
  },
};

const checkOf = (end: Json, change: Json, id: string): Check =>
  reportOf(changed(end, change), false).checks.find((one) => one.id === id)!;
const stateOf = (end: Json, change: Json, id: string) => {
  const { state, reason } = checkOf(end, change, id);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const codesOf = (end: Json, change: Json) => {
  const outcome = checkEnd(changed(end, change));
  return 'faults' in outcome ? outcome.faults.map(({ code }) => code) : [];
};
const inSupport = (more: Json): Json => ({ joint: { supportBolts: more } });
const opposite = (otherReaction: number, more: Json = {}): Json => ({ support: { otherReaction, ...more } });

describe('steels of cleats and end plates under AS 4100', () => {
  test('a cleat is rolled, AS/NZS 3679.1; an end plate is plate, AS/NZS 3678: 10 mm of grade 300 yield at 320 and 310 MPa', () => {
    expect(as4100.materials.cleats!.strengthAt('300', 10)).toEqual({ fy: 320, fu: 440 });
    expect(as4100.materials.plates.strengthAt('300', 10)).toEqual({ fy: 310, fu: 430 });
  });

  test('a grade that is rolled as plate only is refused for a cleat', () => {
    expect(codesOf(pair, { joint: { cleat: { grade: '250' } } })).toEqual(['unknown-grade']);
    expect(codesOf(endPlate, {})).toEqual([]);
  });
});

describe('legs of cleats under AS 4100', () => {
  test('a welded leg has no block: the other one stands', () => {
    expect(checkOf(webWelded, {}, 'cleat-block').of).toBe('support leg');
    expect(checkOf(supportWelded, {}, 'cleat-block').of).toBe('web leg');
    expect(stateOf(webWelded, {}, 'cleat-bearing')).toBe('notApplicable, no-web-holes');
    for (const id of ['support-bolt-shear', 'support-bearing']) {
      expect(stateOf(supportWelded, {}, id)).toBe('notApplicable, no-support-bolts');
    }
  });

  test('option plate-block: non-uniform halves the tension plane in both legs', () => {
    const uneven = checkOf(pair, { options: { 'plate-block': 'non-uniform' } }, 'cleat-block').resistance;
    // 2 × 0.75 × [0.6 × 440 × 1200 + 0.5 × 440 × 228]
    expect(uneven).toBeCloseTo(2 * 0.75 * (316.8 + 50.16), 9);
  });

  test('one bolt of one cleat in the support refers without a number; two, one on either side of the web, do not', () => {
    const oneRow = inSupport({ rows: 1, topEdge: 105 });
    for (const id of ['support-bolt-shear', 'support-bearing']) {
      expect(stateOf(single, oneRow, id)).toBe('refer, one-bolt');
      expect(checkOf(single, oneRow, id).resistance).toBeNull();
      expect(stateOf(pair, { ...oneRow, reaction: 100 }, id)).toBe('holds');
    }
  });

  test('the weld along the web says when its leg is below the least for the thicker of cleat and web', () => {
    const thin = (reaction: number) =>
      stateOf(webWelded, { reaction, joint: { cleat: { webWeld: { leg: 3.9 } } } }, 'weld-web');
    expect(thin(60)).toBe('refer, weld-leg-below-least');
    expect(thin(400)).toBe('fails');
  });
});

describe('bolts into the support under AS 4100', () => {
  test('bear towards the nearer of upper and lower edge', () => {
    const low = checkOf(pair, inSupport({ topEdge: 42 }), 'support-bearing');
    // Below the last row 28 remain: 0.9 × (28 − 1) × 10 × 440.
    expect(low.resistance).toBeCloseTo(0.9 * 27 * 4.4, 9);
  });

  test('holes wider than the standard ones refer in bearing there, and there alone', () => {
    expect(stateOf(pair, inSupport({ hole: 24 }), 'support-bearing')).toBe('refer, hole-above-standard');
    expect(stateOf(pair, inSupport({ hole: 24 }), 'cleat-bearing')).toBe('holds');
  });

  test('a size without a core area refers, without a number where threads lie in the plane', () => {
    const inch = { size: '3/4', grade: { fu: 830 } };
    expect(stateOf(pair, inSupport(inch), 'support-bolt-shear')).toBe('refer, bolt-not-listed');
    expect(checkOf(pair, inSupport(inch), 'support-bolt-shear').resistance).toBeNull();
    expect(checkOf(pair, inSupport({ ...inch, threads: 'out' }), 'support-bolt-shear').resistance).not.toBeNull();
  });

  test('without a support only leg or plate bears', () => {
    expect(checkOf(webWelded, {}, 'support-bearing').of).toBe('up');
    expect(stateOf(webWelded, {}, 'support-shear')).toBe('notApplicable, no-support');
  });
});

describe('a beam on the other side under AS 4100', () => {
  const thin = { section: undefined, thickness: 5 };

  test("adds its reaction on a shared web, not on a column's flange", () => {
    const web = checkOf(pair, opposite(120, thin), 'support-bearing');
    expect(web.of).toBe('support');
    expect(web.demand).toBe(270);
    const flange = checkOf(pair, opposite(120, { ...thin, kind: 'column-flange' }), 'support-bearing');
    expect(flange.reactionAtFailure).toBeCloseTo(689.04, 6);
  });

  test('that uses the web up leaves nothing: it fails at every reaction', () => {
    const all = opposite(700, thin);
    expect(checkOf(pair, all, 'support-bearing').reactionAtFailure).toBe(0);
    expect(stateOf(pair, all, 'support-bearing')).toBe('fails, nothing-left');
  });

  test('refers with the one line of one cleat', () => {
    expect(stateOf(single, opposite(20), 'support-bearing')).toBe('refer, one-line-opposite');
    expect(stateOf(single, opposite(0), 'support-bearing')).toBe('holds');
  });
});

describe('end plates under AS 4100', () => {
  const rows = ['gross-shear', 'block', 'web-shear'].map((name) => `endplate-${name}`);
  const joint = [...rows, 'weld-web', 'support-bolt-shear', 'support-bearing', 'support-shear'];

  test('have no rule for net shear; tear-out is part of the bearing at the support bolts', () => {
    expect(stateOf(endPlate, {}, 'endplate-net-shear')).toBe('notApplicable, no-rule');
    for (const id of ['endplate-bearing', 'endplate-tearout']) {
      expect(stateOf(endPlate, {}, id)).toBe('notApplicable, covered');
    }
  });

  test('of the full depth refer in every row of the joint that would hold, and fail where it fails', () => {
    for (const id of joint) {
      expect(stateOf(fullDepth, {}, id), id).toBe('refer, full-depth-plate');
      expect(checkOf(fullDepth, {}, id).resistance, id).not.toBeNull();
      expect(stateOf(endPlate, {}, id), id).toBe('holds');
    }
    expect(stateOf(fullDepth, { reaction: 600 }, 'support-bolt-shear')).toBe('fails');
  });

  test('weld: GP takes 0.60 in place of 0.80; the category is said of every weld', () => {
    const gp = { options: { weld: 'GP' } };
    expect(checkOf(endPlate, gp, 'weld-web').resistance).toBeCloseTo(
      0.75 * checkOf(endPlate, {}, 'weld-web').resistance!,
      9,
    );
    const said = (end: Json) => reportOf(end, false).notes.map(({ code }) => code);
    for (const end of [endPlate, webWelded, supportWelded]) expect(said(end)).toContain('weld-category');
    expect(said(pair)).not.toContain('weld-category');
  });
});

describe('a tie force under AS 4100', () => {
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

describe('fit of cleats and end plates under AS 4100', () => {
  test('pitch of the support bolts from 2.5 d to 15 t of leg or plate', () => {
    expect(stateOf(endPlate, inSupport({ pitch: 49 }), 'fit-pitch')).toBe('fails, too-little');
    const tall = { top: null, joint: { plate: { depth: 380, top: 23 }, supportBolts: { topEdge: 40 } } };
    expect(stateOf(endPlate, changed(tall, inSupport({ pitch: 150 })), 'fit-pitch')).toBe('holds');
    expect(stateOf(endPlate, changed(tall, inSupport({ pitch: 151 })), 'fit-pitch')).toBe('fails, too-much');
  });

  test('the two lines stand 2.5 d apart; one line has no cross centres', () => {
    expect(stateOf(endPlate, inSupport({ crossCentres: 48 }), 'fit-gauge')).toBe('fails, too-little');
    expect(stateOf(single, {}, 'fit-gauge')).toBe('notApplicable, single-column');
  });

  test("1.25 d to a cleat's rolled toes, 1.75 d to the cut edges of an end plate", () => {
    const centres = (crossCentres: number) => inSupport({ crossCentres });
    // 100 − (157.6 − 7.6)/2 = 25
    expect(stateOf(pair, centres(157.6), 'fit-edge-plate')).toBe('holds');
    expect(stateOf(pair, centres(158), 'fit-edge-plate')).toBe('fails, too-little');
    expect(stateOf(endPlate, centres(150), 'fit-edge-plate')).toBe('holds');
    expect(stateOf(endPlate, centres(151), 'fit-edge-plate')).toBe('fails, too-little');
  });

  test('cleat and end plate turn by bending: no thicker than half the support bolt and 2 mm', () => {
    const thick = { joint: { plate: { thickness: 12.5 } } };
    expect(stateOf(endPlate, thick, 'fit-rotation')).toBe('refer, too-much');
    expect(stateOf(endPlate, changed(thick, inSupport({ size: 'M24' })), 'fit-rotation')).toBe('holds');
  });

  test('an end plate fills the setback', () => {
    expect(stateOf(endPlate, { setback: 40 }, 'fit-setback')).toBe('notApplicable, fills-setback');
  });
});
