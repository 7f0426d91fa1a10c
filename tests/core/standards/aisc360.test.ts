import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { aisc360Lrfd } from '../../../core/standards/aisc360/index.ts';
import { INCH } from '../../../core/units/systems.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';

type Json = Record<string, unknown>;

const named = (name: string): Json => goodEnds().find((one) => one.name === name)!.end;
/** W18x50 coped 4-3/4 x 1-3/4, three 3/4 A325, single plate 3/8 A36: a conventional plate. */
const end = named('aisc-360-single-plate');
/** W16x36, 4 x 2 bolts, plate 1/2 x 12 A36, 9 in to the first column. */
const long: Json = changed(named('aisc-360-asd-extended-plate'), { standard: 'aisc-360-lrfd', options: undefined });
const twoCopes = named('aisc-360-two-copes');

const checkOf = (change: Json, id: string, of: Json = end): Check =>
  reportOf(changed(of, change)).checks.find((one) => one.id === id)!;
const stateOf = (change: Json, id: string, of: Json = end): string => {
  const { state, reason } = checkOf(change, id, of);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const rowOf = (change: Json, id: string, symbol: string, of: Json = end): number =>
  checkOf(change, id, of).working!.find((row) => row.symbol === symbol)!.value;
const strengthOf = (change: Json, id: string, of: Json = end): number => checkOf(change, id, of).reactionAtFailure!;
const notesOf = (change: Json, of: Json = end): string[] => reportOf(changed(of, change)).notes.map(({ code }) => code);
const bolts = (more: Json): Json => ({ joint: { bolts: more } });
const plate = (more: Json): Json => ({ joint: { plate: more } });
const option = (key: string, value: string): Json => ({ options: { [key]: value } });

describe('steels, bolts and holes of AISC 360', () => {
  const { sections, plates, bolt, holeFor, netHole } = aisc360Lrfd.materials;
  const ksi = (MPa: number | undefined) => (MPa ?? 0) / 6.894757293168361;

  test('A992 and A572 grade 50 yield at 50 ksi and break at 65, A588 at 70, A36 at 36 and 58', () => {
    const strengths = ['A992', 'A572-50', 'A913-50', 'A588', 'A36'].map((name) => sections.strengthAt(name, 12)!);
    expect(strengths.map(({ fy }) => Math.round(ksi(fy)))).toEqual([50, 50, 50, 50, 36]);
    expect(strengths.map(({ fu }) => Math.round(ksi(fu)))).toEqual([65, 65, 65, 70, 58]);
  });

  test('grades are read as people write them; a plate is not rolled in A992', () => {
    const names = ['a992', 'ASTM A572 Gr. 50', 'A572 Grade 50', 'A572-50', 'S355', 'S355J2', 'S275 JR', 'X52'];
    expect(names.map((name) => sections.named(name))).toEqual([
      'A992',
      'A572-50',
      'A572-50',
      'A572-50',
      'S355JR',
      'S355JR',
      'S275JR',
      undefined,
    ]);
    expect(plates.named('A992')).toBeUndefined();
  });

  test('European grades have the strengths of their own standard by thickness, and the sheet says that they are not listed', () => {
    expect([16, 40, 41].map((t) => sections.strengthAt('S355JR', t)?.fy)).toEqual([355, 345, 335]);
    expect(notesOf({ beam: { grade: 'S355' } })).toContain('grade-not-listed');
    expect(notesOf({ beam: { grade: 'A588' } })).toContain('memory-grade');
    const codes = notesOf({});
    expect(codes).not.toContain('grade-not-listed');
    expect(codes).not.toContain('memory-grade');
  });

  test('shear strengths of Table J3.2, threads in and out of the plane, ksi', () => {
    const both = (grade: string) => {
      const found = bolt(grade, 19.05)!;
      return [found.shear!.in, found.shear!.out].map((MPa) => Math.round(ksi(MPa)));
    };
    expect(['A325', 'F1852', 'A490', 'F2280', 'A307'].map(both)).toEqual([
      [54, 68],
      [54, 68],
      [68, 84],
      [68, 84],
      [27, 27],
    ]);
  });

  test('property classes and a strength of its own are computed and refer, and class 8.8 is made in mm only', () => {
    const metric = bolt('8.8', 20)!;
    expect([metric.fub, metric.shear!.in, metric.listed]).toEqual([830, 0.45 * 830, false]);
    expect(bolt('8.8', 19.05)).toBeUndefined();
    expect(stateOf(bolts({ grade: { fu: 120 } }), 'bolt-shear')).toBe('refer, bolt-not-listed');
    expect(stateOf(bolts({ grade: { fu: 120 } }), 'plate-bearing')).toBe('refer, bolt-not-listed');
  });

  test('standard holes: 1/16 over the bolt, 1/8 from 1 in; 1/16 in or 2 mm more in net areas, drilled or punched', () => {
    const inches = [0.5, 0.75, 0.875, 1, 1.125, 1.25].map((d) => holeFor(d * INCH) / INCH);
    expect(inches.map((hole) => Number(hole.toFixed(4)))).toEqual([0.5625, 0.8125, 0.9375, 1.125, 1.25, 1.375]);
    expect([12, 16, 20, 22, 24, 27, 30, 36].map(holeFor)).toEqual([14, 18, 22, 24, 27, 30, 33, 39]);
    expect(netHole(20.6375, 'drilled', 19.05)).toBeCloseTo(22.225, 9);
    expect(netHole(22, 'punched', 20)).toBe(24);
  });
});

describe('LRFD and ASD', () => {
  test('are one set of rules: each strength is φ Ω times that of the other', () => {
    const lrfd = reportOf({ ...end, tie: 0 }).checks;
    const asd = reportOf(changed(end, { standard: 'aisc-360-asd', level: 'service', tie: 0 })).checks;
    for (const one of lrfd) {
      const other = asd.find(({ id }) => id === one.id)!;
      if (one.reactionAtFailure === undefined) continue;
      const ratio = one.reactionAtFailure! / other.reactionAtFailure!;
      expect(
        [1.5, 0.9 * 1.67].some((factor) => Math.abs(ratio - factor) < 1e-9),
        `${one.id} ${ratio}`,
      ).toBe(true);
    }
  });

  test('say so in the working: φ R_n with factored, R_n/Ω with service reactions', () => {
    expect(checkOf({}, 'web-block').working!.at(-1)!.symbol).toBe('φR_n');
    const service = { standard: 'aisc-360-asd', level: 'service' };
    const last = checkOf(service, 'web-block').working!.at(-1)!;
    expect([last.symbol, last.expression]).toEqual(['R_n/Ω', 'R_n / Ω']);
  });

  test('the level of the other method is refused', () => {
    const outcome = checkEnd(changed(end, { level: 'service' }));
    expect('faults' in outcome && outcome.faults[0]).toMatchObject({ code: 'reaction-level', limit: 'factored' });
  });
});

describe('conventional and extended plates', () => {
  test('a conventional plate has its bolts at half the distance to the weld, and needs no check of bending and buckling', () => {
    expect(rowOf({}, 'bolt-shear', 'e')).toBeCloseTo((0.5 + 1.75) / 2, 9);
    expect(stateOf({}, 'plate-bending')).toBe('notApplicable, conventional-plate');
    expect(stateOf({}, 'plate-buckling')).toBe('notApplicable, conventional-plate');
    expect(notesOf({})).toContain('conventional-plate');
  });

  test('from six rows the whole distance', () => {
    const many = changed(end, {
      beam: { section: 'W27x84' },
      joint: { bolts: { rows: 6 }, plate: { thickness: 0.25 } },
    });
    expect(rowOf({}, 'bolt-shear', 'e', many)).toBeCloseTo(2.25, 9);
    expect(stateOf({}, 'plate-bending', many)).toBe('notApplicable, conventional-plate');
  });

  test.each([
    ['3-9/16 in to the bolts', { setback: 1.8125 }],
    ['one row', bolts({ rows: 1 })],
    ['wider holes', bolts({ hole: 0.875 })],
    ['a plate edge below Table J3.4', plate({ bottomEdge: 0.9375 })],
    ['less than 2 d to the end', { joint: { endDistance: 1.4375 } }],
    ['less than 2 d to the free edge', plate({ edge: 1.4375 })],
    ['both plies thicker than d/2 + 1/16 in', { beam: { section: 'W18x86' }, joint: { plate: { thickness: 0.5 } } }],
  ])('%s makes it an extended plate', (_, change) => {
    expect(notesOf(change)).toContain('extended-plate');
    expect(stateOf(change, 'plate-bending')).not.toContain('conventional-plate');
    expect(rowOf({ setback: 1.8125 }, 'bolt-shear', 'e')).toBeCloseTo(1.8125 + 1.75, 9);
  });

  test('3-1/2 in exactly, and d/2 + 1/16 in exactly, are within', () => {
    expect(notesOf({ setback: 1.75 })).toContain('conventional-plate');
    const exact = { beam: { section: 'W18x86' }, joint: { plate: { thickness: 0.4375 } } };
    expect(notesOf(exact)).toContain('conventional-plate');
  });

  test('an extended plate is as strong as C times its weakest bolt; option sum takes all bolts, without their rows', () => {
    const lowest = strengthOf({}, 'plate-bearing', long);
    expect(checkOf({}, 'plate-bearing', long).working!.map(({ symbol }) => symbol)).toContain('r_min');
    expect(strengthOf(option('eccentric-bearing', 'sum'), 'plate-bearing', long)).toBeGreaterThan(lowest);
  });

  test('a web bolted to a ply: the ply beyond the bolts is to be checked apart', () => {
    const { plate: ply, weld: _, ...joint } = end.joint as Json;
    const bolted = { ...end, joint: { ...joint, kind: 'web-bolts', ply } };
    expect(stateOf({}, 'plate-bending', bolted)).toBe('notApplicable, ply-not-described');
    expect(stateOf({}, 'plate-buckling', bolted)).toBe('notApplicable, ply-not-described');
    expect(rowOf({}, 'bolt-shear', 'e', bolted)).toBeCloseTo(2.25, 9);
  });
});

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

describe('fit', () => {
  test('edges below Table J3.4 refer, below the bolt diameter fail', () => {
    expect(stateOf(plate({ topEdge: 0.9375 }), 'fit-edge-plate')).toBe('refer, too-little');
    expect(stateOf(plate({ topEdge: 0.7 }), 'fit-edge-plate')).toBe('fails, too-little');
    expect(stateOf({ joint: { endDistance: 0.7 } }, 'fit-end')).toBe('fails, too-little');
    expect(stateOf({ joint: { endDistance: 6.5 } }, 'fit-end')).toBe('refer, too-much');
  });

  test('bolts closer than 2-2/3 d fail, farther apart than 24 t refer', () => {
    expect(stateOf(bolts({ pitch: 1.9 }), 'fit-pitch')).toBe('fails, too-little');
    const wide = {
      beam: { section: 'W27x84' },
      joint: { bolts: { pitch: 9.5, rows: 2 }, plate: { thickness: 0.375 } },
    };
    expect(stateOf(wide, 'fit-pitch')).toBe('refer, too-much');
  });

  test('a corner of 1/2 in holds, from 3/8 in or not stated refers, below fails', () => {
    const corner = (radius: number | undefined) => stateOf({ top: { radius } }, 'fit-cope-radius');
    expect([0.5, 0.4, undefined, 0.3].map(corner)).toEqual([
      'holds',
      'refer, too-little',
      'refer, too-little',
      'fails, too-little',
    ]);
  });

  test('copes clear the flanges of the supporting beam or fail', () => {
    // W21x62: t_f 0.615, k 1.12; (8.24 - 0.4)/2 - 0.5 + 0.5 = 3.92 in.
    expect(stateOf({}, 'fit-cope-clearance')).toBe('holds');
    expect(stateOf({ top: { depth: 1 }, joint: { firstRow: 2.5 } }, 'fit-cope-clearance')).toBe('fails, too-little');
    expect(stateOf({ top: { length: 3.9 } }, 'fit-cope-clearance')).toBe('fails, too-little');
    expect(stateOf({ top: null }, 'fit-cope-clearance')).toBe('fails, too-little');
    expect(stateOf({ setback: 5 }, 'fit-cope-clearance')).toBe('notApplicable, clear-of-support');
  });

  test('a plate shorter than half the clear web, or in the fillet, fails; a cope takes the flange out of its way', () => {
    expect(stateOf(bolts({ rows: 2 }), 'fit-plate-depth')).toBe('fails, too-little');
    expect(stateOf({ top: null, support: undefined, joint: { firstRow: 2.3 } }, 'fit-plate-depth')).toBe(
      'fails, too-little',
    );
    expect(stateOf({ joint: { firstRow: 3 } }, 'fit-plate-depth')).toBe('holds');
  });

  test('the gap is 1/4 to 1 in, of extended plates without upper limit', () => {
    expect([0.2, 0.25, 1, 1.1].map((setback) => stateOf({ setback }, 'fit-setback'))).toEqual([
      'refer, too-little',
      'holds',
      'holds',
      'refer, too-much',
    ]);
    expect(stateOf({}, 'fit-setback', long)).toBe('holds');
  });

  test('an extended plate turns by ploughing, or is thinner than its bolts are strong, or fails', () => {
    const thick = { beam: { section: 'W18x86' }, joint: { endDistance: 1.6, plate: { thickness: 0.75 } } };
    expect(stateOf(thick, 'fit-rotation')).toBe('fails, too-much');
    const far = { ...end, setback: 3 };
    expect(checkOf({}, 'fit-rotation', far).of).toBe('ply');
    expect(stateOf({}, 'fit-rotation', far)).toBe('holds');
    expect(checkOf({}, 'fit-rotation', long).of).toBe('plate');
  });

  test('rows without holes inside a cope say why nothing is checked', () => {
    expect(stateOf({ top: null, support: undefined }, 'cope-bending')).toBe('notApplicable, no-cope');
    expect(stateOf({ top: null, support: undefined }, 'fit-edge-web')).toBe('notApplicable, intact-flange');
  });
});
