import type { Box, Line, Point } from './drawing.ts';
import { CAPITAL, type Pad, setLine, widthOf } from './pad.ts';

/** Distance between the base lines of two lines of one block, in text heights. */
export const LEADING = 1.25;

/** Air around words, in text heights. */
export const AIR = 0.22;

/** Space kept under a block. */
const APART = 0.2;

/** The box of lines of words whose first line stands on the base line at `at`, with a little air around. */
export const blockBox = (pad: Pad, lines: readonly Line[], at: Point): Box => {
  const { em } = pad;
  const air = AIR * em;
  const wide = Math.max(...lines.map((line) => widthOf(pad, line)));
  return {
    left: at.x - air,
    top: at.y - CAPITAL * em - air,
    right: at.x + wide + air,
    bottom: at.y + (lines.length - 1) * LEADING * em + 0.1 * em + air,
  };
};

/** Puts `box` where `own`, a box around the origin, stands once moved to x, y. */
export const move = (box: { -readonly [side in keyof Box]: number }, own: Box, x: number, y: number): void => {
  box.left = x + own.left;
  box.right = x + own.right;
  box.top = y + own.top;
  box.bottom = y + own.bottom;
};

/** Writes a block, its first line on the base line at `at`, set to the left or to the right. */
export const setBlock = (pad: Pad, lines: readonly Line[], at: Point, align: 'start' | 'end'): void => {
  const wide = Math.max(...lines.map((line) => widthOf(pad, line)));
  const { left, top, right, bottom } = blockBox(pad, lines, at);
  pad.ground.take({ left, top, right, bottom: bottom + APART * pad.em });
  lines.forEach((line, i) => {
    const shift = align === 'end' ? wide - widthOf(pad, line) : 0;
    setLine(pad, 'words', line, { x: at.x + shift, y: at.y + i * LEADING * pad.em });
  });
};

export interface Option {
  readonly at: Point;
  readonly box: Box;
  /** How much less this one is liked than the first. */
  readonly cost: number;
}

/** The place that covers least. */
export const cheapest = ({ ground }: Pad, options: readonly Option[]): Point => {
  let least = Number.POSITIVE_INFINITY;
  let best = options[0]!;
  for (const it of options) {
    const cost = it.cost + ground.cost(it.box, undefined, least - it.cost);
    if (cost < least) [least, best] = [cost, it];
  }
  return best.at;
};
