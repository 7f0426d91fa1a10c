import type { Check } from '../check/report.ts';
import type { Pen } from './pen.ts';
import { isClose } from './sign.ts';

/** mm that the reaction V takes on the axis, which ends at 3 V; a bar that goes on is broken off. */
export const PER_V = 8.5;
const END = 3 * PER_V;
const BROKEN = END + 1.4;

/** The reaction at which a check fails, as a bar from x along the row's middle y. */
export const drawBar = (
  pen: Pen,
  x: number,
  y: number,
  reaction: number,
  { reactionAtFailure, state, utilisation }: Check,
  governs: boolean,
): void => {
  // The axis counts in V: without a reaction it has no length.
  if (reactionAtFailure === null || reactionAtFailure === undefined || reaction <= 0) return;
  const times = reactionAtFailure / reaction;
  const beyond = times > 3;
  const length = beyond ? BROKEN : times * PER_V;
  const height = governs ? 2.5 : 2;
  const top = y - height / 2;
  if (state === 'fails') {
    pen.box(x, top, Math.max(length, 0.4), height, { fill: 'black' });
    return;
  }
  const width = governs ? 0.35 : 0.2;
  const style = state === 'refer' ? { width: 0.25, dash: [1, 0.7] } : { width };
  if (beyond) drawBroken(pen, x, top, height, style);
  else pen.box(x, top, length, height, style);
  if (state === 'holds' && isClose(utilisation)) pen.box(x, y, length, height / 2, { fill: 'black' });
};

/** Open to the right, with the zigzag of a break. */
const drawBroken = (
  pen: Pen,
  x: number,
  top: number,
  height: number,
  style: { width: number; dash?: readonly number[] },
): void => {
  const right = x + BROKEN;
  const zig = 0.45;
  const bottom = top + height;
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
    { x: right, y: bottom + 0.4 },
  ];
  pen.path({ x: right, y: top - 0.4 }, zigzag, { width: style.width });
};
