import type { Line, Point, View } from './drawing.ts';
import type { Placed } from './lanes.ts';
import { drawStroke, type Pad, setLine, widthOf } from './pad.ts';
import { blockBox, cheapest } from './place.ts';

/** Levels of the upper end of the face's line, of its foot, and of the tail of the reaction's arrow below it. */
export const arrowOf = (
  { em }: Pad,
  face: NonNullable<View['face']>,
  placed: readonly Placed[],
): { head: number; foot: number; tail: number } => {
  const under = placed.filter((it) => it.side === 'bottom' && !it.inRoom).map((it) => it.level + 0.5 * em);
  const foot = Math.max(face.bottom + 0.9 * em, ...under);
  return { head: face.top - 0.9 * em, foot, tail: foot + 2.7 * em };
};

/** The support's face with its name, and the reaction below it: beyond whatever dimensions stand under the beam. */
export const layFace = (pad: Pad, { face, reaction }: View, placed: readonly Placed[]): void => {
  if (face === undefined || reaction === undefined) return;
  const { em } = pad;
  const { x, bottom } = face;
  const { head, foot, tail } = arrowOf(pad, face, placed);
  drawStroke(pad, 'piece', { kind: 'neighbour', from: { x, y: head }, to: [{ x, y: foot }] });
  drawStroke(pad, 'words', { kind: 'force', from: { x, y: tail }, to: [{ x, y: foot + 0.25 * em }], arrow: true });
  write(pad, reaction, [
    { x: x + 0.7 * em, y: tail - 0.2 * em },
    { x: x - 0.7 * em - widthOf(pad, reaction), y: tail - 0.2 * em },
  ]);
  const left = x - 0.5 * em - widthOf(pad, face.line);
  write(pad, face.line, [
    { x: left, y: bottom + 1.25 * em },
    { x: left, y: foot + 0.2 * em },
    { x: left, y: foot + 1.3 * em },
    { x: x + 0.6 * em, y: foot + 1 * em },
  ]);
};

const write = (pad: Pad, line: Line, places: readonly Point[]): void => {
  const at = cheapest(
    pad,
    places.map((place, i) => ({ at: place, cost: i * 2, box: blockBox(pad, [line], place) })),
  );
  setLine(pad, 'words', line, at);
};
