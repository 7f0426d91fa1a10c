import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import { reportOf } from '../../support/compare.ts';
import { check, cope, end, type Json, joint, notes, report } from './en1993Ends.ts';

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
