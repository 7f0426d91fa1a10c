import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import { is800 } from '../../../core/standards/is800/index.ts';
import { changed } from '../../support/changed.ts';
import { bolts, checkOf, end, iSection, type Json, notes, own, plate, rowOf, stateOf } from './is800Ends.ts';

describe('steels of IS 800', () => {
  const { sections } = is800.materials;

  test.each([
    ['E250', [250, 240, 230], 410],
    ['E300', [300, 290, 280], 440],
    ['E350', [350, 330, 320], 490],
    ['E410', [410, 390, 380], 540],
    ['E450', [450, 430, 420], 570],
  ])('%s yields at %j MPa below 20 mm, to 40 mm and above, and breaks at %d', (grade, yields, fu) => {
    expect([19.9, 40, 40.1].map((t) => sections.strengthAt(grade, t))).toEqual(yields.map((fy) => ({ fy, fu })));
    expect(sections.strengthAt(grade, 20)?.fy).toBe(yields[1]);
  });

  test('letters of quality change no strength', () => {
    expect(['E250', 'E250A', 'e250 br', 'E350B0', 'E350C'].map((name) => sections.named(name))).toEqual([
      'E250',
      'E250',
      'E250',
      'E350',
      'E350',
    ]);
    expect(sections.named('E250X')).toBeUndefined();
  });

  test('the lesser of web and flange counts behind a notch', () => {
    expect(rowOf(own({ ...iSection, flange: 20 }), 'cope-bending', 'f_yb')).toBe(240);
  });

  test('are said to be from memory', () => {
    expect(notes({})).toContain('memory-grade');
  });
});

describe('bolts and holes of IS 800', () => {
  test('8.8 breaks at 800 MPa up to M16 and at 830 above; 4.6 at 400, 10.9 at 1040', () => {
    const { bolt } = is800.materials;
    expect([12, 16, 20].map((d) => bolt('8.8', d)?.fub)).toEqual([800, 800, 830]);
    expect(['4.6', '10.9'].map((name) => bolt(name, 20)?.fub)).toEqual([400, 1040]);
  });

  test('holes are 1, 2 or 3 mm wider, and 2 mm more in net areas where punched', () => {
    const { holeFor, netHole } = is800.materials;
    expect([12, 16, 24, 27].map(holeFor)).toEqual([13, 18, 26, 30]);
    expect([netHole(22, 'drilled', 20), netHole(22, 'punched', 20)]).toEqual([22, 24]);
    expect(checkOf(bolts({ holes: undefined }), 'web-block').resistance).toBeCloseTo(270.517, 3);
  });

  test('threads out of the plane give the shank, 830 × 314.16/(√3 × 1.25) = 120.436 kN', () => {
    expect(checkOf(bolts({ threads: 'out' }), 'bolt-shear').resistance).toBeCloseTo(120.436, 3);
  });

  test('a size without a tensile area refers, without a number where threads lie in the plane', () => {
    const inch = { size: '3/4', grade: { fu: 830 } };
    expect(stateOf(bolts(inch), 'bolt-shear')).toBe('refer, bolt-not-listed');
    expect(checkOf(bolts(inch), 'bolt-shear').resistance).toBeNull();
    expect(stateOf(bolts({ ...inch, threads: 'out' }), 'bolt-shear')).toBe('refer, bolt-not-listed');
    expect(checkOf(bolts({ ...inch, threads: 'out' }), 'bolt-shear').resistance).not.toBeNull();
  });

  test('one bolt alone refers', () => {
    for (const id of ['bolt-shear', 'web-bearing', 'plate-bearing']) {
      expect(stateOf(bolts({ rows: 1 }), id)).toBe('refer, one-bolt');
    }
  });

  test('a grip beyond 5 d counts less, 8 × 16/(48 + 88.9); beyond 8 d it refers', () => {
    const grip = (thickness: number) => ({
      reaction: 30,
      ...plate({ thickness }),
      ...{ joint: { bolts: { size: 'M16' }, plate: { thickness } } },
    });
    expect(rowOf(grip(70), 'bolt-shear', 'β_lg')).toBe(1);
    expect(rowOf(grip(80), 'bolt-shear', 'β_lg')).toBeCloseTo(128 / 136.9, 12);
    expect(stateOf(grip(119), 'bolt-shear')).toBe('holds');
    expect(stateOf(grip(120), 'bolt-shear')).toBe('refer, grip-too-long');
  });

  test('a long joint takes its factor down in the grip too', () => {
    const long = { ...own({ ...iSection, depth: 900, width: 300 }), ...bolts({ size: 'M16', rows: 5, pitch: 100 }) };
    expect(rowOf(long, 'bolt-shear', 'β_lj')).toBeCloseTo(1.075 - 400 / 3200, 12);
    const thick = changed(long, plate({ thickness: 80 }));
    expect(rowOf(thick, 'bolt-shear', 'β_lg')).toBeCloseTo(128 / 136.9, 12);
    expect(rowOf(changed(thick, plate({ thickness: 72 })), 'bolt-shear', 'β_lg')).toBeCloseTo(0.95, 12);
  });

  test('holes wider than the standard ones refer in bearing', () => {
    expect(stateOf(bolts({ hole: 24 }), 'web-bearing')).toBe('refer, hole-above-standard');
  });
});

describe('bearing under IS 800 takes distances along the force', () => {
  test('upright from the cut edge and the pitch, only where the flange is cut away', () => {
    const low = { reaction: 60, joint: { firstRow: 75, endDistance: 80, plate: { topEdge: 30 } } };
    const up = (change: Json) => checkOf(changed(low, change), 'web-bearing');
    expect(up({ joint: { bolts: { rows: 2 } } }).of).toBe('resultant');
    const wide = { joint: { bolts: { rows: 2, columns: 2, pitch: 60, gauge: 160 } }, top: { length: 300 } };
    expect(up(wide)).toMatchObject({ of: 'up', resistance: expect.closeTo(2.5 * (30 / 66) * 20 * 8.9 * 0.328, 9) });
    expect(up({ ...wide, top: { length: 20 } })).toMatchObject({
      of: 'up',
      resistance: expect.closeTo(2.5 * (60 / 66 - 0.25) * 20 * 8.9 * 0.328, 9),
    });
  });
});

describe('the weld under IS 800', () => {
  const leg = (size: number, more: Json = {}): Json => ({ reaction: 30, joint: { weld: { leg: size }, ...more } });

  test('a plate less than six legs deep refers, one that two legs use up has no number', () => {
    const small = { bolts: { rows: 1 }, plate: { topEdge: 24, bottomEdge: 24 } };
    expect(stateOf(leg(9, small), 'weld')).toBe('refer, short-weld');
    expect(checkOf(leg(9, small), 'weld').resistance).not.toBeNull();
    expect(stateOf(leg(24, small), 'weld')).toBe('refer, short-weld');
    expect(checkOf(leg(24, small), 'weld').resistance).toBeNull();
  });

  test('a leg below the least for the thicker part, or a throat below 3 mm, refers where it would hold', () => {
    expect(stateOf(leg(4.9, { plate: { thickness: 12 } }), 'weld')).toBe('refer, weld-leg-below-least');
    expect(stateOf(leg(4.2), 'weld')).toBe('refer, thin-throat');
    expect(stateOf(leg(4.3), 'weld')).toBe('holds');
  });

  test('the weaker of weld metal and plate counts; option weld: site takes 1.50', () => {
    expect(checkOf(leg(8, { weld: { leg: 8, electrode: 490 } }), 'weld').resistance).toBeCloseTo(1060.477, 3);
    expect(checkOf({ options: { weld: 'site' } }, 'weld').resistance).toBeCloseTo((1060.477 * 1.25) / 1.5, 3);
  });
});

describe('options and fit of IS 800', () => {
  test('plate-bending: plastic changes nothing where the shear is high', () => {
    const options = { 'plate-bending': 'plastic' };
    expect(checkOf({ options }, 'plate-bending').resistance).toBeCloseTo(12.54, 3);
    const far = { joint: { endDistance: 120 } };
    expect(checkOf({ ...far, options }, 'plate-bending').resistance).toBeCloseTo(22, 9);
    expect(checkOf(far, 'plate-bending').resistance).toBeCloseTo(110 / 6, 9);
  });

  test('edges by the hole: 1.7 d_0, by machine 1.5 d_0, at most 12 t ε', () => {
    const tight = plate({ topEdge: 34, bottomEdge: 34 });
    expect(stateOf(tight, 'fit-edge-plate')).toBe('fails, too-little');
    expect(stateOf({ ...tight, options: { edges: 'machine' } }, 'fit-edge-plate')).toBe('holds');
    expect(stateOf(plate({ edge: 121 }), 'fit-edge-plate')).toBe('fails, too-much');
    expect(checkOf({ ...plate({ edge: 110, grade: 'E350' }) }, 'fit-edge-plate').demand).toBeCloseTo(
      120 * Math.sqrt(250 / 350),
      9,
    );
  });

  test('pitch to 16 t of the thinner ply', () => {
    expect(stateOf(bolts({ rows: 2, pitch: 142.4 }), 'fit-pitch')).toBe('holds');
    expect(stateOf(bolts({ rows: 2, pitch: 143 }), 'fit-pitch')).toBe('fails, too-much');
  });

  test('the elastic stress is for information; as a verdict it finds no limit', () => {
    expect(stateOf({}, 'stress-cope')).toBe('information');
    expect(stateOf({ options: { 'elastic-shear': 'verdict' } }, 'stress-cope')).toBe('notApplicable, no-rule');
  });
});

describe('what is said', () => {
  test('flanges of a section by its own sizes are parallel, those of a named ISMB are not', () => {
    expect(notes(own(iSection))).toContain('parallel-flanges');
    expect(notes({})).not.toContain('parallel-flanges');
    expect(rowOf(own(iSection), 'cope-bending', 'Z_p')).not.toBeCloseTo(513_305, -2);
  });

  test('under a tie force plate, weld and support are not covered', () => {
    expect(notes({})).toContain('tie-in-web-only');
    expect(notes({ tie: 0 })).not.toContain('tie-in-web-only');
  });

  test('the support is checked where its thickness and its grade are told, and a web', () => {
    const support = (more: Json) => ({ support: { kind: 'beam-web', section: 'ISMB 500', grade: 'E250', ...more } });
    expect(stateOf(support({}), 'support-shear')).toBe('holds');
    expect(stateOf(support({ grade: undefined }), 'support-shear')).toBe('notApplicable, support-not-told');
    expect(stateOf(support({ kind: 'column-flange' }), 'support-shear')).toBe('notApplicable, support-flange');
  });
});

test('a grade or bolt class that IS 800 does not list is refused by name', () => {
  const codes = (change: Json) => {
    const outcome = checkEnd(changed(end, change));
    return 'faults' in outcome ? outcome.faults.map(({ code }) => code) : [];
  };
  expect(codes({ beam: { grade: 'S355' } })).toEqual(['unknown-grade']);
  expect(codes(bolts({ grade: '4.8' }))).toEqual(['unknown-bolt-grade']);
});
