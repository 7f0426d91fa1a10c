import type { Facts } from '../end/facts.ts';
import { lastColumnX } from './bolts.ts';
import type { Box, Point, Stroke } from './drawing.ts';
import { behindWeb } from './outline.ts';

/** Plate, ply or a cleat's web leg, from the support's face to its free edge; of an end plate, which fills the setback, its edge. */
export const plateBox = (it: Facts): Box => ({
  left: -it.g,
  top: it.yp,
  right: freeEdge(it),
  bottom: it.yp + it.hp,
});

const freeEdge = (it: Facts): number => {
  if (it.bp > 0) return 0;
  return it.legWeb > 0 ? it.legWeb - it.g : lastColumnX(it) + it.ex;
};

/** Edges of a plate on the far side: dashed where the web hides them, else in full. The edge at the support is the support's own line. */
export const plateEdges = (it: Facts): Stroke[] => {
  const { left, top, right, bottom } = plateBox(it);
  return [
    ...edge(it, { x: left, y: top }, { x: right, y: top }),
    ...edge(it, { x: right, y: top }, { x: right, y: bottom }),
    ...edge(it, { x: left, y: bottom }, { x: right, y: bottom }),
  ];
};

const edge = (it: Facts, from: Point, to: Point): Stroke[] => {
  const at = (s: number): Point => ({ x: from.x + (to.x - from.x) * s, y: from.y + (to.y - from.y) * s });
  const stops = [0, 1, ...crossings(it, from, to)].filter((s) => s >= 0 && s <= 1).sort((a, b) => a - b);
  const parts: { start: number; end: number; hidden: boolean }[] = [];
  for (let i = 1; i < stops.length; i++) {
    const [start, end] = [stops[i - 1]!, stops[i]!];
    if (end - start < 1e-9) continue;
    const hidden = behindWeb(it, at((start + end) / 2));
    const last = parts.at(-1);
    if (last?.hidden === hidden) last.end = end;
    else parts.push({ start, end, hidden });
  }
  return parts.map(({ start, end, hidden }) => ({
    kind: hidden ? 'hidden' : 'outline',
    from: at(start),
    to: [at(end)],
  }));
};

/** Where an upright or level edge may pass from free to hidden: at the beam's end, and at the faces and edges of the copes. */
const crossings = (it: Facts, from: Point, to: Point): number[] =>
  from.x === to.x
    ? [0, it.dt, it.h - it.db, it.h].map((y) => (y - from.y) / (to.y - from.y || 1))
    : [0, it.ct, it.cb].map((x) => (x - from.x) / (to.x - from.x || 1));
