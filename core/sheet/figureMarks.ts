import { isArc } from '../drawing/arcs.ts';
import type { Point } from '../drawing/drawing.ts';
import type { LaidText, Mark } from '../drawing/laid.ts';
import { dashes, widths } from '../drawing/toSvg.ts';
import type { Context } from './context.ts';
import { HAIR, NARROW, WIDE } from './page.ts';
import { POINT, type Spot, type TextStyle } from './pen.ts';
import { plainRun } from './textBlock.ts';

/** Marks of a laid drawing on the paper; lines give way where words must stand on them. */
export const drawMarks = (context: Context, marks: readonly Mark[], place: (p: Point) => Spot, scale: number): void => {
  const words = marks.filter((mark) => mark.shape === 'text');
  for (const mark of marks) if (mark.shape !== 'text') drawMark(context, mark, place, scale);
  for (const { box } of words) {
    const [from, to] = [place({ x: box.left, y: box.top }), place({ x: box.right, y: box.bottom })];
    context.pen.box(from.x, from.y, to.x - from.x, to.y - from.y, { fill: 'white' });
  }
  for (const mark of words) drawWord(context, mark, place, scale);
};

/** One line, area or hole; `place` takes it to the paper, at 1:`scale`. */
const drawMark = ({ pen }: Context, mark: Exclude<Mark, LaidText>, place: (p: Point) => Spot, scale: number): void => {
  switch (mark.shape) {
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
