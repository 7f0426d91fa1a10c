import type { Context } from './context.ts';
import { FRAME, LEFT, small, TOP, WIDTH } from './page.ts';
import type { TextStyle } from './pen.ts';
import { sheetWords as say } from './sheetWords.ts';
import { optionsText, standardName } from './standardNames.ts';
import { atMostLines, oneLine, plainRun, setLines, wrap } from './textBlock.ts';
import { drawEmpty } from './titleBlock.ts';

/** Sizes in which the mark is tried, the largest first; the last two in the narrow family. */
const marks: readonly TextStyle[] = [
  { size: 29, family: 'wide', bold: true },
  { size: 25, family: 'wide', bold: true },
  { size: 25, family: 'narrow', bold: true },
  { size: 21, family: 'narrow', bold: true },
];
const MARK = 48;
const WIDEST_MARK = 84;
/** Room for the standard at the right of the head, mm. */
export const STANDARD = 64;

const optionStyle: TextStyle = { size: 8, family: 'narrow' };

/** True where the options find room in the head strip. */
export const optionsFit = (context: Context): boolean =>
  wrap(context.pen, [plainRun(optionsText(context))], optionStyle, STANDARD).length <= (context.second ? 1 : 2);

/** Mark, job, drawing, standard with edition and options. */
export const drawHead = (context: Context): void => {
  const { pen } = context;
  pen.line(LEFT, TOP, LEFT + WIDTH, TOP, FRAME);
  const used = drawMark(context);
  const jobLeft = LEFT + Math.max(MARK, used) + 2;
  const standardLeft = LEFT + WIDTH - STANDARD;
  drawJob(context, jobLeft, standardLeft - jobLeft - 3);
  drawStandard(context, standardLeft, say.title);
};

const drawMark = ({ pen, input }: Context): number => {
  const text = input.report.mark;
  if (!text) {
    pen.box(LEFT, TOP + 3, MARK - 4, 11, { width: 0.25 });
    return MARK - 4;
  }
  for (const style of marks) {
    const width = pen.width(text, style);
    if (width > (style.size > 25 ? MARK : WIDEST_MARK)) continue;
    pen.text(LEFT - 0.3, TOP + 11.6, text, style);
    return width;
  }
  const style: TextStyle = { size: 16, family: 'narrow', bold: true };
  const lines = atMostLines(pen, wrap(pen, [plainRun(text)], style, WIDEST_MARK), 2, style, WIDEST_MARK);
  setLines(pen, LEFT, TOP + 6.6, lines, style, 6.4);
  return WIDEST_MARK;
};

/** Job, drawing and number, `width` mm wide. */
export const drawJob = ({ pen, input }: Context, left: number, width: number): void => {
  const { job = '', drawing = '', number = '' } = input.end.sheet ?? {};
  pen.text(left, TOP + 4.1, say.job, small);
  const style: TextStyle = { size: 10 };
  const lines = atMostLines(pen, wrap(pen, [plainRun(job)], style, width), 2, style, width);
  if (job) setLines(pen, left, TOP + 8, lines, style, 3.7);
  else drawEmpty(pen, left, TOP + 5, width);
  const base = TOP + (lines.length > 1 ? 14.9 : 12.9);
  const label = pen.text(left, base, `${say.drawing}: `, small);
  const half = (width - label) / (number ? 2 : 1);
  if (drawing) pen.text(left + label, base, oneLine(pen, drawing, small, half - 1), small);
  else drawEmpty(pen, left + label, base - 3, half - 2);
  if (number)
    pen.text(left + width, base, oneLine(pen, `${say.number} ${number}`, small, half - 1), { ...small, anchor: 'end' });
};

/** Standards with their editions under a title, and the options of the first; lines closer where there are two standards. */
export const drawStandard = (context: Context, left: number, title: string): void => {
  const { pen, second } = context;
  const style: TextStyle = { size: 10, bold: true };
  const [first, leading] = second ? [7.6, 3.7] : [8.2, 3.4];
  pen.text(left, TOP + first - 4.1, title, small);
  pen.text(left, TOP + first, oneLine(pen, standardName(context), style, STANDARD), style);
  if (second) {
    const other: TextStyle = { size: 9 };
    const text = `${say.beside} ${standardName(second)}`;
    pen.text(left, TOP + first + leading, oneLine(pen, text, other, STANDARD), other);
  }
  const text = optionsFit(context) ? optionsText(context) : say.optionsBelow;
  const base = TOP + first + (second ? 2 * leading - 0.1 : leading);
  setLines(pen, left, base, wrap(pen, [plainRun(text)], optionStyle, STANDARD), optionStyle, 3.2);
};
