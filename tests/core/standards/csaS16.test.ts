import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check, Report } from '../../../core/check/report.ts';
import { csaS16 } from '../../../core/standards/csaS16/index.ts';
import { reportOf } from '../../support/compare.ts';

type Json = Record<string, unknown>;

const bolts = { size: 'M20', grade: 'A325M', threads: 'in', rows: 3, columns: 1, pitch: 70, holes: 'drilled' };
const plate = { thickness: 10, grade: '300W', topEdge: 40, bottomEdge: 40, edge: 50 };
const joint = { kind: 'fin-plate', firstRow: 90, endDistance: 45, bolts, plate, weld: { leg: 8, electrode: 490 } };
const base: Json = {
  standard: 'csa-s16',
  units: 'mm-kN',
  reaction: 100,
  tie: 0,
  beam: { section: 'UB 406x178x60', grade: '350W' },
  top: { length: 110, depth: 45, radius: 12 },
  bottom: null,
  setback: 12,
  joint,
};

const withBolts = (change: Json): Json => ({ ...base, joint: { ...joint, bolts: { ...bolts, ...change } } });
const withJoint = (change: Json): Json => ({ ...base, joint: { ...joint, ...change } });

const checkOf = (end: Json | Report, id: string): Check =>
  ('checks' in end ? (end as Report) : reportOf(end)).checks.find((one) => one.id === id)!;
const faultsOf = (end: Json) => {
  const outcome = checkEnd(end);
  return 'faults' in outcome ? outcome.faults.map(({ code, path }) => `${code} ${path}`) : [];
};
const codes = (end: Json) => reportOf(end).notes.map(({ code }) => code);

describe('beyond what the standard or the method covers, an engineer decides', () => {
  test('a cut web beyond 1014/√F_y refers in shear, with its number; a stockier one does not', () => {
    // 355/6 = 59.2 and 355/8 = 44.4 against 1014/√350 = 54.2
    const slender = { depth: 400, width: 180, flange: 13, web: 6, radius: 10 };
    const end = (web: number) => ({ ...base, beam: { section: { ...slender, web }, grade: '350W' } });
    expect(checkOf(end(6), 'cope-shear')).toMatchObject({ state: 'refer', reason: 'slender-cut' });
    expect(checkOf(end(6), 'cope-shear').resistance).toBeGreaterThan(0);
    expect(checkOf(end(8), 'cope-shear').state).toBe('holds');
    expect(checkOf({ ...end(6), reaction: 1000 }, 'cope-shear').state).toBe('fails');
  });

  test('a hole at the face of the cope and a cope shallower than the flange refer, whatever the number', () => {
    const cut = (top: Json) => ({ ...base, top });
    for (const id of ['web-net-shear', 'cope-shear', 'cope-bending', 'cope-buckling']) {
      const at = checkOf(cut({ length: 45, depth: 45, radius: 12 }), id);
      expect(at, id).toMatchObject({ state: 'refer', reason: 'hole-at-cope-face' });
      const left = checkOf(cut({ length: 110, depth: 10, radius: 12 }), id);
      expect(left, id).toMatchObject({ state: 'refer', reason: 'flange-left' });
    }
  });

  test('a cope longer than twice the depth, or deeper than half of it, refers in buckling', () => {
    const buckling = (top: Json) => checkOf({ ...base, top }, 'cope-buckling');
    expect(buckling({ length: 900, depth: 45, radius: 12 })).toMatchObject({ reason: 'cope-longer-than-method' });
    const deep = {
      ...withJoint({ firstRow: 250, bolts: { ...bolts, rows: 2 } }),
      top: { length: 110, depth: 210, radius: 12 },
    };
    expect(checkOf(deep, 'cope-buckling')).toMatchObject({ state: 'refer', reason: 'cope-deeper-than-method' });
  });

  test('a coped channel has no number behind the cope', () => {
    const channel = { ...base, beam: { section: 'PFC 380x100x54', grade: '350W' } };
    for (const id of ['cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(checkOf(channel, id)).toMatchObject({ state: 'refer', reason: 'channel-cope', resistance: null });
    }
  });

  test('holes wider than the standard ones refer in bearing', () => {
    expect(checkOf(withBolts({ hole: 24 }), 'web-bearing')).toMatchObject({ reason: 'hole-above-standard' });
    expect(checkOf(withBolts({ hole: 22 }), 'web-bearing').state).toBe('holds');
  });

  test('a weld leg below 5, 6 or 8 mm refers by the thicker part, the support included where it is told', () => {
    const weld = (thickness: number, leg: number, support?: Json) =>
      checkOf(
        {
          ...withJoint({ plate: { ...plate, thickness }, weld: { leg, electrode: 490 } }),
          ...(support && { support }),
        },
        'weld',
      );
    expect(weld(12, 5).state).toBe('holds');
    expect(weld(12, 4)).toMatchObject({ state: 'refer', reason: 'weld-leg-below-least' });
    expect(weld(12.1, 5).state).toBe('refer');
    expect(weld(20, 6).state).toBe('holds');
    expect(weld(21, 6).state).toBe('refer');
    expect(weld(10, 5, { kind: 'column-flange', thickness: 25, grade: '350W' }).state).toBe('refer');
  });
});

describe('one bolt alone', () => {
  test('holds no moment: bolt and bearing fail at no reaction at all', () => {
    const end = withBolts({ rows: 1 });
    for (const id of ['bolt-shear', 'web-bearing', 'plate-bearing']) {
      expect(checkOf(end, id)).toMatchObject({ state: 'fails', reason: 'one-bolt', reactionAtFailure: 0 });
    }
    expect(checkOf(end, 'plate-tearout').of).toBe('down');
  });
});

describe('a size that stands exactly on a limit', () => {
  test('is within it, in inches as in millimetres', () => {
    const inch = (mm: number) => mm / 25.4;
    const metric = withJoint({ endDistance: 48, plate: { ...plate, thickness: 9 } });
    // z_1 = 12 + 48 = 60 = 9/0.15
    expect(checkOf(metric, 'plate-buckling')).toMatchObject({ state: 'notApplicable', reason: 'short-plate' });
    const inches = {
      ...base,
      units: 'in-kip',
      beam: { section: 'UB 406x178x60', grade: { fy: 460 / 6.894757293168361, fu: 80 } },
      top: { length: inch(110), depth: inch(45), radius: inch(12) },
      setback: inch(12),
      joint: {
        kind: 'fin-plate',
        firstRow: inch(90),
        endDistance: inch(48),
        bolts: { ...bolts, pitch: inch(70) },
        plate: { thickness: inch(9), grade: '300W', topEdge: inch(40), bottomEdge: inch(40), edge: inch(50) },
        weld: { leg: inch(8), electrode: 71 },
      },
    };
    expect(checkOf(inches, 'plate-buckling')).toMatchObject({ state: 'notApplicable', reason: 'short-plate' });
    // At 460 MPa the mean of yield and tensile strength still counts.
    const mean = checkOf(inches, 'web-net-shear').working!.find(({ symbol }) => symbol === 'F_m')!;
    expect(mean.value).toBeCloseTo((460 / 6.894757293168361 + 80) / 2, 9);
  });

  test('a joint of 760 mm is a long one, one of 759 mm is not', () => {
    const end = (pitch: number) => ({
      ...withBolts({ rows: 11, pitch }),
      beam: { section: { depth: 1000, width: 300, flange: 20, web: 12, radius: 20 }, grade: '350W' },
    });
    const [short, long] = [75.9, 76].map((pitch) => checkOf(end(pitch), 'bolt-shear').resistance!);
    expect(long! / short!).toBeCloseTo(0.5 / 0.6, 12);
  });
});

describe('block tearing', () => {
  test('counts 0.3 of the tension plane from two columns on, says so, and says that three have no published value', () => {
    const end = (columns: number) => ({
      ...withBolts({ columns, gauge: 60 }),
      top: { length: 250, depth: 45, radius: 12 },
    });
    const share = (columns: number) =>
      checkOf(end(columns), 'web-block').working!.find(({ symbol }) => symbol === 'P_t')!.numbers;
    expect(share(1)).toContain('0.75 × 0.9');
    expect(share(2)).toContain('0.75 × 0.3');
    expect(share(3)).toContain('0.75 × 0.3');
    expect([1, 2, 3].map((columns) => checkOf(end(columns), 'web-block').basis)).toEqual(['seen', 'memory', 'memory']);
    expect(codes(end(1))).not.toContain('two-columns-ut');
    expect(codes(end(2))).toContain('two-columns-ut');
    expect(codes(end(3))).toContain('three-columns-ut');
  });

  test('does not apply where an intact flange closes the path; the row along the beam is still checked', () => {
    const end = { ...base, top: null };
    expect(checkOf(end, 'web-block')).toMatchObject({ state: 'notApplicable', reason: 'intact-flange' });
    expect(checkOf(end, 'web-tearout')).toMatchObject({ state: 'holds', of: 'along' });
  });
});

describe('options', () => {
  const resistance = (id: string, options: Json = {}) => checkOf({ ...base, options }, id).resistance!;

  test('web-net-shear: net takes the holes off the web and leaves the plate as it is', () => {
    const net = { 'web-net-shear': 'net' };
    // 0.6 × 0.75 × 450 × 7.9 × (361.4 − 3 × 22) against 0.6 × 0.75 × 400 × 7.9 × 361.4
    expect(resistance('web-net-shear', net)).toBeCloseTo(472.57, 2);
    expect(resistance('web-net-shear')).toBeCloseTo(513.91, 2);
    expect(resistance('plate-net-shear', net)).toBe(resistance('plate-net-shear'));
  });

  test('cope-shear: mean is half as much again in a web cut at both edges', () => {
    const end = { ...base, bottom: { length: 110, depth: 45, radius: 12 } };
    const [elastic, mean] = ['elastic', 'mean'].map(
      (value) => checkOf({ ...end, options: { 'cope-shear': value } }, 'cope-shear').resistance!,
    );
    expect(mean! / elastic!).toBeCloseTo(1.5, 9);
  });

  test('elastic-shear: verdict makes a check of the elastic stress', () => {
    expect(checkOf(base, 'stress-full').state).toBe('information');
    expect(checkOf({ ...base, options: { 'elastic-shear': 'verdict' } }, 'stress-full').state).toBe('holds');
  });

  test('that another standard has are refused', () => {
    expect(faultsOf({ ...base, options: { 'web-block': 'cautious' } })).toEqual(['unknown-option options.web-block']);
  });
});

describe('the end in the line of the force', () => {
  test('is 1.5 d with two rows, as the table of edges allows with three (M20: 30 against 26 mm)', () => {
    const end = (rows: number) => ({ ...withBolts({ rows }), top: { length: 110, depth: 62, radius: 12 } });
    expect(checkOf(end(2), 'fit-edge-web')).toMatchObject({ state: 'fails', of: 'top, in line', demand: 30 });
    expect(checkOf(end(3), 'fit-edge-web')).toMatchObject({ state: 'holds', of: 'top', demand: 26 });
  });

  test('counts along the beam under a tie force alone', () => {
    const end = (tie: number) => ({ ...withJoint({ endDistance: 28 }), tie });
    expect(checkOf(end(0), 'fit-end').state).toBe('holds');
    expect(checkOf(end(20), 'fit-end')).toMatchObject({ state: 'fails', demand: 30 });
  });

  test('a bolt between two rows of the table takes the next larger, one beyond it a share of its diameter', () => {
    const least = (size: string) => checkOf(withBolts({ size, grade: 'A325' }), 'fit-end').demand;
    expect(least('5/8')).toBe(22);
    expect(least('7/8')).toBe(30);
  });
});

describe('materials', () => {
  const { sections, bolt, holeFor, netHole } = csaS16.materials;

  test.each([
    ['350W', '350W'],
    ['G40.21-350W', '350W'],
    ['CSA G40.21 300W', '300W'],
    ['a992', 'A992'],
    ['ASTM A36', 'A36'],
    ['A572 Gr. 50', 'A572-50'],
    ['A572 Grade 50', 'A572-50'],
    ['S355J2', 'S355'],
    ['S355JR', 'S355'],
    ['S275', 'S275'],
  ])('%s is read as %s', (written, name) => expect(sections.named(written)).toBe(name));

  test.each(['350', '350WT', 'A572-65', 'S355X', ''])('%s is not guessed at', (written) =>
    expect(sections.named(written)).toBeUndefined(),
  );

  test('European grades lose strength with thickness, the web being read by its own', () => {
    expect(sections.strengthAt('S355', 16)).toEqual({ fy: 355, fu: 470 });
    expect(sections.strengthAt('S355', 17)).toEqual({ fy: 345, fu: 470 });
  });

  test('steels from memory, and those the standard does not list, are named as such', () => {
    const grade = (name: string) => codes({ ...base, beam: { section: 'UB 406x178x60', grade: name } });
    expect(grade('A36')).toContain('memory-grade');
    expect(grade('S355')).toContain('grade-not-listed');
    for (const code of ['memory-grade', 'grade-not-listed']) expect(grade('350W')).not.toContain(code);
  });

  test('a bolt has the strength of its own series, and none in the other', () => {
    expect(bolt('A325M', 20)?.fub).toBe(830);
    expect(bolt('A325', 19.05)?.fub).toBe(825);
    expect(bolt('A490M', 24)?.fub).toBe(1040);
    expect(bolt('A490', 25.4)?.fub).toBe(1035);
    expect(bolt('A307', 19.05)?.fub).toBe(410);
    expect(bolt('8.8', 16)?.fub).toBe(800);
    expect(bolt('8.8', 20)?.fub).toBe(830);
    expect(bolt('A325M', 19.05)).toBeUndefined();
    expect(bolt('A325', 20)).toBeUndefined();
    expect(bolt('8.8', 19.05)).toBeUndefined();
    expect(bolt('constructor', 20)).toBeUndefined();
    expect(faultsOf(withBolts({ grade: 'A325' }))).toEqual(['bolt-grade-not-for-size joint.bolts.grade']);
  });

  test('holes are 2 mm wider than the bolt to 24 mm and 3 mm above, punched ones 2 mm more in net areas', () => {
    expect([20, 24, 27].map(holeFor)).toEqual([22, 26, 30]);
    expect([netHole(22, 'drilled', 20), netHole(22, 'punched', 20)]).toEqual([22, 24]);
  });

  test('holes are taken as punched and weld metal as 490 MPa where the file is silent, and both are said', () => {
    const { holes: _, ...rest } = bolts;
    const silent = withJoint({ bolts: rest, weld: { leg: 8 } });
    const said = reportOf(silent).assumptions.map(({ text }) => text);
    expect(said).toContain('Holes taken as punched (assumed).');
    expect(said.some((text) => text.includes('490'))).toBe(true);
  });
});

describe('the weld', () => {
  test('is held to the plate beside it, and to the support where its grade is told', () => {
    const end = (more: Json = {}) => ({ ...withJoint({ weld: { leg: 8, electrode: 700 } }), ...more });
    const support = { kind: 'column-flange', thickness: 12, grade: 'A36' };
    // 0.67 × 0.67 × 8 × 450 of the plate, × 400 of the support
    expect(checkOf(end(), 'weld').resistance).toBeCloseTo(1616.04, 2);
    expect(checkOf(end({ support }), 'weld').resistance).toBeCloseTo(1436.48, 2);
  });
});

test('Canadian words: cope, single plate, gage', () => {
  const { checks } = reportOf(withBolts({ columns: 2, gauge: 60 }));
  const titles = checks.map(({ title }) => title);
  expect(titles).toContain('Shear at the cope');
  expect(titles).toContain('Gage');
});
