import type { Break, Circle, CutPart, Point, View } from './drawing.ts';
import { hatchLines } from './hatch.ts';
import { drawStroke, keepOff, type Pad } from './pad.ts';

/** Spacing of the hatch of a part that is cut through, in text heights. */
const HATCH = 0.36;

/** Lines of the piece, what is cut through, holes, and the breaks. */
export const layPiece = (pad: Pad, drawing: View): void => {
  for (const cut of drawing.cuts) layCut(pad, cut);
  for (const stroke of drawing.strokes) drawStroke(pad, 'piece', stroke);
  for (const hole of drawing.holes) layHole(pad, hole);
  for (const it of drawing.breaks) layBreak(pad, it);
};

const layCut = (pad: Pad, { outline, slant }: CutPart): void => {
  const turned = ({ x, y }: Point): Point => ({ x: slant * x, y });
  for (const [from, to] of hatchLines(outline.map(turned), HATCH * pad.em, [])) {
    drawStroke(pad, 'piece', { kind: 'hatch', from: turned(from), to: [turned(to)] });
  }
};

const HOLE_WEIGHT = 40;

const layHole = (pad: Pad, { kind, centre, radius, filled }: Circle): void => {
  pad.marks.push({ shape: 'circle', layer: 'piece', kind, centre, radius, filled: filled ?? false });
  const { x, y } = centre;
  keepOff(
    pad,
    [
      { x: x - radius, y },
      { x: x + radius, y },
    ],
    HOLE_WEIGHT,
  );
  keepOff(
    pad,
    [
      { x, y: y - radius },
      { x, y: y + radius },
    ],
    HOLE_WEIGHT,
  );
};

/** An upright narrow line with two zigzags, a little longer than the beam is deep. */
const layBreak = (pad: Pad, { x, top, bottom }: Break): void => {
  const { em } = pad;
  const over = 0.55 * em;
  const zig = 0.4 * em;
  const at = (share: number): Point[] => {
    const y = top + (bottom - top) * share;
    return [
      { x, y: y - zig },
      { x: x + zig, y: y - 0.45 * zig },
      { x: x - zig, y: y + 0.45 * zig },
      { x, y: y + zig },
    ];
  };
  drawStroke(pad, 'piece', {
    kind: 'break',
    from: { x, y: top - over },
    to: [...at(0.25), ...at(0.77), { x, y: bottom + over }],
  });
};
