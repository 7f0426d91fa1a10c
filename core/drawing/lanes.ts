import type { Dimension, Lane, Side } from './drawing.ts';
import { type Pad, widthOf } from './pad.ts';

/** A dimension and the coordinate of its line: y for one along the beam, x for an upright one. */
export interface Placed {
  readonly dimension: Dimension;
  readonly level: number;
  readonly side: Side;
  /** In the space kept for it near the piece. */
  readonly inRoom: boolean;
}

/** Distances in text heights: first line off its edge, and from line to line. */
const FIRST = 2;
const NEXT = 2.1;
/** Of a line in a notch, off the beam's end. */
const IN_ROOM = { gap: 1.1, parallel: 1.7 } as const;

/** Finds where every dimension line lies: lines of one lane on one level, shorter ones inside, longer ones outside, lanes that stand empty closed up. */
export const intoLanes = (pad: Pad, dimensions: readonly Dimension[]): Placed[] => {
  const chosen = dimensions.map((dimension) => ({ dimension, ...choose(pad, dimension) }));
  const edges = new Map<string, Lane[]>();
  for (const { lane } of chosen) {
    const key = edgeKey(lane);
    edges.set(key, [...(edges.get(key) ?? []), lane]);
  }
  const offsets = new Map<string, number>();
  for (const [key, lanes] of edges) {
    let offset = 0;
    let last = 0;
    for (const lane of [...new Set(lanes.map((it) => it.lane))].sort((a, b) => a - b)) {
      const of = chosen.filter((it) => it.lane.lane === lane && edgeKey(it.lane) === key);
      const half = Math.max(...of.map((it) => halfWidth(pad, it.dimension)));
      offset += offset === 0 ? first(pad, of[0]!, half) : next(pad, of[0]!.dimension, last, half);
      last = half;
      offsets.set(`${key} ${lane}`, offset);
    }
  }
  return chosen.map(({ dimension, lane, inRoom }) => {
    const offset = offsets.get(`${edgeKey(lane)} ${lane.lane}`)!;
    const out = lane.side === 'left' || lane.side === 'top' ? -1 : 1;
    return { dimension, level: lane.base + out * offset, side: lane.side, inRoom };
  });
};

const edgeKey = ({ side, base }: Lane): string => `${side} ${base}`;

/** The space near the piece where it is wide and, for an upright line, high enough; else the lane further out. */
const choose = ({ em }: Pad, { at, room, axis, value }: Dimension): { lane: Lane; inRoom: boolean } => {
  const enough = room !== undefined && room.width >= room.heights * em && (axis === 'x' || value >= 2.2 * em);
  return enough
    ? { lane: { side: room.side, base: room.base, lane: room.lane ?? 1 }, inRoom: true }
    : { lane: at, inRoom: false };
};

/** Half of what an upright line needs to each side: its value stands across it, or along it. */
const halfWidth = (pad: Pad, { axis, line }: Dimension): number =>
  axis === 'y' && pad.values === 'gap' ? widthOf(pad, line) / 2 : 0;

const first = (pad: Pad, { dimension, inRoom }: { dimension: Dimension; inRoom: boolean }, half: number): number => {
  if (inRoom && dimension.axis === 'y') return IN_ROOM[pad.values] * pad.em;
  return Math.max(FIRST * pad.em, half + 0.5 * pad.em);
};

const next = (pad: Pad, { axis }: Dimension, last: number, half: number): number =>
  axis === 'y' && pad.values === 'gap' ? Math.max(NEXT * pad.em, last + half + 0.45 * pad.em) : NEXT * pad.em;
