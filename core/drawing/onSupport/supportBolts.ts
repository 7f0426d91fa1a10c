import type { Facts } from '../../end/facts.ts';
import { CROSS } from '../bolts.ts';
import type { Circle, Point, Stroke } from '../drawing.ts';

/** Lines of bolts, across from the web's middle; the one line of a single cleat stands on its side, the near one. */
export const linesX = ({ supportBolts: { lines, cc } }: Facts): number[] =>
  lines === 2 ? [-cc / 2, cc / 2] : lines === 1 ? [-cc / 2] : [];

/** Rows, below top of steel. */
export const rowsY = ({ yp, supportBolts: { n, p, eTop } }: Facts): number[] =>
  Array.from({ length: n }, (_, i) => yp + eTop + i * p);

/** Line by line, each from the top. */
export const supportCentres = (it: Facts): Point[] => linesX(it).flatMap((x) => rowsY(it).map((y) => ({ x, y })));

export const supportHoles = (it: Facts): Circle[] =>
  supportCentres(it).map((centre) => ({ kind: 'outline', centre, radius: it.supportBolts.d0 / 2 }));

/** A centre line along each line, a short one across each hole. */
export const supportCentreLines = (it: Facts): Stroke[] => {
  const reach = (CROSS * it.supportBolts.d0) / 2;
  const rows = rowsY(it);
  const [first, last] = [rows[0], rows.at(-1)];
  if (first === undefined || last === undefined) return [];
  return [
    ...linesX(it).map(
      (x): Stroke => ({ kind: 'centre', from: { x, y: first - 1.3 * reach }, to: [{ x, y: last + 1.3 * reach }] }),
    ),
    ...supportCentres(it).map(
      ({ x, y }): Stroke => ({ kind: 'narrow', from: { x: x - reach, y }, to: [{ x: x + reach, y }] }),
    ),
  ];
};
