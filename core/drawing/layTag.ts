import type { Box, Point, Tag } from './drawing.ts';
import { CAPITAL, drawLine, type Pad, setLine } from './pad.ts';
import { AIR, blockBox } from './place.ts';
import { rings } from './rings.ts';

/** Dislike of words away from the part they speak of, and from its middle, per text height; of a leader; and of words outside the drawing. */
const APART = 1.4;
const MIDDLE = 0.12;
const LEADER = 2;
const OUTSIDE = 25;
/** Words of a path are heavy and may stand on thin lines: share of the weight of lines that counts. */
const OVER_LINES = 0.22;
/** Words this near need no leader, in text heights. */
const NEAR = 0.9;
/** Points of the part that are looked at. */
const POINTS = 9;

/** Words of a path, close to the part they speak of, where they cover least. */
export const layTag = (pad: Pad, { along, text }: Tag, drawing: Box): void => {
  const { em, ground } = pad;
  const line = [{ text, role: 'path' }] as const;
  const own = blockBox(pad, [line], { x: 0, y: 0 });
  const [a, b] = along;
  const middle = { x: (a.x + b.x) / 2 - (own.left + own.right) / 2, y: (a.y + b.y) / 2 - (own.top + own.bottom) / 2 };
  const part = pointsOf(along);
  let best: { at: Point; box: Box; near: Nearest } | undefined;
  let least = Number.POSITIVE_INFINITY;
  const reach = Math.hypot(b.x - a.x, b.y - a.y) / 2 / em;
  for (const spread of [1, Math.max(1, reach / 5)]) {
    for (const { x, y, far } of rings) {
      if (far * spread * MIDDLE >= least) break;
      const at = { x: middle.x + x * spread * em, y: middle.y + y * spread * em };
      const box = { left: at.x + own.left, right: at.x + own.right, top: at.y + own.top, bottom: at.y + own.bottom };
      const near = nearest(part, box, em);
      const before =
        far * spread * MIDDLE +
        near.apart * APART +
        (near.apart > NEAR ? LEADER : 0) +
        (inside(box, drawing) ? 0 : OUTSIDE);
      if (before >= least) continue;
      let cost = before + ground.cost(box, undefined, least - before, OVER_LINES);
      if (near.apart > NEAR && cost < least) cost += ground.crossing(leaderStart(pad, box, near.point), near.point);
      if (cost < least) [best, least] = [{ at, box, near }, cost];
    }
  }
  if (best === undefined) return;
  if (best.near.apart > NEAR) drawLine(pad, 'path', leaderStart(pad, best.box, best.near.point), best.near.point);
  setLine(pad, 'path', line, best.at);
};

interface Nearest {
  /** Distance in text heights. */
  readonly apart: number;
  readonly point: Point;
}

const pointsOf = ([a, b]: Tag['along']): Point[] =>
  Array.from({ length: POINTS }, (_, i) => ({
    x: a.x + ((b.x - a.x) * i) / (POINTS - 1),
    y: a.y + ((b.y - a.y) * i) / (POINTS - 1),
  }));

const nearest = (part: readonly Point[], box: Box, em: number): Nearest => {
  let apart = Number.POSITIVE_INFINITY;
  let point = part[0]!;
  for (const it of part) {
    const dx = Math.max(box.left - it.x, 0, it.x - box.right);
    const dy = Math.max(box.top - it.y, 0, it.y - box.bottom);
    const far = Math.hypot(dx, dy) / em;
    if (far < apart) [apart, point] = [far, it];
  }
  return { apart, point };
};

const leaderStart = ({ em }: Pad, box: Box, to: Point): Point => {
  const beside = to.x < box.left || to.x > box.right;
  const x = to.x < box.left ? box.left : to.x > box.right ? box.right : (box.left + box.right) / 2;
  return { x, y: beside ? box.top + (AIR + CAPITAL / 2) * em : to.y < box.top ? box.top : box.bottom };
};

const inside = (box: Box, drawing: Box): boolean =>
  box.left >= drawing.left && box.right <= drawing.right && box.top >= drawing.top && box.bottom <= drawing.bottom;
