import type { Dimension, Point } from './drawing.ts';
import type { Placed } from './lanes.ts';

const ends = ({ axis, from, to }: Dimension): [number, number] => [from[axis], to[axis]];

/** Where a dimension line starts and ends along its axis, mm. */
export const startOf = ({ dimension }: Placed): number => Math.min(...ends(dimension));
export const endOf = ({ dimension }: Placed): number => Math.max(...ends(dimension));

export const pointOn = ({ dimension, level }: Placed, along: number): Point =>
  dimension.axis === 'x' ? { x: along, y: level } : { x: level, y: along };

export const middleOf = (it: Placed): Point => pointOn(it, (startOf(it) + endOf(it)) / 2);

/** True where another line of the same chain, not further off than `near`, lies within the span: a value that stands there is read as that one's. */
export const overAnother = (
  it: Placed,
  [from, to]: readonly [number, number],
  placed: readonly Placed[],
  near: number,
): boolean =>
  placed.some(
    (other) =>
      other !== it &&
      other.dimension.axis === it.dimension.axis &&
      Math.abs(other.level - it.level) < near &&
      startOf(other) < to - 1e-6 &&
      endOf(other) > from + 1e-6,
  );
