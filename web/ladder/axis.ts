/** A stretch of the kN axis: what stands at its left end and at its right end, and what is written under it. */
export interface Axis {
  readonly from: number;
  readonly to: number;
  /** The end reaction, where a line stands for it. */
  readonly line: number | null;
  readonly ticks: readonly number[];
}

/** Always 0 to 3 V, so that the line never moves; without a reaction, half as far again as the weakest way reaches, and no line. */
export const axisOf = (reaction: number, weakest: number | null): Axis => {
  if (reaction > 0) {
    return { from: 0, to: 3 * reaction, line: reaction, ticks: [0, reaction, 2 * reaction, 3 * reaction] };
  }
  const to = weakest !== null && weakest > 0 ? 1.5 * weakest : 1;
  return { from: 0, to, line: null, ticks: weakest !== null && weakest > 0 ? [0, weakest, to] : [0] };
};

/** From how far below the reaction to how far above it the close-up reaches: a tenth of the axis, the line at the same place. */
const BELOW = 0.1;
const ABOVE = 0.2;

/** The stretch around the reaction at ten times the size, where a way of failing ends within it; null where the axis shows enough. */
export const closeUpOf = (reaction: number, weakest: number | null): Axis | null => {
  if (weakest === null || reaction <= 0) return null;
  const [from, to] = [reaction * (1 - BELOW), reaction * (1 + ABOVE)];
  if (weakest < from || weakest >= to) return null;
  return { from, to, line: reaction, ticks: [from, reaction, reaction * (1 + BELOW), to] };
};

/** Place of a value on an axis, 0 at its left end, 1 at its right end and beyond. */
export const shareOn = ({ from, to }: Axis, value: number): number =>
  Math.min(1, Math.max(0, (value - from) / (to - from)));

/** True for a bar that runs off the axis. */
export const runsOff = ({ to }: Axis, value: number): boolean => value > to * (1 + 1e-9);
