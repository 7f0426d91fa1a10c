import type { Drawing, FailurePath } from '../../core/drawing/drawing.ts';
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
/** Layouts tried before the best is taken. */
const TURNS = 7;
/** Scales differ by this share at least, from one that does not fit to the next. */
const STEP = 0.03;
/** Below this share of the scale at which the bare piece fills the room nothing is left to read. */
const LEAST = 0.3;

/** How much of the room a laid drawing takes, 1 = all of it. */
export const taken = ({ box }: Laid, scale: number, room: Room): number =>
  Math.max(((box.right - box.left) * scale) / room.width, ((box.bottom - box.top) * scale) / room.height);

/** A drawing laid out at a scale, with a path over it if one is given. */
export const layAt = (drawing: Drawing, scale: number, { textSize }: Room, over: FailurePath | null = null): Laid =>
  layoutDrawing(drawing, { values: 'gap', textHeight: textSize / scale }, over);

/** The scale at which this drawing would just go in, if its words stood around the piece as they do. */
const wouldFit = ({ box }: Drawing, { laid, scale }: Fit, room: Room): number => {
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
  const bare = Math.min(room.width / (right - left), room.height / (bottom - top));
  const within = (scale: number): number => Math.min(LARGEST, Math.max(LEAST * bare, scale));
  const at = (scale: number): Fit => {
    const laid = layAt(drawing, scale, room);
    return { laid, scale, shrink: Math.min(1, 1 / taken(laid, scale, room)) };
  };
  let fit = at(within(0.75 * bare));
  let best = fit;
  for (let turn = 1; turn < TURNS; turn += 1) {
    const exact = wouldFit(drawing, fit, room);
    const next = within(fit.shrink === 1 ? exact : Math.min(exact, fit.scale * (1 - STEP)));
    if (Math.abs(next - fit.scale) < 0.004 * fit.scale) break;
    fit = at(next);
    if (worth(fit) > worth(best)) best = fit;
  }
  return best;
};
