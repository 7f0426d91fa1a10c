import type { Facts } from '../end/facts.ts';
import type { Box, Stroke } from './drawing.ts';
import { plateBox, plateEdges } from './plate.ts';
import { seam } from './seam.ts';

/** Levels between which a cleat on the near side stands before the beam's end; null where nothing does. */
export const before = (it: Facts): readonly [number, number] | null => (it.legWeb > 0 ? [it.yp, it.yp + it.hp] : null);

/** Plate, ply, cleat or end plate from the side. */
export const fittingFromSide = (it: Facts): Stroke[] => {
  if (it.bp > 0) return [outlineOf(plateBox(it)), ...fillets(it), ...supportRows(it)];
  if (it.legWeb > 0) return [outlineOf(plateBox(it)), supportLeg(it), ...legWeld(it), ...supportRows(it)];
  return plateEdges(it);
};

export const outlineOf = ({ left, top, right, bottom }: Box): Stroke => ({
  kind: 'outline',
  from: { x: left, y: top },
  to: [
    { x: right, y: top },
    { x: right, y: bottom },
    { x: left, y: bottom },
  ],
  closed: true,
});

/** The leg on the support, seen at its end. */
const supportLeg = (it: Facts): Stroke => {
  const { left, top, bottom } = plateBox(it);
  const x = left + it.tp;
  return { kind: 'outline', from: { x, y: top }, to: [{ x, y: bottom }] };
};

/** Levels of the web beside an end plate, where its fillets run. */
export const webAtPlate = (it: Facts): { top: number; bottom: number } => {
  const [above, below] = [it.dt > 0 ? it.dt : it.tf, it.db > 0 ? it.h - it.db : it.h - it.tf];
  const top = Math.max(it.yp, above);
  return { top, bottom: Math.max(top, Math.min(it.yp + it.hp, below)) };
};

const fillets = (it: Facts): Stroke[] => {
  const { top, bottom } = webAtPlate(it);
  return seam({ x: 0, y: top }, { x: 0, y: bottom }, { x: 1, y: 0 }, it.leg);
};

/** Along the toe of the web leg and its returns; nothing where it is bolted. */
const legWeld = (it: Facts): Stroke[] => {
  if (it.weldTo !== 'web') return [];
  const { top, right, bottom } = plateBox(it);
  const back = right - it.weldReturn;
  return [
    ...seam({ x: right, y: top }, { x: right, y: bottom }, { x: 1, y: 0 }, it.leg),
    ...seam({ x: back, y: top }, { x: right, y: top }, { x: 0, y: -1 }, it.leg),
    ...seam({ x: back, y: bottom }, { x: right, y: bottom }, { x: 0, y: 1 }, it.leg),
  ];
};

/** Centre lines of the support bolts' rows through the leg or end plate. */
const supportRows = (it: Facts): Stroke[] => {
  const { n, p, eTop, d } = it.supportBolts;
  const [left, right] = [-it.g - d, -it.g + it.tp + d];
  return Array.from({ length: n }, (_, i): Stroke => {
    const y = it.yp + eTop + i * p;
    return { kind: 'centre', from: { x: left, y }, to: [{ x: right, y }] };
  });
};
