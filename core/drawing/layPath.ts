import type { Box, Circle, FailurePath, Point, Tag } from './drawing.ts';
import { hatchLines } from './hatch.ts';
import { drawStroke, type Pad, setLine, widthOf } from './pad.ts';
import { blockBox } from './place.ts';

/** Spacing of the hatch in text heights. */
const HATCH = 0.5;
const OUTSIDE = 25;

/** A way of failing over the piece: areas, lines, and its words where they cover least. */
export const layPath = (pad: Pad, path: FailurePath, holes: readonly Circle[], piece: Box): void => {
  for (const { outline, fill } of path.areas) {
    if (fill === 'black') pad.marks.push({ shape: 'fill', layer: 'path', outline });
    else {
      for (const [from, to] of hatchLines(outline, HATCH * pad.em, holes)) {
        drawStroke(pad, 'path', { kind: 'hatch', from, to: [to] });
      }
    }
  }
  for (const stroke of path.strokes) drawStroke(pad, 'path', stroke);
  for (const { kind, centre, radius, filled } of path.circles) {
    pad.marks.push({ shape: 'circle', layer: 'path', kind, centre, radius, filled: filled ?? false });
  }
  for (const tag of path.tags) layTag(pad, tag, piece);
};

const layTag = (pad: Pad, tag: Tag, piece: Box): void => {
  const line = [{ text: tag.text, role: 'path' }] as const;
  const width = widthOf(pad, line);
  let best: Point | undefined;
  let least = Number.POSITIVE_INFINITY;
  for (const { at, cost } of places(pad, tag, width)) {
    if (cost >= least) continue;
    const box = blockBox(pad, [line], at);
    const whole = cost + (inBox(box, piece) ? 0 : OUTSIDE) + pad.ground.cost(box, undefined, least - cost);
    if (whole < least) [best, least] = [at, whole];
  }
  if (best !== undefined) setLine(pad, 'path', line, best);
};

/** Beside the part it speaks of, on either side, along its whole length; further off at need. */
const places = function* ({ em }: Pad, { along: [a, b] }: Tag, width: number): Generator<{ at: Point; cost: number }> {
  const run = Math.hypot(b.x - a.x, b.y - a.y);
  const spot = run < 1e-9;
  const upright = Math.abs(b.y - a.y) > Math.abs(b.x - a.x);
  for (const away of [0, 0.8, 1.6, 2.6, 4, 6]) {
    for (const share of spot ? [0.5] : [0.5, 0.4, 0.6, 0.3, 0.7, 0.2, 0.8, 0.1, 0.9, 0, 1]) {
      const x = a.x + (b.x - a.x) * share;
      const y = a.y + (b.y - a.y) * share;
      const cost = Math.abs(share - 0.5) * 4 + away * 3;
      const right = { x: x + (0.5 + away) * em, y: y + 0.35 * em };
      const left = { x: x - (0.5 + away) * em - width, y: y + 0.35 * em };
      const below = { x: x - width / 2, y: y + (1.15 + away) * em };
      const above = { x: x - width / 2, y: y - (0.45 + away) * em };
      if (upright || spot) {
        yield { at: right, cost };
        yield { at: left, cost: cost + 0.5 };
      }
      if (!upright || spot) {
        yield { at: below, cost: cost + (spot ? 1 : 0) };
        yield { at: above, cost: cost + 0.5 + (spot ? 1 : 0) };
      }
    }
  }
};

const inBox = (box: Box, piece: Box): boolean =>
  box.left >= piece.left && box.right <= piece.right && box.top >= piece.top && box.bottom <= piece.bottom;
