import type { Context, Second } from './context.ts';
import type { SetRun } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { optionsText, standardTitles } from './standardNames.ts';
import { plainRun } from './textBlock.ts';

/** What was taken as true under the second standard and not said before: its level is its own, its reaction stands with its verdict. */
const ownTexts = ({ input }: Context, second: Second): string[] => {
  const { assumptions, notes } = second.input.report;
  const said = new Set([...input.report.assumptions, ...input.report.notes].map(({ text }) => text));
  return [...notes, ...assumptions]
    .filter(({ code, text }) => code !== 'level-assumed' && !said.has(text))
    .map(({ text }) => text);
};

/** Strengths carried over, holes, notes, assumed values and options of the second standard. */
export const secondLimits = (context: Context, second: Second): SetRun[] => {
  const { numbers, input } = second;
  const { facts, report } = input;
  const options = Object.keys(report.options).length > 0 ? `${say.options}${optionsText(second)}.` : '';
  const sentences = [
    ...ownTexts(context, second),
    say.holesUnder(numbers.mm(facts.d0), numbers.mm(facts.dn)),
    options,
  ].filter(Boolean);
  return [plainRun(` ${standardTitles(context)[1]}. `, true), ...richText(sentences.join(' '), 'prose')];
};
