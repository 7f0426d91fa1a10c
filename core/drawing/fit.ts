import type { Drawing, FailurePath } from './drawing.ts';
import type { Laid } from './laid.ts';
import { type LayoutOptions, layoutDrawing } from './layout.ts';

/** The space that a pen has for the drawing, and its text size, in the pen's own unit: px, or mm of paper. */
export interface Window {
  readonly width: number;
  readonly height: number;
  readonly textSize: number;
}

export interface Fitted {
  readonly laid: Laid;
  /** Pen units for one mm of the piece. */
  readonly scale: number;
  /** False where even the smallest scale is too large for the window. */
  readonly fits: boolean;
}

/** Layouts tried before the best one is taken. */
const TURNS = 6;

type Options = Omit<LayoutOptions, 'textHeight'>;

/** Standard scales of a drawing on paper (ISO 5455), the largest first. */
export const paperScales = [1, 1 / 2, 1 / 5, 1 / 10, 1 / 20] as const;

/** The drawing at the largest of the scales at which it fits. */
export const fitToScale = (
  drawing: Drawing,
  window: Window,
  options: Options,
  scales: readonly number[] = paperScales,
  path: FailurePath | null = null,
): Fitted => {
  let last: Fitted | undefined;
  for (const scale of scales) {
    if (!couldFit(drawing, window, scale)) continue;
    last = at(drawing, window, options, scale, path);
    if (last.fits) return last;
  }
  return last ?? at(drawing, window, options, scales.at(-1) ?? 1, path);
};

/** Below this share of the scale at which the bare piece fills the window nothing is left to read, and the drawing is said not to fit. */
const LEAST = 0.3;

/** The drawing as large as the window allows, its text at the text size; `largest` bounds the scale for small pieces. */
export const fitToWindow = (drawing: Drawing, window: Window, options: Options, largest: number): Fitted => {
  const { box } = drawing;
  const [wide, high] = [box.right - box.left, box.bottom - box.top];
  const bare = Math.min(window.width / wide, window.height / high);
  const least = Math.min(largest, LEAST * bare);
  let best: Fitted | undefined;
  let fitted = at(drawing, window, options, Math.min(largest, 0.75 * bare), null);
  for (let turn = 0; turn < TURNS; turn++) {
    if (fitted.fits && fitted.scale > (best?.scale ?? 0)) best = fitted;
    // What stands around the piece is a number of text heights and keeps its size while the piece is scaled.
    const around = rest(fitted, wide, high);
    const exact = Math.min((window.width - around.width) / wide, (window.height - around.height) / high);
    const next = Math.min(largest, Math.max(least, fitted.fits ? exact : Math.min(exact, fitted.scale * 0.97)));
    if (Math.abs(next - fitted.scale) < 0.004 * fitted.scale) break;
    fitted = at(drawing, window, options, next, null);
  }
  if (fitted.fits && fitted.scale > (best?.scale ?? 0)) best = fitted;
  return best ?? fitted;
};

/** Window taken up by all but the piece, in pen units. */
const rest = ({ laid, scale }: Fitted, wide: number, high: number): { width: number; height: number } => ({
  width: (laid.box.right - laid.box.left - wide) * scale,
  height: (laid.box.bottom - laid.box.top - high) * scale,
});

const couldFit = ({ box }: Drawing, { width, height }: Window, scale: number): boolean =>
  (box.right - box.left) * scale <= width && (box.bottom - box.top) * scale <= height;

const at = (drawing: Drawing, window: Window, options: Options, scale: number, path: FailurePath | null): Fitted => {
  const laid = layoutDrawing(drawing, { ...options, textHeight: window.textSize / scale }, path);
  const { left, top, right, bottom } = laid.box;
  const fits = (right - left) * scale <= window.width && (bottom - top) * scale <= window.height;
  return { laid, scale, fits };
};
