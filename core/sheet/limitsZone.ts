import type { Basis } from '../formula/tree.ts';
import type { Context, Zone } from './context.ts';
import { optionsFit, optionsText } from './head.ts';
import { body, LEADING, LEFT, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { plainRun, setLines, wrap } from './textBlock.ts';

const style: TextStyle = { ...body, family: 'narrow' };
const order: readonly Basis[] = ['seen', 'memory', 'research', 'practice'];

/** What each standing of a formula means, for those that the sheet prints. */
const basesText = ({ input, words }: Context): string => {
  const used = new Set(input.report.checks.filter(({ state }) => state !== 'notApplicable').map(({ basis }) => basis));
  const lines = order.filter((one) => used.has(one)).map((one) => `${one}, ${words.bases[one] ?? ''}`);
  return lines.length > 0 ? `${say.basis}${lines.join('; ')}.` : '';
};

const unverified = ({ input }: Context): boolean =>
  input.report.checks.some(({ state, verified }) => state !== 'notApplicable' && verified === 'none');

/** What was taken as true, notes, options where the head has no room, and what the marks of the table mean. */
export const limitsZone = (context: Context): Zone => {
  const { pen, input } = context;
  const { assumptions, notes } = input.report;
  const options = optionsFit(context) ? '' : `${say.options}${optionsText(context)}.`;
  const sentences = [
    ...assumptions.map(({ text }) => text),
    ...notes.map(({ text }) => text),
    options,
    basesText(context),
    unverified(context) ? say.unverified : '',
  ].filter(Boolean);
  const runs: SetRun[] = [plainRun(say.limits, true), ...richText(sentences.join(' '), 'prose')];
  const lines = wrap(pen, runs, style, WIDTH);
  return {
    height: 0.8 + lines.length * LEADING,
    draw: (_x, y) => setLines(pen, LEFT, y + 3.2, lines, style, LEADING),
  };
};
