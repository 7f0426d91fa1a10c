import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plasticAxis, plasticModulus } from '../../../core/shape/plasticModulus.ts';
import type { Section } from '../../../core/shape/section.ts';
import { cutShape, firstMoment, rectangle, wholeShape } from '../../../core/shape/shape.ts';
import { anyCut, anySection } from './anySection.ts';

const near = (value: number, target: number, share: number) =>
  expect(Math.abs(value / target - 1), `${value} against ${target}`).toBeLessThanOrEqual(share);

describe('the plastic modulus', () => {
  it('of a rectangle is t d²/4', () => {
    near(plasticModulus(rectangle(10, 240)), (10 * 240 ** 2) / 4, 1e-13);
    expect(plasticAxis(rectangle(10, 240))).toBe(120);
  });

  it('of UB 457x191x67 is twice the first moment at its axis (SCI/BCSA section tables: 1470 cm³)', () => {
    const shape = wholeShape({ family: 'I', h: 453.4, b: 189.9, tf: 12.7, tw: 8.5, r: 10.2 });
    near(plasticModulus(shape), 2 * firstMoment(shape, 453.4 / 2), 1e-12);
    near(plasticModulus(shape), 1470e3, 0.002);
  });

  it('of the tee 360 deep (flange 140 x 8.8, web 6.4) is the hand sum 359 816 mm³', () => {
    const section: Section = { family: 'I', h: 399, b: 140, tf: 8.8, tw: 6.4, r: 0 };
    const tee = cutShape(section, 39, 0);
    // Half the area is 1739.84 mm²: web from the cut edge down to 271.85 mm, 88.15 mm above the soffit.
    expect(section.h - plasticAxis(tee)).toBeCloseTo(360 - 1739.84 / 6.4, 10);
    near(plasticModulus(tee), 359816, 1e-5);
  });

  it('is found with the axis inside the flange too', () => {
    const section: Section = { family: 'I', h: 200, b: 200, tf: 20, tw: 6, r: 0 };
    const tee = cutShape(section, 60, 0);
    // A = 200·20 + 6·120 = 4720; half of it fills 11.8 mm of the flange from the soffit: W = 200·11.8²/2 + 200·8.2²/2 + 720·(8.2 + 60).
    expect(200 - plasticAxis(tee)).toBeCloseTo(11.8, 10);
    near(plasticModulus(tee), 100 * 11.8 ** 2 + 100 * 8.2 ** 2 + 720 * 68.2, 1e-12);
  });

  it('of any cut section halves the area and is no less than the elastic modulus', () => {
    fc.assert(
      fc.property(anySection, anyCut, (section, cut) => {
        const shape = cutShape(section, cut.top * section.h, cut.bottom * section.h);
        const axis = plasticAxis(shape);
        near(cutShape(section, axis, section.h - shape.bottom).area, shape.area / 2, 1e-9);
        expect(plasticModulus(shape)).toBeGreaterThan(Math.min(shape.modulusTop, shape.modulusBottom));
      }),
    );
  });
});
