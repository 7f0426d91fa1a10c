import { describe, expect, test } from 'vitest';
import { changed } from '../../support/changed.ts';
import { bolts, checkOf, end, long, notesOf, option, rowOf, stateOf, strengthOf, twoCopes } from './aisc360Ends.ts';

describe('bolts and bearing', () => {
  test('holes above the standard ones refer even where the number fails', () => {
    const wide = { reaction: 500, ...bolts({ hole: 0.875 }) };
    for (const id of ['bolt-shear', 'web-bearing', 'web-tearout', 'plate-bearing']) {
      const { state, utilisation, reason } = checkOf(wide, id);
      expect([id, state, reason]).toEqual([id, 'refer', 'hole-above-standard']);
      expect(utilisation).toBeGreaterThan(1);
    }
  });

  test('one bolt alone refers, without a number', () => {
    expect(stateOf(bolts({ rows: 1 }), 'bolt-shear')).toBe('refer, one-bolt');
    expect(checkOf(bolts({ rows: 1 }), 'bolt-shear').resistance).toBeNull();
  });

  test('rows longer than 38 in carry 0.833 of their shear', () => {
    const deep = changed(end, { beam: { section: 'W44x335' }, joint: { bolts: { rows: 10, pitch: 4.25 } } });
    expect(rowOf({}, 'bolt-shear', 'r_v', deep) / rowOf({}, 'bolt-shear', 'r_v')).toBeCloseTo(0.833, 9);
  });

  test('bearing where the deformation of holes is not counted: 3.0 for 2.4', () => {
    const free = option('hole-deformation', 'not-considered');
    expect(strengthOf(free, 'web-bearing') / strengthOf({}, 'web-bearing')).toBeCloseTo(3 / 2.4, 9);
  });

  test('the first row tears out to the cut edge: 1.2 (a_t − d_0/2) t F_u', () => {
    // a_t = 3.25 - 1.75 = 1.5: 1.2 x (1.5 - 0.40625) x 0.355 x 65
    expect(rowOf({}, 'web-tearout', 'r_w1')).toBeCloseTo(30.286, 3);
    expect(stateOf({ top: null, support: undefined }, 'web-tearout')).toBe('notApplicable, intact-flange');
  });

  test('the end distance is used 1/4 in shorter than drawn, 6 mm with metric bolts, unless the option says as drawn', () => {
    const row = checkOf({}, 'web-block').working!.find(({ symbol }) => symbol === 'e′')!;
    expect([row.numbers, row.value]).toEqual(['1.75 − 0.25', expect.closeTo(1.5, 9)]);
    expect(rowOf({}, 'web-block', 'e′', twoCopes)).toBe(39);
    expect(strengthOf(option('end-underrun', 'as-drawn'), 'web-block')).toBeGreaterThan(strengthOf({}, 'web-block'));
  });

  test('with two columns the tension plane counts half, in the web those inside the cope', () => {
    const two = { joint: { bolts: { columns: 2, gauge: 3 } } };
    expect(rowOf({ top: { length: 6 }, ...two }, 'web-block', 'U_bs')).toBe(0.5);
    expect(rowOf({ top: { length: 4 }, ...two }, 'web-block', 'U_bs')).toBe(1);
    expect(rowOf(two, 'plate-block', 'U_bs')).toBe(0.5);
  });
});

describe('copes', () => {
  const five = ['cope-shear', 'web-net-shear', 'web-block', 'cope-bending', 'cope-buckling'];

  test('a hole at the face of a cope, or a flange left, turns five checks to refer and keeps their numbers', () => {
    for (const [change, reason] of [
      [{ top: { length: 1.75 } }, 'hole-at-cope-face'],
      [{ top: { depth: 0.5 }, joint: { firstRow: 3 } }, 'flange-left'],
    ] as const) {
      for (const id of five) {
        const found = checkOf({ ...change, support: undefined }, id);
        expect([id, found.state, found.reason]).toEqual([id, 'refer', reason]);
        expect(found.reactionAtFailure).toBeGreaterThan(0);
      }
    }
  });

  test('a web too slender to yield first refers, even where the number fails', () => {
    const thin = { beam: { section: { depth: 18, width: 7.5, flange: 0.57, web: 0.2, radius: 0.4 }, grade: 'A992' } };
    expect(stateOf({ ...thin, reaction: 500 }, 'cope-shear')).toBe('refer, slender-cut-web');
    expect(stateOf({ ...thin, reaction: 500 }, 'cope-buckling')).toBe('refer, slender-cut-web');
  });

  test('a top cope longer than 2 h or deeper than h/2 refers', () => {
    expect(stateOf({ top: { length: 36.5 } }, 'cope-buckling')).toBe('refer, cope-longer-than-method');
    const deep = { top: { depth: 9.5 }, joint: { firstRow: 11, bolts: { rows: 2 } } };
    expect(stateOf(deep, 'cope-buckling')).toBe('refer, cope-deeper-than-method');
    expect(stateOf(deep, 'fit-cope-depth')).toBe('refer, too-much');
  });

  test('two copes: 0.4 h each, by the 14th edition 0.2 h', () => {
    expect(stateOf({}, 'cope-buckling', twoCopes)).toBe('holds');
    expect(stateOf({ top: { depth: 90 } }, 'cope-buckling', twoCopes)).toBe('holds');
    const older = { options: { 'cope-method': 'older' }, top: { depth: 90 } };
    expect(stateOf(older, 'cope-buckling', twoCopes)).toBe('refer, cope-deeper-than-method');
    expect(stateOf(older, 'fit-cope-depth', twoCopes)).toBe('refer, too-much');
  });

  test('two copes: the arm goes to the longer one, by option to the top one', () => {
    const bottomLonger = { bottom: { length: 300 }, options: undefined };
    const toLonger = checkOf({ ...bottomLonger, reaction: 1 }, 'cope-buckling', twoCopes);
    const toTop = checkOf(
      { ...bottomLonger, reaction: 1, options: { 'double-cope-arm': 'top' } },
      'cope-buckling',
      twoCopes,
    );
    expect([toLonger.demand, toTop.demand]).toEqual([expect.closeTo(0.312, 9), expect.closeTo(0.212, 9)]);
    expect(notesOf({}, twoCopes)).not.toContain('double-cope-arm');
    expect(notesOf({ options: undefined }, twoCopes)).toContain('double-cope-arm');
  });

  test('a bottom cope alone does not buckle; its stem in tension yields at no more than 1.6 F_y S', () => {
    const bottom = { top: null, bottom: { length: 5, depth: 2, radius: 0.5 }, support: undefined };
    expect(stateOf(bottom, 'cope-buckling')).toBe('notApplicable, cut-edge-in-tension');
    const last = checkOf(bottom, 'cope-bending').working!.find(({ symbol }) => symbol === 'M_n')!;
    expect(last.expression).toBe('min(F_y Z; 1.6 F_y S)');
  });

  test('the elastic shear stress has no limit here: for information, and no rule where a verdict is asked for', () => {
    expect(stateOf({}, 'stress-cope')).toBe('information');
    expect(stateOf(option('elastic-shear', 'verdict'), 'stress-cope')).toBe('notApplicable, no-rule');
    expect(checkOf(option('elastic-shear', 'verdict'), 'stress-full').demand).toBeGreaterThan(0);
  });

  test('a coped channel refers without a number; its full section has φ 0.90', () => {
    const channel = {
      beam: { section: { depth: 18, width: 4, flange: 0.6, web: 0.4, radius: 0.6, family: 'channel' } },
    };
    for (const id of ['cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(stateOf(channel, id)).toBe('refer, channel-cope');
      expect(checkOf(channel, id).resistance).toBeNull();
    }
    // 0.9 x 0.6 x 50 x 18 x 0.4
    expect(strengthOf(channel, 'web-gross-shear')).toBeCloseTo(194.4, 9);
  });
});

describe('plate, weld, support, tie', () => {
  test('the twist of the lap is left out where a slab holds the beam', () => {
    expect(checkOf({}, 'plate-buckling', long).of).toBe('twist of the lap');
    expect(checkOf(option('lap-torsion', 'none'), 'plate-buckling', long).of).toBe('bar');
  });

  test('a weld that cannot make the plate yield refers where it carries the force, and fails where not', () => {
    const small = (reaction: number) => stateOf({ reaction, joint: { weld: { leg: 0.1875 } } }, 'weld');
    expect(stateOf({}, 'weld')).toBe('holds');
    expect(small(20)).toBe('refer, weld-leg-below-least');
    expect(small(200)).toBe('fails');
  });

  test('by its strength a weld of full size holds or fails with the reaction', () => {
    const byStrength = { options: { weld: 'strength' } };
    expect(checkOf(byStrength, 'weld').unit).toBe('kip/in');
    expect(stateOf(byStrength, 'weld')).toBe('holds');
    expect(stateOf({ ...byStrength, reaction: 500 }, 'weld')).toBe('fails');
  });

  test('the support shears where its thickness and grade are told', () => {
    expect(stateOf({}, 'support-shear')).toBe('holds');
    expect(stateOf({ support: { grade: undefined } }, 'support-shear')).toBe('notApplicable, support-not-told');
    expect(stateOf({ support: undefined }, 'support-shear')).toBe('notApplicable, no-support');
    const flange = { kind: 'column-flange', section: 'W14x90', grade: 'A992', topOfSteel: undefined };
    expect(stateOf({ support: flange }, 'support-shear')).toBe('holds');
  });

  test('a tie force is held by bolts and web alone, and the sheet says so', () => {
    expect(checkOf({}, 'web-tie').state).toBe('holds');
    expect(notesOf({})).toContain('tie-in-web-only');
    expect(stateOf({ tie: 0 }, 'web-tie')).toBe('notApplicable, no-tie');
    expect(notesOf({ tie: 0 })).not.toContain('tie-in-web-only');
  });
});
