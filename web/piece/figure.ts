import { computed, signal } from '@preact/signals';
import { drawEnd } from '../../core/drawing/drawEnd.ts';
import type { Drawing, FailurePath } from '../../core/drawing/drawing.ts';
import type { Laid } from '../../core/drawing/laid.ts';
import { layoutDrawing } from '../../core/drawing/layout.ts';
import type { DrawingWords } from '../../core/drawing/words.ts';
import { chosenCheck, shown, words } from '../ladder/shown.ts';
import { focused } from '../state/bench.ts';
import { later } from '../state/later.ts';
import { drawingWords } from './drawingWords.ts';
import { type Fit, fitRoom, LARGEST, layAt, type Room, taken } from './fitRoom.ts';

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
}

/** What the drawing writes beside its sizes. */
export const spoken = computed<DrawingWords | null>(() =>
  shown.value ? drawingWords(shown.value, words.value) : null,
);

const drawing = computed<Drawing | null>(() =>
  shown.value && spoken.value ? drawEnd(shown.value.facts, spoken.value) : null,
);

/** The fit is kept from one keystroke to the next, so that fields do not wander while one types in them. */
let kept: Pick<Fit, 'scale' | 'shrink'> | null = null;

/** The drawing at the kept scale, where it still goes in and does not leave too much room. */
const asBefore = (piece: Drawing, within: Room): Fit | null => {
  if (kept === null) return null;
  const { scale, shrink } = kept;
  const laid = layAt(piece, scale, within);
  const share = taken(laid, scale, within) * shrink;
  const typing = focused.value !== null;
  return share <= 1.001 && (typing || share >= LOOSE || scale >= LARGEST) ? { laid, scale, shrink } : null;
};

/** The drawing in the room there is; null until both are known. */
export const figure = computed<Figure | null>(() => {
  const { width, height } = room.value;
  const piece = drawing.value;
  if (piece === null || width <= 0) return null;
  const fields = width >= FIELDS_FROM;
  const within: Room = { width, height, textSize: fields ? TEXT.wide : TEXT.narrow };
  const fit = asBefore(piece, within) ?? fitRoom(piece, within);
  kept = fit;
  return { drawing: piece, fields, ...fit };
});

const drawPath = later(async () => (await import('../../core/drawing/failurePath.ts')).failurePath);

/** The path along which the chosen check fails; no part of the first view. */
export const path = computed<FailurePath | null>(() => {
  const check = chosenCheck.value;
  if (!check || !shown.value || !spoken.value) return null;
  return drawPath.value?.(check.id, check.of ?? '', shown.value.facts, spoken.value) ?? null;
});

/** The path laid over the figure. */
export const pathLaid = computed<Laid | null>(() => {
  const it = figure.value;
  if (!it || !path.value) return null;
  return layoutDrawing(it.drawing, { values: 'gap', textHeight: it.laid.textHeight }, path.value);
});
