import { computed, signal } from '@preact/signals';
import { drawEnd } from '../../core/drawing/drawEnd.ts';
import type { Drawing, FailurePath } from '../../core/drawing/drawing.ts';
import type { Laid } from '../../core/drawing/laid.ts';
import type { DrawingWords } from '../../core/drawing/words.ts';
import { chosenCheck, shown, words } from '../ladder/shown.ts';
import { focused } from '../state/bench.ts';
import { later } from '../state/later.ts';
import { drawingWords } from './drawingWords.ts';
import { type Fit, fitRoom, LARGEST, layAt, type Room, taken } from './fitRoom.ts';
import { withoutPath } from './withoutPath.ts';

/** Room that the page gives the drawing, px; 0 until it is measured. */
export const room = signal({ width: 0, height: 0 });

/** Columns narrower than this carry plain numbers: the order holds the fields there. */
const FIELDS_FROM = 380;
/** Text of the drawing, px: in wide columns, and in narrow ones. */
const TEXT = { wide: 14.5, narrow: 13 } as const;
/** While nobody types, the drawing grows once it fills less than this of what it could. */
const LOOSE = 0.93;

/** The end as drawn and laid out. */
export interface Figure extends Fit {
  readonly drawing: Drawing;
  /** Sizes are fields. */
  readonly fields: boolean;
  /** The same with the path of the chosen check over it; null where none is chosen. */
  readonly over: Laid | null;
}

/** What the drawing writes beside its sizes. */
export const spoken = computed<DrawingWords | null>(() =>
  shown.value ? drawingWords(shown.value, words.value) : null,
);

const drawing = computed<Drawing | null>(() =>
  shown.value && spoken.value ? drawEnd(shown.value.facts, spoken.value) : null,
);

const drawPath = later(async () => (await import('../../core/drawing/failurePath.ts')).failurePath);

/** The path along which the chosen check fails; no part of the first view. */
export const path = computed<FailurePath | null>(() => {
  const check = chosenCheck.value;
  if (!check || !shown.value || !spoken.value) return null;
  return drawPath.value?.(check.id, check.of ?? '', shown.value.facts, spoken.value) ?? null;
});

type Laying = Pick<Figure, 'laid' | 'over'>;

const lay = (piece: Drawing, scale: number, within: Room, over: FailurePath | null): Laying => {
  const laid = layAt(piece, scale, within, over);
  return over ? { laid: withoutPath(laid), over: laid } : { laid, over: null };
};

/** The fit is kept from one keystroke to the next, so that fields do not wander while one types in them. */
let kept: Pick<Fit, 'scale' | 'shrink'> | null = null;

/** The drawing at the kept scale, where it still goes in and does not leave too much room. */
const asBefore = (piece: Drawing, within: Room, over: FailurePath | null): (Fit & Laying) | null => {
  if (kept === null) return null;
  const { scale, shrink } = kept;
  const laying = lay(piece, scale, within, over);
  const share = taken(laying.laid, scale, within) * shrink;
  const typing = focused.value !== null;
  return share <= 1.001 && (typing || share >= LOOSE || scale >= LARGEST) ? { ...laying, scale, shrink } : null;
};

const fresh = (piece: Drawing, within: Room, over: FailurePath | null): Fit & Laying => {
  const fit = fitRoom(piece, within);
  return over ? { ...fit, ...lay(piece, fit.scale, within, over) } : { ...fit, over };
};

/** The drawing in the room there is; null until both are known. */
export const figure = computed<Figure | null>(() => {
  const { width, height } = room.value;
  const piece = drawing.value;
  if (piece === null || width <= 0) return null;
  const fields = width >= FIELDS_FROM;
  const within: Room = { width, height, textSize: fields ? TEXT.wide : TEXT.narrow };
  const fit = asBefore(piece, within, path.value) ?? fresh(piece, within, path.value);
  kept = fit;
  return { drawing: piece, fields, ...fit };
});
