import type { Facts } from '../end/facts.ts';
import type { Box, Stroke } from './drawing.ts';

/** Levels between which the support's face is drawn, mm below the beam's top of steel. */
export const faceSpan = (it: Facts): { top: number; bottom: number } => {
  const { here, topOfSteel, h } = it.support;
  return here ? { top: Math.min(0, 0 - topOfSteel), bottom: Math.max(it.h, h - topOfSteel) } : { top: 0, bottom: it.h };
};

/** How far the supporting beam reaches toward the beam from its face, and away from it, mm. */
export const supportBox = (it: Facts): Box | null => {
  const { here, b, tw, h, topOfSteel } = it.support;
  if (!here) return null;
  return {
    left: -it.g - tw,
    right: -it.g + Math.max(0, (b - tw) / 2),
    top: 0 - topOfSteel,
    bottom: h - topOfSteel,
  };
};

/** The supporting beam's flanges on the beam's side and the far face of its web, as a neighbour part; the near face is the support's face. */
export const supportSection = (it: Facts): Stroke[] => {
  const box = supportBox(it);
  if (box === null) return [];
  const { tf, r } = it.support;
  const face = -it.g;
  const { left, right, top, bottom } = box;
  const fillet = Math.min(r, right - face);
  const flange = (outer: number, inward: 1 | -1): Stroke => {
    const inner = outer + inward * tf;
    return {
      kind: 'neighbour',
      from: { x: left, y: outer },
      to: [
        { x: right, y: outer },
        { x: right, y: inner },
        { x: face + fillet, y: inner },
        { to: { x: face, y: inner + inward * fillet }, radius: fillet, clockwise: inward < 0 },
      ],
    };
  };
  return [
    flange(top, 1),
    flange(bottom, -1),
    { kind: 'neighbour', from: { x: left, y: top + tf }, to: [{ x: left, y: bottom - tf }] },
  ];
};
