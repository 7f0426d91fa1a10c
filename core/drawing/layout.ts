import type { FailurePath, View } from './drawing.ts';
import type { Laid, Mark } from './laid.ts';
import { layCallouts } from './layCallouts.ts';
import { layDimensions } from './layDimensions.ts';
import { layFace } from './layFace.ts';
import { layPathLines, layTags } from './layPath.ts';
import { layPiece } from './layPiece.ts';
import { layWeld } from './layWeld.ts';
import { condensed, type Measure } from './measure.ts';
import { boxOf, createPad, keepOff } from './pad.ts';

export interface LayoutOptions {
  /** Text size (em), mm of the piece: what the pen's text size is at the scale it draws to. */
  readonly textHeight: number;
  /** Values upright in a gap of the dimension line, as fields on the bench; or above and parallel to it, as on paper. */
  readonly values: 'gap' | 'parallel';
  /** Width of a text in the pen's own font. */
  readonly measure?: Measure;
  /** True where one path is shown for good, as on paper: words keep off it. Else it is laid over the drawing and moves nothing of it. */
  readonly pathStays?: boolean;
}

/** How much words keep off lines where paths will run. */
const CLEAR = 2.5;
/** Air around the drawing, in text heights. */
export const AIR = 0.35;

/**
 * Gives every line and word of one view its place, the same for every pen. The box holds the view, and the path's words where these had
 * to stand outside. A path that belongs to another view is left out.
 */
export const layoutDrawing = (drawing: View, options: LayoutOptions, shown: FailurePath | null = null): Laid => {
  const path = (shown?.view ?? 'side') === drawing.name ? shown : null;
  const pad = createPad(options.textHeight, options.measure ?? condensed, options.values);
  const { pathStays = false } = options;
  layPiece(pad, drawing);
  if (path !== null && pathStays) layPathLines(pad, path, drawing.holes);
  const placed = layDimensions(pad, drawing);
  layFace(pad, drawing, placed);
  if (path !== null && pathStays) layTags(pad, path.tags);
  for (const line of drawing.keptClear) keepOff(pad, line, CLEAR);
  if (drawing.weld !== null) layWeld(pad, drawing.weld);
  layCallouts(pad, drawing.callouts, drawing.beam);
  if (path !== null && !pathStays) layTags(pad, layPathLines(pad, path, drawing.holes));
  const { left, top, right, bottom } = boxOf(pad.marks);
  const air = AIR * pad.em;
  return {
    marks: inOrder(pad.marks),
    box: { left: left - air, top: top - air, right: right + air, bottom: bottom + air },
    textHeight: pad.em,
  };
};

/** Words over lines, whatever was laid first. */
const inOrder = (marks: readonly Mark[]): Mark[] => [
  ...marks.filter((it) => it.shape !== 'text'),
  ...marks.filter((it) => it.shape === 'text'),
];
