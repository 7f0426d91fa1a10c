import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Report } from '../../../core/check/report.ts';
import { reportOf } from '../../support/compare.ts';
import { goodEnds } from '../../support/published.ts';

const good = (name: string): Record<string, unknown> =>
  structuredClone(goodEnds().find((one) => one.name === name)!.end);
const check = (report: Report, id: string) => report.checks.find((one) => one.id === id)!;

describe('the order of the checks', () => {
  test('strength weakest first, then rules of fit, then information, then what does not apply', () => {
    const { checks } = reportOf(good('example'));
    const kinds = checks.map(({ id, state }) =>
      state === 'notApplicable' ? 3 : state === 'information' ? 2 : id.startsWith('fit-') ? 1 : 0,
    );
    expect(kinds).toEqual([...kinds].sort());
    const reactions = checks.slice(0, kinds.indexOf(1)).map((one) => one.reactionAtFailure!);
    expect(reactions).toEqual([...reactions].sort((a, b) => a - b));
  });
});

describe('states of checks', () => {
  const five = ['web-block', 'web-net-shear', 'cope-shear', 'cope-bending', 'cope-buckling'];

  test('a cope shallower than the flange refers five checks, each with its number, and the cope depth', () => {
    const report = reportOf(good('flange-left'));
    for (const id of five) {
      expect(check(report, id)).toMatchObject({ state: 'refer', reason: 'flange-left' });
      expect(check(report, id).reactionAtFailure).toBeGreaterThan(0);
    }
    expect(check(report, 'fit-cope-depth').state).toBe('refer');
    expect(report.verdict).toBe('refer');
  });

  test('a hole at the face of the cope refers the same five', () => {
    const report = reportOf(good('hole-at-cope-face'));
    for (const id of five) expect(check(report, id)).toMatchObject({ state: 'refer', reason: 'hole-at-cope-face' });
  });

  test('a cope that ends before the first column leaves no block: the flange closes the path', () => {
    const report = reportOf(good('short-cope'));
    expect(check(report, 'web-block')).toMatchObject({ state: 'notApplicable', reason: 'intact-flange' });
    expect(check(report, 'fit-cope-length')).toMatchObject({ state: 'refer', demand: 56, resistance: 30 });
  });

  test('a column beyond the cope is no part of the block', () => {
    const { working } = check(reportOf(good('column-beyond-cope')), 'web-block');
    expect(working!.find(({ symbol }) => symbol === 'A_nt')!.numbers).toContain('(1 − 0.5)');
  });

  test('one bolt alone fails in shear and bearing at any reaction', () => {
    const report = reportOf(good('one-bolt'));
    for (const id of ['bolt-shear', 'web-bearing', 'plate-bearing']) {
      expect(check(report, id)).toMatchObject({
        state: 'fails',
        reactionAtFailure: 0,
        reason: 'one-bolt',
        demand: null,
      });
    }
    expect(report.capacity).toBe(0);
  });

  test('holes that leave nothing fail at any reaction, even at none', () => {
    const end = good('example') as { reaction: number; joint: { firstRow: number; bolts: Record<string, unknown> } };
    end.reaction = 0;
    end.joint.firstRow = 57;
    Object.assign(end.joint.bolts, { holes: 'punched', columns: 2, gauge: 23, pitch: 23 });
    const report = reportOf(end);
    expect(check(report, 'web-tearout')).toMatchObject({
      state: 'fails',
      reason: 'nothing-left',
      reactionAtFailure: 0,
    });
    expect(report).toMatchObject({ verdict: 'fails', capacity: 0 });
  });

  test('a bottom cope alone has its cut edge in tension: no buckling', () => {
    expect(check(reportOf(good('bottom-cope')), 'cope-buckling')).toMatchObject({
      state: 'notApplicable',
      reason: 'cut-edge-in-tension',
    });
  });

  test('two copes of unequal length are looked at twice: the web between them, and the tee beyond', () => {
    const { sections } = reportOf(good('both-copes-top-longer')).shape;
    expect(sections.map(({ name }) => name)).toEqual(['full', 'rectangle', 'tee-bottom']);
    expect(sections.map(({ at }) => at)).toEqual([0, 130, 210]);
    expect(reportOf(good('both-copes-bottom-longer')).shape.sections.map(({ name }) => name)).toEqual([
      'full',
      'rectangle',
      'tee-top',
    ]);
  });

  test('a coped channel refers without a number, and prints where its reaction is taken', () => {
    const report = reportOf(good('channel-coped'));
    for (const id of ['cope-shear', 'cope-bending', 'cope-buckling']) {
      expect(check(report, id)).toMatchObject({ state: 'refer', reason: 'channel-cope', resistance: null });
    }
    expect(check(report, 'stress-cope').state).toBe('notApplicable');
    expect(report.assumptions.map(({ code }) => code)).toContain('channel-shear-centre');
  });

  test('a cope beyond the method refers, with the number the same formulas give', () => {
    const buckling = check(reportOf(good('long-cope')), 'cope-buckling');
    expect(buckling).toMatchObject({ state: 'refer', reason: 'cope-longer-than-method' });
    expect(buckling.reactionAtFailure).toBeGreaterThan(0);
  });

  test('a weld below the least leg refers while its number holds, and stays failed once it does not', () => {
    const end = good('example') as { joint: { weld: { leg: number } }; reaction: number };
    end.joint.weld.leg = 4;
    end.reaction = 140;
    expect(check(reportOf(end), 'weld')).toMatchObject({ state: 'refer', reason: 'weld-leg-below-least' });
    end.reaction = 160;
    expect(check(reportOf(end), 'weld').state).toBe('fails');
  });

  test('stresses are information, and a verdict when the option asks for one', () => {
    const end = good('example');
    expect(check(reportOf(end), 'stress-full').state).toBe('information');
    const verdict = reportOf({ ...end, options: { 'elastic-shear': 'verdict' } });
    expect(check(verdict, 'stress-full').state).toBe('holds');
    expect(check(verdict, 'stress-cope').state).toBe('holds');
  });

  test('a tie force acts alone: it has a use, and no reaction at failure', () => {
    const tie = check(reportOf(good('tie')), 'web-tie');
    expect(tie.state).toBe('holds');
    expect(tie).not.toHaveProperty('reactionAtFailure');
    const end = { ...good('tie'), tie: 500 };
    expect(reportOf(end)).toMatchObject({ verdict: 'fails', governing: 'web-tie' });
  });
});

describe('what the report carries besides', () => {
  test('a share of the web shear, and the force it came to', () => {
    const report = reportOf(good('share-of-shear'));
    expect(report.reaction).toBeCloseTo(0.25 * 677.0107872, 9);
    expect(report.notes[0]).toMatchObject({ code: 'reaction-from-share', text: expect.stringContaining('169.3 kN') });
    expect(report.shareOfWebShear).toBeCloseTo(0.25, 12);
  });

  test('a fingerprint that follows everything that is checked, and nothing else', () => {
    const end = good('example');
    const mark = reportOf(end).fingerprint;
    expect(mark).toMatch(/^[0-9a-f]{8}$/);
    expect(reportOf({ ...end, sheet: { job: 'x' } }).fingerprint).toBe(mark);
    expect(reportOf(Object.fromEntries(Object.entries(end).reverse())).fingerprint).toBe(mark);
    expect(reportOf({ ...end, reaction: 166 }).fingerprint).not.toBe(mark);
  });

  test('a South African label is read, and said', () => {
    const end = { ...good('example'), beam: { section: 'UB 406x178x75', grade: 'S355JR' } };
    const report = reportOf(end);
    expect(report.notes.map(({ text }) => text).join()).toMatch(/UB 406x178x75 \(South Africa\).*UB 406x178x74/);
  });

  test('strengths from memory of an older standard are said to be so', () => {
    const report = reportOf({ ...good('example'), beam: { section: 'UB 406x178x60', grade: '350WA' } });
    expect(report.notes.map(({ code }) => code)).toContain('memory-grade');
  });

  test('inches and kips leave as inches and kips', () => {
    const report = reportOf(good('inch'));
    expect(new Set(report.checks.map(({ unit }) => unit))).toEqual(
      new Set(['kip', 'kip in', 'kip/in', 'ksi', 'in', '']),
    );
    expect(checkEnd(good('inch'))).toHaveProperty('report');
  });
});
