import { chords } from '../../../core/drawing/arcs.ts';
import type { Box, Point } from '../../../core/drawing/drawing.ts';
import type { Laid, LaidText, Mark } from '../../../core/drawing/laid.ts';

/** Points that a mark reaches. */
export const pointsOf = (mark: Mark): Point[] => {
  if (mark.shape === 'run') return chords(mark.from, mark.to, mark.closed);
  if (mark.shape === 'fill') return [...mark.outline];
  if (mark.shape === 'text') {
    const { left, top, right, bottom } = mark.box;
    return [mark.at, { x: left, y: top }, { x: right, y: bottom }];
  }
  const { centre, radius } = mark;
  return [
    { x: centre.x - radius, y: centre.y - radius },
    { x: centre.x + radius, y: centre.y + radius },
  ];
};

export const textsOf = ({ marks }: Laid): LaidText[] => marks.filter((it) => it.shape === 'text');

export const contains = (box: Box, { x, y }: Point): boolean =>
  x >= box.left && x <= box.right && y >= box.top && y <= box.bottom;

/** True where two boxes share more than a hair, mm. */
export const collide = (a: Box, b: Box): boolean =>
  Math.min(a.right, b.right) - Math.max(a.left, b.left) > 1e-6 &&
  Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top) > 1e-6;
