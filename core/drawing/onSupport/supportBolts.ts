import type { Facts } from '../../end/facts.ts';
import { linesX, rowsY, supportCentres } from '../../end/supportPattern.ts';
import { CROSS } from '../bolts.ts';
import type { Circle, Stroke } from '../drawing.ts';

export const supportHoles = (it: Facts): Circle[] =>
  supportCentres(it).map((centre) => ({ kind: 'outline', centre, radius: it.supportBolts.d0 / 2 }));

/** Bolts of the beam opposite that go through no hole of ours, as thin circles. */
export const oppositeHoles = ({ opposite, supportBolts }: Facts): Circle[] =>
  opposite.apart.map((centre) => ({ kind: 'narrow', centre, radius: supportBolts.d0 / 2 }));

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
