import type { Arc, Point } from './drawing.ts';

/** An arc by its centre; angles in radians, x toward y, so that a positive sweep is clockwise as seen. */
export interface Swept {
  readonly centre: Point;
  readonly radius: number;
  readonly start: number;
  readonly sweep: number;
}

export const isArc = (step: Point | Arc): step is Arc => 'to' in step;
export const endOf = (step: Point | Arc): Point => (isArc(step) ? step.to : step);

/** Centre and angles of an arc of at most a half circle; null where the radius is too small to span it, which then is a straight line. */
export const swept = (from: Point, { to, radius, clockwise }: Arc): Swept | null => {
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const half = Math.hypot(dx, dy) / 2;
  if (half < 1e-9 || radius < half * (1 - 1e-9)) return null;
  const off = Math.sqrt(Math.max(0, radius * radius - half * half)) * (clockwise ? 1 : -1);
  const centre = {
    x: from.x + dx / 2 - (off * dy) / (2 * half),
    y: from.y + dy / 2 + (off * dx) / (2 * half),
  };
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  const end = Math.atan2(to.y - centre.y, to.x - centre.x);
  const turn = clockwise ? end - start : start - end;
  const positive = ((turn % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
  return { centre, radius, start, sweep: clockwise ? positive : -positive };
};

/** A run as a polyline: arcs become chords of about a tenth of a turn. */
export const chords = (from: Point, to: readonly (Point | Arc)[], closed = false): Point[] => {
  const points: Point[] = [from];
  for (const step of to) {
    const it = isArc(step) ? swept(points.at(-1)!, step) : null;
    if (it !== null) {
      const count = Math.max(2, Math.ceil(Math.abs(it.sweep) / 0.6));
      for (let i = 1; i < count; i++) points.push(onArc(it, it.start + (it.sweep * i) / count));
    }
    points.push(endOf(step));
  }
  if (closed) points.push(from);
  return points;
};

const onArc = ({ centre, radius }: Swept, angle: number): Point => ({
  x: centre.x + radius * Math.cos(angle),
  y: centre.y + radius * Math.sin(angle),
});
