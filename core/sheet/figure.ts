import { isArc } from '../drawing/arcs.ts';
import { drawEnd } from '../drawing/drawEnd.ts';
import type { Arc, Box, Drawing, FailurePath, Point } from '../drawing/drawing.ts';
import { failurePath } from '../drawing/failurePath.ts';
import type { Laid, LaidText, Mark } from '../drawing/laid.ts';
import { layoutDrawing } from '../drawing/layout.ts';
import { dashes, widths } from '../drawing/toSvg.ts';
import type { DrawingWords } from '../drawing/words.ts';
import { fromSystem } from '../units/systems.ts';
import type { Context, Zone } from './context.ts';
import { holesAssumed, sectionName } from './given.ts';
import { body, HAIR, NARROW, WIDE } from './page.ts';
import { POINT, type Spot, type TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { type Lines, plainRun, setLines, wrap } from './textBlock.ts';
import { governingOf } from './verdictLine.ts';

/** Standard scales, the largest first. */
export const scales = [1, 2, 5, 10, 20] as const;
export type Scale = (typeof scales)[number];

/** Capitals 2.5 mm high: size in pt of a face whose capitals stand 0.698 em high. */
const SIZE = 2.5 / 0.698 / POINT;
const LEADING = 3.75;
const SCALE_HEIGHT = 5.9;
/** Width of the caption below the piece, and least width of one beside it. */
const CAPTION = 62;
const BESIDE = 28;

/** Length of the scale bar in the file's units, by scale; its parts are a half each. */
const bars: Readonly<Record<'mm-kN' | 'in-kip', Readonly<Record<Scale, number>>>> = {
  'mm-kN': { 1: 20, 2: 50, 5: 100, 10: 200, 20: 400 },
  'in-kip': { 1: 1, 2: 2, 5: 4, 10: 8, 20: 20 },
};

/** The end to scale with its dimensions and the governing path, its caption and the scale bar. */
export interface Figure extends Zone {
  readonly width: number;
  readonly scale: Scale;
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

/** Where the caption and the scale stand, mm on the paper from the figure's upper left corner, and how large the figure then is. */
interface Placed {
  readonly lines: Lines;
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

const style: TextStyle = { ...body, family: 'narrow' };

/** The figures of one end at the standard scales, each laid out at first use. */
export interface Figures {
  /** The two largest scales at which the piece alone would fit: a still smaller figure could not be read. */
  readonly scales: readonly Scale[];
  readonly at: (scale: Scale) => Figure;
}

/** `width` and `height`: room on the paper, mm. */
export const figuresOf = (context: Context, width: number, height: number): Figures => {
  const path = governingPath(context);
  const drawing = drawEnd(context.input.facts, drawingWords(context));
  const { box } = drawing;
  const fitting = scales.filter(
    (scale) => (box.right - box.left) / scale <= width && (box.bottom - box.top) / scale <= height,
  );
  const made = new Map<Scale, Figure>();
  const at = (scale: Scale): Figure => {
    const known = made.get(scale) ?? figureAt(context, drawing, path, scale, width);
    made.set(scale, known);
    return known;
  };
  return { scales: fitting.length > 0 ? fitting.slice(0, 2) : [20], at };
};

const figureAt = (context: Context, drawing: Drawing, path: FailurePath | null, scale: Scale, room: number): Figure => {
  const { pen } = context;
  const measure = (text: string, size: number): number => (pen.width(text, { size: SIZE }) * size) / (SIZE * POINT);
  const laid = layoutDrawing(drawing, { textHeight: SIZE * POINT * scale, values: 'parallel', measure }, path);
  const { box, marks } = laid;
  const caption = placeCaption(context, laid, path, scale, room);
  const draw = (x: number, y: number): void => {
    const place = (p: Point): Spot => ({ x: x + (p.x - box.left) / scale, y: y + (p.y - box.top) / scale });
    for (const mark of marks) drawMark(context, mark, place, scale);
    setLines(pen, x + caption.x, y + caption.y + 3, caption.lines, style, LEADING);
    drawScale(context, x + caption.x, y + caption.y + caption.lines.length * LEADING + 3.4, scale);
  };
  return { width: caption.width, height: caption.height, scale, draw };
};

/** Beside the piece where there is room for it, the higher the better; else below, to the right of the reaction's arrow. */
const placeCaption = (context: Context, laid: Laid, path: FailurePath | null, scale: Scale, room: number): Placed => {
  const { box, marks } = laid;
  const [wide, high] = [(box.right - box.left) / scale, (box.bottom - box.top) / scale];
  const left = room - BESIDE - 1;
  const beside = captionLines(context, path, BESIDE);
  const needed = beside.length * LEADING + SCALE_HEIGHT;
  const y = freeFrom(marks, box, left - 2, needed, scale);
  if (y !== null) return { lines: beside, x: left, y, width: Math.max(wide, room), height: high };
  const x = Math.max(36, Math.min(wide, room) - CAPTION);
  const lines = captionLines(context, path, CAPTION);
  const clear = (lowestOf(marks, box.left + (x - 2) * scale) - box.top) / scale + 1.5;
  return {
    lines,
    x,
    y: clear,
    width: Math.max(wide, x + CAPTION),
    height: Math.max(high, clear + lines.length * LEADING + SCALE_HEIGHT),
  };
};

/** The lowest stretch of this height that no mark right of x enters; mm on the paper. */
const freeFrom = (marks: readonly Mark[], box: Box, x: number, height: number, scale: number): number | null => {
  const spans = marks
    .flatMap(boxesOf)
    .filter(({ right }) => (right - box.left) / scale > x)
    .map(({ top, bottom }) => [(top - box.top) / scale - 1.5, (bottom - box.top) / scale + 1.5] as const)
    .sort(([, a], [, b]) => b - a);
  let low = (box.bottom - box.top) / scale;
  for (const [top, bottom] of spans) {
    if (low - height >= bottom) break;
    low = Math.min(low, top);
  }
  return low - height >= 0 ? low - height : null;
};

const captionLines = ({ pen, numbers }: Context, path: FailurePath | null, width: number): Lines =>
  path ? wrap(pen, richText(numbers.marked(path.caption), 'prose'), style, width) : [];

/** Lowest point of all marks that reach to the right of x, mm of the piece. */
const lowestOf = (marks: readonly Mark[], x: number): number => {
  let lowest = Number.NEGATIVE_INFINITY;
  for (const mark of marks) {
    for (const { right, bottom } of boxesOf(mark)) if (right > x) lowest = Math.max(lowest, bottom);
  }
  return lowest;
};

const boxesOf = (mark: Mark): Pick<Box, 'right' | 'top' | 'bottom'>[] => {
  if (mark.shape === 'text') return [mark.box];
  if (mark.shape === 'circle') {
    const { centre, radius } = mark;
    return [{ right: centre.x + radius, top: centre.y - radius, bottom: centre.y + radius }];
  }
  const points = mark.shape === 'fill' ? mark.outline : [mark.from, ...mark.to.map(endOf)];
  const ys = points.map((p) => p.y);
  return [{ right: Math.max(...points.map((p) => p.x)), top: Math.min(...ys), bottom: Math.max(...ys) }];
};

const endOf = (step: Point | Arc): Point => (isArc(step) ? step.to : step);

const drawMark = (context: Context, mark: Mark, place: (p: Point) => Spot, scale: number): void => {
  const { pen } = context;
  switch (mark.shape) {
    case 'text':
      drawWord(context, mark, place, scale);
      return;
    case 'fill': {
      const [from, ...to] = mark.outline.map(place);
      if (from) pen.path(from, to, { fill: 'black', closed: true });
      return;
    }
    case 'circle': {
      const { x, y } = place(mark.centre);
      const style = mark.filled ? { fill: 'black' as const } : { width: widthOf(mark.kind) };
      pen.circle(x, y, mark.radius / scale, style);
      return;
    }
    case 'run': {
      const to = mark.to.map((step) =>
        isArc(step) ? { ...place(step.to), radius: step.radius / scale, clockwise: step.clockwise } : place(step),
      );
      const dash = dashes[mark.kind]?.map((one) => one * NARROW);
      const width = mark.tick ? WIDE : widthOf(mark.kind);
      pen.path(place(mark.from), to, { width, closed: mark.closed, ...(dash && { dash }) });
    }
  }
};

const widthOf = (kind: keyof typeof widths): number => Math.max(HAIR, widths[kind] * NARROW);

const drawWord = ({ pen, numbers }: Context, mark: LaidText, place: (p: Point) => Spot, scale: number): void => {
  const { x, y } = place(mark.at);
  const text = numbers.marked(mark.text);
  const style: TextStyle = {
    size: mark.size / scale / POINT,
    family: 'narrow',
    bold: mark.role === 'path',
    anchor: mark.anchor,
    turned: mark.rotation !== 0,
  };
  pen.text(x, y, mark.italic ? [{ text, italic: true, sub: false }] : [plainRun(text)], style);
};

/** Scale in figures and as a bar, since printers shrink. */
const drawScale = ({ pen, numbers }: Context, x: number, y: number, scale: Scale): void => {
  const length = bars[numbers.units][scale];
  const onPaper = fromSystem(length, '1,0', numbers.units) / scale;
  pen.text(x, y, say.scaleText(scale, `${length} ${numbers.length}`), style);
  const line = y + 1.5;
  pen.line(x, line, x + onPaper, line, WIDE);
  for (const share of [0, 0.5, 1]) pen.line(x + share * onPaper, line - 0.7, x + share * onPaper, line + 0.7, NARROW);
};
