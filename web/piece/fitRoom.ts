import type { Drawing } from '../../core/drawing/drawing.ts';
import type { Laid } from '../../core/drawing/laid.ts';
import { layoutDrawing } from '../../core/drawing/layout.ts';

/** The room for a drawing, and its text size, px. */
export interface Room {
  readonly width: number;
  readonly height: number;
  readonly textSize: number;
}

/** A drawing laid out at a scale. */
export interface Fit {
  readonly laid: Laid;
  /** px for one mm of the piece. */
  readonly scale: number;
  /** Below 1 where drawing and words together have to be made smaller to go into the room. */
  readonly shrink: number;
}

/** px for one mm of the piece at most: a small section is not blown up beyond this. */
export const LARGEST = 2;
/** Words may be this much smaller than asked for before a smaller scale is tried. */
const NEARLY = 0.96;
/** From one scale to the next that is tried, at least and at most; and how many are tried. */
const STEP = { least: 0.97, most: 0.8 } as const;
const TRIES = 18;

/** How much of the room a laid drawing takes, 1 = all of it. */
export const taken = ({ box }: Laid, scale: number, room: Room): number =>
  Math.max(((box.right - box.left) * scale) / room.width, ((box.bottom - box.top) * scale) / room.height);

export const layAt = (drawing: Drawing, scale: number, { textSize }: Room): Laid =>
  layoutDrawing(drawing, { values: 'gap', textHeight: textSize / scale });

/** The scale at which this drawing would just go in, if its words stayed where they are. */
const wouldFit = ({ box }: Drawing, laid: Laid, scale: number, room: Room): number => {
  const along = (side: number, piece: number, whole: number): number => (side - (whole - piece) * scale) / piece;
  return Math.min(
    along(room.width, box.right - box.left, laid.box.right - laid.box.left),
    along(room.height, box.bottom - box.top, laid.box.bottom - laid.box.top),
  );
};

/** A large piece is worth more than a small one, but not if its words get too small to read. */
const worth = ({ scale, shrink }: Fit): number => scale * shrink ** 3;

/**
 * The drawing as large as the room allows with its words at their size. Words keep their size while the piece gets smaller, and may have to
 * stand further out then: where no scale will do, piece and words are shrunk together.
 */
export const fitRoom = (drawing: Drawing, room: Room): Fit => {
  const { left, top, right, bottom } = drawing.box;
  const air = 4 * room.textSize;
  let scale = Math.min(
    LARGEST,
    Math.max(0.02, Math.min((room.width - air) / (right - left), (room.height - air) / (bottom - top))),
  );
  let best: Fit | undefined;
  for (let at = 0; at < TRIES; at += 1) {
    const laid = layAt(drawing, scale, room);
    const fit = { laid, scale, shrink: Math.min(1, 1 / taken(laid, scale, room)) };
    if (!best || worth(fit) > worth(best)) best = fit;
    if (fit.shrink >= NEARLY) break;
    scale = Math.min(scale * STEP.least, Math.max(scale * STEP.most, wouldFit(drawing, laid, scale, room)));
  }
  return best!;
};
