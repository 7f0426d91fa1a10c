import type { FailurePath } from '../drawing/drawing.ts';
import type { Laid } from '../drawing/laid.ts';
import type { Context } from './context.ts';
import { AIR, freeAbove, lowestRightOf, type PaperBox, paperBoxes } from './figureSpace.ts';
import { body } from './page.ts';
import type { Spot, TextStyle } from './pen.ts';
import { type Code, sideOf } from './qr.ts';
import { richText } from './richText.ts';
import { type Lines, wrap } from './textBlock.ts';

export const LEADING = 3.75;
const SCALE_HEIGHT = 5.9;
/** Width of the caption below the piece, and least width of one beside it. */
const CAPTION = 62;
const BESIDE = 28;

export const style: TextStyle = { ...body, family: 'narrow' };

/** The path's caption broken into lines, as it stands beside the piece and below it. */
export interface Captions {
  readonly beside: Lines;
  readonly below: Lines;
}

export const captionsOf = (context: Context, path: FailurePath | null): Captions => ({
  beside: captionLines(context, path, BESIDE),
  below: captionLines(context, path, CAPTION),
});

const captionLines = ({ pen, numbers }: Context, path: FailurePath | null, width: number): Lines =>
  path ? wrap(pen, richText(numbers.marked(path.caption), 'prose'), style, width) : [];

/** What stands beside the piece or below it. */
export interface FigureWords {
  readonly captions: Captions;
  readonly code: Code | null;
  /** Width on the paper, mm. */
  readonly room: number;
}

/** Width that caption and code take beside the piece, with air, mm. */
export const besideWidth = (code: Code | null): number => Math.max(BESIDE, code ? sideOf(code) : 0) + 1 + AIR;

/** Where the caption with the scale stands, and the square code if it found room; mm on the paper from the figure's upper left corner. */
interface Placed {
  readonly lines: Lines;
  readonly x: number;
  readonly y: number;
  readonly code: Spot | null;
  readonly width: number;
  readonly height: number;
}

/** The caption beside the piece where there is room for it; else below, to the right of the reaction's arrow. */
export const placeWords = (laid: Laid, { captions, code, room }: FigureWords, scale: number): Placed => {
  const boxes = paperBoxes(laid, scale);
  const [wide, high] = [(laid.box.right - laid.box.left) / scale, (laid.box.bottom - laid.box.top) / scale];
  const left = room - BESIDE - 1;
  const { beside, below } = captions;
  const needed = beside.length * LEADING + SCALE_HEIGHT;
  const y = freeAbove(boxes, left, needed, high);
  if (y !== null) {
    const words = { left, right: room, top: y, bottom: y + needed };
    const spot = placeCode([...boxes, words], code, room, high);
    return { lines: beside, x: left, y, code: spot, width: Math.max(wide, room), height: high };
  }
  // Under the right end of the piece, or further right where it then stands higher.
  const spots = [Math.min(wide, room), room].map((right) => {
    const x = Math.max(36, right - CAPTION);
    const top = lowestRightOf(boxes, x) + 1.5;
    return { x, top, height: Math.max(high, top + below.length * LEADING + SCALE_HEIGHT) };
  });
  const { x, top, height } = spots[1]!.height < spots[0]!.height ? spots[1]! : spots[0]!;
  return {
    lines: below,
    x,
    y: top,
    code: placeCode(boxes, code, room, high),
    width: Math.max(wide, x + CAPTION),
    height,
  };
};

const placeCode = (boxes: readonly PaperBox[], code: Code | null, room: number, high: number): Spot | null => {
  if (!code) return null;
  const side = sideOf(code);
  const x = room - side - 1;
  const y = freeAbove(boxes, x - 0.5, side + 1, high - 1);
  return y === null ? null : { x, y };
};
