import { type Shape, thickness } from '../../../core/shape/shape.ts';

/** Area by 2000 strips between neighbouring changes of the width's law, each by Simpson's rule on a variable that tames the arcs. */
export const stripArea = (shape: Shape, from: number, to: number): number => {
  const stops = [from, ...shape.bands.map((it) => it.bottom).filter((y) => y > from && y < to), to];
  let sum = 0;
  for (const [i, a] of stops.slice(0, -1).entries()) {
    const half = (stops[i + 1]! - a) / 2;
    const n = 2000;
    for (let k = 0; k < n; k++) {
      const turn = ((k + 0.5) / n) * Math.PI;
      sum += thickness(shape, a + half * (1 - Math.cos(turn))) * half * Math.sin(turn) * (Math.PI / n);
    }
  }
  return sum;
};
