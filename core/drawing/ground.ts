import type { Box, Point } from './drawing.ts';

/** What stands on the drawing so far: words find their places by how much they would cover. */
export interface Ground {
  /** A line that words should keep off; `weight` says how much. Lines of the same owner do not disturb it. */
  line(from: Point, to: Point, weight: number, owner?: object): void;
  /** A box that nothing else may stand on. */
  take(box: Box): void;
  /** What covering this box would cost; counting stops beyond `enough`. Words within `aside` to its left and right count as covered. */
  cost(box: Box, owner?: object, enough?: number, aside?: number): number;
  /** How many words a line would run through. */
  words(from: Point, to: Point): number;
  /** What a leader along this line would cost. */
  crossing(from: Point, to: Point): number;
}

/** What it costs to stand on other words. */
export const WORDS = 1000;
/** A leader through words, and over a line of weight 1. */
const LEADER_WORDS = 120;
const LEADER_LINE = 0.12;
/** Share of a leader at its end that is not looked at. */
const ENDS = 0.08;

/** A line from a to b, and the box around it. */
interface Segment extends Box {
  readonly ax: number;
  readonly ay: number;
  readonly bx: number;
  readonly by: number;
  readonly weight: number;
  readonly owner: object | undefined;
}

const segmentOf = (from: Point, to: Point, weight = 0, owner?: object): Segment => ({
  ax: from.x,
  ay: from.y,
  bx: to.x,
  by: to.y,
  left: Math.min(from.x, to.x),
  top: Math.min(from.y, to.y),
  right: Math.max(from.x, to.x),
  bottom: Math.max(from.y, to.y),
  weight,
  owner,
});

export const createGround = (): Ground => {
  const segments: Segment[] = [];
  const boxes: Box[] = [];
  return {
    line: (from, to, weight, owner) => {
      segments.push(segmentOf(from, to, weight, owner));
    },
    take: (box) => {
      boxes.push(box);
    },
    cost: (box, owner, enough = Number.POSITIVE_INFINITY, aside = 0) => {
      const { left, top, right, bottom } = box;
      let sum = 0;
      for (const it of boxes) if (overlaps(it, box, aside)) sum += WORDS;
      for (let i = 0; i < segments.length && sum < enough; i++) {
        const it = segments[i]!;
        // Most lines are far away: told here, since this is the innermost loop of all.
        if (it.left > right || it.right < left || it.top > bottom || it.bottom < top) continue;
        if (it.owner !== undefined && it.owner === owner) continue;
        if (meets(it, box)) sum += it.weight;
      }
      return sum;
    },
    words: (from, to) => {
      const line = segmentOf(from, to);
      return boxes.filter((box) => meets(line, box)).length;
    },
    crossing: (from, to) => {
      // A leader ends on the line that it names.
      const leader = segmentOf(from, { x: to.x - (to.x - from.x) * ENDS, y: to.y - (to.y - from.y) * ENDS });
      const { left, top, right, bottom } = leader;
      let sum = 0;
      for (const it of boxes) if (meets(leader, it)) sum += LEADER_WORDS;
      for (const it of segments) {
        if (it.left > right || it.right < left || it.top > bottom || it.bottom < top) continue;
        if (cross(leader, it)) sum += LEADER_LINE * it.weight;
      }
      return sum;
    },
  };
};

const overlaps = (a: Box, b: Box, aside: number): boolean =>
  a.left < b.right + aside && b.left - aside < a.right && a.top < b.bottom && b.top < a.bottom;

/** True where a segment touches a box: the part of it within the box's four sides is not empty. */
const meets = (it: Segment, { left, top, right, bottom }: Box): boolean => {
  if (it.right < left || it.left > right || it.bottom < top || it.top > bottom) return false;
  const dx = it.bx - it.ax;
  const dy = it.by - it.ay;
  if (dx === 0 || dy === 0) return true;
  const [p, q] = [(left - it.ax) / dx, (right - it.ax) / dx];
  const [r, s] = [(top - it.ay) / dy, (bottom - it.ay) / dy];
  const start = Math.max(0, Math.min(p, q), Math.min(r, s));
  const end = Math.min(1, Math.max(p, q), Math.max(r, s));
  return start <= end;
};

const cross = (a: Segment, b: Segment): boolean =>
  side(a, b.ax, b.ay) * side(a, b.bx, b.by) < 0 && side(b, a.ax, a.ay) * side(b, a.bx, a.by) < 0;

const side = ({ ax, ay, bx, by }: Segment, x: number, y: number): number => (bx - ax) * (y - ay) - (by - ay) * (x - ax);
