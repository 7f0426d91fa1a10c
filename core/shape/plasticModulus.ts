import { type Band, moments } from './band.ts';
import { firstMoment, type Shape } from './shape.ts';

/** Plastic section modulus, mm³: the halves of the area on either side of the plastic axis have equal and opposite first moments. */
export const plasticModulus = (shape: Shape): number => 2 * firstMoment(shape, plasticAxis(shape));

/** Level that halves the area of the shape, mm: the neutral axis of the fully plastic section. */
export const plasticAxis = (shape: Shape): number => {
  let missing = shape.area / 2;
  for (const it of shape.bands) {
    if (it.bottom <= shape.top || it.top >= shape.bottom) continue;
    const { area } = moments(it, shape.top, shape.bottom);
    if (area >= missing) return levelAt(it, Math.max(it.top, shape.top), Math.min(it.bottom, shape.bottom), missing);
    missing -= area;
  }
  return shape.bottom;
};

/** The level down to which the band holds the given area from `from` on; by halving where its edges are not upright. */
const levelAt = (it: Band, from: number, to: number, area: number): number => {
  if (it.grade === 0 && it.factor === 0) return from + area / it.base;
  let [low, high] = [from, to];
  for (let step = 0; step < 50; step++) {
    const middle = (low + high) / 2;
    if (moments(it, from, middle).area < area) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
};
