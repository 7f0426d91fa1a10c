import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Check, Report } from '../../core/check/report.ts';
import type { Answer } from '../support/secondAnswers.ts';
import { type SecondEnd, secondCalculation } from '../support/secondCalculation.ts';

/** Sizes of three sections as the published tables give them: the program knows supports by name only. */
const supports = {
  'UB 305x165x40': { depth: 303.4, width: 165, flange: 10.2, web: 6, radius: 8.9, family: 'I' },
  'UB 406x178x60': { depth: 406.4, width: 177.9, flange: 12.8, web: 7.9, radius: 10.2, family: 'I' },
  'UB 610x229x101': { depth: 602.6, width: 227.6, flange: 14.8, web: 10.5, radius: 12.7, family: 'I' },
} as const;
type SupportName = keyof typeof supports;

const between = (min: number, max: number) => fc.integer({ min, max });
const oneOf = <T>(...values: T[]) => fc.constantFrom(...values);
const share = between(2, 55).map((hundredths) => hundredths / 100);

const raw = fc.record({
  V: fc.oneof(between(1, 900), between(1, 300), oneOf(0)),
  T: oneOf(0, 0, 50, 300, 1000),
  h: between(200, 900),
  b: between(130, 300),
  tf: between(6, 30),
  tw: between(45, 200).map((tenths) => tenths / 10),
  r: fc.oneof(between(0, 25), oneOf(0)),
  family: oneOf<'I' | 'channel'>('I', 'I', 'I', 'channel'),
  fy: oneOf(235, 275, 355, 450),
  copes: oneOf('none', 'top', 'top', 'bottom', 'both', 'both'),
  ct: between(20, 700),
  cb: between(20, 700),
  sameLength: fc.boolean(),
  dt: share,
  db: share,
  radius: oneOf(undefined, 5, 10, 12),
  limit: fc.oneof(
    oneOf(''),
    oneOf('c before hole', 'c on hole', 'c past hole', 'c = h', 'c = 2h'),
    oneOf('d = t_f', 'd = t_f + r', 'd = 0.2 h', 'd > 0.2 h', 'd = h/2', 'd > h/2'),
  ),
  g: fc.oneof(between(0, 30), between(0, 30), between(75, 112)),
  at: between(20, 120),
  eEnd: fc.oneof(between(18, 100), between(18, 200)),
  d: oneOf(12, 16, 20, 22, 24, 27, 30, 36),
  wider: oneOf(undefined, undefined, 1, 4),
  threads: oneOf<'in' | 'out'>('in', 'out'),
  holes: oneOf<'drilled' | 'punched'>('drilled', 'punched'),
  rows: fc.oneof(between(1, 3), between(1, 8)),
  columns: oneOf(1, 1, 2, 3),
  pitch: between(41, 110),
  gauge: between(41, 110),
  tp: fc.oneof(between(5, 25), between(3, 8)),
  eTop: between(18, 150),
  eBot: between(18, 150),
  ex: between(18, 150),
  weld: fc.option(fc.record({ leg: between(3, 16), electrode: oneOf(410, 480) }), { nil: undefined }),
  support: oneOf<SupportName | undefined>(undefined, undefined, ...(Object.keys(supports) as SupportName[])),
  topOfSteel: oneOf(0, -150, -20, 30, 100),
  options: fc.record({
    'elastic-shear': oneOf('report', 'verdict'),
    'bolt-group': oneOf('elastic', 'instantaneous-centre'),
    'cope-shear': oneOf('elastic', 'mean'),
    'web-block': oneOf('standard', 'cautious'),
    'plate-edges': oneOf('sheared', 'cut'),
  }),
});
type Raw = typeof raw extends fc.Arbitrary<infer T> ? T : never;

const holeOf = ({ d, wider }: Raw): number => (wider === undefined ? d + (d <= 24 ? 2 : 3) : d + wider);

/** Lengths and depths of the copes; some stand exactly on a limit of the rules. */
const copesOf = (x: Raw) => {
  const half = holeOf(x) / 2;
  const lengths: Record<string, number> = {
    'c before hole': x.eEnd - half,
    'c on hole': x.eEnd,
    'c past hole': x.eEnd + half,
    'c = h': x.h,
    'c = 2h': 2 * x.h,
  };
  const depths: Record<string, number> = {
    'd = t_f': x.tf,
    'd = t_f + r': x.tf + x.r,
    'd = 0.2 h': 0.2 * x.h,
    'd > 0.2 h': 0.2 * x.h + 0.1,
    'd = h/2': x.copes === 'both' ? 0.2 * x.h : x.h / 2,
    'd > h/2': x.copes === 'both' ? 0.2 * x.h : x.h / 2 + 0.1,
  };
  // Two copes of less than 0.46 h each leave a web, and a strip that the published method can put a number on.
  const most = x.copes === 'both' ? 0.45 : 0.55;
  const radius = x.radius === undefined ? {} : { radius: x.radius };
  const depth = (part: number) => depths[x.limit] ?? Math.round(Math.min(part, most) * x.h * 10) / 10;
  const length = lengths[x.limit] ?? x.ct;
  const top = { length, depth: depth(x.dt), ...radius };
  const bottom = { length: x.sameLength || x.copes === 'bottom' ? length : x.cb, depth: depth(x.db), ...radius };
  return {
    top: x.copes === 'top' || x.copes === 'both' ? top : null,
    bottom: x.copes === 'bottom' || x.copes === 'both' ? bottom : null,
  };
};

/** Random ends, plausible and odd, invented: every cope and option, both joints, limits met exactly. Tie forces on two rows or more. */
const anEnd: fc.Arbitrary<SecondEnd & { readonly beside: SupportName | undefined }> = raw.map((x) => {
  const { top, bottom } = copesOf(x);
  return {
    reaction: x.V,
    tie: x.T,
    section: { depth: x.h, width: x.b, flange: x.tf, web: x.tw, radius: x.r, family: x.family },
    web: { fy: x.fy, fu: 470 },
    top,
    bottom,
    setback: x.g,
    firstRow: Math.max(top?.depth ?? 0, x.tf) + x.at,
    endDistance: x.eEnd,
    bolts: {
      d: x.d,
      fu: 830,
      threads: x.threads,
      rows: x.rows,
      columns: x.columns,
      pitch: x.pitch,
      gauge: x.gauge,
      holes: x.holes,
      ...(x.wider === undefined ? {} : { hole: holeOf(x) }),
    },
    ply: { fy: 275, fu: 410, thickness: x.tp, topEdge: x.eTop, bottomEdge: x.eBot, edge: x.ex },
    ...(x.weld && { weld: x.weld }),
    ...(x.support && { support: { ...supports[x.support], topOfSteel: x.topOfSteel } }),
    beside: x.support,
    options: x.options,
  };
});

/** The same end as the program reads it. */
const jsonOf = (end: SecondEnd, beside: SupportName | undefined) => {
  const { d, fu, ...bolts } = end.bolts;
  const { fy, fu: fuPly, ...sizes } = end.ply;
  const ply = { ...sizes, grade: { fy, fu: fuPly } };
  const place = {
    firstRow: end.firstRow,
    endDistance: end.endDistance,
    bolts: { ...bolts, size: `M${d}`, grade: { fu } },
  };
  return {
    standard: 'sans-10162-1',
    units: 'mm-kN',
    reaction: end.reaction,
    tie: end.tie,
    beam: { section: end.section, grade: end.web },
    top: end.top,
    bottom: end.bottom,
    setback: end.setback,
    joint: end.weld
      ? { kind: 'fin-plate', ...place, plate: ply, weld: end.weld }
      : { kind: 'web-bolts', ...place, ply },
    ...(beside && {
      support: { kind: 'beam-web', section: beside, grade: end.web, topOfSteel: end.support?.topOfSteel },
    }),
    options: end.options,
  };
};

const sizeOf: Readonly<Record<string, number>> = { kN: 1e3, 'kN m': 1e6 };

const alike = (one: number | null | undefined, other: number | null | undefined, tolerance: number): boolean => {
  const [a, b] = [one ?? Number.NaN, other ?? Number.NaN];
  if (!Number.isFinite(a) || !Number.isFinite(b)) return Number.isFinite(a) === Number.isFinite(b);
  return Math.abs(a - b) <= tolerance * Math.max(Math.abs(a), Math.abs(b), 1e-6);
};

/** Checks whose numbers come from the strips: near the flange the strips follow the fillet's arc only to about 1e-4. */
const byStrips: ReadonlySet<string> = new Set([
  'cope-shear',
  'stress-cope',
  'stress-full',
  'cope-bending',
  'cope-buckling',
]);

/** Why a coped channel has no stress at the cope is left to words; so is which of two failing parts gives its reason, `nothing-left` or none. */
const leftOpen: ReadonlySet<string> = new Set(['stress-cope notApplicable']);

/** What the program and the second calculation say differently of one check; empty where they agree. */
const differences = (check: Check, second: Answer, radius: number): string[] => {
  const tolerance = radius > 0 && byStrips.has(check.id) ? 3e-4 : 1e-6;
  const found = (second.level ?? []).map((part) => numbersApart(check, part, tolerance));
  const numbers = found.find((list) => list.length === 0) ?? found[0] ?? numbersApart(check, second, tolerance);
  // At the very edge of holding the strips may fall on either side.
  const onTheEdge = Math.abs((check.utilisation ?? 0) - 1) <= tolerance && byStrips.has(check.id);
  const said = ({ state, reason = '' }: Pick<Check | Answer, 'state' | 'reason'>) =>
    leftOpen.has(`${check.id} ${state}`) || reason === 'nothing-left' ? state : `${state} ${reason}`.trim();
  const words = onTheEdge || said(check) === said(second) ? [] : [`${said(check)} against ${said(second)}`];
  return [...numbers, ...words].map((one) => `${check.id}: ${one}`);
};

const numbersApart = (check: Check, second: Answer, tolerance: number): string[] => {
  const unit = sizeOf[check.unit] ?? 1;
  const compare = (name: string, one: number | null | undefined, factor: number, other: number | undefined) => {
    const value = one === null || one === undefined ? one : one * factor;
    return alike(value, other, tolerance) ? [] : [`${name} ${value} against ${other}`];
  };
  return [
    ...compare('demand', check.demand, unit, second.demand),
    ...compare('resistance', check.resistance, unit, second.resistance),
    ...compare('reaction at failure', check.reactionAtFailure, 1e3, second.reactionAtFailure),
    ...compare('utilisation', check.utilisation, 1, second.utilisation),
  ];
};

const verdictOf = (answers: readonly Answer[]) =>
  ['fails', 'refer'].find((state) => answers.some((one) => one.state === state)) ?? 'holds';

const capacityOf = (answers: readonly Answer[]): number =>
  Math.min(
    ...answers
      .filter(({ state }) => state !== 'information' && state !== 'notApplicable')
      .map((one) => one.reactionAtFailure ?? Number.POSITIVE_INFINITY),
  );

const reportOf = (end: SecondEnd, beside?: SupportName): Report | undefined => {
  const outcome = checkEnd(jsonOf(end, beside));
  return 'report' in outcome ? outcome.report : undefined;
};

/** A fin-plate end of round sizes: top cope 110 x 45, one column of three M20 8.8, plate 10, weld 8; 355/470, drilled. */
const plain: SecondEnd = {
  reaction: 165,
  tie: 0,
  section: { depth: 406.4, width: 177.9, flange: 12.8, web: 7.9, radius: 10.2, family: 'I' },
  web: { fy: 355, fu: 470 },
  top: { length: 110, depth: 45, radius: 10 },
  bottom: null,
  setback: 10,
  firstRow: 90,
  endDistance: 45,
  bolts: { d: 20, fu: 830, threads: 'in', rows: 3, columns: 1, pitch: 70, gauge: 0, holes: 'drilled' },
  ply: { fy: 355, fu: 470, thickness: 10, topEdge: 40, bottomEdge: 40, edge: 50 },
  weld: { leg: 8, electrode: 480 },
  options: {},
};

describe('a second calculation, written from the rules alone, finds what the program finds', () => {
  test('the second calculation itself gives the numbers of sums by hand', () => {
    const answers = secondCalculation(plain);
    const kN = (id: string) => answers[id]!.reactionAtFailure! / 1e3;
    // 0.9 x 406.4 x 7.9 x 0.66 x 355 = 677.01
    expect(kN('web-gross-shear')).toBeCloseTo(677.01, 2);
    // A_nt = 7.9 (45 - 11) = 268.6; A_nv = 7.9 (185 - 55) = 1027: 0.5 x 0.9 x 268.6 x 470 + 0.6 x 0.9 x 1027 x 470 = 56.81 + 260.65
    expect(kN('web-block')).toBeCloseTo(317.46, 2);
    // J = 2 x 70^2 = 9800, z = 55: R_max/V = hypot(1/3, 55 x 70/9800) = 0.515216; 0.48 x 314.159 x 830 x 0.7 = 87.613
    expect(kN('bolt-shear')).toBeCloseTo(170.05, 2);
    // 2 x 7.9 x 0.54 x 470 (45 - 11) = 136.30 against 0.392857 V
    expect(kN('web-tearout')).toBeCloseTo(346.94, 2);
    // 0.9 x 355 x 10 x 220^2/6 = 25.773 against 0.055 V
    expect(kN('plate-bending')).toBeCloseTo(468.6, 2);
    // 0.67 x 0.67 x 480 x 8/1.41421 = 1218.89 against V hypot(1/440, 6 x 55/(2 x 220^2)) = 0.00409722 V
    expect(kN('weld')).toBeCloseTo(297.49, 2);
  });

  test('an end loaded with exactly what it carries holds, and a thousandth more fails', () => {
    // Gross shear of a plate 10 x 100: 0.6 x 0.9 x 355 x 10 x 100 = 191.7 kN.
    const short = { ...plain, bolts: { ...plain.bolts, rows: 1, columns: 2, gauge: 60 } };
    const end = { ...short, ply: { ...plain.ply, topEdge: 50, bottomEdge: 50 } };
    const gross = (reaction: number) =>
      reportOf({ ...end, reaction })?.checks.find(({ id }) => id === 'plate-gross-shear')?.state;
    expect(gross(191.7)).toBe('holds');
    expect(gross(191.701)).toBe('fails');
  });

  test('every check of some hundreds of random ends: demand, resistance, reaction at failure, state and reason', () => {
    let compared = 0;
    fc.assert(
      fc.property(anEnd, ({ beside, ...end }) => {
        const report = reportOf(end, beside);
        if (!report) return;
        const second = secondCalculation(end);
        const ruled = report.checks.filter(({ reason }) => reason !== 'no-rule');
        const answers = ruled.map(({ id }) => second[id]!);
        expect(ruled.flatMap((one, at) => differences(one, answers[at]!, end.section.radius))).toEqual([]);
        expect(report.verdict).toBe(verdictOf(answers));
        expect(alike((report.capacity ?? Number.NaN) * 1e3, capacityOf(answers), 3e-4)).toBe(true);
        compared += 1;
      }),
      { numRuns: 600 },
    );
    expect(compared).toBeGreaterThan(200);
  });
});
