import type { Point } from '../drawing/drawing.ts';
import { boxOfViews, layViews } from '../drawing/layViews.ts';
import { fromSystem, type UnitSystem } from '../units/systems.ts';
import type { Context, Zone } from './context.ts';
import { drawMarks } from './figureMarks.ts';
import { besideWidth, captionsOf, type FigureWords, LEADING, placeWords, style } from './figureWords.ts';
import { NARROW, WIDE } from './page.ts';
import type { Spot } from './pen.ts';
import {
  leastAt,
  longerPiece,
  type PaperSize,
  type Piece,
  penAt,
  pieceOf,
  unlabelled,
  type ViewsShown,
  viewsOf,
} from './piece.ts';
import { type Code, drawCode } from './qr.ts';
import { standardScales } from './scales.ts';
import { sheetWords as say } from './sheetWords.ts';
import { setLines } from './textBlock.ts';

/** A beam drawn less deep than this cannot be read, mm. */
const LEAST_DEPTH = 26;

/** The end to scale with its dimensions and the governing path, its caption and the scale bar. */
export interface Figure extends Zone {
  readonly width: number;
  readonly scale: number;
  /** True where the square code stands in it. */
  readonly coded: boolean;
}

/** The figures of one end at the standard scales, each laid out at first use. */
export interface Figures {
  /** How many views of the end stand in each. */
  readonly views: number;
  /** Scales at which the piece alone would fit and can still be read, the largest first. */
  readonly scales: readonly number[];
  /** What no figure at this scale goes below: known without laying one out. */
  readonly least: (scale: number) => PaperSize;
  /** `labelled`: with the words that the data beside the figure repeat. */
  readonly at: (scale: number, labelled: boolean) => Figure;
  /** The figure that takes the least room, however small its piece is then. */
  readonly smallest: () => Figure;
}

/** Room on the paper, mm. */
export interface FigureRoom {
  readonly width: number;
  readonly height: number;
}

/** `code`: a square code that looks for room beside the piece. */
export const figuresOf = (
  context: Context,
  shown: ViewsShown,
  { width, height }: FigureRoom,
  code: Code | null,
): Figures => {
  const usual = pieceOf(context, shown);
  const box = boxOfViews(viewsOf(usual));
  const [wide, high] = [box.right - box.left, box.bottom - box.top];
  const { beam } = usual.drawing;
  const deep = beam.bottom - beam.top;
  const first = standardScales.find((scale) => wide / scale <= width && high / scale <= height);
  const words: FigureWords = { captions: captionsOf(context, usual.path), code, room: width };
  const leasts = new Map<number, PaperSize>();
  const least = (scale: number): PaperSize => {
    const known = leasts.get(scale) ?? leastAt(context, usual, scale);
    leasts.set(scale, known);
    return known;
  };
  const laid = (scale: number, labelled: boolean): Figure => {
    if (!labelled) return figureAt(context, unlabelled(usual), words, scale);
    const free = width - besideWidth(code) - least(scale).width;
    const longer = longerPiece(context, shown, scale, free);
    const figure = longer && figureAt(context, longer, words, scale);
    // Words beside the beam may still take the code's place; those that the data repeat give way to it.
    if (figure && (figure.coded || !code)) return figure;
    const short = figureAt(context, usual, words, scale);
    return short.coded || !code || !at(scale, false).coded ? short : at(scale, false);
  };
  const made = new Map<string, Figure>();
  const at = (scale: number, labelled: boolean): Figure => {
    const key = `${scale} ${labelled}`;
    const known = made.get(key) ?? laid(scale, labelled);
    made.set(key, known);
    return known;
  };
  const scales = standardScales.filter((scale) => scale === first || (scale > first! && deep / scale >= LEAST_DEPTH));
  const smallest = (): Figure => {
    const fits = standardScales.find((scale) => scale >= scales.at(-1)! && at(scale, false).width <= width);
    return at(fits ?? standardScales.at(-1)!, false);
  };
  return { views: viewsOf(usual).length, scales, least, at, smallest };
};

const figureAt = (context: Context, piece: Piece, words: FigureWords, scale: number): Figure => {
  const { pen } = context;
  const { code } = words;
  const laid = layViews(viewsOf(piece), penAt(context, scale), piece.path);
  const { box, marks } = laid;
  const placed = placeWords(laid, words, scale);
  const draw = (x: number, y: number): void => {
    const place = (p: Point): Spot => ({ x: x + (p.x - box.left) / scale, y: y + (p.y - box.top) / scale });
    drawMarks(context, marks, place, scale);
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
