import type { FailurePath, View } from '../../core/drawing/drawing.ts';
import type { Laid } from '../../core/drawing/laid.ts';
import { layoutDrawing } from '../../core/drawing/layout.ts';
import { type Standing, together } from './together.ts';
import { withoutPath } from './withoutPath.ts';

/** The room for a drawing, and its text size, px. */
export interface Room {
  readonly width: number;
  /** Of each view where they all have to stand one below the other, else of the whole drawing. */
  readonly height: number;
  readonly textSize: number;
  /** The page is one column: views stand one below the other. */
  readonly narrow?: boolean;
}

/** One view with its lines and words in their places. */
export interface LaidView {
  readonly view: View;
  readonly laid: Laid;
  /** The same with a path over it; null where none runs in this view. */
  readonly over: Laid | null;
}

/** Views laid out at a scale. */
export interface Fit {
  readonly views: readonly LaidView[];
  readonly standing: Standing;
  /** px for one mm of the piece. */
  readonly scale: number;
  /** Below 1 where drawing and words together have to be made smaller to go into the room. */
  readonly shrink: number;
}

/** px for one mm of the piece at most: a small section is not blown up beyond this. */
export const LARGEST = 2;
/** Over each of several views its title, and the space between two, px. */
export const TITLE = 22;
export const BETWEEN = 20;
/** Views beside each other share their levels: below each other they have to be worth so much more. */
const LEVELS = 1.25;
/** Layouts tried before the best is taken. */
const TURNS = 7;
/** Scales differ by this share at least, from one that does not fit to the next. */
const STEP = 0.03;
/** Below this share of the scale at which the bare piece fills the room nothing is left to read. */
const LEAST = 0.3;

/** What titles and spaces leave of the room, px. */
const leftFor = (count: number, standing: Standing, { width, height, narrow = false }: Room) => {
  if (count === 1) return { width, height };
  const spaces = (count - 1) * BETWEEN;
  if (standing === 'beside') return { width: width - spaces, height: height - TITLE };
  return { width, height: narrow ? count * height : height - count * TITLE - spaces };
};

const boxesOf = (views: readonly LaidView[]) => views.map(({ laid }) => laid.box);

/** How much of the room laid views take, 1 = all of it. */
export const taken = ({ views, standing, scale }: Omit<Fit, 'shrink'>, room: Room): number => {
  const [it, left] = [together(boxesOf(views), standing), leftFor(views.length, standing, room)];
  return Math.max((it.width * scale) / left.width, (it.height * scale) / left.height);
};

/** Views laid out at a scale, with a path over the one it belongs to if there is one. */
export const layAt = (views: readonly View[], scale: number, { textSize }: Room, path: FailurePath | null) =>
  views.map((view): LaidView => {
    const own = (path?.view ?? 'side') === view.name ? path : null;
    const laid = layoutDrawing(view, { values: 'gap', textHeight: textSize / scale }, own);
    return own ? { view, laid: withoutPath(laid), over: laid } : { view, laid, over: null };
  });

/** The scale at which these views would just go in, if their words stood around them as they do. */
const wouldFit = ({ views, standing, scale }: Fit, room: Room): number => {
  const left = leftFor(views.length, standing, room);
  const bare = together(
    views.map(({ view }) => view.box),
    standing,
  );
  const whole = together(boxesOf(views), standing);
  const along = (side: 'width' | 'height'): number => (left[side] - (whole[side] - bare[side]) * scale) / bare[side];
  return Math.min(along('width'), along('height'));
};

/** A large piece is worth more than a small one, but not if its words get too small to read. */
const worth = ({ scale, shrink }: Fit): number => scale * shrink ** 3;

const fitStanding = (views: readonly View[], standing: Standing, room: Room, path: FailurePath | null): Fit => {
  const piece = together(
    views.map(({ box }) => box),
    standing,
  );
  const left = leftFor(views.length, standing, room);
  const bare = Math.min(left.width / piece.width, left.height / piece.height);
  const within = (scale: number): number => Math.min(LARGEST, Math.max(LEAST * bare, scale));
  const at = (scale: number): Fit => {
    const laid = { views: layAt(views, scale, room, path), standing, scale };
    return { ...laid, shrink: Math.min(1, 1 / taken(laid, room)) };
  };
  let fit = at(within(0.75 * bare));
  let best = fit;
  for (let turn = 1; turn < TURNS; turn += 1) {
    const exact = wouldFit(fit, room);
    const next = within(fit.shrink === 1 ? exact : Math.min(exact, fit.scale * (1 - STEP)));
    if (Math.abs(next - fit.scale) < 0.004 * fit.scale) break;
    fit = at(next);
    if (worth(fit) > worth(best)) best = fit;
  }
  return best;
};

/**
 * The views as large as the room allows with their words at their size. Words keep their size while the piece gets smaller, and may have to
 * stand further out then: where no scale will do, piece and words are shrunk together.
 */
export const fitRoom = (views: readonly View[], room: Room, path: FailurePath | null = null): Fit => {
  const below = (): Fit => fitStanding(views, 'below', room, path);
  if (room.narrow) return below();
  const beside = fitStanding(views, 'beside', room, path);
  if (views.length === 1) return beside;
  const other = below();
  return worth(other) > LEVELS * worth(beside) ? other : beside;
};
