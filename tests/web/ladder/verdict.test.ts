import { describe, expect, test } from 'vitest';
import { examine } from '../../../core/check/examine.ts';
import { incompleteLine, verdictLine } from '../../../web/ladder/verdict.ts';
import { demo, demoEnd, demoJoint } from './demoEnds.ts';

describe('verdict line', () => {
  test('an end that holds by little says so, with its weakest way and what is to spare', () => {
    // R_max 85.011 of 87.613 kN: ratio 0.970; V at failure 165 / 0.97030 = 170.05, rounded down.
    expect(verdictLine(demo().report)).toEqual({
      mark: 'close',
      word: 'HOLDS',
      ratio: '0.97',
      close: true,
      lead: 'Weakest: ',
      first: 'bolt shear, fails at 170.0 kN',
      spare: '5.0 kN to spare',
      others: '',
    });
  });

  test('an end that fails says by how much, and names all else that fails or refers', () => {
    const line = verdictLine(demo({ reaction: 310 }).report);
    expect(line).toMatchObject({ mark: 'fails', word: 'FAILS', spare: '140.0 kN short', close: false });
    expect(line.others).toBe('Also fails: bearing on the web, weld.');
  });

  test('one or two that refer for a reason are named with it, and the number stays: what is weakest and by how much', () => {
    const line = verdictLine(demo({ setback: 25, reaction: 100 }).report);
    expect(line).toMatchObject({ mark: 'refer', word: 'REFER' });
    expect(Number(line.ratio)).toBeGreaterThan(0);
    expect(line.first).toMatch(/^bolt shear, fails at [\d.]+ kN$/);
    expect(line.others).toBe('Refers: setback (more than allowed).');
  });

  test('more than two that refer for a reason are counted, and the reason is said once, as on the sheet', () => {
    const { report } = demo({ top: { length: 110, depth: 10, radius: 5 } });
    const reason = 'the notch is shallower than the flange';
    const count = report.checks.filter((one) => one.state === 'refer' && one.reasonText === reason).length;
    expect(count).toBeGreaterThan(2);
    expect(verdictLine(report).others).toContain(`${count} checks (${reason})`);
    expect(verdictLine(report).others.match(new RegExp(reason, 'g'))).toHaveLength(1);
  });

  test('a rule that cannot be built fails the end even where every bar passes the line', () => {
    const support = { kind: 'beam-web', section: 'UB 457x191x67', topOfSteel: 0 };
    const { report } = demo({ support, reaction: 50, top: { length: 60, depth: 45, radius: 10 } });
    const line = verdictLine(report);
    expect(report.checks.find(({ id }) => id === 'fit-cope-clearance')?.state).toBe('fails');
    expect(line).toMatchObject({ mark: 'fails', word: 'FAILS' });
    expect(line.others).toMatch(/^Fails: .*notch clearance/);
  });

  test('no number is made up where the end is used up without bound', () => {
    const { report } = demoJoint({ bolts: { ...demoEnd.joint.bolts, rows: 1 } }, { reaction: 30 });
    expect(verdictLine(report)).toMatchObject({ word: 'FAILS', ratio: '', spare: '30.0 kN short' });
  });

  test('an end that cannot be examined is incomplete: what is missing, and how much more', () => {
    const found = examine({ ...demoEnd, setback: undefined, reaction: 'much' });
    if (!('faults' in found)) throw new Error('faults expected');
    const line = incompleteLine(found.faults);
    expect(line).toMatchObject({ mark: 'incomplete', word: 'INCOMPLETE', ratio: '', first: found.faults[0]!.text });
    expect(line.others).toBe(`And ${found.faults.length - 1} more.`);
  });
});
