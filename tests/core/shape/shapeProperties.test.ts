import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { moments, widthAt } from '../../../core/shape/band.ts';
import { cutShape, firstMoment, wholeShape } from '../../../core/shape/shape.ts';
import { anyCut, anySection } from './anySection.ts';
import { stripArea } from './stripArea.ts';

const near = (value: number, target: number, share: number) =>
  expect(Math.abs(value / target - 1), `${value} against ${target}`).toBeLessThanOrEqual(share);

describe('any section, cut anywhere', () => {
  it('has bands that add up to the whole wherever they are parted', () => {
    fc.assert(
      fc.property(anySection, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (section, share) => {
        const y = share * section.h;
        for (const it of wholeShape(section).bands.filter((one) => one.top < y && y < one.bottom)) {
          const [upper, lower] = [moments(it, 0, y), moments(it, y, section.h)];
          near(upper.area + lower.area, it.whole.area, 1e-9);
          near(upper.first + lower.first, it.whole.first, 1e-9);
          near(upper.second + lower.second, it.whole.second, 1e-9);
        }
      }),
    );
  });

  it('has the area and the centroid of its strips', () => {
    fc.assert(
      fc.property(anySection, anyCut, (section, cut) => {
        const shape = cutShape(section, cut.top * section.h, cut.bottom * section.h);
        near(shape.area, stripArea(shape, shape.top, shape.bottom), 1e-5);
        expect(shape.centroid).toBeGreaterThan(shape.top);
        expect(shape.centroid).toBeLessThan(shape.bottom);
      }),
    );
  });

  it('mirrored has mirrored properties', () => {
    fc.assert(
      fc.property(anySection, anyCut, (section, cut) => {
        const [a, b] = [cut.top * section.h, cut.bottom * section.h];
        const [one, other] = [cutShape(section, a, b), cutShape(section, b, a)];
        near(one.area, other.area, 1e-10);
        near(one.centroid, section.h - other.centroid, 1e-9);
        near(one.inertia, other.inertia, 1e-7);
        near(one.modulusTop, other.modulusBottom, 1e-7);
      }),
    );
  });

  it('has a first moment of nothing at both edges and more than nothing between', () => {
    fc.assert(
      fc.property(anySection, anyCut, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (section, cut, share) => {
        const shape = cutShape(section, cut.top * section.h, cut.bottom * section.h);
        expect(firstMoment(shape, shape.top)).toBe(0);
        expect(firstMoment(shape, shape.bottom)).toBe(0);
        const scale = shape.area * shape.depth;
        expect(firstMoment(shape, shape.top + 1e-9 * shape.depth) / scale).toBeCloseTo(0, 7);
        expect(firstMoment(shape, shape.bottom - 1e-9 * shape.depth) / scale).toBeCloseTo(0, 7);
        expect(firstMoment(shape, shape.top + share * shape.depth)).toBeGreaterThan(0);
      }),
    );
  });

  it('has no step of width but where flange meets web', () => {
    fc.assert(
      fc.property(anySection, (section) => {
        const { bands, webTop, webBottom } = wholeShape(section);
        for (const [i, it] of bands.slice(1).entries()) {
          const joint = it.top;
          expect(joint).toBeCloseTo(bands[i]!.bottom, 9);
          const parallel = section.slope === undefined;
          if (parallel && (Math.abs(joint - webTop) < 1e-9 || Math.abs(joint - webBottom) < 1e-9)) continue;
          if (section.r === 0) continue;
          expect(widthAt(it, joint)).toBeCloseTo(widthAt(bands[i]!, joint), 5);
        }
      }),
    );
  });
});
