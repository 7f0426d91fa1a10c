import type { Facts } from '../../end/facts.ts';
import { supportCentres } from '../../end/supportPattern.ts';
import type { BoltForce } from '../paths/boltForces.ts';

/**
 * Force of each support bolt on the leg or end plate that it holds, N; x across from the web's middle, y down. Two lines share V evenly, as
 * the eccentricities of both sides balance. Of one line V stands at the arm from the web's middle and turns the leg about its bolts.
 */
export const supportForces = (it: Facts): BoltForce[] => {
  const places = supportCentres(it);
  const { lines, cc } = it.supportBolts;
  const middle = places.reduce((sum, { y }) => sum + y, 0) / places.length;
  const squares = places.reduce((sum, { y }) => sum + (y - middle) ** 2, 0);
  const turn = lines === 1 && squares > 0 ? cc / 2 / squares : 0;
  return places.map((at) => {
    const unit = { x: turn * (at.y - middle), y: -1 / places.length };
    const run = Math.hypot(unit.x, unit.y);
    return {
      at,
      force: { x: it.V * unit.x, y: it.V * unit.y },
      size: it.V * run,
      towards: { x: unit.x / run, y: unit.y / run },
    };
  });
};
