import { isArc } from '../drawing/arcs.ts';
import type { Point } from '../drawing/drawing.ts';
import type { LaidText, Mark } from '../drawing/laid.ts';
import { dashes, widths } from '../drawing/toSvg.ts';
import type { Context } from './context.ts';
import { HAIR, NARROW, WIDE } from './page.ts';
import { POINT, type Spot, type TextStyle } from './pen.ts';
import { plainRun } from './textBlock.ts';

/** One mark of a laid drawing on the paper; `place` takes it there, at 1:`scale`. */
export const drawMark = (context: Context, mark: Mark, place: (p: Point) => Spot, scale: number): void => {
  const { pen } = context;
  switch (mark.shape) {
    case 'text':
      drawWord(context, mark, place, scale);
      return;
    case 'fill': {
      const [from, ...to] = mark.outline.map(place);
      if (from) pen.path(from, to, { fill: 'black', closed: true });
      return;
    }
    case 'circle': {
      const { x, y } = place(mark.centre);
      const style = mark.filled ? { fill: 'black' as const } : { width: widthOf(mark.kind) };
      pen.circle(x, y, mark.radius / scale, style);
      return;
    }
    case 'run': {
      const to = mark.to.map((step) =>
        isArc(step) ? { ...place(step.to), radius: step.radius / scale, clockwise: step.clockwise } : place(step),
      );
      const dash = dashes[mark.kind]?.map((one) => one * NARROW);
      const width = mark.tick ? WIDE : widthOf(mark.kind);
      pen.path(place(mark.from), to, { width, closed: mark.closed, ...(dash && { dash }) });
    }
  }
};

const widthOf = (kind: keyof typeof widths): number => Math.max(HAIR, widths[kind] * NARROW);

const drawWord = ({ pen, numbers }: Context, mark: LaidText, place: (p: Point) => Spot, scale: number): void => {
  const { x, y } = place(mark.at);
  const text = numbers.marked(mark.text);
  const style: TextStyle = {
    size: mark.size / scale / POINT,
    family: 'narrow',
    bold: mark.role === 'path',
    anchor: mark.anchor,
    turned: mark.rotation !== 0,
  };
  pen.text(x, y, mark.italic ? [{ text, italic: true, sub: false }] : [plainRun(text)], style);
};
