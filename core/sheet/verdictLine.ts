import type { Check } from '../check/report.ts';
import type { Context, Under } from './context.ts';
import { FIGURE_TOP, LEFT, NARROW, VERDICT_TOP, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { drawSecondVerdict, figureTop } from './secondVerdict.ts';
import { sheetWords as say } from './sheetWords.ts';
import { drawSign, isClose } from './sign.ts';
import { atMostLines, setLines, wrap } from './textBlock.ts';
import { verdictSentence } from './verdictSentence.ts';

const word: TextStyle = { size: 18, family: 'wide', bold: true };
const tries: readonly { style: TextStyle; lines: number; leading: number; first: number }[] = [
  { style: { size: 13 }, lines: 1, leading: 0, first: 6.6 },
  { style: { size: 11.5 }, lines: 1, leading: 0, first: 6.6 },
  { style: { size: 9.5 }, lines: 2, leading: 3.9, first: 4.4 },
];

export const governingOf = ({ input }: Pick<Under, 'input'>): Check | undefined =>
  input.report.checks.find(({ id }) => id === input.report.governing);

/** The verdict's sign, word and ratio, and the sentence. */
export const drawVerdict = (context: Context): void => {
  const { pen, input, numbers } = context;
  const { verdict } = input.report;
  const governing = governingOf(context);
  const utilisation = governing?.utilisation ?? null;
  pen.line(LEFT, VERDICT_TOP, LEFT + WIDTH, VERDICT_TOP, NARROW);
  pen.line(LEFT, figureTop(context) - 1.2, LEFT + WIDTH, figureTop(context) - 1.2, NARROW);
  const stated = verdict === 'refer' || utilisation === null ? '' : ` ${numbers.ratio(utilisation)}`;
  const text = `${say.verdict[verdict]}${stated}`;
  const width = pen.width(text, word);
  const middle = (VERDICT_TOP + FIGURE_TOP - 1.2) / 2;
  drawSign(pen, LEFT + 2.1, middle, 2, { state: verdict, utilisation: verdict === 'holds' ? utilisation : null });
  const wordLeft = LEFT + 6;
  if (verdict === 'fails') pen.box(wordLeft - 0.8, middle - 3.4, width + 1.6, 6.8, { fill: 'black' });
  if (verdict === 'refer') pen.box(wordLeft - 0.8, middle - 3.4, width + 1.6, 6.8, { width: 0.3, dash: [1.2, 0.9] });
  pen.text(wordLeft, middle + 2.25, text, { ...word, white: verdict === 'fails' });
  const close = verdict === 'holds' && isClose(utilisation) ? drawClose(context, middle) : 0;
  drawSentence(context, wordLeft + width + 4, LEFT + WIDTH - close - (close ? 3 : 0));
  drawSecondVerdict(context);
};

const drawClose = ({ pen, numbers }: Context, middle: number): number => {
  const style: TextStyle = { size: 9 };
  const width = pen.text(LEFT + WIDTH, middle + 1.15, numbers.marked(say.close), { ...style, anchor: 'end' });
  drawSign(pen, LEFT + WIDTH - width - 2.2, middle, 1, { state: 'holds', utilisation: 1 });
  return width + 4.4;
};

const drawSentence = (context: Context, left: number, right: number): void => {
  const { pen, input, numbers } = context;
  const runs: SetRun[] = richText(verdictSentence(input.report, numbers), 'prose');
  for (const { style, lines, leading, first } of tries) {
    const broken = wrap(pen, runs, style, right - left);
    if (broken.length > lines && style !== tries.at(-1)!.style) continue;
    const kept = atMostLines(pen, broken, lines, style, right - left);
    setLines(pen, left, VERDICT_TOP + (kept.length === 1 ? 6.4 : first), kept, style, leading);
    return;
  }
};
