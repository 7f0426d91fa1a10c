import { isArc } from '../drawing/arcs.ts';
import type { Arc, Point } from '../drawing/drawing.ts';
import type { Laid, Mark } from '../drawing/laid.ts';

/** A box on the paper, mm from the figure's upper left corner. */
export interface PaperBox {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Air around what stands beside a drawing, mm. */
export const AIR = 1.5;

/** The boxes of all marks on the paper, at 1:`scale`. */
export const paperBoxes = ({ marks, box }: Laid, scale: number): PaperBox[] =>
  marks.map((mark) => {
    const { left, right, top, bottom } = boxOf(mark);
    return {
      left: (left - box.left) / scale,
      right: (right - box.left) / scale,
      top: (top - box.top) / scale,
      bottom: (bottom - box.top) / scale,
    };
  });

/** Top of the lowest stretch of this height, above `floor`, that no box right of x enters; null where there is none. */
export const freeAbove = (boxes: readonly PaperBox[], x: number, height: number, floor: number): number | null => {
  const spans = boxes.filter(({ right }) => right > x - AIR).sort((a, b) => b.bottom - a.bottom);
  let low = floor;
  for (const { top, bottom } of spans) {
    if (low - height >= bottom + AIR) break;
    low = Math.min(low, top - AIR);
  }
  return low - height >= 0 ? low - height : null;
};

/** Lowest edge of the boxes that reach to the right of x. */
export const lowestRightOf = (boxes: readonly PaperBox[], x: number): number =>
  Math.max(0, ...boxes.filter(({ right }) => right > x - AIR).map(({ bottom }) => bottom));

const boxOf = (mark: Mark): PaperBox => {
  if (mark.shape === 'text') return mark.box;
  if (mark.shape === 'circle') {
    const { centre, radius } = mark;
    return {
      left: centre.x - radius,
      right: centre.x + radius,
      top: centre.y - radius,
      bottom: centre.y + radius,
    };
  }
  const points = mark.shape === 'fill' ? mark.outline : [mark.from, ...mark.to.map(endOf)];
  const xs = points.map((p) => p.x);
  const ys = points.map((p) => p.y);
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
};

const endOf = (step: Point | Arc): Point => (isArc(step) ? step.to : step);
