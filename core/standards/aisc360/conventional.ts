import type { Facts } from '../../end/facts.ts';
import type { Gate } from '../../end/gates.ts';
import { flag, n, z, z1 } from '../../end/given.ts';
import { atMost, over, pick, step } from '../../formula/tree.ts';
import { INCH } from '../../units/systems.ts';
import { leastEdge } from './boltTable.ts';
import { manual } from './clauses.ts';
import { noLength } from './given.ts';

/** Sizes that meet a bound exactly keep meeting it after conversion from inches, mm. */
const NOISE = 1e-9;
const within = (size: number, most: number): boolean => size <= most + NOISE;

/** Edges at right angles to the reaction, the web's where it is coped, not below Table J3.4. */
const edgesHold = ({ d, eTop, eBot, mTop, mBottom, at, ab }: Facts): boolean => {
  const least = leastEdge(d);
  return (
    within(least, eTop) &&
    within(least, eBot) &&
    (mTop === 0 || within(least, at)) &&
    (mBottom === 0 || within(least, ab))
  );
};

/** Both plies reach 2 d past the bolts. */
export const endsHold = ({ d, eEnd, ex }: Facts): boolean => within(2 * d, eEnd) && within(2 * d, ex);

/** Greatest thickness, of one ply at least, at which the bolts plough before they break, mm. */
export const ploughed = (d: number): number => d / 2 + INCH / 16;
const ploughedInMany = (d: number): number => d / 2 - INCH / 16;

const conventionalFacts = (f: Facts): boolean =>
  f.kind === 'fin-plate' &&
  f.m === 1 &&
  f.n >= 2 &&
  f.n <= 12 &&
  within(f.z1, 3.5 * INCH) &&
  within(f.d0, f.dStandard) &&
  within(Math.min(f.tp, f.tw), f.n <= 5 ? ploughed(f.d) : ploughedInMany(f.d)) &&
  edgesHold(f) &&
  endsHold(f);

/**
 * A single plate within every limit of the conventional kind: one column of 2 to 12 bolts, z_1 <= 3-1/2 in, standard holes, edges of
 * Table J3.4, 2 d to the ends, one ply of at most d/2 + 1/16 in (from 6 rows d/2 - 1/16 in). Manual Part 10, table of 14th and 15th edition.
 */
export const conventional = flag('conventional plate', conventionalFacts);
/** Every other plate, and a web bolted straight to a ply. */
export const extended = flag('not a conventional plate', (f) => !conventionalFacts(f));
/** As long as both plies are thick enough to break bolts, `t` is counted against the ploughing thickness. */
export const fits = within;

export const conventionalPlate: Gate = { when: conventional, reason: 'conventional-plate' };

/** Angles with one column within 3 in of the support: the Manual leaves the arm of their web bolts out. */
export const concentric = flag(
  'angles, one column within 3 in: no arm',
  (f) => f.legWeb > 0 && f.m === 1 && within(f.z1, 3 * INCH),
);

/** Arm of the reaction to the centroid of the bolts. */
export const e = step(
  'e',
  pick(
    [
      [concentric, noLength],
      [extended, z],
      [atMost(n, 5), over(z1, 2)],
    ],
    z1,
  ),
  manual(10),
);
