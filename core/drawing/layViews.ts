import { isArc } from './arcs.ts';
import type { Arc, Box, FailurePath, Point, View } from './drawing.ts';
import type { Laid, Mark } from './laid.ts';
import { type LayoutOptions, layoutDrawing } from './layout.ts';
import { condensed } from './measure.ts';
import { createPad, setLine, widthOf } from './pad.ts';

/** In text heights: between two views, and the titles over them. */
const BETWEEN = 0.5;
const TITLE = 1.2;

/** Several views side by side on their own levels, a title over each; one alone stands without a title. */
export const layViews = (
  views: readonly [View, ...View[]],
  options: LayoutOptions,
  path: FailurePath | null = null,
): Laid => {
  const [first, ...others] = views.map((view) => layoutDrawing(view, options, path)) as [Laid, ...Laid[]];
  if (others.length === 0) return first;
  const em = options.textHeight;
  let { left, top, right, bottom } = first.box;
  const places = [{ laid: first, shift: 0 }];
  for (const laid of others) {
    const shift = right + BETWEEN * em - laid.box.left;
    places.push({ laid, shift });
    top = Math.min(top, laid.box.top);
    bottom = Math.max(bottom, laid.box.bottom);
    right = laid.box.right + shift;
  }
  const pad = createPad(em, options.measure ?? condensed, options.values);
  places.forEach(({ laid, shift }, i) => {
    const { title, box } = views[i]!;
    const middle = (box.left + box.right) / 2 + shift;
    const half = widthOf(pad, title) / 2;
    const x = Math.min(Math.max(middle, laid.box.left + shift + half), laid.box.right + shift - half);
    setLine(pad, 'words', title, { x: x - half, y: top - 0.3 * em });
    right = Math.max(right, x + half);
    left = Math.min(left, x - half);
  });
  return {
    marks: [...places.flatMap(({ laid, shift }) => laid.marks.map((mark) => moved(mark, shift))), ...pad.marks],
    box: { left, top: top - TITLE * em, right, bottom },
    textHeight: em,
  };
};

/** The bare pieces of the views beside each other: what a layout takes without its words, mm. */
export const boxOfViews = (views: readonly [View, ...View[]]): Box => {
  const boxes = views.map(({ box }) => box);
  const wide = boxes.reduce((sum, { left, right }) => sum + right - left, 0);
  const { left } = boxes[0]!;
  return {
    left,
    right: left + wide,
    top: Math.min(...boxes.map((one) => one.top)),
    bottom: Math.max(...boxes.map((one) => one.bottom)),
  };
};

const moved = (mark: Mark, by: number): Mark => {
  if (by === 0) return mark;
  const at = ({ x, y }: Point): Point => ({ x: x + by, y });
  const step = (one: Point | Arc): Point | Arc => (isArc(one) ? { ...one, to: at(one.to) } : at(one));
  switch (mark.shape) {
    case 'run':
      return { ...mark, from: at(mark.from), to: mark.to.map(step) };
    case 'fill':
      return { ...mark, outline: mark.outline.map(at) };
    case 'circle':
      return { ...mark, centre: at(mark.centre) };
    case 'text': {
      const { left, right, ...rest } = mark.box;
      return { ...mark, at: at(mark.at), box: { ...rest, left: left + by, right: right + by } };
    }
  }
};
