import type { Box, Point, Tag } from './drawing.ts';
import { CAPITAL, drawLine, keepOff, type Pad, setLine } from './pad.ts';
import { AIR, blockBox, move } from './place.ts';
import { rings } from './rings.ts';

/** Dislike of words away from the part they speak of, and from its middle, per text height; of a leader; and of words outside the drawing. */
const APART = 1;
const MIDDLE = 0.12;
const LEADER = 2;
const OUTSIDE = 25;
/** How much more than other words these keep off a line: a force with a line through it is misread. */
const STRUCK = 8;
/** Words this near need no leader, in text heights. */
const NEAR = 0.9;
/** How much other words keep off a leader. */
const LINE = 8;
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
  let best: { at: Point; box: Box; apart: number; point: Point } | undefined;
  let least = Number.POSITIVE_INFINITY;
  const reach = Math.hypot(b.x - a.x, b.y - a.y) / 2 / em;
  // One box for all places tried: they are many.
  const box = { left: 0, top: 0, right: 0, bottom: 0 };
  for (const spread of [1, Math.max(1, reach / 5)]) {
    for (const { x, y, far } of rings) {
      const walk = far * spread * MIDDLE;
      if (walk >= least) break;
      const [left, top] = [middle.x + x * spread * em, middle.y + y * spread * em];
      move(box, own, left, top);
      const outside = inside(box, drawing) ? 0 : OUTSIDE;
      if (walk + outside >= least) continue;
      const point = nearest(part, box);
      const apart = apartOf(point, box) / em;
      const before = walk + apart * APART + (apart > NEAR ? LEADER : 0) + outside;
      if (before >= least) continue;
      let cost = before + STRUCK * ground.cost(box, undefined, (least - before) / STRUCK);
      if (apart > NEAR && cost < least) cost += ground.crossing(leaderStart(pad, box, point), point);
      if (cost < least) [best, least] = [{ at: { x: left, y: top }, box: { ...box }, apart, point }, cost];
    }
  }
  if (best === undefined) return;
  if (best.apart > NEAR) {
    const start = leaderStart(pad, best.box, best.point);
    drawLine(pad, 'path', start, best.point);
    keepOff(pad, [start, best.point], LINE);
  }
  setLine(pad, 'path', line, best.at);
};

const pointsOf = ([a, b]: Tag['along']): Point[] =>
  Array.from({ length: POINTS }, (_, i) => ({
    x: a.x + ((b.x - a.x) * i) / (POINTS - 1),
    y: a.y + ((b.y - a.y) * i) / (POINTS - 1),
  }));

/** Square of the distance between a point and a box. */
const squareOf = ({ x, y }: Point, { left, top, right, bottom }: Box): number => {
  const dx = x < left ? left - x : x > right ? x - right : 0;
  const dy = y < top ? top - y : y > bottom ? y - bottom : 0;
  return dx * dx + dy * dy;
};

const apartOf = (point: Point, box: Box): number => Math.sqrt(squareOf(point, box));

const nearest = (part: readonly Point[], box: Box): Point => {
  let best = part[0]!;
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i < part.length; i++) {
    const square = squareOf(part[i]!, box);
    if (square < least) [best, least] = [part[i]!, square];
  }
  return best;
};

const leaderStart = ({ em }: Pad, box: Box, to: Point): Point => {
  const beside = to.x < box.left || to.x > box.right;
  const x = to.x < box.left ? box.left : to.x > box.right ? box.right : (box.left + box.right) / 2;
  return { x, y: beside ? box.top + (AIR + CAPITAL / 2) * em : to.y < box.top ? box.top : box.bottom };
};

const inside = (box: Box, drawing: Box): boolean =>
  box.left >= drawing.left && box.right <= drawing.right && box.top >= drawing.top && box.bottom <= drawing.bottom;
