import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Section } from '../../../core/shape/section.ts';
import { cutShape, firstMoment, rectangle, thickness, wholeShape } from '../../../core/shape/shape.ts';
import { shearPeak, shearProfile } from '../../../core/shape/shearStress.ts';
import { anyCut, anySection } from './anySection.ts';

const ub: Section = { family: 'I', h: 453.4, b: 189.9, tf: 12.7, tw: 8.5, r: 10.2 };

const near = (value: number, target: number, share: number) =>
  expect(Math.abs(value / target - 1), `${value} against ${target}`).toBeLessThanOrEqual(share);

describe('the peak shear stress', () => {
  it('of a rectangle is 1.5 V/A at mid-depth', () => {
    const peak = shearPeak(rectangle(10, 240));
    near(peak.perNewton, 1.5 / 2400, 1e-13);
    expect(peak.at).toBe(120);
  });

  it('of the deep cantilever 120 x 1 mm under 1000 N is 12.5 MPa (theory of elasticity: 1.5 P/A)', () => {
    near(1000 * shearPeak(rectangle(1, 120)).perNewton, 12.5, 1e-13);
  });

  it('of the tee 360 deep (flange 140 x 8.8, web 6.4) is 1.35 times the mean, and 207.9 MPa there are 354.9 kN', () => {
    const tee = cutShape({ family: 'I', h: 399, b: 140, tf: 8.8, tw: 6.4, r: 0 }, 39, 0);
    near(shearPeak(tee).perNewton * 360 * 6.4, 1.35, 1e-3);
    // V = 0.66·0.90·350·I t/Q = 207.9 MPa·48.895e6·6.4/183293 = 354.9 kN.
    near((0.66 * 0.9 * 350) / shearPeak(tee).perNewton, 354.9e3, 2e-4);
  });

  it('of the tee 350 deep (flange 140 x 8.6, web 6.4) is 1.350 times the mean over its depth', () => {
    const tee = cutShape({ family: 'I', h: 400, b: 140, tf: 8.6, tw: 6.4, r: 0 }, 50, 0);
    near(shearPeak(tee).perNewton * 350 * 6.4, 1.35, 5e-4);
    expect(shearPeak(tee).at).toBe(tee.centroid);
  });

  it('of UB 457x191x67 is Q(0)/(I t_w) = 735.51 cm³/(29380 cm⁴·8.5 mm)', () => {
    const peak = shearPeak(wholeShape(ub));
    near(peak.perNewton, 735.512e3 / (293.8027e6 * 8.5), 1e-5);
    expect(peak.at).toBeCloseTo(226.7, 10);
  });

  it('stands in the fillets when the centroid lies in the flange of a stubby tee', () => {
    const stub = cutShape(ub, 0, 400);
    expect(stub.centroid).toBeLessThan(12.7);
    const peak = shearPeak(stub);
    expect(peak.at).toBeGreaterThan(12.7);
    expect(peak.at).toBeLessThan(12.7 + 10.2);
  });

  it('stands at the flange face of a stubby tee without fillets', () => {
    const stub = cutShape({ ...ub, r: 0 }, 400, 0);
    expect(shearPeak(stub).at).toBeCloseTo(453.4 - 12.7, 12);
    near(shearPeak(stub).perNewton, firstMoment(stub, 453.4 - 12.7) / (stub.inertia * 8.5), 1e-12);
  });

  it('is 1.5 V/A of a flange of which no web is left', () => {
    near(shearPeak(cutShape(ub, 0, 445)).perNewton, 1.5 / (189.9 * 8.4), 1e-9);
  });

  it('is exceeded nowhere in the web of any cut section', () => {
    fc.assert(
      fc.property(anySection, anyCut, (section, cut) => {
        const shape = cutShape(section, cut.top * section.h, cut.bottom * section.h);
        const peak = shearPeak(shape);
        const whole = wholeShape(section);
        fc.pre(shape.top < whole.webBottom && shape.bottom > whole.webTop);
        near(firstMoment(shape, peak.at) / (shape.inertia * thickness(shape, peak.at)), peak.perNewton, 1e-9);
        for (let i = 1; i < 400; i++) {
          const y = shape.webTop + ((shape.webBottom - shape.webTop) * i) / 400;
          const here = firstMoment(shape, y) / (shape.inertia * thickness(shape, y));
          expect(here).toBeLessThanOrEqual(peak.perNewton * (1 + 1e-9));
        }
      }),
    );
  });

  it('is the same for the mirrored section, at the mirrored level', () => {
    fc.assert(
      fc.property(anySection, anyCut, (section, cut) => {
        const [a, b] = [cut.top * section.h, cut.bottom * section.h];
        const [one, other] = [shearPeak(cutShape(section, a, b)), shearPeak(cutShape(section, b, a))];
        near(one.perNewton, other.perNewton, 1e-7);
        expect((one.at + other.at) / section.h).toBeCloseTo(1, 5);
      }),
    );
  });
});

describe('the shear-stress profile', () => {
  it('carries the whole shear force: tau t added up over the depth is V', () => {
    fc.assert(
      fc.property(anySection, anyCut, (section, cut) => {
        const shape = cutShape(section, cut.top * section.h, cut.bottom * section.h);
        // Q is a smooth cubic at most between levels where the width changes its law; added up by Simpson's rule between them.
        const stops = shape.bands.map((it) => it.bottom).filter((y) => y > shape.top && y < shape.bottom);
        let sum = 0;
        [...stops, shape.bottom].reduce((from, to) => {
          const n = 200;
          for (let k = 0; k < n; k++) {
            const [a, b] = [from + ((to - from) * k) / n, from + ((to - from) * (k + 1)) / n];
            sum +=
              ((b - a) / 6) * (firstMoment(shape, a) + 4 * firstMoment(shape, (a + b) / 2) + firstMoment(shape, b));
          }
          return to;
        }, shape.top);
        near(sum / shape.inertia, 1, 1e-5);
      }),
    );
  });

  it('as drawn for UB 457x191x67 cut by 50 mm encloses V within half a percent', () => {
    const tee = cutShape(ub, 50, 0);
    const points = shearProfile(tee, 100e3);
    let sum = 0;
    for (const [i, [y, tau]] of points.slice(1).entries()) {
      const [before, stress] = points[i]!;
      const middle = (before + y) / 2;
      if (y > before) sum += ((y - before) * (tau + stress) * thickness(tee, middle)) / 2;
    }
    near(sum, 100e3, 0.005);
  });

  it('starts and ends at nothing, runs downward and shows the peak itself', () => {
    fc.assert(
      fc.property(anySection, anyCut, (section, cut) => {
        const shape = cutShape(section, cut.top * section.h, cut.bottom * section.h);
        const points = shearProfile(shape, 1000);
        expect(points[0]).toEqual([shape.top, 0]);
        expect(points.at(-1)).toEqual([shape.bottom, 0]);
        for (const [i, [y, tau]] of points.entries()) {
          expect(Number.isFinite(tau) && tau >= -1e-9).toBe(true);
          if (i > 0) expect(y).toBeGreaterThanOrEqual(points[i - 1]![0]);
        }
        const peak = shearPeak(shape);
        const top = points.find(([y]) => Math.abs(y - peak.at) <= 1e-9 * section.h)!;
        expect(top).toBeDefined();
        const shown = points.filter(([y]) => Math.abs(y - peak.at) <= 1e-9 * section.h).map(([, tau]) => tau);
        near(Math.max(...shown), 1000 * peak.perNewton, 1e-6);
      }),
    );
  });

  it('shows the jump between flange and web twice, once with each width', () => {
    const points = shearProfile(wholeShape(ub), 100e3).filter(([y]) => y === 12.7);
    expect(points).toHaveLength(2);
    near(points[1]![1] / points[0]![1], 189.9 / (8.5 + 20.4), 1e-9);
  });

  it('has points enough for a smooth curve: each straight run between them misses the true one by less than a hundredth of the peak', () => {
    for (const shape of [wholeShape(ub), cutShape(ub, 50, 0), cutShape(ub, 50, 50)]) {
      const peak = shearPeak(shape).perNewton;
      const points = shearProfile(shape, 1);
      for (const [i, [y, tau]] of points.slice(1).entries()) {
        const [before, stress] = points[i]!;
        if (y <= before) continue;
        const middle = (before + y) / 2;
        const exact = firstMoment(shape, middle) / (shape.inertia * thickness(shape, middle));
        expect(Math.abs(exact - (tau + stress) / 2)).toBeLessThan(peak / 100);
      }
    }
  });
});
