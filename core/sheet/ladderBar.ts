import type { Check } from '../check/report.ts';
import type { Pen } from './pen.ts';
import { isClose } from './sign.ts';

/** The axis ends at 3 V; a bar that goes on is broken off a little beyond. */
const END = 3;
const BEYOND = 1.4;

/** Where a bar stands: its left edge and its middle, and what the reaction V takes on the axis; mm. */
export interface BarPlace {
  readonly x: number;
  readonly y: number;
  readonly height: number;
  readonly perV: number;
}

/** The reaction at which a check fails, as a bar; the axis counts in the reaction V, in the same unit. */
export const drawBar = (
  pen: Pen,
  { x, y, height, perV }: BarPlace,
  reaction: number,
  { reactionAtFailure, state, utilisation }: Check,
  governs: boolean,
): void => {
  // Without a reaction the axis has no length.
  if (reactionAtFailure === null || reactionAtFailure === undefined || reaction <= 0) return;
  const times = reactionAtFailure / reaction;
  const beyond = times > END;
  const length = beyond ? END * perV + BEYOND : times * perV;
  const top = y - height / 2;
  if (state === 'fails') {
    pen.box(x, top, Math.max(length, 0.4), height, { fill: 'black' });
    return;
  }
  const width = governs ? 0.35 : 0.2;
  const style = state === 'refer' ? { width: 0.25, dash: [1, 0.7] } : { width };
  if (beyond) drawBroken(pen, { x, top, length, height }, style);
  else pen.box(x, top, length, height, style);
  if (state === 'holds' && isClose(utilisation)) pen.box(x, y, length, height / 2, { fill: 'black' });
};

interface Bar {
  readonly x: number;
  readonly top: number;
  readonly length: number;
  readonly height: number;
}

/** Open to the right, with the zigzag of a break. */
const drawBroken = (
  pen: Pen,
  { x, top, length, height }: Bar,
  style: { width: number; dash?: readonly number[] },
): void => {
  const right = x + length;
  const zig = 0.225 * height;
  const bottom = top + height;
  const over = 0.2 * height;
  pen.path(
    { x: right, y: top },
    [
      { x, y: top },
      { x, y: bottom },
      { x: right, y: bottom },
    ],
    style,
  );
  const middle = (top + bottom) / 2;
  const zigzag = [
    { x: right, y: middle - zig },
    { x: right + zig, y: middle - zig / 2 },
    { x: right - zig, y: middle + zig / 2 },
    { x: right, y: middle + zig },
    { x: right, y: bottom + over },
  ];
  pen.path({ x: right, y: top - over }, zigzag, { width: style.width });
};
