import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import { aisc360Lrfd } from '../../../core/standards/aisc360/index.ts';
import { INCH } from '../../../core/units/systems.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import {
  bolts,
  checkOf,
  end,
  type Json,
  long,
  notesOf,
  option,
  plate,
  rowOf,
  stateOf,
  strengthOf,
} from './aisc360Ends.ts';

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
