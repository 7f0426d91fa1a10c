import type { Circle, Point } from './drawing.ts';

/** Lines at 45° across a polygon, `spacing` apart, left out where they would cross the holes. Pairs of end points. */
export const hatchLines = (outline: readonly Point[], spacing: number, holes: readonly Circle[]): [Point, Point][] => {
  const sums = outline.map(({ x, y }) => x + y);
  const step = spacing * Math.SQRT2;
  const lines: [Point, Point][] = [];
  const last = Math.max(...sums);
  for (let k = Math.ceil(Math.min(...sums) / step) * step; k < last; k += step) {
    for (const span of minus(
      inside(outline, k),
      holes.flatMap((hole) => chord(hole, k)),
    )) {
      lines.push([at(k, span[0]), at(k, span[1])]);
    }
  }
  return lines;
};

/** Along x + y = k, stretches of x. */
type Span = readonly [number, number];

const at = (k: number, x: number): Point => ({ x, y: k - x });

const inside = (outline: readonly Point[], k: number): Span[] => {
  const hits: number[] = [];
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    const [p, q] = [a.x + a.y - k, b.x + b.y - k];
    if (p < 0 !== q < 0) hits.push(a.x + ((b.x - a.x) * p) / (p - q));
  });
  hits.sort((a, b) => a - b);
  const spans: Span[] = [];
  for (let i = 1; i < hits.length; i += 2) spans.push([hits[i - 1]!, hits[i]!]);
  return spans;
};

const chord = ({ centre, radius }: Circle, k: number): Span[] => {
  const off = (centre.x + centre.y - k) / Math.SQRT2;
  const half = radius * radius - off * off;
  if (half <= 0) return [];
  const middle = (k + centre.x - centre.y) / 2;
  const reach = Math.sqrt(half) / Math.SQRT2;
  return [[middle - reach, middle + reach]];
};

const minus = (spans: readonly Span[], holes: readonly Span[]): Span[] => {
  let left = [...spans];
  for (const [a, b] of holes) {
    left = left.flatMap(([start, end]): Span[] => {
      if (b <= start || a >= end) return [[start, end]];
      const parts: Span[] = [];
      if (a > start) parts.push([start, a]);
      if (b < end) parts.push([b, end]);
      return parts;
    });
  }
  return left;
};
