import { drawEnd } from '../drawing/drawEnd.ts';
import type { Drawing, FailurePath, View } from '../drawing/drawing.ts';
import { usualBeyond } from '../drawing/drawnLength.ts';
import { failurePath } from '../drawing/failurePath.ts';
import type { LayoutOptions } from '../drawing/layout.ts';
import { leastBox } from '../drawing/leastBox.ts';
import { drawOnSupport } from '../drawing/onSupport/drawOnSupport.ts';
import type { DrawingWords } from '../drawing/words.ts';
import { drawingWordsOf } from '../drawing/wordsOf.ts';
import { standards } from '../standards/known.ts';
import type { Context } from './context.ts';
import { tightName } from './given.ts';
import { POINT } from './pen.ts';
import { sheetWords as say } from './sheetWords.ts';
import { governingOf } from './verdictLine.ts';

/** Capitals 2.5 mm high: size in pt of a face whose capitals stand 0.698 em high. */
const SIZE = 2.5 / 0.698 / POINT;
/** Beam beyond cope and plate that words with leaders need, mm on the paper. */
const REACH = 30;

/** What the drawing writes, as it stands in the end. */
const drawingWords = ({ input, numbers, words }: Context): DrawingWords =>
  drawingWordsOf(input.end, {
    units: numbers.units,
    section: tightName(input.designation) || say.ownSize,
    words,
    standard: standards[input.report.standard.id]!,
  });

/** From the side alone, or on the support too. */
export type ViewsShown = 'all' | 'side';

/** The end as drawn, with the path of the check that governs where a view shows it; none for rules of fit. */
export interface Piece {
  readonly drawing: Drawing;
  /** What lies on the support; null where nothing does, or where it is not to be shown. */
  readonly onSupport: View | null;
  readonly path: FailurePath | null;
}

/** `beyond`: length of beam at least beyond cope and plate, mm. */
export const pieceOf = (context: Context, shown: ViewsShown, beyond = 0): Piece => {
  const { facts } = context.input;
  const words = { ...drawingWords(context), beyond };
  const governing = governingOf(context);
  const path = governing ? failurePath(governing.id, governing.of ?? '', facts, words) : null;
  const onSupport = shown === 'all' ? drawOnSupport(facts, words) : null;
  const visible = path?.view !== 'support' || onSupport !== null;
  return { drawing: drawEnd(facts, words), onSupport, path: visible ? path : null };
};

/** Its views, the one from the side first. */
export const viewsOf = ({ drawing, onSupport }: Piece): [View, ...View[]] =>
  onSupport ? [drawing, onSupport] : [drawing];

/** mm on the paper. */
export interface PaperSize {
  readonly width: number;
  readonly height: number;
}

/** How the paper's text stands on a drawing at 1:`scale`. */
export const penAt = ({ pen }: Context, scale: number): LayoutOptions => ({
  textHeight: SIZE * POINT * scale,
  values: 'parallel',
  pathStays: true,
  measure: (text, size, bold) => (pen.width(text, { size: SIZE, bold }) * size) / (SIZE * POINT),
});

/** What no layout of a piece at 1:`scale` goes below: known without laying one out. */
export const leastAt = (context: Context, piece: Piece, scale: number): PaperSize => {
  const boxes = viewsOf(piece).map((view) => leastBox(view, penAt(context, scale)));
  const wide = boxes.reduce((sum, { left, right }) => sum + right - left, 0);
  const top = Math.min(...boxes.map((one) => one.top));
  const bottom = Math.max(...boxes.map((one) => one.bottom));
  return { width: wide / scale, height: (bottom - top) / scale };
};

/** Below 1:5, the piece with so much more of the beam that words stand on it, up to `free`, mm on the paper; null where that is no more than usual. */
export const longerPiece = (context: Context, shown: ViewsShown, scale: number, free: number): Piece | null => {
  const usual = usualBeyond(context.input.facts);
  const beyond = Math.min(REACH * scale, usual + free * scale);
  return scale > 5 && beyond > usual ? pieceOf(context, shown, beyond) : null;
};

/** Words on the piece that stand among the given data too. */
const repeated = new Set(['section', 'bolts', 'plate', 'support-bolts']);

export const unlabelled = ({ drawing, onSupport, path }: Piece): Piece => ({
  drawing: withoutRepeated(drawing),
  onSupport: onSupport && withoutRepeated(onSupport),
  path,
});

const withoutRepeated = <V extends View>(view: V): V => ({
  ...view,
  callouts: view.callouts.filter(({ name }) => !repeated.has(name)),
});
