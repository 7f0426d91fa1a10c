import { describe, expect, test } from 'vitest';
import type { Check } from '../../../core/check/report.ts';
import { csaS16 } from '../../../core/standards/csaS16/index.ts';
import { changed } from '../../support/changed.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';
import { underStandard } from '../../support/underStandard.ts';

type Json = Record<string, unknown>;

/** The invented good ends with strengths of S355 as given: 355 and 470 MPa. */
const endOf = (name: string): Json => {
  const end = underStandard(goodEnds().find((one) => one.name === name)!.end, csaS16);
  const grade = { fy: 355, fu: 470 };
  const part = name.endsWith('plate') ? 'plate' : 'cleat';
  return changed(end, {
    beam: { grade },
    joint: { [part]: { grade } },
    ...('support' in end && { support: { grade } }),
  });
};
const pair = endOf('double-cleat');
const opposite = endOf('double-cleat-other-beam');
const single = endOf('single-cleat');
const webWelded = endOf('double-cleat-web-welded');
const supportWelded = endOf('double-cleat-support-welded');
const endPlate = endOf('end-plate');
const fullDepth = endOf('full-end-plate');

const checkOf = (end: Json, id: string, change: Json = {}): Check =>
  reportOf(changed(end, change)).checks.find((one) => one.id === id)!;
const stateOf = (end: Json, id: string, change: Json = {}): string => {
  const { state, reason } = checkOf(end, id, change);
  return reason === undefined ? state : `${state}, ${reason}`;
};
const supportBolts = (more: Json): Json => ({ joint: { supportBolts: more } });

describe('angles under CSA S16', () => {
  test('the block of a support leg is one-sided, U_t 0.6; that of a web leg with two columns takes 0.3', () => {
    const share = (change: Json) =>
      checkOf(pair, 'cleat-block', change).working!.find(({ symbol }) => symbol === 'P_t')!;
    expect(share({}).numbers).toContain('0.6');
    const twoColumns = { joint: { cleat: { legWeb: 160 }, bolts: { columns: 2, gauge: 60 } }, top: { length: 160 } };
    expect(
      checkOf(supportWelded, 'cleat-block', twoColumns).working!.find(({ symbol }) => symbol === 'P_t')!.numbers,
    ).toContain('0.3');
  });

  test('net shear counts the gross length, so that punched holes change nothing', () => {
    const punched = { joint: { bolts: { holes: 'punched' }, supportBolts: { holes: 'punched' } } };
    const [drilled, other] = [{}, punched].map((change) => checkOf(pair, 'cleat-net-shear', change).resistance);
    expect(other).toBe(drilled);
  });

  test('a line of bolts into the support as long as 760 mm counts five sixths', () => {
    const rows = (pitch: number): Json =>
      changed(endPlate, {
        beam: { section: { depth: 1000, width: 300, flange: 20, web: 12, radius: 20 } },
        joint: { plate: { depth: 840, top: 80 }, supportBolts: { rows: 11, pitch, topEdge: 40 } },
      });
    const [short, long] = [75.9, 76].map((pitch) => checkOf(rows(pitch), 'support-bolt-shear').resistance!);
    expect(long! / short!).toBeCloseTo(0.5 / 0.6, 12);
  });

  test('one bolt alone in the support leg of one angle fails at no reaction at all', () => {
    const oneRow = supportBolts({ rows: 1, topEdge: 110 });
    expect(checkOf(single, 'support-bolt-shear', oneRow)).toMatchObject({ state: 'fails', reactionAtFailure: 0 });
    expect(checkOf(pair, 'support-bolt-shear', oneRow).state).toBe('holds');
  });

  test('a weld is no stronger than the thinner metal beside it: a weak web counts in the weld along it', () => {
    const strong = checkOf(webWelded, 'weld-web', {
      beam: { section: { depth: 406, width: 178, flange: 13, web: 20, radius: 10 } },
    });
    expect(strong.of).toBe('web leg');
    const weak = {
      beam: { grade: { fy: 235, fu: 300 }, section: { depth: 406, width: 178, flange: 13, web: 20, radius: 10 } },
    };
    // 0.67 × 0.67 × 6 × 300, below 480/√2 = 339.4
    expect(checkOf(webWelded, 'weld-web', weak).resistance).toBeCloseTo(0.67 * 0.67 * 6 * 300, 9);
  });

  test('words of the market: angle, not cleat', () => {
    expect(checkOf(pair, 'cleat-block').title).toBe('Block tearing of the angle');
  });
});

describe('end plates and supports under CSA S16', () => {
  test('of the full depth an end plate refers in every row that would hold', () => {
    for (const id of ['endplate-block', 'endplate-tearout', 'weld-web', 'support-bolt-shear', 'support-bearing']) {
      expect(stateOf(fullDepth, id)).toBe('refer, full-depth-plate');
      expect(stateOf(fullDepth, id, { reaction: 5000 })).toBe('fails');
    }
  });

  test('a beam opposite is added in the shear of the web that both hang on', () => {
    const [alone, shared] = [pair, opposite].map((end) => checkOf(end, 'support-shear').reactionAtFailure!);
    expect(shared).toBeCloseTo(alone! - 120, 9);
  });

  test('a tie force refers with its number where legs bend, without one where nothing covers it', () => {
    expect(stateOf(opposite, 'web-tie')).toBe('refer, tie-bends-legs');
    expect(stateOf(endPlate, 'web-tie', { tie: 10 })).toBe('refer, tie-not-covered');
  });
});

describe('22.3.4 at the bolts into the support', () => {
  test('with one or two bolts in line the nearer edge is 1.5 d at least; with three the table alone', () => {
    // M20: 30 against the cut row's 26, under option plate-edges: cut.
    const cut = { options: { 'plate-edges': 'cut' } };
    const edge = (rows: number, topEdge: number) =>
      checkOf(pair, 'fit-edge-plate', { ...cut, ...supportBolts({ rows, topEdge }) });
    expect(edge(2, 29)).toMatchObject({ state: 'fails', of: 'in line, support bolts' });
    expect(edge(3, 29).state).toBe('holds');
  });
});
