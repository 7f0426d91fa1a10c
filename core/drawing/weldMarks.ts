import type { Facts } from '../end/facts.ts';
import type { Line, Point, WeldMark } from './drawing.ts';
import { plateField } from './fields.ts';
import { webAtPlate } from './fitting.ts';
import { plateBox } from './plate.ts';
import { length } from './sizes.ts';
import type { DrawingWords } from './words.ts';

/** Spots near the foot of an upright weld, near its head, and half way. */
export const spotsAlong = (x: number, top: number, bottom: number): Point[] => {
  const inset = Math.min(0.03 * (bottom - top), 6);
  return [
    { x, y: bottom - inset },
    { x, y: top + inset },
    { x, y: (top + bottom) / 2 },
  ];
};

/** The leg of a weld as its symbol says it. */
export const legLine = (it: Facts, { units, weldSymbols }: DrawingWords, path: string): Line => [
  ...(weldSymbols === 'iso' ? [{ text: 'z', role: 'note' } as const] : []),
  { text: length(it.leg, units), role: 'size', path },
];

/** Welds seen from the side: of a plate along the support's face, of an end plate along the web, of a cleat's web leg around its toe. */
export const weldFromSide = (it: Facts, words: DrawingWords): WeldMark | null => {
  const practice = words.weldSymbols;
  const line = (path: string): Line => legLine(it, words, path);
  if (it.bp > 0) {
    const { top, bottom } = webAtPlate(it);
    const targets = spotsAlong(0, top, bottom);
    return { targets, line: line('joint.webWeld.leg'), towards: 'right', sides: 'both', practice };
  }
  const { left, top, right, bottom } = plateBox(it);
  if (it.legWeb === 0) {
    if (it.weldTo === 'none') return null;
    return {
      targets: spotsAlong(left, top, bottom),
      line: line('joint.weld.leg'),
      towards: 'left',
      sides: 'both',
      practice,
    };
  }
  if (it.weldTo !== 'web') return null;
  return {
    targets: spotsAlong(right, top, bottom),
    line: line(plateField(it, 'webWeld.leg')),
    towards: 'right',
    sides: 'arrow',
    practice,
    ...eachOf(it, words),
  };
};

/** A symbol at one cleat speaks of both. */
export const eachOf = (it: Facts, { plate }: DrawingWords): Pick<WeldMark, 'tail'> =>
  it.k > 1 ? { tail: [{ text: `each ${plate}`, role: 'note' }] } : {};
