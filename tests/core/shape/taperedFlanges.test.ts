import { describe, expect, it } from 'vitest';
import { plasticAxis, plasticModulus } from '../../../core/shape/plasticModulus.ts';
import type { Section } from '../../../core/shape/section.ts';
import { cutShape, firstMoment, thickness, wholeShape } from '../../../core/shape/shape.ts';
import { shearPeak } from '../../../core/shape/shearStress.ts';

/** ISMB 400: flanges 140 x 16 that taper by 8 degrees, root radius 14, toe radius 7. */
const slope = (8 * Math.PI) / 180;
const beam: Section = { family: 'I', h: 400, b: 140, tf: 16, tw: 8.9, r: 14, slope, toe: 7 };

const near = (value: number, target: number, share: number) =>
  expect(Math.abs(value / target - 1), `${value} against ${target}`).toBeLessThanOrEqual(share);

/** Half the outstand: there the face stands t_f below the outer face. */
const quarter = (140 - 8.9) / 4;
/** Points where the toe and the root arc touch the sloping face: how far out from the web, and how deep. */
const toeAt = 2 * quarter - 7 * (1 - Math.sin(slope));
const rootAt = 14 * (1 - Math.sin(slope));
const face = (out: number) => 16 + (quarter - out) * Math.tan(slope);
const toeCentre = face(toeAt) - 7 * Math.cos(slope);
const rootCentre = face(rootAt) + 14 * Math.cos(slope);
const stops = [0, toeCentre, face(toeAt), face(rootAt), rootCentre];

/** Width at the level y below the outer face, drawn with compasses: circles, the sloping line, the web. */
const width = (below: number): number => {
  const y = Math.min(below, 400 - below);
  const out = (): number => {
    if (y <= toeCentre) return 2 * quarter;
    if (y <= face(toeAt)) return 2 * quarter - 7 + Math.sqrt(Math.max(0, 49 - (y - toeCentre) ** 2));
    if (y <= face(rootAt)) return quarter - (y - 16) / Math.tan(slope);
    if (y <= rootCentre) return 14 - Math.sqrt(Math.max(0, 196 - (rootCentre - y) ** 2));
    return 0;
  };
  return 8.9 + 2 * out();
};

/** Integral of width times `weigh` from one level to another, by Simpson's rule between the points where the outline changes its law. */
const integral = (from: number, to: number, weigh: (y: number) => number): number => {
  const all = [...stops, ...stops.map((y) => 400 - y), from, to]
    .filter((y) => y >= from && y <= to)
    .sort((a, b) => a - b);
  let sum = 0;
  for (const [i, a] of all.slice(0, -1).entries()) {
    const half = (all[i + 1]! - a) / 2;
    const n = 400;
    // On an angle instead of the level, which tames the upright ends of the arcs.
    for (let k = 0; k <= n; k++) {
      const angle = (k / n) * Math.PI;
      const y = a + half * (1 - Math.cos(angle));
      const share = k === 0 || k === n ? 1 : k % 2 === 1 ? 4 : 2;
      sum += share * width(Math.min(y, all[i + 1]!)) * weigh(y) * half * Math.sin(angle) * (Math.PI / n / 3);
    }
  }
  return sum;
};

describe('a section with tapered flanges', () => {
  it.each([
    ['whole', 0, 0],
    ['cut behind a top cope', 45, 0],
    ['cut behind a bottom cope', 0, 60],
    ['cut inside the sloping flange', 15, 0],
    ['cut inside the root fillet', 25, 0],
    ['cut on both sides', 45, 45],
  ])('%s has A, centroid, I, Q and W_pl of its outline to nine figures', (_, fromTop, fromBottom) => {
    const shape = cutShape(beam, fromTop, fromBottom);
    const [top, bottom] = [fromTop, 400 - fromBottom];
    const area = integral(top, bottom, () => 1);
    const centroid = integral(top, bottom, (y) => y) / area;
    near(shape.area, area, 1e-9);
    near(shape.centroid, centroid, 1e-9);
    const inertia = integral(top, bottom, (y) => (y - centroid) ** 2);
    near(shape.inertia, inertia, 1e-9);
    near(shape.modulusTop, inertia / (centroid - top), 1e-9);
    for (const y of [8, 12, 17, 22, 30, 100, 200, 300, 372, 380, 386, 395].filter((one) => one > top && one < bottom)) {
      const above = integral(top, y, (one) => centroid - one);
      expect(Math.abs(firstMoment(shape, y) - above)).toBeLessThanOrEqual(1e-9 * area * shape.depth);
      near(thickness(shape, y), width(y), 1e-12);
    }
    const axis = plasticAxis(shape);
    near(
      integral(top, axis, () => 1),
      area / 2,
      1e-9,
    );
    near(plasticModulus(shape), integral(top, axis, (y) => axis - y) + integral(axis, bottom, (y) => y - axis), 1e-9);
  });

  it('of ISMB 400 behind a notch of 45 mm has the figures of a million strips (A 5302.29 mm², I 69.6624e6 mm⁴, W 283.470e3, W_pl 513.305e3 mm³)', () => {
    const tee = cutShape(beam, 45, 0);
    near(tee.area, 5302.288, 1e-5);
    near(tee.inertia, 69.6624e6, 1e-5);
    near(tee.modulusTop, 283.47e3, 1e-5);
    near(plasticModulus(tee), 513.305e3, 1e-5);
    near(firstMoment(tee, shearPeak(tee).at), 268.7466e3, 1e-5);
  });

  it('has its mean thickness half way out: the flange weighs as a flat one of t_f but for the radii', () => {
    const square = wholeShape({ ...beam, r: 0, toe: 0 });
    near(square.area, 2 * 140 * 16 + (400 - 2 * 16) * 8.9, 1e-12);
  });

  it('with no slope is the parallel section, to the last bit', () => {
    const { slope: _, toe: __, ...parallel } = beam;
    const [one, other] = [wholeShape({ ...beam, slope: 0, toe: 0 }), wholeShape(parallel)];
    expect([one.area, one.inertia, one.modulusTop, plasticModulus(one)]).toEqual([
      other.area,
      other.inertia,
      other.modulusTop,
      plasticModulus(other),
    ]);
  });
});
