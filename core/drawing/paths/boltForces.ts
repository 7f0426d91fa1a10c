import type { Facts } from '../../end/facts.ts';
import { centres } from '../bolts.ts';
import type { Point } from '../drawing.ts';

/** Force of one bolt on the web, N; x along the beam, y down. The plate takes the opposite. */
export interface BoltForce {
  readonly at: Point;
  readonly force: Point;
  /** Size of the force, N. */
  readonly size: number;
  /** Its direction; upright where there is none. */
  readonly towards: Point;
}

/**
 * Elastic vector sum: V at arm z from the centroid of the bolts, shared evenly and turned about it. A single bolt holds no moment: its share
 * of V alone is shown.
 */
export const boltForces = (it: Facts): BoltForce[] => {
  const places = centres(it);
  const count = places.length;
  const middle = { x: it.eEnd + ((it.m - 1) * it.q) / 2, y: (it.y1 + it.yn) / 2 };
  const J = places.reduce((sum, { x, y }) => sum + (x - middle.x) ** 2 + (y - middle.y) ** 2, 0);
  const turn = J > 0 ? it.z / J : 0;
  return places.map((at) => {
    // Per newton of the reaction, so that an end without load still shows the way the bolts push.
    const unit = { x: -turn * (at.y - middle.y), y: turn * (at.x - middle.x) - 1 / count };
    const run = Math.hypot(unit.x, unit.y);
    return {
      at,
      force: { x: it.V * unit.x, y: it.V * unit.y },
      size: it.V * run,
      towards: run > 0 ? { x: unit.x / run, y: unit.y / run } : { x: 0, y: -1 },
    };
  });
};

/** Share of the largest force that each bolt carries, also where the reaction is nil. */
export const shares = (forces: readonly BoltForce[]): number[] => {
  const most = Math.max(...forces.map((it) => it.size));
  return forces.map((it) => (most > 0 ? it.size / most : 1));
};
