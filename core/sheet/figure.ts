import { drawEnd } from '../drawing/drawEnd.ts';
import type { Drawing, FailurePath, Point } from '../drawing/drawing.ts';
import { failurePath } from '../drawing/failurePath.ts';
import { type LayoutOptions, layoutDrawing } from '../drawing/layout.ts';
import { leastBox } from '../drawing/leastBox.ts';
import type { DrawingWords } from '../drawing/words.ts';
import { fromSystem, type UnitSystem } from '../units/systems.ts';
import type { Context, Zone } from './context.ts';
import { drawMark } from './figureMarks.ts';
import { captionsOf, type FigureWords, LEADING, placeWords, style } from './figureWords.ts';
import { holesAssumed, sectionName } from './given.ts';
import { NARROW, WIDE } from './page.ts';
import { POINT, type Spot } from './pen.ts';
import { type Code, drawCode } from './qr.ts';
import { standardScales } from './scales.ts';
import { sheetWords as say } from './sheetWords.ts';
import { setLines } from './textBlock.ts';
import { governingOf } from './verdictLine.ts';

/** Capitals 2.5 mm high: size in pt of a face whose capitals stand 0.698 em high. */
const SIZE = 2.5 / 0.698 / POINT;
/** A piece drawn less deep than this cannot be read, mm. */
const LEAST_DEPTH = 28;

/** The end to scale with its dimensions and the governing path, its caption and the scale bar. */
export interface Figure extends Zone {
  readonly width: number;
  readonly scale: number;
  /** True where the square code stands in it. */
  readonly coded: boolean;
}

/** What the drawing writes, as it stands in the end. */
const drawingWords = (context: Context): DrawingWords => {
  const { input, numbers, words } = context;
  const { end, designation } = input;
  const { bolts } = end.joint;
  return {
    units: numbers.units,
    section: sectionName(designation).replaceAll(' × ', '×') || say.ownSize,
    boltSize: bolts.size,
    boltGrade: typeof bolts.grade === 'string' ? bolts.grade : '',
    holes: bolts.holes ?? holesAssumed(context),
    cope: words.cope,
    plate: (end.joint.kind === 'fin-plate' ? say.labels.finPlate : say.labels.ply).toLowerCase(),
  };
};

/** The path of the check that governs, over the piece; null for rules of fit. */
export const governingPath = (context: Context): FailurePath | null => {
  const governing = governingOf(context);
  if (!governing) return null;
  return failurePath(governing.id, governing.of ?? '', context.input.facts, drawingWords(context));
};

/** mm on the paper. */
interface Least {
  readonly width: number;
  readonly height: number;
}

/** The figures of one end at the standard scales, each laid out at first use. */
export interface Figures {
  /** Scales at which the piece alone would fit and can still be read, the largest first. */
  readonly scales: readonly number[];
  /** What no figure at this scale goes below: known without laying one out. */
  readonly least: (scale: number) => Least;
  /** `labelled`: with the words that the data beside the figure repeat. */
  readonly at: (scale: number, labelled: boolean) => Figure;
  /** The figure that takes the least room, however small its piece is then. */
  readonly smallest: () => Figure;
}

/** Words on the piece that stand among the given data too. */
const repeated = new Set(['section', 'bolts', 'plate']);

/** `width` and `height`: room on the paper, mm; `code`: a square code that looks for room beside the piece. */
export const figuresOf = (context: Context, width: number, height: number, code: Code | null): Figures => {
  const path = governingPath(context);
  const drawing = drawEnd(context.input.facts, drawingWords(context));
  const { box } = drawing;
  const [wide, high] = [box.right - box.left, box.bottom - box.top];
  const first = standardScales.find((scale) => wide / scale <= width && high / scale <= height);
  const bare = { ...drawing, callouts: drawing.callouts.filter(({ name }) => !repeated.has(name)) };
  const captions = captionsOf(context, path);
  const made = new Map<string, Figure>();
  const at = (scale: number, labelled: boolean): Figure => {
    const key = `${scale} ${labelled}`;
    const content = { drawing: labelled ? drawing : bare, path, captions, code, room: width };
    const known = made.get(key) ?? figureAt(context, content, scale);
    made.set(key, known);
    return known;
  };
  const scales = standardScales.filter((scale) => scale === first || (scale > first! && high / scale >= LEAST_DEPTH));
  const leasts = new Map<number, Least>();
  const least = (scale: number): Least => {
    const known = leasts.get(scale) ?? leastAt(context, drawing, scale);
    leasts.set(scale, known);
    return known;
  };
  const smallest = (): Figure => {
    const fits = standardScales.find((scale) => scale >= scales.at(-1)! && at(scale, false).width <= width);
    return at(fits ?? standardScales.at(-1)!, false);
  };
  return { scales, least, at, smallest };
};

/** How the paper's text stands on a drawing at 1:`scale`. */
const penAt = ({ pen }: Context, scale: number): LayoutOptions => ({
  textHeight: SIZE * POINT * scale,
  values: 'parallel',
  measure: (text, size) => (pen.width(text, { size: SIZE }) * size) / (SIZE * POINT),
});

const leastAt = (context: Context, drawing: Drawing, scale: number): Least => {
  const { left, right, top, bottom } = leastBox(drawing, penAt(context, scale));
  return { width: (right - left) / scale, height: (bottom - top) / scale };
};

interface Content extends FigureWords {
  readonly drawing: Drawing;
  readonly path: FailurePath | null;
}

const figureAt = (context: Context, content: Content, scale: number): Figure => {
  const { pen } = context;
  const { drawing, path, code } = content;
  const laid = layoutDrawing(drawing, penAt(context, scale), path);
  const { box, marks } = laid;
  const placed = placeWords(laid, content, scale);
  const draw = (x: number, y: number): void => {
    const place = (p: Point): Spot => ({ x: x + (p.x - box.left) / scale, y: y + (p.y - box.top) / scale });
    for (const mark of marks) drawMark(context, mark, place, scale);
    setLines(pen, x + placed.x, y + placed.y + 3, placed.lines, style, LEADING);
    drawScale(context, x + placed.x, y + placed.y + placed.lines.length * LEADING + 3.4, scale);
    if (code && placed.code) drawCode(pen, x + placed.code.x, y + placed.code.y, code);
  };
  return { width: placed.width, height: placed.height, scale, coded: placed.code !== null, draw };
};

/** Length of the scale bar in the file's units: 20 mm on paper, or the nearest whole inches. */
const barOf = (units: UnitSystem, scale: number): number =>
  units === 'mm-kN' ? 20 * scale : Math.max(1, Math.round(0.8 * scale));

/** Scale in figures and as a bar, since printers shrink. */
const drawScale = ({ pen, numbers }: Context, x: number, y: number, scale: number): void => {
  const length = barOf(numbers.units, scale);
  const onPaper = fromSystem(length, '1,0', numbers.units) / scale;
  pen.text(x, y, say.scaleText(scale, `${length} ${numbers.length}`), style);
  const line = y + 1.5;
  pen.line(x, line, x + onPaper, line, WIDE);
  for (const share of [0, 0.5, 1]) pen.line(x + share * onPaper, line - 0.7, x + share * onPaper, line + 0.7, NARROW);
};
