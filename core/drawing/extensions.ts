import type { Point } from './drawing.ts';
import type { Placed } from './lanes.ts';
import { drawLine, keepOff, type Pad } from './pad.ts';

/** Gap between the piece and its extension line, and how far that runs past the dimension line, in text heights. */
const GAP = 0.22;
const PAST = 0.5;
const WEIGHT = 6;

/** A line from a point of the piece past a dimension line: where it lies, and from where to where it runs, mm. */
export interface Extension {
  /** Of the dimension; the line runs across it. */
  readonly axis: 'x' | 'y';
  /** The coordinate that the line marks. */
  readonly level: number;
  readonly start: number;
  readonly end: number;
}

/** Extension lines of all dimensions; lines that would lie on each other are drawn as one. */
export const layExtensions = (pad: Pad, placed: readonly Placed[]): void => {
  const lines = new Map<string, Extension[]>();
  for (const it of placed) {
    for (const point of [it.dimension.from, it.dimension.to]) {
      const line = extension(pad, it, point);
      const key = `${line.axis} ${line.level.toFixed(6)}`;
      lines.set(key, [...(lines.get(key) ?? []), line]);
    }
  }
  for (const group of lines.values()) for (const line of merged(group)) draw(pad, line);
};

export const extension = ({ em }: Pad, { dimension, level }: Placed, point: Point): Extension => {
  const { axis } = dimension;
  const foot = axis === 'x' ? point.y : point.x;
  const out = Math.sign(level - foot);
  const [a, b] = [foot + out * GAP * em, level + out * PAST * em];
  return { axis, level: point[axis], start: Math.min(a, b), end: Math.max(a, b) };
};

const merged = (group: readonly Extension[]): Extension[] => {
  const sorted = [...group].sort((a, b) => a.start - b.start);
  const kept: Extension[] = [];
  for (const it of sorted) {
    const last = kept.at(-1);
    if (last !== undefined && it.start <= last.end)
      kept[kept.length - 1] = { ...last, end: Math.max(last.end, it.end) };
    else kept.push(it);
  }
  return kept;
};

const draw = (pad: Pad, { axis, level, start, end }: Extension): void => {
  const at = (along: number): Point => (axis === 'x' ? { x: level, y: along } : { x: along, y: level });
  drawLine(pad, 'size', at(start), at(end));
  keepOff(pad, [at(start), at(end)], WEIGHT);
};
