import { type Band, moments, widthAt, widthSlope } from './band.ts';
import { bandsOf, firstMoment, type Shape } from './shape.ts';

/** The largest elastic shear stress in the web. */
export interface ShearPeak {
  /** Largest Q/(I t), 1/mm²: times the shear force in N it is the stress in MPa. */
  readonly perNewton: number;
  /** Its level, mm below top of steel. */
  readonly at: number;
  /** First moment of what lies above that level, mm³. */
  readonly Q: number;
}

/**
 * Where V Q/(I t) is largest in the web, root fillets included. The flange is left out: where the width jumps from flange to web the
 * formula speaks of no real stress. The peak stands at the centroid if that lies in the plain web; with the centroid in a flange or
 * among the fillets it stands in the fillets, found by halving to a rounding error. Where no web is left, the centroid is taken.
 */
export const shearPeak = (shape: Shape): ShearPeak => {
  const level = Math.min(Math.max(shape.centroid, shape.webTop), shape.webBottom);
  const it = webBandAt(shape, level);
  const at = it.factor < 0 ? peakInFillets(shape, it, level) : level;
  const Q = firstMoment(shape, at);
  return { perNewton: Q / (shape.inertia * widthAt(it, at)), at, Q };
};

/** A level of the curve, mm; first moment above it, mm³; width there, mm. */
interface Level {
  readonly y: number;
  readonly Q: number;
  readonly t: number;
}

/** Both edges are free: what rounding leaves there is nothing. */
const edge = (y: number): Level => ({ y, Q: 0, t: 1 });

const curves = new WeakMap<Shape, readonly Level[]>();

/** What the curve is drawn from whatever the shear force: worked out once for each shape. */
const curveOf = (shape: Shape): readonly Level[] => {
  const seen = curves.get(shape);
  if (seen !== undefined) return seen;
  const peak = shearPeak(shape).at;
  const curve: Level[] = [];
  // First moment above the band: carried down from band to band, so that no level sums the bands above it again.
  let above = 0;
  for (const it of bandsOf(shape)) {
    const [top, bottom] = [Math.max(it.top, shape.top), Math.min(it.bottom, shape.bottom)];
    const inWeb = it.bottom > shape.webTop && it.top < shape.webBottom;
    const count = it.factor !== 0 ? 10 : inWeb ? 24 : 6;
    let Q = above;
    for (const y of levels(it, top, bottom, peak, count)) {
      const part = moments(it, top, y);
      Q = above + shape.centroid * part.area - part.first;
      curve.push(y === shape.top || y === shape.bottom ? edge(y) : { y, Q, t: widthAt(it, y) });
    }
    above = Q;
  }
  curves.set(shape, curve);
  return curve;
};

/** Points of the curve of V Q/(I t) down the shape, tau in MPa for the shear force V in N: a level where the width jumps stands twice. */
export const shearProfile = (shape: Shape, V: number): [y: number, tau: number][] => {
  const points: [number, number][] = [];
  const force = V / shape.inertia;
  let last = Number.NaN;
  let lastTau = Number.NaN;
  for (const { y, Q, t } of curveOf(shape)) {
    const tau = (force * Q) / t;
    if (last === y && Math.abs(lastTau - tau) <= 1e-9 * Math.abs(tau)) continue;
    points.push([y, tau]);
    last = y;
    lastTau = tau;
  }
  return points;
};

const webBandAt = (shape: Shape, y: number): Band => {
  const { bands, webTop, webBottom } = shape;
  for (let i = 0; i < bands.length; i++) {
    const it = bands[i]!;
    if (it.bottom >= y && it.bottom > webTop && it.top < webBottom) return it;
  }
  throw new RangeError(`no web at ${y}`);
};

/**
 * Going from the centroid toward the plain web, Q falls and t falls. Q/t turns where Q' t = Q t', with Q' = (centroid - y) t;
 * before that level the thinning wins, after it the loss of Q.
 */
const peakInFillets = (shape: Shape, it: Band, start: number): number => {
  const thinsDownward = it.centre > (it.top + it.bottom) / 2;
  let rising = start;
  let falling = thinsDownward ? Math.min(it.bottom, shape.webBottom) : Math.max(it.top, shape.webTop);
  for (let step = 0; step < 50; step++) {
    const y = (rising + falling) / 2;
    const t = widthAt(it, y);
    const slope = (shape.centroid - y) * t * t - firstMoment(shape, y) * widthSlope(it, y);
    if (slope > 0 === thinsDownward) rising = y;
    else falling = y;
  }
  return (rising + falling) / 2;
};

/** Levels to draw a band by: closer where an arc runs level, and the peak among them. */
const levels = (it: Band, from: number, to: number, peak: number, count: number): number[] =>
  peak > from && peak < to
    ? [...steps(it, from, peak, count / 2), ...steps(it, peak, to, count / 2)]
    : steps(it, from, to, count);

const angleAt = (it: Band, y: number): number => Math.asin(Math.max(-1, Math.min(1, (y - it.centre) / it.radius)));

const steps = (it: Band, from: number, to: number, count: number): number[] => {
  const arc = it.factor !== 0;
  const start = arc ? angleAt(it, from) : from;
  const whole = (arc ? angleAt(it, to) : to) - start;
  const found = [from];
  for (let i = 1; i < count; i++) {
    const between = start + (whole * i) / count;
    found.push(arc ? it.centre + it.radius * Math.sin(between) : between);
  }
  found.push(to);
  return found;
};
