import { computed, signal } from '@preact/signals';
import { drawEnd } from '../../core/drawing/drawEnd.ts';
import type { Drawing, FailurePath, View } from '../../core/drawing/drawing.ts';
import { liesOnSupport } from '../../core/drawing/onSupport/liesOnSupport.ts';
import type { DrawingWords } from '../../core/drawing/words.ts';
import { chosenCheck, shown, words } from '../ladder/shown.ts';
import { focused } from '../state/bench.ts';
import { later } from '../state/later.ts';
import { drawingWords } from './drawingWords.ts';
import { type Fit, fitRoom, LARGEST, layAt, type Room, taken } from './fitRoom.ts';

/** Room that the page gives the drawing, px; 0 until it is measured. */
export const room = signal({ width: 0, height: 0, narrow: false });

/** Columns narrower than this carry plain numbers: the order holds the fields there. */
const FIELDS_FROM = 380;
/** Text of the drawing, px: in wide columns, and in narrow ones. */
const TEXT = { wide: 14.5, narrow: 13 } as const;
/** While nobody types, the drawing grows once it fills less than this of what it could. */
const LOOSE = 0.93;

/** The end as drawn and laid out. */
export interface Figure extends Fit {
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

const drawOnSupport = later(async () => (await import('../../core/drawing/onSupport/drawOnSupport.ts')).drawOnSupport);

/** Null too where nothing lies on the support: such an end does not ask for what draws the view. */
const onSupport = computed<View | null>(() =>
  shown.value && spoken.value && liesOnSupport(shown.value.facts)
    ? (drawOnSupport.value?.(shown.value.facts, spoken.value) ?? null)
    : null,
);

/** The views there are, the one from the side first. */
export const views = computed<readonly View[]>(() => [drawing.value, onSupport.value].filter((view) => view !== null));

const say = later(async () => (await import('../../core/drawing/sentences.ts')).sentences);

/** The end in sentences, for those who cannot see it; no part of the first view. */
export const sentences = computed<readonly string[]>(() =>
  shown.value && spoken.value ? (say.value?.(shown.value.facts, spoken.value) ?? []) : [],
);

const drawPath = later(async () => (await import('../../core/drawing/failurePath.ts')).failurePath);

/** The path along which the chosen check fails; no part of the first view. */
export const path = computed<FailurePath | null>(() => {
  const check = chosenCheck.value;
  if (!check || !shown.value || !spoken.value) return null;
  return drawPath.value?.(check.id, check.of ?? '', shown.value.facts, spoken.value) ?? null;
});

/** The fit is kept from one keystroke to the next, so that fields do not wander while one types in them. */
let kept: (Fit & { readonly within: Room }) | null = null;

const same = (a: Room, b: Room): boolean => a.width === b.width && a.height === b.height && a.narrow === b.narrow;

/** The views at the kept scale, where they still go in and do not leave too much room. */
const asBefore = (all: readonly View[], within: Room, over: FailurePath | null): Fit | null => {
  if (kept?.views.length !== all.length || !same(kept.within, within)) return null;
  const { scale, shrink, standing } = kept;
  const laid = { views: layAt(all, scale, within, over), standing, scale };
  const share = taken(laid, within) * shrink;
  const typing = focused.value !== null;
  return share <= 1.001 && (typing || share >= LOOSE || scale >= LARGEST) ? { ...laid, shrink } : null;
};

/** The drawing in the room there is; null until both are known. */
export const figure = computed<Figure | null>(() => {
  const { width, height, narrow } = room.value;
  if (views.value.length === 0 || width <= 0) return null;
  const fields = width >= FIELDS_FROM;
  const within: Room = { width, height, narrow, textSize: fields ? TEXT.wide : TEXT.narrow };
  const fit = asBefore(views.value, within, path.value) ?? fitRoom(views.value, within, path.value);
  kept = { ...fit, within };
  return { fields, ...fit };
});

/** Level at the upper edge of the views, mm: of the highest of those beside each other, or of the first. */
export const topOf = ({ views: all, standing }: Fit): number => {
  const tops = all.map(({ laid }) => laid.box.top);
  return standing === 'beside' ? Math.min(...tops) : tops[0]!;
};
