import type { Box, Point, Stroke } from '../drawing.ts';

/** What can be seen of the edges of a rectangle behind the boxes: hidden parts are left out, as in every section. */
export const seenEdges = ({ left, top, right, bottom }: Box, boxes: readonly Box[]): Stroke[] => [
  ...seen({ x: left, y: top }, { x: right, y: top }, boxes),
  ...seen({ x: right, y: top }, { x: right, y: bottom }, boxes),
  ...seen({ x: left, y: bottom }, { x: right, y: bottom }, boxes),
  ...seen({ x: left, y: top }, { x: left, y: bottom }, boxes),
];

/** A straight edge along an axis, to the right or down. */
const seen = (from: Point, to: Point, boxes: readonly Box[]): Stroke[] => {
  const level = from.y === to.y;
  const [start, end] = level ? [from.x, to.x] : [from.y, to.y];
  const at = (s: number): Point => (level ? { x: s, y: from.y } : { x: from.x, y: s });
  const covers = boxes
    .filter((it) => (level ? it.top < from.y && from.y < it.bottom : it.left < from.x && from.x < it.right))
    .map((it): [number, number] => (level ? [it.left, it.right] : [it.top, it.bottom]))
    .sort((a, b) => a[0] - b[0]);
  const strokes: Stroke[] = [];
  let open = start;
  for (const [a, b] of [...covers, [end, end] as const]) {
    if (Math.min(a, end) - open > 1e-9) {
      strokes.push({ kind: 'outline', from: at(open), to: [at(Math.min(a, end))] });
    }
    open = Math.max(open, b);
  }
  return strokes;
};
