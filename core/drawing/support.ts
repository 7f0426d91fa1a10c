import type { Facts } from '../end/facts.ts';
import type { Box, Stroke } from './drawing.ts';

/** Levels between which the support's face is drawn, mm below the beam's top of steel. */
export const faceSpan = (it: Facts): { top: number; bottom: number } => {
  const { here, topOfSteel, h } = it.support;
  return here
    ? { top: Math.min(0, -topOfSteel), bottom: Math.max(it.h, h - topOfSteel) }
    : { top: 0, bottom: it.h };
};

/** How far the supporting beam reaches toward the beam from its face, and away from it, mm. */
export const supportBox = (it: Facts): Box | null => {
  const { here, b, tw, h, topOfSteel } = it.support;
  if (!here) return null;
  return {
    left: -it.g - tw,
    right: -it.g + Math.max(0, (b - tw) / 2),
    top: -topOfSteel,
    bottom: h - topOfSteel,
  };
};

/** The near half of the supporting beam's section, web and flanges on the beam's side, as a neighbour part. */
export const supportSection = (it: Facts): Stroke[] => {
  const box = supportBox(it);
  if (box === null) return [];
  const { tf, r } = it.support;
  const face = -it.g;
  const { left, right, top, bottom } = box;
  const fillet = Math.min(r, right - face);
  return [
    {
      kind: 'neighbour',
      from: { x: left, y: top },
      to: [
        { x: right, y: top },
        { x: right, y: top + tf },
        { x: face + fillet, y: top + tf },
        { to: { x: face, y: top + tf + fillet }, radius: fillet, clockwise: false },
        { x: face, y: bottom - tf - fillet },
        { to: { x: face + fillet, y: bottom - tf }, radius: fillet, clockwise: false },
        { x: right, y: bottom - tf },
        { x: right, y: bottom },
        { x: left, y: bottom },
      ],
    },
    { kind: 'neighbour', from: { x: left, y: top + tf }, to: [{ x: left, y: bottom - tf }] },
  ];
};
