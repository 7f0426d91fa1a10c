import type { Drawing, Line, Point } from './drawing.ts';
import type { Placed } from './lanes.ts';
import { drawStroke, type Pad, setLine, widthOf } from './pad.ts';
import { blockBox, cheapest } from './place.ts';

/** The support's face with its name, and the reaction below it: beyond whatever dimensions stand under the beam. */
export const layFace = (pad: Pad, { face, reaction }: Drawing, placed: readonly Placed[]): void => {
  const { em } = pad;
  const { x, top, bottom } = face;
  const under = placed.filter((it) => it.side === 'bottom' && !it.inRoom).map((it) => it.level + 0.5 * em);
  const foot = Math.max(bottom + 0.9 * em, ...under);
  drawStroke(pad, 'piece', { kind: 'neighbour', from: { x, y: top - 0.9 * em }, to: [{ x, y: foot }] });
  const tail = { x, y: foot + 2.7 * em };
  drawStroke(pad, 'words', { kind: 'force', from: tail, to: [{ x, y: foot + 0.25 * em }], arrow: true });
  write(pad, reaction, [
    { x: x + 0.7 * em, y: tail.y - 0.2 * em },
    { x: x - 0.7 * em - widthOf(pad, reaction), y: tail.y - 0.2 * em },
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
