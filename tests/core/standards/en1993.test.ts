import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { webBesideRoot } from '../../../core/standards/en1993/longPlate.ts';
import { reportOf } from '../../support/compare.ts';

type Json = Record<string, unknown>;

const bolts = { size: 'M20', grade: '8.8', threads: 'in', rows: 4, columns: 1, pitch: 70, gauge: 0 };
const plate = { thickness: 10, grade: 'S275', topEdge: 40, bottomEdge: 40, edge: 50 };
const cope = { length: 120, depth: 50, radius: 10 };
const end: Json = {
  standard: 'en-1993',
  units: 'mm-kN',
  reaction: 250,
  beam: { section: 'UB 406x178x60', grade: 'S275' },
  top: cope,
  setback: 10,
  joint: { kind: 'fin-plate', firstRow: 90, endDistance: 50, bolts, plate, weld: { leg: 8 } },
};
const joint = (changes: { bolts?: Json; plate?: Json; weld?: Json; firstRow?: number; endDistance?: number }) => ({
  joint: {
    kind: 'fin-plate',
    firstRow: changes.firstRow ?? 90,
    endDistance: changes.endDistance ?? 50,
    bolts: { ...bolts, ...changes.bolts },
    plate: { ...plate, ...changes.plate },
    weld: { leg: 8, ...changes.weld },
  },
});
const report = (changes: Json = {}) => reportOf({ ...end, ...changes });
const check = (id: string, changes: Json = {}): Check => report(changes).checks.find((one) => one.id === id)!;
const notes = (changes: Json = {}) => report(changes).notes.map(({ code }) => code);

describe('materials', () => {
  test('a sub-grade and a delivery condition do not change the strengths', () => {
    for (const grade of ['S275', 'S275JR', 's275 j2+n', 'S275M']) {
      expect(check('cope-shear', { beam: { section: 'UB 406x178x60', grade } }).resistance).toBeCloseTo(466.82, 2);
    }
  });

  test('a beam takes the strength of its thickest part, in the UK by the product standard', () => {
    // UB 610x229x125: t_f 19.6 above 16, so 265 MPa; a plate 16 thick keeps 275.
    const beam = { section: 'UB 610x229x125', grade: 'S275' };
    const uk = { standard: 'en-1993-uk', beam, ...joint({ plate: { thickness: 16 } }) };
    expect(check('stress-full', uk).resistance).toBeCloseTo(265 / Math.sqrt(3), 9);
    expect(check('stress-full', { beam }).resistance).toBeCloseTo(275 / Math.sqrt(3), 9);
    expect(check('plate-gross-shear', uk).resistance).toBeCloseTo((290 * 16 * 275) / (1.27 * Math.sqrt(3)) / 1e3, 6);
  });

  test('a grade or a thickness outside the tables is refused, with the grades that are known', () => {
    const faultOf = (changes: Json) => {
      const outcome = checkEnd({ ...end, ...changes });
      return 'faults' in outcome ? outcome.faults.map(({ code, path }) => `${code} ${path}`) : [];
    };
    expect(faultOf({ beam: { section: 'UB 406x178x60', grade: 'S420' } })).toEqual(['unknown-grade beam.grade']);
    const thick = { standard: 'en-1993-uk', ...joint({ plate: { grade: 'S460', thickness: 41 } }) };
    expect(faultOf(thick)).toEqual(['grade-outside-range joint.plate.grade']);
    expect(faultOf(joint({ bolts: { grade: '12.9' } }))).toEqual(['unknown-bolt-grade joint.bolts.grade']);
  });

  test('strengths from memory are said to be so', () => {
    expect(notes({ beam: { section: 'UB 406x178x60', grade: 'S460M' } })).toContain('memory-grade');
    expect(notes()).not.toContain('memory-grade');
  });

  test('classes whose thread shears at 0.5 f_ub do so with threads in the plane only', () => {
    // 10.9: 0.5 x 1000 x 245/1.25 = 98.0 kN; out of the thread 0.6 x 1000 x 314.16/1.25 = 150.80 kN.
    const force = (threads: string) =>
      check('bolt-shear', joint({ bolts: { grade: '10.9', threads } })).working!.find((row) => row.symbol === 'F_v')!;
    expect(force('in').value).toBeCloseTo(98, 9);
    expect(force('out').value).toBeCloseTo(150.796, 3);
  });

  test('a bolt of its own strength and an inch bolt refer, and never pass', () => {
    for (const own of [{ grade: { fu: 1000 } }, { size: '3/4', grade: { fu: 825 }, threads: 'out' }]) {
      for (const id of ['bolt-shear', 'web-bearing', 'plate-bearing']) {
        const { state, reason } = check(id, { reaction: 50, ...joint({ bolts: own }) });
        expect([state, reason], id).toEqual(['refer', 'bolt-not-listed']);
      }
    }
  });

  test('weld metal plays a part only where it is given and weaker than the parts', () => {
    const line = (weld: Json) => check('weld', joint({ weld })).resistance;
    expect(line({})).toBeCloseTo(1321.76, 2);
    expect(line({ electrode: 500 })).toBeCloseTo(1321.76, 2);
    expect(line({ electrode: 400 })).toBeCloseTo((1321.764 * 400) / 430, 2);
    expect(report().assumptions.map(({ code }) => code)).not.toContain('electrode-assumed');
  });

  test('a weaker support lowers the strength of the weld, with the correlation factor of the stronger plate', () => {
    const support = { kind: 'column-flange', thickness: 12, grade: 'S235' };
    // 5.657 x 360/(√3 x 0.85 x 1.25) = 1106.6
    expect(check('weld', { support }).resistance).toBeCloseTo(1106.59, 1);
  });
});

describe('in inches and ksi', () => {
  test('sizes and strengths that meet a bound exactly still meet it', () => {
    const inch = (mm: number) => mm / 25.4;
    const ksi = (MPa: number) => (MPa * 25.4 ** 2) / 4448.2216152605;
    const at = (h: number, top: { length: number; depth: number }, fy: number) =>
      reportOf({
        standard: 'en-1993',
        units: 'in-kip',
        reaction: 10,
        beam: {
          section: { depth: inch(h), width: inch(180), flange: inch(13), web: inch(9), radius: inch(10) },
          grade: { fy: ksi(fy), fu: ksi(430) },
        },
        top: { length: inch(top.length), depth: inch(top.depth), radius: inch(10) },
        setback: inch(10),
        joint: {
          kind: 'fin-plate',
          firstRow: inch(top.depth + 50),
          endDistance: inch(50),
          bolts: { size: 'M20', grade: '8.8', threads: 'in', rows: 2, columns: 2, pitch: inch(70), gauge: inch(60) },
          plate: {
            thickness: inch(12),
            grade: { fy: ksi(275), fu: ksi(430) },
            topEdge: inch(40),
            bottomEdge: inch(40),
            edge: inch(50),
          },
          weld: { leg: inch(8) },
        },
      }).checks;
    for (let h = 350; h <= 430; h += 7) {
      const checks = at(h, { length: h, depth: h / 2 }, 355);
      expect(checks.find(({ id }) => id === 'cope-buckling')).not.toHaveProperty('reactionAtFailure');
    }
    // The face stands exactly 2 d past the last column: 50 + 60 + 40.
    expect(at(400, { length: 150, depth: 60 }, 275).find(({ id }) => id === 'cope-bending')?.of).toMatch(
      /last column$/,
    );
  });
});

describe('limits', () => {
  test('fewer than two rows, more than two columns refer; one bolt alone has no number', () => {
    const one = check('bolt-shear', joint({ bolts: { rows: 1 } }));
    expect([one.state, one.reason, one.resistance]).toEqual(['refer', 'rows-below-two', null]);
    const row = check('bolt-shear', joint({ bolts: { rows: 1, columns: 2, gauge: 60 } }));
    expect([row.state, row.reason]).toEqual(['refer', 'rows-below-two']);
    expect(row.resistance).toBeGreaterThan(0);
    const three = check('web-bearing', joint({ bolts: { columns: 3, gauge: 60 } }));
    expect([three.state, three.reason]).toEqual(['refer', 'columns-above-two']);
  });

  test('oversize holes bear 0.8; wider ones refer in every check that counts holes', () => {
    const [standard, oversize] = [22, 24].map((hole) =>
      check('plate-bearing', joint({ bolts: { hole } })).working!.find((row) => row.symbol === 'F_hor'),
    );
    // F_hor = k_1 α_b f_u d t/γ_M2, α_b = 50/(3 d_0): 22 gives 0.7576, 24 gives 0.6944 and 0.8 of it; k_1 2.5 and 2.383.
    expect(standard!.value).toBeCloseTo((2.5 * (50 / 66) * 430 * 200) / 1.25 / 1e3, 6);
    expect(oversize!.value).toBeCloseTo((0.8 * ((1.4 * 70) / 24 - 1.7) * (50 / 72) * 430 * 200) / 1.25 / 1e3, 6);
    const wide = report({ reaction: 100, tie: 10, ...joint({ bolts: { hole: 25 } }) }).checks;
    const referred = wide.filter(({ reason }) => reason === 'hole-above-oversize').map(({ id }) => id);
    expect(referred.sort()).toEqual(
      [
        'bolt-shear',
        'plate-bearing',
        'plate-block',
        'plate-net-shear',
        'web-bearing',
        'web-block',
        'web-net-shear',
        'web-tearout',
        'web-tie',
      ].sort(),
    );
  });

  test('a slender cut web refers, its number kept', () => {
    const beam = { section: { depth: 600, width: 200, flange: 12, web: 7, radius: 12 }, grade: 'S275' };
    // (600 - 50 - 12)/7 = 76.9 above 72 x 0.924 = 66.6
    const { state, reason, resistance } = check('cope-shear', { reaction: 100, beam });
    expect([state, reason]).toEqual(['refer', 'slender-cut-panel']);
    expect(resistance).toBeGreaterThan(0);
    // h_w/t_w = 576/7 = 82.3: λ = 82.29/(86.4 x 0.92442) = 1.0303, χ = 0.80561; 0.80561 x 275 x 576 x 7/√3 = 515.7 kN
    expect(check('web-gross-shear', { beam }).resistance).toBeCloseTo(515.73, 1);
  });

  test('a weld with a throat below 3 mm, or too short for it, refers', () => {
    const thin = check('weld', { reaction: 20, ...joint({ weld: { leg: 4 } }) });
    expect([thin.state, thin.reason]).toEqual(['refer', 'weld-throat-below-least']);
    const rows = { rows: 1 };
    const short = check('weld', { reaction: 5, ...joint({ bolts: rows, weld: { leg: 15 } }) });
    expect([short.state, short.reason]).toEqual(['refer', 'weld-too-short']);
    const none = check('weld', { reaction: 5, ...joint({ bolts: rows, weld: { leg: 60 } }) });
    expect([none.state, none.resistance]).toEqual(['refer', null]);
  });

  test('notches outside the published limits: one flange by the elastic method, two without a number', () => {
    const deep = { length: 120, depth: 90, radius: 10 };
    const two = check('cope-buckling', { bottom: deep });
    expect([two.state, two.reason, two.resistance]).toEqual(['refer', 'outside-cope-limits', null]);
    const long = check('cope-buckling', { reaction: 20, top: { ...cope, length: 500 } });
    expect([long.state, long.of, long.basis]).toEqual(['holds', 'tee', 'research']);
    const beyond = check('cope-buckling', { reaction: 5, top: { ...cope, length: 900 } });
    expect([beyond.state, beyond.reason]).toEqual(['refer', 'cope-longer-than-method']);
    expect(beyond.resistance).toBeGreaterThan(0);
  });

  test('inside the limits buckling asks for no reaction, and a bottom notch alone for no check', () => {
    expect(check('cope-buckling')).not.toHaveProperty('reactionAtFailure');
    const below = check('cope-buckling', { top: null, bottom: cope });
    expect([below.state, below.reason]).toEqual(['notApplicable', 'cut-edge-in-tension']);
    expect(check('cope-buckling', { top: null }).reason).toBe('no-cope');
    const unequal = check('cope-buckling', { bottom: { ...cope, length: 200 } });
    expect([unequal.state, unequal.utilisation]).toEqual(['holds', 50 / 81.28]);
  });

  test('a notched channel: its sections refer, its stress has no number', () => {
    const beam = { section: 'PFC 380x100x54', grade: 'S275' };
    for (const id of ['cope-shear', 'cope-bending', 'cope-buckling']) {
      expect([check(id, { beam }).state, check(id, { beam }).reason], id).toEqual(['refer', 'channel-cope']);
    }
    const { state, resistance } = check('stress-cope', { beam });
    expect([state, resistance]).toEqual(['information', null]);
    expect(check('stress-cope', { beam, options: { 'elastic-shear': 'verdict' } }).state).toBe('refer');
  });
});

describe('bending at the notch', () => {
  test('at the reaction at failure demand and resistance meet', () => {
    for (const reaction of [368.3577, 100]) {
      const { demand, resistance } = check('cope-bending', { reaction });
      if (reaction > 200) expect(demand! / resistance!).toBeCloseTo(1, 5);
      else expect(demand! / resistance!).toBeLessThan(0.2);
    }
  });

  test('beyond the shear resistance nothing is left', () => {
    const { state, resistance } = check('cope-bending', { reaction: 500 });
    expect([state, resistance]).toEqual(['fails', 0]);
  });

  test('with the notch clear of the last column that column is looked at too, with the block as its shear', () => {
    const two = joint({ bolts: { columns: 2, gauge: 60 } });
    expect(check('cope-bending', { top: { ...cope, length: 140 }, ...two }).of).toBe('tee');
    expect(check('cope-bending', { top: { ...cope, length: 151 }, ...two }).of).toBe('tee, last column');
  });
});

describe('the web beside a long plate', () => {
  const long = { top: null, setback: 60, ...joint({ firstRow: 100 }) };

  test('stands where bending at the notch would, under its own name', () => {
    const found = check('cope-bending', long);
    expect([found.title, found.of, found.ofText]).toEqual([
      'Web beside a long plate',
      'beside a long plate',
      undefined,
    ]);
  });

  test('is not asked for beside a short plate, one row, or a plain ply', () => {
    expect(check('cope-bending', { top: null }).state).toBe('notApplicable');
    expect(check('cope-bending', { ...long, ...joint({ bolts: { rows: 1 } }) }).state).toBe('notApplicable');
    const { weld: _, plate: ply, kind: __, ...rest } = (long.joint as Json) ?? {};
    expect(check('cope-bending', { ...long, joint: { kind: 'web-bolts', ...rest, ply } }).state).toBe('notApplicable');
  });

  test('its root lies where demand and resistance meet, in each of three ranges', () => {
    const bending = (V: number, rest: number) => {
      const shear = Math.max(0, V - rest);
      return shear <= 50 ? 30 : shear >= 100 ? 0 : 30 * (1 - (shear / 50 - 1) ** 2);
    };
    for (const [arm, rest] of [
      [1, 400],
      [0.5, 60],
      [0.2, -20],
    ] as const) {
      const V = webBesideRoot(arm, 10, 30, 100, rest);
      expect(bending(V, rest) + 10).toBeCloseTo(V * arm, 6);
    }
  });
});

describe('the support', () => {
  test('its shear needs thickness and grade; its strength goes by its thickest part', () => {
    expect(check('support-shear').reason).toBe('no-support');
    expect(check('support-shear', { support: { kind: 'column-web', thickness: 10 } }).reason).toBe('support-not-told');
    // UC 305x305x283: web 26.8, flange 44.1 above 40: 255 MPa.
    const web = { kind: 'column-web', section: 'UC 305x305x283', grade: 'S275' };
    expect(check('support-shear', { support: web }).resistance).toBeCloseTo(
      (2 * 290 * 26.8 * 255) / Math.sqrt(3) / 1e3,
      3,
    );
  });

  test('a plate that would punch through it refers', () => {
    const support = { kind: 'column-web', thickness: 7, grade: 'S275' };
    const { state, of } = check('fit-rotation', { support });
    expect([state, of]).toEqual(['refer', 'plate on the support']);
  });
});

describe('fit', () => {
  test('corners of execution class 4 are rounder', () => {
    const top = { ...cope, radius: 8 };
    expect(check('fit-cope-radius', { top }).state).toBe('holds');
    expect(check('fit-cope-radius', { top, options: { execution: 'EXC4' } }).state).toBe('fails');
  });

  test('plate or web may be thick, not both; above S355 neither counts', () => {
    expect(check('fit-rotation', joint({ plate: { thickness: 20 }, weld: { leg: 20 } })).state).toBe('holds');
    const strong = { section: 'UB 406x178x60', grade: 'S460' };
    const both = { beam: strong, ...joint({ plate: { grade: 'S460' }, weld: { leg: 20 } }) };
    const { state, of, utilisation } = check('fit-rotation', both);
    expect([state, of, utilisation]).toEqual(['refer', 'plate or web', null]);
  });

  test('a plate on the root of a flange that is not cut fails; a shallow one refers', () => {
    const high = { top: null, ...joint({ firstRow: 60 }) };
    expect([check('fit-plate-depth', high).state, check('fit-plate-depth', high).of]).toEqual(['fails', 'top']);
    const shallow = check('fit-plate-depth', joint({ bolts: { rows: 3 } }));
    expect([shallow.state, shallow.of]).toEqual(['refer', 'depth']);
  });
});

describe('what is printed beside the checks', () => {
  test('the guide always; the notch, a tie and close bolts where they are there', () => {
    expect(notes()).toEqual(['joint-guide', 'notch-in-buckling']);
    expect(notes({ top: null })).toEqual(['joint-guide', 'bolts-govern']);
    expect(notes({ tie: 10 })).toContain('tie-support');
    expect(notes(joint({ endDistance: 35 }))).toContain('guide-spacing');
    expect(notes({ top: null, ...joint({ plate: { thickness: 8 } }) })).not.toContain('bolts-govern');
  });
});
