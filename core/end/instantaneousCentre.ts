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

/** Sums over the bolts for a centre l0 beyond the centroid, away from the load, in units of one bolt's strength R_u. */
const balance = ({ n, m, p, q }: Pattern, l0: number, { mu, lambda, slip }: BoltCurve): Balance => {
  const far = Math.hypot(((m - 1) * q) / 2 + l0, ((n - 1) * p) / 2);
  let vertical = 0;
  let moment = 0;
  for (let j = 0; j < m; j += 1) {
    const x = (j - (m - 1) / 2) * q + l0;
    for (let i = 0; i < n; i += 1) {
      const y = (i - (n - 1) / 2) * p;
      const l = Math.hypot(x, y);
      if (l === 0) continue;
      const R = (1 - Math.exp((-mu * slip * l) / far)) ** lambda;
      vertical += (R * x) / l;
      moment += R * l;
    }
  }
  return { vertical, moment };
};

/**
 * Instantaneous centre of a bolt group under an upright load at arm e from its centroid: the centre at which the bolts' forces, each at
 * right angles to its radius and grown by the curve, balance the load. Bracketed and halved; e > 0 and two bolts or more.
 */
export const instantaneousCentre = (pattern: Pattern, e: number, curve: BoltCurve = boltCurve): CentreFound => {
  // Positive while the centre is too near: the bolts then hold more moment about it than the load brings.
  const excess = (l0: number): number => {
    const { vertical, moment } = balance(pattern, l0, curve);
    return moment - (e + l0) * vertical;
  };
  const size = Math.hypot((pattern.n - 1) * pattern.p, (pattern.m - 1) * pattern.q);
  let near = 0;
  let far = size;
  while (excess(far) > 0 && far < 1e9) far *= 2;
  for (let turn = 0; turn < 200 && far - near > 1e-13 * far; turn += 1) {
    const middle = (near + far) / 2;
    if (excess(middle) > 0) near = middle;
    else far = middle;
  }
  const l0 = (near + far) / 2;
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
