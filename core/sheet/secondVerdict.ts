import type { Context, Second } from './context.ts';
import { FIGURE_TOP, LEFT, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { hasOwnReaction } from './second.ts';
import { sheetWords as say } from './sheetWords.ts';
import { drawSign } from './sign.ts';
import { standardName } from './standardNames.ts';
import { atMostLines, type Lines, oneLine, plainRun, setLines, wrap } from './textBlock.ts';

const HEIGHT = 5.6;
const LEADING = 3.6;
const INDENT = 6;
const word: TextStyle = { size: 11, family: 'narrow', bold: true };
const style: TextStyle = { size: 9.5, family: 'narrow' };

/** Why there is no second standard, in two lines at most. */
const faultLines = ({ pen, fault }: Context): Lines => {
  const runs = [plainRun(say.secondFault, true), plainRun(fault)];
  return atMostLines(pen, wrap(pen, runs, style, WIDTH - INDENT), 2, style, WIDTH - INDENT);
};

/** Height that the second standard's verdict takes below the first's, mm. */
const secondHeight = (context: Context): number => {
  if (context.second) return HEIGHT;
  return context.fault ? HEIGHT + (faultLines(context).length - 1) * LEADING : 0;
};

/** Where figure and data begin. */
export const figureTop = (context: Context): number => FIGURE_TOP + secondHeight(context);

/** Word and ratio of the second standard, smaller; or that it gives strengths only, or why there is none. */
export const drawSecondVerdict = (context: Context): void => {
  const { pen, second } = context;
  const top = FIGURE_TOP - 1.2;
  if (!second) {
    if (context.fault) setLines(pen, LEFT + INDENT, top + 3.3, faultLines(context), style, LEADING);
    return;
  }
  const left = LEFT + INDENT;
  const right = second.stated ? left + drawWord(second, left, top) + 3 : left;
  pen.text(right, top + 3.6, restOf(context, second, LEFT + WIDTH - right), style);
};

const restOf = (context: Context, second: Second, width: number): readonly SetRun[] => {
  const { reaction, level } = second.input.report;
  const own = hasOwnReaction(context)
    ? say.secondReaction(`${second.numbers.load(reaction)} ${second.numbers.force}`, level)
    : '';
  const said = second.stated ? own : say.strengthsOnly(level);
  const name = plainRun(standardName(second), true);
  const after = said ? [plainRun(`;  ${said}`)] : [];
  const room = width - second.pen.width(after, style);
  return [
    ...oneLine(second.pen, name.text, { ...style, bold: true }, room).map((run) => ({ ...run, bold: true })),
    ...after,
  ];
};

/** Sign, word and ratio; the width of the word. */
const drawWord = ({ pen, input, numbers }: Second, left: number, top: number): number => {
  const { verdict, checks, governing } = input.report;
  const utilisation = checks.find(({ id }) => id === governing)?.utilisation ?? null;
  const ratio = verdict === 'refer' || utilisation === null ? '' : ` ${numbers.ratio(utilisation)}`;
  const text = `${say.verdict[verdict]}${ratio}`;
  const width = pen.width(text, word);
  const middle = top + 2.25;
  drawSign(pen, LEFT + 2.1, middle, 1.3, { state: verdict, utilisation: verdict === 'holds' ? utilisation : null });
  if (verdict === 'fails') pen.box(left - 0.8, middle - 2, width + 1.6, 4.1, { fill: 'black' });
  if (verdict === 'refer') pen.box(left - 0.8, middle - 2, width + 1.6, 4.1, { width: 0.25, dash: [1, 0.7] });
  pen.text(left, top + 3.6, text, { ...word, white: verdict === 'fails' });
  return width;
};
