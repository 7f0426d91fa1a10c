import { describe, expect, test } from 'vitest';
import { webBesideRoot } from '../../../core/standards/en1993/longPlate.ts';
import { check, cope, type Json, joint, report } from './en1993Ends.ts';

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
