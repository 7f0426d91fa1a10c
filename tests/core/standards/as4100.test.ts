import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Check } from '../../../core/check/report.ts';
import { as4100 } from '../../../core/standards/as4100/index.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';

type Json = Record<string, unknown>;

const end = goodEnds().find(({ name }) => name === 'as-4100-fin-plate')!.end;
const checkOf = (change: Json, id: string): Check =>
  reportOf(changed(end, change), false).checks.find((one) => one.id === id)!;
const stateOf = (change: Json, id: string) => {
  const { state, reason } = checkOf(change, id);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const bolts = (more: Json): Json => ({ joint: { bolts: more } });
const plate = (more: Json): Json => ({ joint: { plate: more } });
const own = (section: Json): Json => ({ beam: { section } });

describe('steels of AS 4100', () => {
  const { sections, plates } = as4100.materials;

  test('sections of grade 300 yield at 320 MPa below 11 mm, 300 from 11 to 17, 280 above', () => {
    expect([10.9, 11, 17, 17.1].map((t) => sections.strengthAt('300', t))).toEqual(
      [320, 300, 300, 280].map((fy) => ({ fy, fu: 440 })),
    );
  });

  test('sections of grade 350 yield at 360 MPa below 11 mm, 340 below 40, 330 from there', () => {
    expect([10.9, 11, 39.9, 40].map((t) => sections.strengthAt('350', t))).toEqual(
      [360, 340, 340, 330].map((fy) => ({ fy, fu: 480 })),
    );
  });

  test.each([
    ['250', [8, 12, 50], [280, 260, 250], 410],
    ['300', [8, 12, 20, 50], [320, 310, 300, 280], 430],
    ['350', [12, 20, 80], [360, 350, 340], 450],
  ])('plates of grade %s up to %j mm yield at %j MPa and break at %d', (grade, limits, yields, fu) => {
    expect(limits.map((t) => plates.strengthAt(grade, t))).toEqual(yields.map((fy) => ({ fy, fu })));
    expect(plates.strengthAt(grade, limits.at(-1)! + 0.1)).toBeUndefined();
  });

  test('300PLUS and the grades of proven toughness are read as the grade', () => {
    expect(['300', '300PLUS', '300 plus', '300L15', '350L0'].map((name) => sections.named(name))).toEqual([
      '300',
      '300',
      '300',
      '300',
      '350',
    ]);
    expect(['250', '350PLUS', 'S355'].map((name) => sections.named(name))).toEqual([undefined, undefined, undefined]);
  });

  test('web and flange have their own strengths: the lesser counts behind a notch', () => {
    const thick = own({ depth: 403, width: 178, flange: 18, web: 7.6, radius: 11.4 });
    const found = reportOf(changed(end, thick)).checks.find(({ id }) => id === 'cope-bending')!;
    expect(found.working!.find(({ symbol }) => symbol === 'f_yb')!.value).toBe(280);
  });
});

describe('bolts of AS 4100', () => {
  test('8.8 breaks at 800 MPa below M16 and at 830 from there, in every category', () => {
    const { bolt } = as4100.materials;
    expect([12, 16, 20].map((d) => bolt('8.8', d)?.fub)).toEqual([800, 830, 830]);
    expect(['4.6/S', '8.8/S', '8.8/TB', '8.8/TF', '10.9/TF'].map((name) => bolt(name, 20)?.fub)).toEqual([
      400, 830, 830, 830, 1040,
    ]);
  });

  test('threads out of the plane give the shank, 0.8 × 0.62 × 830 × 314.16 = 129.33 kN', () => {
    expect(checkOf(bolts({ threads: 'out' }), 'bolt-shear').resistance).toBeCloseTo(129.33, 2);
  });

  test('10.9 takes 0.83 with threads in the plane alone', () => {
    const shear = (more: Json) => checkOf(bolts({ grade: '10.9', ...more }), 'bolt-shear').resistance;
    expect(shear({})).toBeCloseTo(0.8 * 0.62 * 1.04 * 0.83 * 225, 9);
    expect(shear({ threads: 'out' })).toBeCloseTo(0.8 * 0.62 * 1.04 * 100 * Math.PI, 9);
  });

  test('a size without a core area refers, without a number where threads lie in the plane', () => {
    const inch = bolts({ size: '3/4', grade: { fu: 830 } });
    expect(stateOf(inch, 'bolt-shear')).toBe('refer, bolt-not-listed');
    expect(checkOf(inch, 'bolt-shear').resistance).toBeNull();
    const out = bolts({ size: '3/4', grade: { fu: 830 }, threads: 'out' });
    expect(stateOf(out, 'bolt-shear')).toBe('refer, bolt-not-listed');
    expect(checkOf(out, 'bolt-shear').resistance).not.toBeNull();
  });

  test('one bolt alone refers; the tear-out of the web takes the whole reaction', () => {
    const one = bolts({ rows: 1 });
    for (const id of ['bolt-shear', 'web-bearing', 'plate-bearing']) expect(stateOf(one, id)).toBe('refer, one-bolt');
    expect(checkOf(one, 'web-tearout').demand).toBe(150);
  });

  test('holes wider than the standard ones refer in bearing', () => {
    expect(stateOf(bolts({ hole: 24 }), 'web-bearing')).toBe('refer, hole-above-standard');
  });

  test('a joint from 300 mm on counts less, no less than 0.75 beyond 1300 mm', () => {
    const factor = (rows: number, pitch: number) =>
      reportOf(
        changed(end, {
          ...own({ depth: 2500, width: 300, flange: 20, web: 20, radius: 0 }),
          ...bolts({ rows, pitch }),
        }),
      )
        .checks.find(({ id }) => id === 'bolt-shear')!
        .working!.find(({ symbol }) => symbol === 'k_r')!.value;
    expect(factor(4, 99)).toBe(1);
    expect(factor(4, 100)).toBe(1);
    expect(factor(5, 100)).toBeCloseTo(0.975, 12);
    expect(factor(14, 101)).toBe(0.75);
  });
});

describe('the notch under AS 4100', () => {
  test('no rule for net shear: the holes are filled', () => {
    for (const id of ['web-net-shear', 'plate-net-shear']) expect(stateOf({}, id)).toBe('notApplicable, no-rule');
    expect(stateOf({}, 'plate-tearout')).toBe('notApplicable, covered');
  });

  test('a column at the face of the notch refers, whatever the number', () => {
    const two = { ...bolts({ columns: 2, gauge: 70 }) };
    for (const id of ['web-block', 'cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(stateOf(two, id)).toBe('refer, hole-at-cope-face');
    }
    expect(stateOf(two, 'web-net-shear')).toBe('notApplicable, no-rule');
    expect(stateOf({ ...two, top: { length: 150 } }, 'web-block')).toBe('holds');
  });

  test('a notch that ends before the bolts leaves the flange above them', () => {
    const short = { top: { length: 28 }, ...bolts({ columns: 2, gauge: 70 }) };
    for (const id of ['web-block', 'web-tearout']) expect(stateOf(short, id)).toBe('notApplicable, intact-flange');
  });

  test('a notch shallower than the flange refers', () => {
    const shallow = { top: { depth: 10 } };
    for (const id of ['web-block', 'cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(stateOf(shallow, id)).toBe('refer, flange-left');
    }
  });

  test('a stem or a strip that may buckle before it yields refers', () => {
    const slender = own({ depth: 800, width: 178, flange: 10.9, web: 7.6, radius: 11.4 });
    expect(stateOf({ ...slender, reaction: 100 }, 'cope-shear')).toBe('refer, slender-cut');
    expect(stateOf({}, 'cope-shear')).toBe('holds');
  });

  test('a web beyond 180 refers', () => {
    const thin = own({ depth: 1200, width: 178, flange: 10.9, web: 6, radius: 11.4 });
    expect(stateOf({ ...thin, reaction: 60 }, 'web-gross-shear')).toBe('refer, web-below-least');
  });

  test('a bottom notch alone: no web buckling, no block; a slender flange keeps to its elastic modulus', () => {
    const bottom = { top: null, bottom: { length: 120, depth: 65, radius: 10 } };
    expect(stateOf(bottom, 'cope-buckling')).toBe('notApplicable, cut-edge-in-tension');
    expect(stateOf(bottom, 'web-block')).toBe('notApplicable, intact-flange');
    const section = { depth: 403, width: 178, flange: 10.9, web: 7.6, radius: 11.4 };
    const compact = checkOf({ ...bottom, ...own(section) }, 'cope-bending').resistance!;
    const slender = checkOf({ ...bottom, ...own({ ...section, width: 190 }) }, 'cope-bending').resistance!;
    expect(compact).toBeCloseTo(97.225, 2);
    expect(slender).toBeLessThan(0.75 * compact);
  });

  test('a notched channel refers without a number', () => {
    const channel = own({ depth: 400, width: 110, flange: 16, web: 8, radius: 14, family: 'channel' });
    for (const id of ['cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(stateOf(channel, id)).toBe('refer, channel-cope');
      expect(checkOf(channel, id).resistance).toBeNull();
    }
    expect(stateOf(channel, 'stress-cope')).toBe('notApplicable, channel-cope');
  });

  test('a corner of less than 10 mm fails, as a clause', () => {
    expect(stateOf({ top: { radius: 9 } }, 'fit-cope-radius')).toBe('fails, too-little');
    expect(checkOf({}, 'fit-cope-radius').clause).toBe('14.3.3');
  });
});

describe('the elastic stress under AS 4100', () => {
  test('is for information; as a verdict it finds no limit', () => {
    for (const id of ['stress-full', 'stress-cope']) {
      expect(stateOf({}, id)).toBe('information');
      expect(stateOf({ options: { 'elastic-shear': 'verdict' } }, id)).toBe('notApplicable, no-rule');
    }
  });
});

describe('the least action', () => {
  test('stands in for a smaller reaction, and is said', () => {
    const report = reportOf(changed(end, { reaction: 0 }));
    expect(report.reaction).toBe(40);
    expect(report.notes.map(({ code }) => code)).toContain('least-reaction');
    expect(reportOf(end).notes.map(({ code }) => code)).not.toContain('least-reaction');
  });

  test('fails what is used up below it at every reaction, and changes no reaction at failure', () => {
    const weak = bolts({ size: 'M12', grade: '4.6', rows: 2, pitch: 40 });
    const none = checkOf({ ...weak, reaction: 0 }, 'bolt-shear');
    expect(none.state).toBe('fails');
    expect(none.reactionAtFailure).toBeLessThan(40);
    expect(none.reactionAtFailure).toBe(checkOf({ ...weak, reaction: 100 }, 'bolt-shear').reactionAtFailure);
  });

  test('leaves the tie force alone', () => {
    expect(checkOf({ reaction: 0 }, 'web-tie').demand).toBe(75);
  });
});

describe('options of AS 4100', () => {
  const withOption = (options: Json, id: string) => checkOf({ options }, id).resistance!;

  test('plate-block: non-uniform halves the tension plane, as two columns do', () => {
    expect(withOption({ 'plate-block': 'non-uniform' }, 'plate-block')).toBeCloseTo(0.75 * (273 + 49.2), 9);
    const two = bolts({ columns: 2, gauge: 70 });
    expect(checkOf(two, 'plate-block').resistance).toBeCloseTo(0.75 * (273 + 0.5 * 0.41 * 10 * (105 - 33)), 9);
  });

  test('weld: GP takes 0.60 in place of 0.80 and says nothing of category SP', () => {
    expect(withOption({ weld: 'GP' }, 'weld')).toBeCloseTo(0.75 * withOption({}, 'weld'), 9);
    const codes = (options: Json) => reportOf(changed(end, { options })).notes.map(({ code }) => code);
    expect(codes({})).toContain('weld-category');
    expect(codes({ weld: 'GP' })).not.toContain('weld-category');
  });

  test('edges: machine asks for 1.5 d in place of 1.75 d', () => {
    const tight = plate({ topEdge: 31, bottomEdge: 31 });
    expect(stateOf(tight, 'fit-edge-plate')).toBe('fails, too-little');
    expect(stateOf({ ...tight, options: { edges: 'machine' } }, 'fit-edge-plate')).toBe('holds');
  });
});

describe('fit under AS 4100', () => {
  test('pitch from 2.5 d to 15 t of the thinner ply', () => {
    expect(stateOf(bolts({ pitch: 49 }), 'fit-pitch')).toBe('fails, too-little');
    expect(stateOf(bolts({ pitch: 114 }), 'fit-pitch')).toBe('holds');
    expect(stateOf(bolts({ pitch: 115 }), 'fit-pitch')).toBe('fails, too-much');
  });

  test('a leg below the least for the thicker part refers where it would hold', () => {
    const thin = { reaction: 60, joint: { weld: { leg: 3.9 } } };
    expect(stateOf(thin, 'weld')).toBe('refer, weld-leg-below-least');
    expect(stateOf({ reaction: 150, joint: { weld: { leg: 3.9 } } }, 'weld')).toBe('fails');
  });
});

describe('the support under AS 4100', () => {
  const support = (more: Json) => ({ support: { kind: 'beam-web', section: '530UB92.4', grade: '300', ...more } });

  test('is checked where its thickness and its grade are told, and a web', () => {
    expect(stateOf({}, 'support-shear')).toBe('notApplicable, no-support');
    expect(stateOf(support({}), 'support-shear')).toBe('holds');
    expect(stateOf(support({ grade: undefined }), 'support-shear')).toBe('notApplicable, support-not-told');
    expect(stateOf(support({ kind: 'column-flange', section: '310UC96.8' }), 'support-shear')).toBe(
      'notApplicable, support-flange',
    );
  });
});

describe('the tie force under AS 4100', () => {
  test('says that plate, weld and support are not covered', () => {
    const codes = (tie: number) => reportOf(changed(end, { tie })).notes.map(({ code }) => code);
    expect(codes(75)).toContain('tie-in-web-only');
    expect(codes(0)).not.toContain('tie-in-web-only');
  });
});

test('a grade or bolt class that AS 4100 does not list is refused by name', () => {
  const codes = (change: Json) => {
    const outcome = checkEnd(changed(end, change));
    return 'faults' in outcome ? outcome.faults.map(({ code }) => code) : [];
  };
  expect(codes({ beam: { grade: 'S355' } })).toEqual(['unknown-grade']);
  expect(codes(plate({ grade: '400' }))).toEqual(['unknown-grade']);
  expect(codes(plate({ thickness: 60 }))).toEqual(['grade-outside-range']);
  expect(codes(bolts({ grade: '12.9' }))).toEqual(['unknown-bolt-grade']);
});
