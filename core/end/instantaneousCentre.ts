import { over, step } from '../formula/tree.ts';
import { found, m, n, p, q, V, z } from './given.ts';

/** Load-deformation curve of one bolt: R/R_u = (1 - exp(-mu D))^lambda with D the slip in mm, D_max at the farthest bolt. */
export interface BoltCurve {
  /** 1/mm */
  readonly mu: number;
  readonly lambda: number;
  /** mm */
  readonly slip: number;
}

/** The curve of Crawford and Kulak for high-strength bolts, as the American and Canadian handbooks use it (10 per inch, 0.34 in). */
export const boltCurve: BoltCurve = { mu: 10 / 25.4, lambda: 0.55, slip: 8.636 };
/** The same rounded to metric, as Canadian practice writes it. */
export const metricBoltCurve: BoltCurve = { mu: 0.394, lambda: 0.55, slip: 8.64 };

/** A rectangular grid of bolts, mm. */
export interface Pattern {
  readonly n: number;
  readonly m: number;
  readonly p: number;
  readonly q: number;
}

/** Solved group: coefficient C = load / strength of one bolt, and the distance of the centre from the centroid, mm. */
export interface CentreFound {
  readonly C: number;
  readonly l0: number;
}

interface Balance {
  readonly vertical: number;
  readonly moment: number;
}

/**
 * Sums over the bolts for a centre l0 beyond the centroid, away from the load, in units of one bolt's strength R_u. Rows lie in pairs above and
 * below the centroid, so half of them are worked out.
 */
const balance = ({ n, m, p, q }: Pattern, l0: number, { mu, lambda, slip }: BoltCurve): Balance => {
  const xFar = ((m - 1) * q) / 2 + l0;
  const yFar = ((n - 1) * p) / 2;
  const perLength = (-mu * slip) / Math.sqrt(xFar * xFar + yFar * yFar);
  let vertical = 0;
  let moment = 0;
  for (let j = 0; j < m; j += 1) {
    const x = (j - (m - 1) / 2) * q + l0;
    for (let i = 0; 2 * i < n; i += 1) {
      const y = (i - (n - 1) / 2) * p;
      const l = Math.sqrt(x * x + y * y);
      if (l === 0) continue;
      const R = (2 * i === n - 1 ? 1 : 2) * (1 - Math.exp(perLength * l)) ** lambda;
      vertical += (R * x) / l;
      moment += R * l;
    }
  }
  return { vertical, moment };
};

/** Positive while the centre is too near: the bolts then hold more moment about it than the load brings. */
const excess = (pattern: Pattern, e: number, curve: BoltCurve, l0: number): number => {
  const { vertical, moment } = balance(pattern, l0, curve);
  return moment - (e + l0) * vertical;
};

/** Share of the distance within which the centre is known. */
const CLOSE = 1e-13;

/**
 * Instantaneous centre of a bolt group under an upright load at arm e from its centroid: the centre at which the bolts' forces, each at
 * right angles to its radius and grown by the curve, balance the load. Kept between two bounds; e > 0 and two bolts or more.
 */
export const instantaneousCentre = (pattern: Pattern, e: number, curve: BoltCurve = boltCurve): CentreFound => {
  let near = 0;
  let atNear = excess(pattern, e, curve, near);
  let far = Math.hypot((pattern.n - 1) * pattern.p, (pattern.m - 1) * pattern.q);
  let atFar = excess(pattern, e, curve, far);
  while (atFar > 0 && far < 1e9) {
    near = far;
    atNear = atFar;
    far *= 2;
    atFar = excess(pattern, e, curve, far);
  }
  let kept = 0;
  for (let turn = 0; turn < 200 && far - near > CLOSE * far && atFar !== 0; turn += 1) {
    // The chord's root; every third turn the middle, so that the bounds close in whatever the curve.
    const chord = near + ((far - near) * atNear) / (atNear - atFar);
    const l0 = turn % 3 < 2 && chord > near && chord < far ? chord : (near + far) / 2;
    const found = excess(pattern, e, curve, l0);
    // A bound that stays twice counts for half (the Illinois rule), else the chord would creep.
    if (found > 0) {
      near = l0;
      atNear = found;
      if (kept === 1) atFar /= 2;
      kept = 1;
    } else {
      far = l0;
      atFar = found;
      if (kept === -1) atNear /= 2;
      kept = -1;
    }
  }
  const l0 = atFar === 0 ? far : (near + far) / 2;
  return { C: balance(pattern, l0, curve).vertical, l0 };
};

const KEPT = 256;

interface Solved extends Pattern {
  readonly C: number;
}

/** Coefficient C of a pattern of n rows and m columns, pitch p, gauge q, at arm e; mm. */
export type Coefficient = (n: number, m: number, p: number, q: number, e: number) => number;

/** Solves groups by one curve; the last few hundred patterns solved are remembered, as schedules repeat them. */
export const coefficientsBy = (curve: BoltCurve): Coefficient => {
  const solved = new Map<number, Solved[]>();
  let kept = 0;
  return (n, m, p, q, e) => {
    const known = solved.get(e)?.find((one) => one.n === n && one.m === m && one.p === p && one.q === q);
    if (known) return known.C;
    const { C } = instantaneousCentre({ n, m, p, q }, e, curve);
    if (kept >= KEPT) {
      solved.clear();
      kept = 0;
    }
    solved.set(e, [...(solved.get(e) ?? []), { n, m, p, q, C }]);
    kept += 1;
    return C;
  };
};

export const coefficientOf: Coefficient = coefficientsBy(metricBoltCurve);

/** Moment that a group alone holds about its centroid over the strength of one bolt, C′ in mm. */
export const pureMoment = (pattern: Pattern, curve: BoltCurve = boltCurve): number => balance(pattern, 0, curve).moment;

/** C of the bolt group at arm z. */
const C = step(
  'C',
  found('0,0', 'instantaneous centre, R = R_u (1 − e^(−0.394 Δ))^0.55', [n, m, p, q, z], (_, n, m, p, q, e) =>
    coefficientOf(n!, m!, p!, q!, e!),
  ),
);

/** Force on the farthest bolt by the instantaneous centre, N. */
export const centreForce = step('R_max', over(V, C));
