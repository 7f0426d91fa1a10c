import { type Band, moments, straightBand, widthAt } from './band.ts';
import type { Section } from './section.ts';
import { sectionBands } from './sectionBands.ts';

/**
 * A plane cross-section, whole or cut level: the full I or channel, the tee behind a cope, the rectangle between two copes, a plate.
 * Levels y in mm, measured down from top of steel of the uncut section (of a rectangle: from its own top).
 */
export interface Shape {
  /** Level of the upper edge, mm. */
  readonly top: number;
  /** Level of the lower edge, mm. */
  readonly bottom: number;
  /** bottom - top, mm. */
  readonly depth: number;
  /** mm². */
  readonly area: number;
  /** Level of the centroid, mm. */
  readonly centroid: number;
  /** Second moment of area about the centroidal axis across the web, mm⁴. */
  readonly inertia: number;
  /** Elastic section modulus to the upper edge, mm³. */
  readonly modulusTop: number;
  /** Elastic section modulus to the lower edge, mm³. */
  readonly modulusBottom: number;
  /** Level at which the web, with its root fillets, begins, mm; the flange is outside it. Where no web is left: the upper edge. */
  readonly webTop: number;
  /** Level at which the web ends, mm. Where no web is left: the lower edge. */
  readonly webBottom: number;
  /** Bands of the uncut section; those outside top to bottom are no part of the shape. */
  readonly bands: readonly Band[];
}

const known = new WeakMap<Section, Shape>();

/** The uncut section. Worked out once for each section object. */
export const wholeShape = (section: Section): Shape => {
  const seen = known.get(section);
  if (seen !== undefined) return seen;
  const { bands, webTop, webBottom } = sectionBands(section);
  const shape = clipped(bands, 0, section.h, webTop, webBottom);
  known.set(section, shape);
  return shape;
};

/**
 * What is left of a section after `fromTop` mm are cut away from above and `fromBottom` mm from below. Any depth is allowed, inside a
 * flange or a fillet too, as long as something is left; a cut that leaves nothing is a broken promise of the caller and throws.
 */
export const cutShape = (section: Section, fromTop: number, fromBottom: number): Shape => {
  const whole = wholeShape(section);
  if (fromTop === 0 && fromBottom === 0) return whole;
  const bottom = section.h - fromBottom;
  if (!(fromTop >= 0 && fromBottom >= 0 && fromTop < bottom)) {
    throw new RangeError(`no section is left: ${fromTop} and ${fromBottom} cut from ${section.h}`);
  }
  return clipped(whole.bands, fromTop, bottom, whole.webTop, whole.webBottom);
};

/** A plate or a plain web, `width` thick and `depth` deep, mm. */
export const rectangle = (width: number, depth: number): Shape =>
  clipped([straightBand(0, depth, width)], 0, depth, 0, depth);

/** First moment about the centroid of the part of the shape above the level y, mm³; 0 at and beyond both edges. */
export const firstMoment = (shape: Shape, y: number): number => {
  const { bands, top, bottom, centroid } = shape;
  if (y <= top || y >= bottom) return 0;
  let sum = 0;
  for (let i = 0; i < bands.length; i++) {
    const it = bands[i]!;
    if (it.top >= y) break;
    if (it.bottom <= top) continue;
    const part = moments(it, top, y);
    sum += centroid * part.area - part.first;
  }
  return sum;
};

/** Width of the shape at the level y, mm: in the web its thickness. At a level where it jumps, the narrower side; 0 outside the shape. */
export const thickness = (shape: Shape, y: number): number => {
  if (y < shape.top || y > shape.bottom) return 0;
  const { bands } = shape;
  let narrowest = Number.POSITIVE_INFINITY;
  for (let i = 0; i < bands.length; i++) {
    const it = bands[i]!;
    const touches = it.top <= y && y <= it.bottom && it.top < shape.bottom && it.bottom > shape.top;
    if (touches) narrowest = Math.min(narrowest, widthAt(it, y));
  }
  return narrowest;
};

/** The bands of which something is left in the shape, from top to bottom. */
export const bandsOf = (shape: Shape): readonly Band[] =>
  shape.bands.filter((it) => it.bottom > shape.top && it.top < shape.bottom);

const clipped = (bands: readonly Band[], top: number, bottom: number, webTop: number, webBottom: number): Shape => {
  let area = 0;
  let first = 0;
  let second = 0;
  for (let i = 0; i < bands.length; i++) {
    const it = bands[i]!;
    if (it.bottom <= top) continue;
    if (it.top >= bottom) break;
    const part = moments(it, top, bottom);
    area += part.area;
    first += part.first;
    second += part.second;
  }
  const centroid = first / area;
  const inertia = second - first * centroid;
  const hasWeb = webTop < bottom && webBottom > top;
  return {
    top,
    bottom,
    depth: bottom - top,
    area,
    centroid,
    inertia,
    modulusTop: inertia / (centroid - top),
    modulusBottom: inertia / (bottom - centroid),
    webTop: hasWeb ? Math.max(webTop, top) : top,
    webBottom: hasWeb ? Math.min(webBottom, bottom) : bottom,
    bands,
  };
};
