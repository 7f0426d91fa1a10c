import { describe, expect, test } from 'vitest';
import { reportOf } from '../support/compare.ts';
import { goodEnds } from '../support/published.ts';

/**
 * Exact plate-buckling coefficients of the plate that the method models (ends and lower edge held, cut edge free, pure bending with
 * compression at the cut edge): Ritz, polynomials of 10 to 12 terms a direction, converged. c/h_o and k.
 */
const ritz = [
  [0.2, 33.3],
  [0.3, 16.4],
  [0.4, 10.1],
  [0.5, 7.07],
  [0.6, 5.34],
  [0.75, 3.86],
  [1, 2.63],
  [1.5, 1.68],
  [2, 1.33],
] as const;

describe('web buckling at a top cope (Cheng, Yura, Johnson 1984)', () => {
  test.each(ritz)('theory: at c/h_o = %f the coefficient k lies below the exact %f', (ratio, exact) => {
    const end = structuredClone(goodEnds().find(({ name }) => name === 'example')!.end);
    end.beam = { section: { depth: 400, width: 160, flange: 10, web: 7, radius: 0 }, grade: 'S355JR' };
    end.top = { length: ratio * 360, depth: 40, radius: 10 };
    const buckling = reportOf(end).checks.find(({ id }) => id === 'cope-buckling')!;
    const k = buckling.working!.find(({ symbol }) => symbol === 'k')!.value;
    expect(k).toBeLessThanOrEqual(exact);
    expect(k).toBeGreaterThan(0.8 * exact);
  });
});

describe('rectangular bar between two copes', () => {
  // Theory: lateral buckling of a narrow rectangle, sqrt(E I_y G J) with G = E/2.6: 6/√(12 × 3 × 2.6) = 0.6202.
  test('theory: the method 0.62 is that of a narrow rectangle', () => {
    expect(6 / Math.sqrt(12 * 3 * 2.6)).toBeCloseTo(0.62, 3);
    const end = structuredClone(goodEnds().find(({ name }) => name === 'both-copes-equal')!.end);
    const { working } = reportOf(end).checks.find(({ id }) => id === 'cope-buckling')!;
    const value = (symbol: string) => working!.find((row) => row.symbol === symbol)!.value;
    const [c, ho, t, h] = [120, 406.4 - 95, 7.9, 406.4];
    expect(value('f_d')).toBeCloseTo(3.5 - (7.5 * 50) / h, 9);
    expect(value('F_cr')).toBeCloseTo(((0.62 * Math.PI * 200_000 * t * t) / (c * ho)) * value('f_d'), 6);
  });
});
