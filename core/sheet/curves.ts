import type { ArcTo, Spot } from './pen.ts';

/** Control points of the cubic curve that follows an arc of at most a quarter circle within 0.03 %. */
const quarter = (centre: Spot, radius: number, from: number, to: number): [Spot, Spot, Spot] => {
  const k = (4 / 3) * Math.tan((to - from) / 4) * radius;
  const on = (angle: number): Spot => ({
    x: centre.x + radius * Math.cos(angle),
    y: centre.y + radius * Math.sin(angle),
  });
  const [a, b] = [on(from), on(to)];
  return [
    { x: a.x - k * Math.sin(from), y: a.y + k * Math.cos(from) },
    { x: b.x + k * Math.sin(to), y: b.y - k * Math.cos(to) },
    b,
  ];
};

/** An arc as cubic curves. With y down, clockwise as seen means growing angles. */
export const curvesOf = (from: Spot, arc: ArcTo): [Spot, Spot, Spot][] => {
  const [dx, dy] = [arc.x - from.x, arc.y - from.y];
  const chord = Math.hypot(dx, dy);
  if (chord === 0) return [];
  const radius = Math.max(arc.radius, chord / 2);
  const side = (arc.clockwise ? 1 : -1) * Math.sqrt(Math.max(0, radius ** 2 - chord ** 2 / 4));
  const centre = { x: from.x + dx / 2 - (side * dy) / chord, y: from.y + dy / 2 + (side * dx) / chord };
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  let turn = Math.atan2(arc.y - centre.y, arc.x - centre.x) - start;
  if (arc.clockwise && turn < 0) turn += 2 * Math.PI;
  if (!arc.clockwise && turn > 0) turn -= 2 * Math.PI;
  const parts = Math.max(1, Math.ceil(Math.abs(turn) / (Math.PI / 2) - 1e-9));
  return Array.from({ length: parts }, (_, i) =>
    quarter(centre, radius, start + (turn * i) / parts, start + (turn * (i + 1)) / parts),
  );
};
