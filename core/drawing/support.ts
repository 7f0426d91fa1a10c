import type { Facts } from '../end/facts.ts';
import type { Box, Stroke } from './drawing.ts';

/** A supporting beam that reaches further below the beam than this share of its depth is broken off a little below it: nothing of the joint lies there. */
const BELOW = 0.25;
const BROKEN = 0.06;
/** Half-width of the zigzag of its break over the web's thickness. */
const ZIG = 0.5;

/** Lower edge of what is drawn of the supporting beam, mm below the beam's top of steel. */
const footOf = (it: Facts): { level: number; broken: boolean } => {
  const level = it.support.h - it.support.topOfSteel;
  const broken = level > (1 + BELOW) * it.h;
  return { level: broken ? (1 + BROKEN) * it.h : level, broken };
};

/** Levels between which the support's face is drawn, mm below the beam's top of steel. */
export const faceSpan = (it: Facts): { top: number; bottom: number } => {
  const { here, topOfSteel } = it.support;
  if (!here) return { top: 0, bottom: it.h };
  return { top: Math.min(0, 0 - topOfSteel), bottom: Math.max(it.h, footOf(it).level) };
};

/** How far what is drawn of the supporting beam reaches toward the beam from its face, and away from it, mm. */
export const supportBox = (it: Facts): Box | null => {
  const { here, b, tw, topOfSteel } = it.support;
  if (!here) return null;
  return {
    left: -it.g - tw,
    right: -it.g + Math.max(0, (b - tw) / 2),
    top: 0 - topOfSteel,
    bottom: footOf(it).level,
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
  const { broken } = footOf(it);
  return [
    flange(top, 1),
    broken ? acrossWeb(box, face) : flange(bottom, -1),
    { kind: 'neighbour', from: { x: left, y: top + tf }, to: [{ x: left, y: broken ? bottom : bottom - tf }] },
  ];
};

/** The break across the web of a supporting beam that is not drawn to its foot. */
const acrossWeb = ({ left, bottom: y }: Box, face: number): Stroke => {
  const [zig, middle] = [ZIG * (face - left), (left + face) / 2];
  return {
    kind: 'break',
    from: { x: left - 2 * zig, y },
    to: [
      { x: middle - zig, y },
      { x: middle - zig / 2, y: y - 2 * zig },
      { x: middle + zig / 2, y: y + 2 * zig },
      { x: middle + zig, y },
      { x: face + 2 * zig, y },
    ],
  };
};
