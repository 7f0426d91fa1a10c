import type { Facts } from '../../end/facts.ts';
import { chords, isArc } from '../arcs.ts';
import type { Arc, Box, CutPart, Point, Stroke } from '../drawing.ts';
import { bottomCut, topCut } from '../outline.ts';

/** What is left of the beam at its end, cut through: x across from the web's middle, heights as everywhere; flanges of even thickness. */
export interface BeamCut {
  readonly strokes: readonly Stroke[];
  readonly part: CutPart;
  /** Web, and the flanges that no cope took. */
  readonly boxes: readonly Box[];
}

export const beamCut = (it: Facts): BeamCut => {
  const right = halfOf(it, true);
  const left = mirrored(halfOf(it, !it.channel));
  const points = chords(left.from, left.to).reverse().slice(1, -1);
  return {
    strokes: [right, left],
    part: { outline: [...chords(right.from, right.to), ...points], slant: 1 },
    boxes: [webOf(it), ...flangesOf(it)],
  };
};

const webOf = (it: Facts): Box => ({
  left: -it.tw / 2,
  right: it.tw / 2,
  top: topCut(it).depth,
  bottom: it.h - bottomCut(it).depth,
});

const flangesOf = (it: Facts): Box[] => {
  const half = it.tw / 2;
  const [left, right] = it.channel ? [-half, it.b - half] : [-it.b / 2, it.b / 2];
  const { top, bottom } = webOf(it);
  return [
    ...(top < it.tf ? [{ left, right, top, bottom: it.tf }] : []),
    ...(bottom > it.h - it.tf ? [{ left, right, top: it.h - it.tf, bottom }] : []),
  ];
};

/** The outline on the right of the web's middle, from its top to its foot. */
const halfOf = (it: Facts, flanged: boolean): Stroke => {
  const { top, bottom, right: face } = webOf(it);
  const edge = it.channel ? it.b - face : it.b / 2;
  const r = Math.max(0, Math.min(it.r, edge - face, it.h / 2 - it.tf));
  const [upper, lower] = [it.tf, it.h - it.tf];
  const above: (Point | Arc)[] =
    flanged && top < upper
      ? [
          { x: edge, y: top },
          { x: edge, y: upper },
          { x: face + r, y: upper },
          { to: { x: face, y: upper + r }, radius: r, clockwise: false },
        ]
      : [{ x: face, y: top }];
  const below: (Point | Arc)[] =
    flanged && bottom > lower
      ? [
          { x: face, y: lower - r },
          { to: { x: face + r, y: lower }, radius: r, clockwise: false },
          { x: edge, y: lower },
          { x: edge, y: bottom },
        ]
      : [{ x: face, y: bottom }];
  return { kind: 'outline', from: { x: 0, y: top }, to: [...above, ...below, { x: 0, y: bottom }] };
};

const mirrored = ({ kind, from, to }: Stroke): Stroke => {
  const over = ({ x, y }: Point): Point => ({ x: 0 - x, y });
  const step = (one: Point | Arc): Point | Arc =>
    isArc(one) ? { ...one, to: over(one.to), clockwise: !one.clockwise } : over(one);
  return { kind, from: over(from), to: to.map(step) };
};
