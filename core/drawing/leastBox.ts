import type { Box, View } from './drawing.ts';
import { extension } from './extensions.ts';
import { intoLanes } from './lanes.ts';
import { arrowOf } from './layFace.ts';
import { AIR, type LayoutOptions } from './layout.ts';
import { condensed } from './measure.ts';
import { createPad } from './pad.ts';

/**
 * A box within every layout of the drawing, mm of the piece: piece, dimension lines, support's face and reaction, no words. It takes a
 * small part of the time of a layout, and scales at which the drawing cannot stand need no more.
 */
export const leastBox = (view: View, { textHeight, measure, values }: LayoutOptions): Box => {
  const pad = createPad(textHeight, measure ?? condensed, values);
  const placed = intoLanes(pad, view.dimensions);
  const lines = placed.flatMap((it) => [it.dimension.from, it.dimension.to].map((point) => extension(pad, it, point)));
  const along = (axis: 'x' | 'y'): number[] =>
    lines.flatMap((line) => (line.axis === axis ? [line.level] : [line.start, line.end]));
  const { box, face } = view;
  const { head, tail } = face ? arrowOf(pad, face, placed) : { head: box.top, tail: box.bottom };
  const { left, top, right, bottom } = box;
  const air = AIR * pad.em;
  return {
    left: Math.min(left, face?.x ?? left, ...along('x')) - air,
    top: Math.min(top, head, ...along('y')) - air,
    right: Math.max(right, ...along('x')) + air,
    bottom: Math.max(bottom, tail, ...along('y')) + air,
  };
};
