import { describe, expect, test } from 'vitest';
import type { Check } from '../../../core/check/report.ts';
import { reportOf } from '../../support/compare.ts';

type Json = Record<string, unknown>;

const bolts = { size: 'M20', grade: '8.8', threads: 'in', rows: 4, columns: 1, pitch: 70, gauge: 0 };
const supportBolts = { size: 'M20', grade: '8.8', threads: 'in', rows: 4, pitch: 70, crossCentres: 110, topEdge: 40 };
const cleat = {
  legWeb: 110,
  legSupport: 90,
  thickness: 10,
  grade: 'S275',
  radius: 12,
  topEdge: 40,
  bottomEdge: 40,
};
const plate = { thickness: 10, width: 180, depth: 290, grade: 'S275', top: 60 };
const support = { kind: 'beam-web', section: 'UB 533x210x92', grade: 'S275', topOfSteel: 0 };

const end: Json = {
  standard: 'en-1993',
  units: 'mm-kN',
  reaction: 100,
  beam: { section: 'UB 406x178x60', grade: 'S275' },
  top: { length: 120, depth: 50, radius: 10 },
  setback: 10,
  support,
};

const cleats = (changes: { kind?: string; cleat?: Json; supportBolts?: Json; bolts?: Json } = {}): Json => ({
  kind: changes.kind ?? 'double-cleat',
  firstRow: 90,
  endDistance: 50,
  bolts: { ...bolts, ...changes.bolts },
  cleat: { ...cleat, ...changes.cleat },
  supportBolts: { ...supportBolts, ...changes.supportBolts },
});
const endPlate = (changes: { kind?: string; plate?: Json; supportBolts?: Json; leg?: number } = {}): Json => ({
  kind: changes.kind ?? 'end-plate',
  plate: { ...plate, ...changes.plate },
  webWeld: { leg: changes.leg ?? 8 },
  supportBolts: { ...supportBolts, ...changes.supportBolts },
});
const { topEdge: _, bottomEdge: __, ...noEdges } = cleat;
const webWelded: Json = {
  kind: 'double-cleat',
  cleat: { ...noEdges, legWeb: 90, top: 60, depth: 290, webWeld: { leg: 6 } },
  supportBolts,
};
const supportWelded: Json = {
  kind: 'double-cleat',
  firstRow: 90,
  endDistance: 50,
  bolts,
  cleat: { ...cleat, supportWeld: { leg: 8 } },
};

const report = (joint: Json, changes: Json = {}) => reportOf({ ...end, ...changes, joint });
const check = (id: string, joint: Json, changes: Json = {}): Check =>
  report(joint, changes).checks.find((one) => one.id === id)!;
const stateOf = (id: string, joint: Json, changes: Json = {}) => {
  const { state, reason } = check(id, joint, changes);
  return [state, reason ?? ''];
};

describe('cleats', () => {
  test('a sound pair of cleats holds, and two cleats carry twice what one does', () => {
    const roomy = cleats({ cleat: { legSupport: 110 }, supportBolts: { crossCentres: 140 } });
    expect(report(roomy).verdict).toBe('holds');
    for (const id of ['bolt-shear', 'cleat-bearing', 'cleat-gross-shear', 'cleat-net-shear', 'cleat-block']) {
      const [pair, one] = [check(id, cleats()), check(id, cleats({ kind: 'single-cleat' }))];
      expect(pair.resistance! / one.resistance!, id).toBeCloseTo(2, 12);
    }
  });

  test('the bolts of one cleat into its support stand beside the web: they refer without a number, and so never pass', () => {
    const one = cleats({ kind: 'single-cleat' });
    for (const id of ['support-bolt-shear', 'support-bearing', 'support-shear']) {
      const { state, reason, resistance } = check(id, one);
      expect([state, reason, resistance], id).toEqual(['refer', 'one-cleat', null]);
    }
    expect(report(one, { reaction: 1 }).verdict).toBe('refer');
  });

  test('long rows of bolts carry less, in the support as in the web, and option long-joint: off leaves that out', () => {
    // L = 5 x 70 = 350 > 15 d = 300: 1 - 50/(200 x 20) = 0.9875.
    const long = cleats({ bolts: { rows: 5, pitch: 87.5 }, supportBolts: { rows: 6 } });
    const beam = { section: 'UB 610x229x101', grade: 'S275' };
    const ratio = (id: string) =>
      check(id, long, { beam }).resistance! / check(id, long, { beam, options: { 'long-joint': 'off' } }).resistance!;
    expect(ratio('bolt-shear')).toBeCloseTo(0.9875, 12);
    expect(ratio('support-bolt-shear')).toBeCloseTo(0.9875, 12);
  });

  test('one row of bolts in the support refers, and the length between outer rows is then nothing', () => {
    const one = cleats({ supportBolts: { rows: 1, topEdge: 145 } });
    expect(stateOf('support-bolt-shear', one)).toEqual(['refer', 'rows-below-two']);
    expect(check('support-bolt-shear', one).resistance).toBeCloseTo(0.8 * 2 * 94.08, 9);
    expect(stateOf('support-bearing', one)).toEqual(['refer', 'rows-below-two']);
    expect([...stateOf('support-shear', one), check('support-shear', one).resistance]).toEqual([
      'refer',
      'rows-below-two',
      null,
    ]);
  });

  test('wide holes for the support bolts bear 0.8 as much, and beyond oversize holes they refer', () => {
    const bearing = (hole: number) => {
      const { working } = check('support-bearing', cleats({ supportBolts: { hole } }), { support: undefined });
      return working!.find(({ symbol }) => symbol === 'F_e')!;
    };
    expect(bearing(22).value).toBeCloseTo(104.24, 2);
    // 24: 0.8 x 2.5 x 40/72 x 430 x 20 x 10/1.25 = 76.44 kN.
    expect(bearing(24).value).toBeCloseTo(76.44, 2);
    for (const id of ['support-bolt-shear', 'support-bearing', 'cleat-net-shear', 'cleat-block', 'support-shear']) {
      expect(stateOf(id, cleats({ supportBolts: { hole: 24.5 } })), id).toEqual(['refer', 'hole-above-oversize']);
    }
  });

  test('a bolt into the support that the standard does not list refers', () => {
    const own = cleats({ supportBolts: { grade: { fu: 1000 } } });
    expect(stateOf('support-bolt-shear', own)).toEqual(['refer', 'bolt-not-listed']);
    expect(stateOf('bolt-shear', own)[0]).toBe('holds');
  });

  test('an inch size has no tensile stress area: its shear and tension refer without a number, in web and support', () => {
    const inch = { size: '7/8', grade: { fu: 800 } };
    const joint = cleats({ bolts: inch, supportBolts: inch });
    for (const id of ['bolt-shear', 'support-bolt-shear']) {
      expect(check(id, joint)).toMatchObject({ state: 'refer', reason: 'bolt-not-listed', resistance: null });
    }
    expect(stateOf('web-tie', joint, { tie: 75 })).toEqual(['refer', 'bolt-not-listed']);
    const out = cleats({ bolts: { ...inch, threads: 'out' }, supportBolts: { ...inch, threads: 'out' } });
    for (const id of ['bolt-shear', 'support-bolt-shear']) {
      expect(check(id, out)).toMatchObject({ state: 'refer', resistance: expect.any(Number) });
    }
  });

  test('the cleats of a pair are the outer plies: their thickness bounds the pitch, the web does not', () => {
    // 14 x 10 = 140 for the pair; 14 x 7.9 = 110.6 for one cleat beside the web.
    const wide = { bolts: { rows: 3, pitch: 120 }, supportBolts: { rows: 3, pitch: 100 } };
    expect(check('fit-pitch', cleats(wide)).state).toBe('holds');
    expect(check('fit-pitch', cleats({ ...wide, kind: 'single-cleat' }))).toMatchObject({
      state: 'fails',
      reason: 'too-much',
    });
  });

  test('a cleat that stands above the cut edge, where the flange of the support is near, refers', () => {
    const cut = (depth: number) => ({ top: { length: 120, depth, radius: 10 } });
    expect(check('fit-plate-depth', cleats(), cut(50)).state).toBe('holds');
    expect(check('fit-plate-depth', cleats(), cut(51))).toMatchObject({ state: 'refer', of: 'top, cleat' });
  });

  test('a cleat that reaches past a short notch must keep clear of the root of the flange there', () => {
    // Leg 110, setback 10: 100 on the web. The top of the cleat stands 15 below the top of steel, flange and root reach 23.
    const near = cleats({ cleat: { topEdge: 75 } });
    const notch = (length: number) => ({ top: { length, depth: 50, radius: 10 }, support: undefined });
    expect(check('fit-plate-depth', near, notch(100))).toMatchObject({ state: 'refer', of: 'top, cleat' });
    expect(check('fit-plate-depth', near, notch(99))).toMatchObject({ state: 'fails', of: 'top' });
  });
});

describe('welded legs', () => {
  test('a leg welded to the web has no holes: its weld and the web behind are checked in their place', () => {
    for (const id of ['bolt-shear', 'cleat-bearing', 'web-net-shear', 'web-block', 'web-bearing', 'fit-end']) {
      expect(stateOf(id, webWelded), id).toEqual(['notApplicable', 'no-web-holes']);
    }
    expect(check('weld-web', webWelded)).toMatchObject({ state: 'holds', of: 'web' });
    expect(check('cleat-net-shear', webWelded).of).toBe('support leg');
    expect(report(webWelded).notes.map(({ code }) => code)).toContain('leg-weld-full');
    expect(report(cleats()).notes.map(({ code }) => code)).not.toContain('leg-weld-full');
  });

  test('no rule says how a cleat welded to its support turns: what would hold refers, what fails fails', () => {
    expect(stateOf('weld', supportWelded, { reaction: 50 })).toEqual(['refer', 'welded-support-leg']);
    expect(stateOf('weld', supportWelded, { reaction: 500 })[0]).toBe('fails');
    expect(stateOf('support-bolt-shear', supportWelded)).toEqual(['notApplicable', 'no-support-bolts']);
  });

  test('a pair welded to its support shears it along its whole depth, as a fin plate does', () => {
    // 2 x 290 x 10.1 x 275/√3.
    expect(check('support-shear', supportWelded).resistance).toBeCloseTo(930.1, 1);
  });
});

describe('end plates', () => {
  test('a sound end plate holds, without a setback or a hole in the web', () => {
    expect(report(endPlate()).verdict).toBe('holds');
    expect(stateOf('fit-setback', endPlate(), { setback: 0 })).toEqual(['notApplicable', 'fills-setback']);
    expect(stateOf('web-block', endPlate())).toEqual(['notApplicable', 'no-web-holes']);
    expect(stateOf('endplate-bearing', endPlate())).toEqual(['notApplicable', 'covered']);
  });

  test('all of the web beside the plate counts under option plain-web: full, nine tenths else', () => {
    const full = check('endplate-web-shear', endPlate(), { options: { 'plain-web': 'full' } });
    expect(check('endplate-web-shear', endPlate()).resistance! / full.resistance!).toBeCloseTo(0.9, 12);
  });

  test('one of the full depth is no simple joint: every row of the joint refers where it would hold, and fails where it fails', () => {
    const whole = endPlate({ kind: 'full-end-plate', plate: { depth: 420, top: 1 }, supportBolts: { topEdge: 105 } });
    const rows = [
      'endplate-gross-shear',
      'endplate-net-shear',
      'endplate-block',
      'endplate-web-shear',
      'weld-web',
      'support-bolt-shear',
      'support-bearing',
      'support-shear',
    ];
    for (const id of rows) {
      expect(stateOf(id, whole, { top: null }), id).toEqual(['refer', 'full-depth-plate']);
      expect(stateOf(id, whole, { top: null, reaction: 9000 })[0], id).toBe('fails');
    }
    expect(stateOf('web-tie', whole, { top: null, tie: 50 })).toEqual(['refer', 'full-depth-plate']);
  });

  test('a fillet with a throat below 3 mm refers, and a plate that stands above the cut edge fails', () => {
    // 4/√2 = 2.83.
    expect(stateOf('weld-web', endPlate({ leg: 4 }))).toEqual(['refer', 'weld-throat-below-least']);
    expect(check('fit-plate-depth', endPlate({ plate: { top: 45 } }))).toMatchObject({
      state: 'fails',
      of: 'top, welded',
    });
  });

  test('cross centres outside 90 to 140 refer; a thick plate does not turn', () => {
    const wide = endPlate({ plate: { width: 220 }, supportBolts: { crossCentres: 150 } });
    expect(check('fit-gauge', wide)).toMatchObject({ state: 'refer', reason: 'too-much' });
    const narrow = endPlate({ supportBolts: { crossCentres: 85 } });
    expect(check('fit-gauge', narrow)).toMatchObject({ state: 'refer', reason: 'too-little' });
    // 20 √(800/275)/2.8 = 12.18.
    expect(check('fit-rotation', endPlate({ plate: { thickness: 12 } })).state).toBe('holds');
    expect(check('fit-rotation', endPlate({ plate: { thickness: 13 } })).state).toBe('refer');
  });
});

describe('the support', () => {
  test('a beam on the other side of the same web is added to what bears on it and shears it, on a column flange it is not', () => {
    const other = (kind: string) => ({ support: { ...support, kind, otherReaction: 300 } });
    for (const joint of [cleats(), endPlate()]) {
      const [alone, both, flange] = [
        check('support-shear', joint),
        check('support-shear', joint, other('beam-web')),
        check('support-shear', joint, other('column-flange')),
      ];
      expect(both.reactionAtFailure).toBeCloseTo(alone.reactionAtFailure! - 300, 9);
      expect(both.demand).toBeCloseTo(400, 9);
      expect(flange.demand).toBeCloseTo(100, 9);
    }
    const fin = {
      kind: 'fin-plate',
      firstRow: 90,
      endDistance: 50,
      bolts,
      plate: { thickness: 10, grade: 'S275', topEdge: 40, bottomEdge: 40, edge: 50 },
      weld: { leg: 8 },
    };
    expect(check('support-shear', fin, other('beam-web')).reactionAtFailure).toBeCloseTo(630.1, 1);
  });

  test('a beam opposite that uses the web up leaves nothing for this one', () => {
    const used = check('support-shear', cleats(), { support: { ...support, otherReaction: 600 } });
    expect([used.state, used.reactionAtFailure]).toEqual(['fails', 0]);
  });

  test('a support that is not told leaves its own checks out, not the legs', () => {
    expect(stateOf('support-shear', cleats(), { support: undefined })).toEqual(['notApplicable', 'no-support']);
    expect(check('support-bearing', cleats(), { support: undefined })).toMatchObject({
      state: 'holds',
      of: 'leg or plate',
    });
  });
});

describe('the tie force', () => {
  test('is no matter where there is none', () => {
    for (const joint of [cleats(), endPlate(), cleats({ kind: 'single-cleat' }), webWelded, supportWelded]) {
      expect(stateOf('web-tie', joint)).toEqual(['notApplicable', 'no-tie']);
    }
  });

  test('refers for one cleat alone and for a welded leg, and still fails where the web or a leg gives', () => {
    for (const joint of [cleats({ kind: 'single-cleat' }), webWelded, supportWelded]) {
      expect(stateOf('web-tie', joint, { tie: 10 })).toEqual(['refer', 'tie-not-covered']);
      expect(stateOf('web-tie', joint, { tie: 5000 })[0]).toBe('fails');
    }
  });

  test('bends cleats and end plates beside their bolts, thick ones break the bolts or the web', () => {
    expect(check('web-tie', endPlate(), { tie: 75 })).toMatchObject({ state: 'holds', of: 'bending beside the bolts' });
    const thick = endPlate({ plate: { thickness: 25 }, leg: 12 });
    expect(check('web-tie', thick, { tie: 75 }).of).not.toBe('bending beside the bolts');
  });

  test('without a root radius the lines stand as if it were nothing, the clear width as if it were the thickness', () => {
    // m = (110 - 7.9 - 20)/2 = 41.05; s = 102.1 - 20 = 82.1.
    const { working } = check('web-tie', cleats({ cleat: { radius: undefined } }), { tie: 75 });
    const value = (symbol: string) => working!.find((row) => row.symbol === symbol)!.value;
    expect(value('m′')).toBeCloseTo(41.05, 9);
    expect(value('s_c')).toBeCloseTo(82.1, 9);
  });

  test('bolts so near the web that no such bending is left refer without a number of it', () => {
    // cc 62: m = (62 - 7.9 - 20 - 19.2)/2 = 7.45, n = 9.31: 2 m n - 9.25 (m + n) = -16.3.
    const near = cleats({ cleat: { legSupport: 70 }, supportBolts: { crossCentres: 62 } });
    expect(stateOf('web-tie', near, { tie: 10 })).toEqual(['refer', 'bolts-near-web']);
  });

  test('a thin fillet of an end plate is used up by the tie force too', () => {
    const thin = endPlate({ plate: { thickness: 20 }, leg: 5 });
    // 2 (290 - 2 x 3.536) x 3.536 x 430/(√3 x 0.85 x 1.25) = 467.5 kN.
    const weld = check('web-tie', thin, { tie: 75 });
    expect([weld.of, weld.resistance!.toFixed(1)]).toEqual(['weld', '467.5']);
  });
});

describe('sections behind a notch', () => {
  test('without holes in the web no column stands behind the notch, and the reaction keeps its arm', () => {
    const bending = check('cope-bending', endPlate());
    // 100 x (10 + 120).
    expect(bending).toMatchObject({ of: 'tee' });
    expect(bending.demand).toBeCloseTo(13, 9);
    expect(check('cope-bending', webWelded, { setback: 0 }).reactionAtFailure).toBeGreaterThan(0);
  });
});
