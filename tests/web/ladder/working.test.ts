import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { examine } from '../../../core/check/examine.ts';
import type { Check } from '../../../core/check/report.ts';
import { RESULT_FIGURES, STEP_FIGURES } from '../../../core/formula/line.ts';
import { significant } from '../../../core/units/figures.ts';
import { verifiedWords } from '../../../core/words/verifiedWords.ts';
import { cited } from '../../../web/ladder/cited.ts';
import { isMost } from '../../../web/ladder/fitSizes.ts';
import { inUse } from '../../../web/ladder/inUse.ts';
import { usedUp } from '../../../web/ladder/usedUp.ts';
import { workingLines } from '../../../web/ladder/workingLines.ts';
import { endOf, plausibleEnd } from '../../support/arbitraryEnd.ts';
import { calculate } from '../../support/calculator.ts';
import { demo } from './demoEnds.ts';

const checkOf = (id: string, parts: Record<string, unknown> = {}): Check =>
  demo(parts).report.checks.find((one) => one.id === id)!;

describe('lines of a working', () => {
  test('a formula of one number is not said twice', () => {
    const line = workingLines(checkOf('web-block')).find(({ symbol }) => symbol === 'L_gt')!;
    expect(line).toMatchObject({ expression: 'e_end', numbers: '', value: '45', unit: 'mm' });
  });

  test('steps stand with the figures that later lines use, the demand and the resistance with those of a result', () => {
    const lines = workingLines(checkOf('bolt-shear'));
    const value = (name: string) => lines.find(({ symbol }) => symbol === name)!;
    // π 20² / 4 = 314.15927
    expect(value('A_b')).toMatchObject({ value: significant(314.15927, STEP_FIGURES), result: false });
    // 165 √((55 × 70 / 9800)² + (1/3)²) = 85.01069; 0.6 × 0.8 × 314.159 × 830 × 0.7 = 87.61274
    expect(value('R_max')).toMatchObject({ value: significant(85.01069, RESULT_FIGURES), result: true });
    expect(value('V_r')).toMatchObject({ value: significant(87.61274, RESULT_FIGURES), result: true });
  });

  test('a clause is cited on a line only where it is another than the check’s own', () => {
    const lines = workingLines(checkOf('cope-shear'));
    expect(lines.find(({ symbol }) => symbol === 'f_s')?.clause).toBe('cl. 13.4.1.1');
    expect(lines.find(({ symbol }) => symbol === 'V_r')?.clause).toBe('');
    expect([cited('13.11'), cited('J4.3'), cited('elastic')]).toEqual(['cl. 13.11', 'cl. J4.3', 'elastic']);
  });

  test('demand over resistance, worked out from the printed numbers, gives the printed value', () => {
    fc.assert(
      fc.property(plausibleEnd, (plan) => {
        const found = examine(endOf(plan));
        fc.pre('examined' in found);
        const { report } = found.examined;
        for (const check of report.checks) {
          const used = usedUp(check, report);
          if (used === null) continue;
          const value = Number(used.value.replaceAll('\u202f', ''));
          // Four figures above and below the line: three parts in ten thousand, and half a unit of what is left of small sizes.
          expect(Math.abs(calculate(used.numbers) - value)).toBeLessThanOrEqual(1.5e-3 * Math.abs(value) + 1e-4);
        }
      }),
    );
  });

  test('a rule of fit says whether the least or the most is near', () => {
    const wide = checkOf('fit-setback', { setback: 25 });
    expect(isMost(wide)).toBe(true);
    expect(usedUp(wide, demo().report)).toEqual({ symbols: 'given / allowed', numbers: '25 / 20', value: '1.25' });
    const pitch = checkOf('fit-pitch');
    expect(isMost(pitch)).toBe(false);
    expect(usedUp(pitch, demo().report)?.numbers).toBe('54 / 70');
  });

  test('factors and strengths in use are named with their values, and no others', () => {
    const symbols = (id: string): string[] => {
      const examined = demo();
      return inUse(examined, examined.report.checks.find((one) => one.id === id)!).map(
        ({ symbol, value }) => `${symbol} ${value}`,
      );
    };
    expect(symbols('web-block')).toEqual(['φ 0.9', 'f_y 355 MPa', 'f_u 470 MPa', 'd′ 22 mm']);
    expect(symbols('bolt-shear')).toEqual(['φ_b 0.8', 'f_ub 830 MPa']);
    expect(symbols('fit-pitch')).toEqual([]);
  });

  test('a formula that no outside number checks says so', () => {
    expect(verifiedWords.none).toBe('no outside number checks this formula');
    expect(new Set(Object.values(verifiedWords)).size).toBe(4);
  });
});
