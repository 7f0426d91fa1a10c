import type { Facts, OnFace, OppositeFacts } from './facts.ts';
import type { OppositeGiven } from './schema.ts';
import { supportCentres } from './supportPattern.ts';

/** Centres no farther apart are those of one hole; sizes that meet in inches meet in mm. mm */
const ONE_HOLE = 0.5 + 1e-9;

/** What is known of this side. */
type Side = Pick<Facts, 'yp' | 'hp' | 'bp' | 'tw' | 'legSupport' | 'supportBolts'>;

/** No beam opposite is told. */
export const noOpposite: OppositeFacts = { told: false, shared: 0, all: false, apart: [], toBolt: 0, toFitting: 0 };

const distance = (a: OnFace, b: OnFace): number => Math.hypot(a.x - b.x, a.y - b.y);
const nearest = (to: OnFace, all: readonly OnFace[]): number => Math.min(...all.map((one) => distance(one, to)));

/** From the outline of what lies on the support, the beam's end with it, to a place: less than nothing inside. mm */
const clear = ({ x, y }: OnFace, { yp, hp, bp, tw, legSupport, supportBolts }: Side): number => {
  const half = bp > 0 ? bp / 2 : tw / 2 + legSupport;
  const across = Math.max(-half - x, x - (supportBolts.lines === 1 ? tw / 2 : half));
  const down = Math.max(yp - y, y - yp - hp);
  const outside = Math.hypot(Math.max(across, 0), Math.max(down, 0));
  return outside > 0 ? outside : Math.max(across, down);
};

/** Bolts of the beam opposite beside those of this one; `k`: mm in one length unit of the file. */
export const oppositeFacts = (
  { firstRow, rows, pitch = 0, gauge }: OppositeGiven,
  k: number,
  side: Side,
): OppositeFacts => {
  const ours = supportCentres(side);
  const theirs = [-gauge / 2, gauge / 2].flatMap((x) =>
    Array.from({ length: rows }, (_, i) => ({ x: x * k, y: (firstRow + i * pitch) * k })),
  );
  const apart = theirs.filter((one) => nearest(one, ours) > ONE_HOLE);
  const shared = theirs.length - apart.length;
  if (apart.length === 0) return { ...noOpposite, told: true, shared, all: shared === ours.length };
  return {
    told: true,
    shared,
    all: false,
    apart,
    toBolt: Math.min(...apart.map((one) => nearest(one, ours))),
    toFitting: Math.min(...apart.map((one) => clear(one, side))),
  };
};
