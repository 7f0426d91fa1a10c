import type { Point, Stroke } from './drawing.ts';

/** Spacing of the strokes across a weld, in legs. */
const SPACING = 1.2;
const MOST = 60;

/** A weld along an edge: short slanting strokes as wide as its leg, to the side that `across` points to; `across` has length 1. */
export const seam = (from: Point, to: Point, across: Point, leg: number): Stroke[] => {
  const run = Math.hypot(to.x - from.x, to.y - from.y);
  if (run < 1e-9 || leg <= 0) return [];
  const [ux, uy] = [(to.x - from.x) / run, (to.y - from.y) / run];
  const count = Math.min(MOST, Math.max(1, Math.floor(run / (SPACING * leg))));
  return Array.from({ length: count }, (_, i): Stroke => {
    const s = ((i + 0.5) * run) / count;
    const foot = { x: from.x + ux * s, y: from.y + uy * s };
    return { kind: 'hatch', from: foot, to: [{ x: foot.x + across.x * leg, y: foot.y + across.y * leg }] };
  });
};
