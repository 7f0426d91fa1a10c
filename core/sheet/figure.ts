import { drawEnd } from '../drawing/drawEnd.ts';
import type { Drawing, FailurePath, Point } from '../drawing/drawing.ts';
import { failurePath } from '../drawing/failurePath.ts';
import type { Laid } from '../drawing/laid.ts';
import { layoutDrawing } from '../drawing/layout.ts';
import type { DrawingWords } from '../drawing/words.ts';
import { fromSystem, type UnitSystem } from '../units/systems.ts';
import type { Context, Zone } from './context.ts';
import { drawMark } from './figureMarks.ts';
import { freeAbove, lowestRightOf, type PaperBox, paperBoxes } from './figureSpace.ts';
import { holesAssumed, sectionName } from './given.ts';
import { body, NARROW, WIDE } from './page.ts';
import { POINT, type Spot, type TextStyle } from './pen.ts';
import { type Code, drawCode, sideOf } from './qr.ts';
import { richText } from './richText.ts';
import { standardScales } from './scales.ts';
import { sheetWords as say } from './sheetWords.ts';
import { type Lines, setLines, wrap } from './textBlock.ts';
import { governingOf } from './verdictLine.ts';

/** Capitals 2.5 mm high: size in pt of a face whose capitals stand 0.698 em high. */
const SIZE = 2.5 / 0.698 / POINT;
const LEADING = 3.75;
const SCALE_HEIGHT = 5.9;
/** Width of the caption below the piece, and least width of one beside it. */
const CAPTION = 62;
const BESIDE = 28;
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

/** Where the caption with the scale stands, and the square code if it found room; mm on the paper from the figure's upper left corner. */
interface Placed {
  readonly lines: Lines;
  readonly x: number;
  readonly y: number;
  readonly code: Spot | null;
  readonly width: number;
  readonly height: number;
}

const style: TextStyle = { ...body, family: 'narrow' };

/** The figures of one end at the standard scales, each laid out at first use. */
export interface Figures {
  /** Scales at which the piece alone would fit and can still be read, the largest first. */
  readonly scales: readonly number[];
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
  const made = new Map<string, Figure>();
  const at = (scale: number, labelled: boolean): Figure => {
    const key = `${scale} ${labelled}`;
    const content = { drawing: labelled ? drawing : bare, path, code, room: width };
    const known = made.get(key) ?? figureAt(context, content, scale);
    made.set(key, known);
    return known;
  };
  const scales = standardScales.filter((scale) => scale === first || (scale > first! && high / scale >= LEAST_DEPTH));
  const smallest = (): Figure => {
    const least = standardScales.find((scale) => scale >= scales.at(-1)! && at(scale, false).width <= width);
    return at(least ?? standardScales.at(-1)!, false);
  };
  return { scales, at, smallest };
};

interface Content {
  readonly drawing: Drawing;
  readonly path: FailurePath | null;
  readonly code: Code | null;
  /** Width on the paper, mm. */
  readonly room: number;
}

const figureAt = (context: Context, content: Content, scale: number): Figure => {
  const { pen } = context;
  const { drawing, path, code } = content;
  const measure = (text: string, size: number): number => (pen.width(text, { size: SIZE }) * size) / (SIZE * POINT);
  const laid = layoutDrawing(drawing, { textHeight: SIZE * POINT * scale, values: 'parallel', measure }, path);
  const { box, marks } = laid;
  const placed = placeWords(context, laid, content, scale);
  const draw = (x: number, y: number): void => {
    const place = (p: Point): Spot => ({ x: x + (p.x - box.left) / scale, y: y + (p.y - box.top) / scale });
    for (const mark of marks) drawMark(context, mark, place, scale);
    setLines(pen, x + placed.x, y + placed.y + 3, placed.lines, style, LEADING);
    drawScale(context, x + placed.x, y + placed.y + placed.lines.length * LEADING + 3.4, scale);
    if (code && placed.code) drawCode(pen, x + placed.code.x, y + placed.code.y, code);
  };
  return { width: placed.width, height: placed.height, scale, coded: placed.code !== null, draw };
};

/** The caption beside the piece where there is room for it; else below, to the right of the reaction's arrow. */
const placeWords = (context: Context, laid: Laid, { path, code, room }: Content, scale: number): Placed => {
  const boxes = paperBoxes(laid, scale);
  const [wide, high] = [(laid.box.right - laid.box.left) / scale, (laid.box.bottom - laid.box.top) / scale];
  const left = room - BESIDE - 1;
  const beside = captionLines(context, path, BESIDE);
  const needed = beside.length * LEADING + SCALE_HEIGHT;
  const y = freeAbove(boxes, left, needed, high);
  if (y !== null) {
    const words = { left, right: room, top: y, bottom: y + needed };
    const spot = placeCode([...boxes, words], code, room, high);
    return { lines: beside, x: left, y, code: spot, width: Math.max(wide, room), height: high };
  }
  const x = Math.max(36, Math.min(wide, room) - CAPTION);
  const lines = captionLines(context, path, CAPTION);
  const top = lowestRightOf(boxes, x) + 1.5;
  const height = Math.max(high, top + lines.length * LEADING + SCALE_HEIGHT);
  return { lines, x, y: top, code: placeCode(boxes, code, room, high), width: Math.max(wide, x + CAPTION), height };
};

const placeCode = (boxes: readonly PaperBox[], code: Code | null, room: number, high: number): Spot | null => {
  if (!code) return null;
  const side = sideOf(code);
  const x = room - side - 1;
  const y = freeAbove(boxes, x - 0.5, side + 1, high - 1);
  return y === null ? null : { x, y };
};

const captionLines = ({ pen, numbers }: Context, path: FailurePath | null, width: number): Lines =>
  path ? wrap(pen, richText(numbers.marked(path.caption), 'prose'), style, width) : [];

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
