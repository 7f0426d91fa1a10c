import { describe, expect, it } from 'vitest';
import type { Section } from '../../../core/shape/section.ts';
import { cutShape, firstMoment, rectangle, thickness, wholeShape } from '../../../core/shape/shape.ts';
import { stripArea } from './stripArea.ts';

/** UB 457x191x67. */
const ub: Section = { family: 'I', h: 453.4, b: 189.9, tf: 12.7, tw: 8.5, r: 10.2 };
const K = 1 - Math.PI / 4;
const c = (10 - 3 * Math.PI) / (3 * (4 - Math.PI));
const i0 = 1 / 3 - Math.PI / 16 - 1 / (9 * (4 - Math.PI));

const near = (value: number, target: number, share: number) =>
  expect(Math.abs(value / target - 1), `${value} against ${target}`).toBeLessThanOrEqual(share);

describe('the uncut section', () => {
  it('has the area and second moment of three rectangles and four root fillets', () => {
    const { h, b, tf, tw, r } = ub;
    const clear = h - 2 * tf;
    const shape = wholeShape(ub);
    near(shape.area, 2 * b * tf + clear * tw + 4 * K * r * r, 1e-13);
    near(
      shape.inertia,
      (b * h ** 3 - (b - tw) * clear ** 3) / 12 + 4 * (i0 * r ** 4 + K * r * r * (clear / 2 - c * r) ** 2),
      1e-13,
    );
    expect(shape.centroid).toBeCloseTo(h / 2, 10);
    near(shape.modulusTop, (2 * shape.inertia) / h, 1e-13);
    near(shape.modulusBottom, (2 * shape.inertia) / h, 1e-13);
  });

  it('gives the published figures of UB 457x191x67 to their rounding (SCI/BCSA section tables: A 85.5, I 29400, W 1300)', () => {
    const shape = wholeShape(ub);
    near(shape.area, 8550, 0.0006);
    near(shape.inertia, 294e6, 0.0017);
    near(shape.modulusTop, 1300e3, 0.004);
  });

  it('gives the first moment of UB 457x191x67 at the axis, in the web, in the fillet, at its foot and in the flange', () => {
    const shape = wholeShape(ub);
    // Levels 0, 150, 208, 213.9 and 218 mm above mid-depth; sums by the formulas for I sections with root fillets, cm³.
    for (const [above, cm3] of [
      [0, 735.51],
      [150, 639.89],
      [208, 551.13],
      [213.9, 532.0],
      [218, 367.35],
    ] as const) {
      expect(firstMoment(shape, 226.7 - above) / 1000).toBeCloseTo(cm3, 2);
    }
    // In the flange: Q = (b/2)(h²/4 - y²).
    near(firstMoment(shape, 226.7 - 218), (189.9 / 2) * (226.7 ** 2 - 218 ** 2), 1e-12);
    // In the plain web: Q = b tf (h - tf)/2 + (tw/2)(clear²/4 - y²) + 2 K r² (clear/2 - c r).
    const flange = (189.9 * 12.7 * (453.4 - 12.7)) / 2;
    const fillets = 2 * K * 10.2 ** 2 * (214 - c * 10.2);
    near(firstMoment(shape, 226.7 - 150), flange + (8.5 / 2) * (214 ** 2 - 150 ** 2) + fillets, 1e-12);
  });

  it('counts two root fillets for a channel where an I has four', () => {
    const channel = wholeShape({ ...ub, family: 'channel' });
    near(wholeShape(ub).area - channel.area, 2 * K * 10.2 ** 2, 1e-9);
  });

  it('is worked out once for each section object', () => {
    expect(wholeShape(ub)).toBe(wholeShape(ub));
    expect(cutShape(ub, 0, 0)).toBe(wholeShape(ub));
  });

  it('widens through the root fillet as a quarter circle does', () => {
    const shape = wholeShape(ub);
    expect(thickness(shape, 200)).toBe(8.5);
    expect(thickness(shape, 5)).toBe(189.9);
    // Half the radius above the foot of the fillet: t = tw + 2 (r - sqrt(r² - (r/2)²)).
    expect(thickness(shape, 12.7 + 5.1)).toBeCloseTo(8.5 + 2 * 10.2 * (1 - Math.sqrt(0.75)), 12);
    // At the flange's inner face the narrower side counts: tw + 2 r.
    expect(thickness(shape, 12.7)).toBeCloseTo(8.5 + 20.4, 12);
    expect(thickness(shape, -0.1)).toBe(0);
    expect(thickness(shape, 453.5)).toBe(0);
  });
});

describe('the tee behind a cope', () => {
  it('matches the hand sum of a W410x39 without radii cut to 360 mm (S16 notes: A 3479.7, axis 120.67, I 48.895e6)', () => {
    const section: Section = { family: 'I', h: 399, b: 140, tf: 8.8, tw: 6.4, r: 0 };
    const tee = cutShape(section, 39, 0);
    // A = 140·8.8 + 6.4·(360 - 8.8)
    near(tee.area, 140 * 8.8 + 6.4 * 351.2, 1e-13);
    near(tee.area, 3479.7, 1e-5);
    near(section.h - tee.centroid, 120.67, 1e-5);
    near(tee.inertia, 48.895e6, 1e-5);
    // Q at the axis: 6.4·(360 - 120.67)²/2
    near(firstMoment(tee, tee.centroid), (6.4 * (section.h - 39 - 120.67) ** 2) / 2, 2e-5);
    near(firstMoment(tee, tee.centroid), 183293, 1e-5);
    near(tee.modulusTop, 204298, 1e-5);
  });

  it('matches the hand sum of a 400 deep I cut by 50 mm (A 3389.0, axis 117.13, I 45.002e6, W to the cut edge 193.2e3)', () => {
    const tee = cutShape({ family: 'I', h: 400, b: 140, tf: 8.6, tw: 6.4, r: 0 }, 50, 0);
    near(tee.area, 3389.0, 2e-5);
    near(400 - tee.centroid, 117.13, 3e-5);
    near(tee.inertia, 45.002e6, 1e-5);
    near(tee.modulusTop, 193.2e3, 3e-4);
    expect([tee.top, tee.bottom, tee.depth]).toEqual([50, 400, 350]);
  });

  it('matches the closed form for notched beams of NCCI SN038a', () => {
    const section: Section = { family: 'I', h: 406.4, b: 177.9, tf: 12.8, tw: 7.9, r: 0 };
    const { h, b, tf, tw } = section;
    const whole = wholeShape(section);
    for (const notch of [12.8, 45, 120, 203.2]) {
      const rest = notch - tf;
      const area = whole.area - b * tf - rest * tw;
      const axis = (0.5 * h * whole.area - 0.5 * b * tf ** 2 - 0.5 * (notch ** 2 - tf ** 2) * tw) / area;
      const inertia =
        whole.inertia +
        whole.area * (h / 2 - axis) ** 2 -
        ((b * tf ** 3) / 12 + b * tf * (axis - tf / 2) ** 2) -
        ((tw * rest ** 3) / 12 + tw * rest * (axis - tf - rest / 2) ** 2);
      const tee = cutShape(section, notch, 0);
      near(tee.area, area, 1e-12);
      near(tee.centroid, axis, 1e-12);
      near(tee.inertia, inertia, 1e-11);
      near(tee.modulusTop, inertia / (axis - notch), 1e-11);
    }
  });

  it('keeps the root fillets of the flange that stays and loses those of the flange that goes', () => {
    const plain = cutShape({ ...ub, r: 0 }, 60, 0);
    const tee = cutShape(ub, 60, 0);
    near(tee.area - plain.area, 2 * K * 10.2 ** 2, 1e-10);
  });

  it('grows from the whole section without a jump as the cope becomes nothing', () => {
    const whole = wholeShape(ub);
    const cut = cutShape(ub, 1e-9, 0);
    near(cut.area, whole.area, 1e-10);
    near(cut.inertia, whole.inertia, 1e-9);
    near(cut.centroid, whole.centroid, 1e-9);
  });

  it('loses the flange in proportion when the cut stays inside it', () => {
    near(wholeShape(ub).area - cutShape(ub, 5, 0).area, 5 * 189.9, 1e-12);
  });

  it('loses what stands above the cut when it ends inside the fillet', () => {
    const gone = 189.9 * 12.7 + stripArea(wholeShape(ub), 12.7, 18);
    near(wholeShape(ub).area - cutShape(ub, 18, 0).area, gone, 1e-6);
  });

  it('refuses to make a section of nothing', () => {
    expect(() => cutShape(ub, 300, 153.4)).toThrow(RangeError);
    expect(() => cutShape(ub, -1, 0)).toThrow(RangeError);
    expect(() => cutShape(ub, Number.NaN, 0)).toThrow(RangeError);
  });
});

describe('the rectangle', () => {
  it('is left of the web where both flanges are gone', () => {
    const left = cutShape(ub, 60, 80);
    const plate = rectangle(8.5, 453.4 - 140);
    near(left.area, plate.area, 1e-13);
    near(left.inertia, plate.inertia, 1e-10);
    near(left.modulusTop, plate.modulusTop, 1e-10);
    expect(left.centroid - 60).toBeCloseTo(plate.centroid, 10);
  });

  it('has A = t d, I = t d³/12, W = t d²/6 and Q = t d²/8', () => {
    const plate = rectangle(10, 240);
    expect(plate.area).toBe(2400);
    near(plate.inertia, (10 * 240 ** 3) / 12, 1e-13);
    near(plate.modulusTop, 96000, 1e-13);
    near(firstMoment(plate, 120), 72000, 1e-13);
  });
});
