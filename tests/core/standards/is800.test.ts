import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { is800 } from '../../../core/standards/is800/index.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';

type Json = Record<string, unknown>;

const end = goodEnds().find(({ name }) => name === 'is-800-fin-plate')!.end;
const report = (change: Json) => reportOf(changed(end, change));
const checkOf = (change: Json, id: string): Check => report(change).checks.find((one) => one.id === id)!;
const rowOf = (change: Json, id: string, symbol: string) =>
  checkOf(change, id).working!.find((row) => row.symbol === symbol)!.value;
const stateOf = (change: Json, id: string) => {
  const { state, reason } = checkOf(change, id);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const notes = (change: Json) => report(change).notes.map(({ code }) => code);
const bolts = (more: Json): Json => ({ joint: { bolts: more } });
const plate = (more: Json): Json => ({ joint: { plate: more } });
const own = (section: Json): Json => ({ beam: { section } });
const iSection = { depth: 400, width: 140, flange: 16, web: 8.9, radius: 14 };

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

describe('the notch under IS 800', () => {
  test('a column at the face of the notch, and a notch shallower than the flange, refer', () => {
    const two = bolts({ columns: 2, gauge: 70 });
    const ids = ['web-block', 'web-net-shear', 'cope-shear', 'cope-bending', 'cope-buckling'];
    for (const id of ids) expect(stateOf(two, id)).toBe('refer, hole-at-cope-face');
    for (const id of ids) expect(stateOf({ top: { depth: 12 } }, id)).toBe('refer, flange-left');
  });

  test('a notch that ends before the bolts leaves the flange above them', () => {
    const short = { top: { length: 28 }, ...bolts({ columns: 2, gauge: 70 }) };
    for (const id of ['web-block', 'web-tearout']) expect(stateOf(short, id)).toBe('notApplicable, intact-flange');
  });

  test('a stem beyond 67 ε refers', () => {
    expect(stateOf(own({ ...iSection, depth: 680, width: 200 }), 'cope-shear')).toBe('refer, slender-cut');
    expect(stateOf({}, 'cope-shear')).toBe('holds');
  });

  test('net shear: the whole depth where not notched, h_o between two notches', () => {
    const net = (depth: number) => (0.9 * 0.41 * 8.9 * (depth - 66)) / (Math.sqrt(3) * 1.25);
    expect(checkOf({ top: null }, 'web-net-shear').resistance).toBeCloseTo(net(400), 9);
    const both = { bottom: { length: 110, depth: 45, radius: 10 } };
    expect(checkOf(both, 'web-net-shear').resistance).toBeCloseTo(net(310), 9);
  });

  test('a bottom notch alone: no web buckling, no block', () => {
    const bottom = { top: null, bottom: { length: 110, depth: 45, radius: 10 } };
    expect(stateOf(bottom, 'cope-buckling')).toBe('notApplicable, cut-edge-in-tension');
    expect(stateOf(bottom, 'web-block')).toBe('notApplicable, intact-flange');
    expect(checkOf(bottom, 'cope-bending').resistance).toBeCloseTo(42.67, 2);
  });

  test('a notched channel refers without a number', () => {
    const channel = own({ depth: 400, width: 100, flange: 15, web: 8.8, radius: 15, family: 'channel' });
    for (const id of ['cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(stateOf(channel, id)).toBe('refer, channel-cope');
      expect(checkOf(channel, id).resistance).toBeNull();
    }
  });

  test('a long notch bends below the high shear: the moment alone counts', () => {
    const long = { top: { length: 500 } };
    expect(checkOf(long, 'cope-bending').resistance).toBeCloseTo((250 * 283.47) / 1100, 2);
  });

  test('option cope-bending: plastic takes the lesser of Z_p and 1.2 Z_e, and the shear still counts', () => {
    const options = { 'cope-bending': 'plastic' };
    expect(rowOf({ options }, 'cope-bending', 'Z')).toBeCloseTo(1.2 * 283_470, -1);
    expect(checkOf({ options, top: { length: 500 } }, 'cope-bending').resistance).toBeCloseTo(
      (1.2 * 250 * 283.47) / 1100,
      2,
    );
    expect(checkOf({ options }, 'cope-bending').resistance).toBeCloseTo(42.67, 2);
  });

  test('a corner below 10 mm is practice here: it refers', () => {
    expect(stateOf({ top: { radius: 9 } }, 'fit-cope-radius')).toBe('refer, too-little');
  });
});

describe('two columns inside the notch', () => {
  const two = { top: { length: 180 }, ...bolts({ columns: 2, gauge: 70 }) };
  const clause = { ...two, options: { 'web-block': 'standard' } };

  test('half of the tension plane counts, and is said to', () => {
    expect(checkOf(two, 'web-block').resistance).toBeCloseTo(308.442, 3);
    expect(notes(two)).toContain('half-tension-plane');
    expect(notes({})).not.toContain('half-tension-plane');
  });

  test('option web-block: standard takes the clause; the row refers only where it is the first to fail', () => {
    expect(report(clause).governing).not.toBe('web-block');
    expect(stateOf(clause, 'web-block')).toBe('holds');
    const strong = changed(clause, {
      joint: {
        firstRow: 95,
        bolts: { size: 'M24', grade: '10.9', rows: 4, pitch: 60, gauge: 60 },
        plate: { thickness: 20, grade: 'E450', topEdge: 50, bottomEdge: 60, edge: 60 },
        weld: { leg: 16, electrode: 570 },
      },
      beam: { section: { ...iSection, depth: 600, width: 200, flange: 20, web: 8 } },
      top: { length: 150 },
    });
    const first = report(strong);
    expect(first.governing).toBe('web-block');
    expect(stateOf(strong, 'web-block')).toBe('refer, block-as-clause');
    expect(first.verdict).toBe('refer');
    expect(stateOf(changed(strong, { options: { 'web-block': 'cautious' } }), 'web-block')).toBe('holds');
    expect(stateOf(changed(strong, { reaction: 2 * first.capacity! }), 'web-block')).toBe('fails');
  });

  test('one column is not concerned', () => {
    expect(checkOf({ options: { 'web-block': 'standard' } }, 'web-block').resistance).toBeCloseTo(278.101, 3);
    expect(stateOf({ options: { 'web-block': 'standard' } }, 'web-block')).toBe('holds');
  });
});

describe('a net area below nothing', () => {
  test('counts as nothing: gross shear alone, or gross tension alone, is left', () => {
    const tight = {
      reaction: 20,
      joint: { firstRow: 57, bolts: { rows: 1, holes: 'punched' }, plate: { topEdge: 12 } },
    };
    // a_t 12, d' 24: A_nv 0; 40 × 8.9 × 250/1.1
    expect(checkOf(tight, 'web-block').resistance).toBeCloseTo((40 * 8.9 * 0.25) / 1.1, 9);
    expect(stateOf(tight, 'web-tearout')).toBe('fails, nothing-left');
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
