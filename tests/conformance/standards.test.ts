import { describe, expect, test } from 'vitest';
import { checkEnd } from '../../core/check/checkEnd.ts';
import type { Check } from '../../core/check/report.ts';
import { fitNames, strengthNames } from '../../core/end/checkNames.ts';
import { RESULT_FIGURES, STEP_FIGURES } from '../../core/formula/line.ts';
import type { Tree } from '../../core/formula/tree.ts';
import { standards } from '../../core/standards/index.ts';
import { isNoRule, type NoRule, type StrengthRule, treesOf } from '../../core/standards/standard.ts';
import { commonwealth } from '../../core/words/commonwealth.ts';
import { calculate } from '../support/calculator.ts';
import { reportOf } from '../support/compare.ts';
import { checkCondition, dimensionFromLeaves } from '../support/dimensions.ts';
import { goodEndsUnder } from '../support/underStandard.ts';

/** Half a unit in the last printed place of a value printed to so many figures. */
const printedRounding = (value: number, figures: number): number =>
  value === 0 ? 0 : 0.5 * 10 ** (Math.floor(Math.log10(Math.abs(value))) - figures + 1);

const numbersOf = ({ id, demand, resistance, reactionAtFailure, utilisation }: Check) => ({
  id,
  demand,
  resistance,
  reactionAtFailure,
  utilisation,
});

describe.each(Object.values(standards))('$id', (standard) => {
  const ends = goodEndsUnder(standard);
  const rules = [...strengthNames.map((id) => standard.strength[id]), ...fitNames.map((id) => standard.fit[id])];

  test('answers every check with a rule, or says which check contains it', () => {
    for (const id of strengthNames) {
      const rule = standard.strength[id];
      if (isNoRule(rule) && rule.covered) expect(strengthNames).toContain(rule.covered);
    }
    expect(rules).toHaveLength(strengthNames.length + fitNames.length);
  });

  test('no tree sums, compares or declares what its dimensions do not allow', () => {
    const trees: Tree[] = [];
    for (const rule of rules) {
      if (isNoRule(rule)) continue;
      if ('ways' in rule) {
        for (const way of rule.ways) {
          const { demand, resistance, off, limits, unbounded, informs, whereFirst } = way;
          trees.push(...treesOf(way));
          if (resistance) expect(dimensionFromLeaves(demand)).toEqual(dimensionFromLeaves(resistance));
          for (const { when } of [...(off ?? []), ...(limits ?? [])]) checkCondition(when);
          for (const when of [unbounded, informs, whereFirst?.when]) if (when) checkCondition(when);
        }
      } else {
        for (const { given, least, most, off } of rule.parts) {
          trees.push(given, ...[least, most].filter((one) => one !== undefined));
          for (const { when } of off ?? []) checkCondition(when);
        }
      }
    }
    for (const tree of trees) expect(() => dimensionFromLeaves(tree)).not.toThrow();
  });

  test('every rule names its clause and its standing', () => {
    for (const rule of rules) {
      if (isNoRule(rule)) continue;
      expect(rule.source.clause).not.toBe('');
      expect(Object.keys(commonwealth.bases)).toContain(rule.source.basis);
    }
  });

  describe.each(ends)('$name', ({ end }) => {
    const report = reportOf(end);

    test('every check says its state, in words where it refers, fails or does not apply', () => {
      expect(report.checks.length).toBeGreaterThan(20);
      for (const check of report.checks) {
        expect(check.title, check.id).not.toBe(check.id);
        if (check.state === 'refer' || check.state === 'notApplicable') expect(check.reasonText, check.id).toBeTruthy();
        if (check.reason) expect(commonwealth.reasons[check.reason], check.reason).toBeTruthy();
      }
    });

    test('nothing that is not finite leaves', () => {
      expect(JSON.stringify(report)).not.toMatch(/NaN|Infinity|undefined/);
      const walk = (value: unknown): void => {
        if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
        else if (typeof value === 'object' && value !== null) for (const one of Object.values(value)) walk(one);
      };
      walk(report);
    });

    test('states follow from unrounded numbers, the verdict from the states', () => {
      for (const { id, state, utilisation } of report.checks) {
        if (state === 'holds') expect(utilisation, id).toBeLessThanOrEqual(1 + 1e-9);
        if (state === 'fails' && utilisation !== null) expect(utilisation, id).toBeGreaterThan(1);
      }
      const states = report.checks.map(({ state }) => state);
      const verdict = states.includes('fails') ? 'fails' : states.includes('refer') ? 'refer' : 'holds';
      expect(report.verdict).toBe(verdict);
    });

    test('the capacity is the least reaction at failure, and the check that has it governs', () => {
      const counted = report.checks.filter(
        ({ state, reactionAtFailure }) =>
          reactionAtFailure !== undefined && reactionAtFailure !== null && ['holds', 'fails', 'refer'].includes(state),
      );
      const least = Math.min(...counted.map(({ reactionAtFailure }) => reactionAtFailure!));
      expect(report.capacity).toBe(least);
      const withoutV = report.checks.some((one) => one.state === 'fails' && one.reactionAtFailure === undefined);
      if (!withoutV) expect(counted.find(({ id }) => id === report.governing)!.reactionAtFailure).toBe(least);
    });

    test('every printed number line works out to its value within the printed rounding, the last line to the check itself', () => {
      for (const check of report.checks) {
        for (const row of check.working ?? []) {
          const { symbol, numbers, value } = row;
          const figures = row === check.working?.at(-1) ? RESULT_FIGURES : STEP_FIGURES;
          const off = Math.abs(calculate(numbers) - value);
          expect(off, `${check.id} ${symbol} = ${numbers} = ${value}`).toBeLessThanOrEqual(
            printedRounding(value, figures),
          );
        }
        const last = check.working?.at(-1);
        if (last && check.resistance !== null && !check.id.startsWith('fit-')) {
          expect(Math.abs(last.value - check.resistance)).toBeLessThanOrEqual(1e-12 * Math.abs(check.resistance));
          expect(last.unit).toBe(check.unit);
        }
      }
    });

    test('what fails at a reaction does not depend on the reaction, and demands grow in proportion', () => {
      if (typeof end.reaction !== 'number') return;
      const changing = (id: string) => {
        const rule = standard.strength[id as never] as StrengthRule | NoRule;
        return !isNoRule(rule) && rule.ways.some(({ failsAt }) => failsAt);
      };
      const doubled = reportOf({ ...end, reaction: 2 * report.reaction + 10 }, false);
      const factor = doubled.reaction / report.reaction;
      for (const check of report.checks) {
        const other = doubled.checks.find(({ id }) => id === check.id)!;
        if (check.reactionAtFailure === undefined || check.demand === null) continue;
        expect(other.reactionAtFailure, check.id).toBe(check.reactionAtFailure);
        if (report.reaction > 0 && !changing(check.id))
          expect(other.demand! / check.demand / factor).toBeCloseTo(1, 12);
      }
    });

    test('the hand of the end and what the sheet says change no number', () => {
      const other = reportOf({ ...end, end: 'far', piece: 'B7', quantity: 3, sheet: { job: 'x', paper: 'Letter' } });
      expect(other.checks.map(numbersOf)).toEqual(report.checks.map(numbersOf));
    });

    test('numbers without working are the very same numbers', () => {
      expect(reportOf(end, false).checks.map(numbersOf)).toEqual(report.checks.map(numbersOf));
    });
  });

  test('every value of every option computes and is printed as in force', () => {
    const { end } = ends[0]!;
    for (const [key, values] of Object.entries(standard.options)) {
      for (const value of values) {
        expect(reportOf({ ...end, options: { [key]: value } }).options[key]).toBe(value);
      }
    }
  });

  test('the other level is refused, the own one is not', () => {
    const { end } = ends[0]!;
    const other = standard.level === 'factored' ? 'service' : 'factored';
    const outcome = checkEnd({ ...end, level: other });
    expect('faults' in outcome && outcome.faults[0]).toMatchObject({ code: 'reaction-level', limit: standard.level });
    expect(checkEnd({ ...end, level: standard.level })).toHaveProperty('report');
  });
});
