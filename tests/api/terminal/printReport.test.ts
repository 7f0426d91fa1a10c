import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { printReport } from '../../../api/terminal/printReport.ts';
import { checkEnd } from '../../../core/check/checkEnd.ts';
import type { Report } from '../../../core/check/report.ts';
import { anyEnd } from '../anyEnd.ts';
import { exampleEnd, failingEnd, referringEnd } from '../exampleEnd.ts';

const reportOf = (end: unknown, working = false): Report => {
  const outcome = checkEnd(end, { working });
  if ('faults' in outcome) throw new Error(outcome.faults.map(({ text }) => text).join(' '));
  return outcome.report;
};
const widest = (text: string): number => Math.max(...text.split('\n').map((line) => [...line].length));
const rowsOf = (text: string): string[] =>
  text
    .split('\n')
    .filter((line) => /^(?:HOLDS|FAILS|REFER) .*\d/.test(line))
    .slice(1);

describe('the table for a person', () => {
  test('begins with what the end is, and what decides', () => {
    const [first, second] = printReport(reportOf(exampleEnd)).split('\n');
    expect(first).toBe('K-207/L, SANS 10162-1:2011, factored reaction 165 kN');
    expect(second).toMatch(/^HOLDS 0\.97 {2}Bolt shear governs: reaction 165 kN, fails at 170\.0 kN\.$/);
  });

  test('has the weakest check first, with numbers, units, clause and basis in one line', () => {
    const [first] = rowsOf(printReport(reportOf(exampleEnd)));
    expect(first).toMatch(/^HOLDS → Bolt shear +85\.0 \/ 87\.6 kN +0\.97 +170\.0 +13\.12 +\w+$/);
  });

  test('has a line for every check that holds, fails or refers, and names what does not apply', () => {
    const report = reportOf(exampleEnd);
    const text = printReport(report);
    const told = report.checks.filter(({ state }) => ['holds', 'fails', 'refer'].includes(state));
    expect(rowsOf(text)).toHaveLength(told.length);
    const flat = text.replace(/\s+/g, ' ');
    for (const { state, title, reasonText } of report.checks) {
      if (state === 'notApplicable') expect(flat).toContain(`${title} (${reasonText})`);
    }
  });

  test('prints every assumption, note and caution, the options in force and the fingerprint', () => {
    const report = reportOf({ ...exampleEnd, reaction: { ofWebShear: 0.2 } });
    const flat = printReport(report).replace(/\s+/g, ' ');
    for (const { text } of [...report.assumptions, ...report.notes]) expect(flat).toContain(text.replace(/\s+/g, ' '));
    for (const [key, value] of Object.entries(report.options)) expect(flat).toContain(`${key} ${value}`);
    expect(flat).toContain('For a competent person');
    expect(flat).toContain(report.fingerprint);
  });

  test('says why an end fails or refers', () => {
    expect(printReport(reportOf(failingEnd))).toMatch(
      /^FAILS 2\.35 {2}Bolt shear fails at 170\.0 kN; the reaction is 400 kN\.$/m,
    );
    const refers = printReport(reportOf(referringEnd));
    expect(refers).toMatch(/^REFER {2}Notch corner, top: less than required\./m);
    expect(refers).toMatch(/^REFER Notch corner, top .*\n +less than required$/m);
  });

  test('a mark that would steer the terminal is printed without its force', () => {
    const text = printReport(reportOf({ ...exampleEnd, mark: 'A\u001b[2J\u0007\u009b1mB' }));
    expect(text).toMatch(/^A·\[2J··1mB, /);
    // biome-ignore lint/suspicious/noControlCharactersInRegex: these are what must not be there.
    expect(text).not.toMatch(/[\u0000-\u0009\u000b-\u001f\u007f-\u009f]/);
  });

  test('fits 100 columns with or without working, whatever the end', () => {
    expect(widest(printReport(reportOf(exampleEnd, true)))).toBeLessThanOrEqual(100);
    let printed = 0;
    fc.assert(
      fc.property(anyEnd, fc.boolean(), (end, working) => {
        const outcome = checkEnd(end, { working });
        if ('faults' in outcome) return;
        // Numbers that no beam has may push a line out.
        if (/\d{7}/.test(JSON.stringify(end))) return;
        printed += 1;
        const text = printReport(outcome.report);
        expect(widest(text)).toBeLessThanOrEqual(100);
        expect(text).not.toMatch(/NaN|Infinity|undefined|null/);
      }),
      { numRuns: 400 },
    );
    expect(printed).toBeGreaterThan(20);
  });
});

describe('the working for a person', () => {
  test('is symbol, formula, numbers and value, on one line where it fits', () => {
    const text = printReport(reportOf(exampleEnd, true));
    expect(text).toContain('\n  A_gv = t_w L_gv = 7.9 × 185 = 1461.5 mm²\n');
  });

  test('stands on a line for each side where it does not fit', () => {
    const text = printReport(reportOf(exampleEnd, true));
    expect(text).toMatch(/\n {2}R_r = min\(P_t .*\n {6}= min\(.*\n {6}= [\d.]+ kN\n/);
  });

  test('does not say a value twice', () => {
    expect(printReport(reportOf(exampleEnd, true))).toContain('\n  L_gt = e_end = 45 mm\n');
  });
});
