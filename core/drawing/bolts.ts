import type { Facts } from '../end/facts.ts';
import type { Circle, Point, Stroke } from './drawing.ts';

/** Half-length of a hole's centre cross over its radius. */
export const CROSS = 1.4;

/** Column j = 0 … m - 1, mm from the beam's end. */
export const columnX = (it: Facts, j: number): number => it.eEnd + j * it.q;

/** Row i = 0 … n - 1, mm below top of steel. */
export const rowY = (it: Facts, i: number): number => it.y1 + i * it.p;

export const lastColumnX = (it: Facts): number => columnX(it, it.m - 1);

/** Centres of all holes, column by column, each from the top. */
export const centres = (it: Facts): Point[] =>
  Array.from({ length: it.n * it.m }, (_, k) => ({ x: columnX(it, Math.floor(k / it.n)), y: rowY(it, k % it.n) }));

export const holes = (it: Facts): Circle[] =>
  centres(it).map((centre) => ({ kind: 'outline', centre, radius: it.d0 / 2 }));

/** A centre line along each column, a short one across each hole. */
export const centreLines = (it: Facts): Stroke[] => {
  const reach = (CROSS * it.d0) / 2;
  const columns = Array.from({ length: it.m }, (_, j): Stroke => {
    const x = columnX(it, j);
    return { kind: 'centre', from: { x, y: it.y1 - reach * 1.3 }, to: [{ x, y: it.yn + reach * 1.3 }] };
  });
  const rows = centres(it).map(
    ({ x, y }): Stroke => ({ kind: 'narrow', from: { x: x - reach, y }, to: [{ x: x + reach, y }] }),
  );
  return [...columns, ...rows];
};
