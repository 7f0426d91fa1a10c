import type { Check } from '../check/report.ts';
import { stateWords } from '../words/stateWords.ts';
import { isFit, isRow } from './cells.ts';
import type { Context, Second } from './context.ts';
import { limitText } from './fitLimit.ts';
import { lower } from './lower.ts';
import type { SetRun } from './pen.ts';
import { tellsWhy } from './reasons.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { standardTitles } from './standardNames.ts';
import { plainRun } from './textBlock.ts';
import { titleOf } from './verdictSentence.ts';

/** A rule of fit that is not held: given, limit, state; or why, where it is no size. */
const brokenText = ({ numbers }: Second, check: Check): string => {
  const { resistance, unit, state, reasonText = '' } = check;
  const sizes = `${numbers.amount(resistance, unit)}, ${limitText(numbers, check)} ${unit}`;
  return `${lower(titleOf(check))} ${tellsWhy(check) ? reasonText : sizes}, ${stateWords[state]}`;
};

/** The second standard's rules of fit in short. */
export const secondFit = (context: Context, second: Second): SetRun[] => {
  const rules = second.input.report.checks.filter((one) => isFit(one) && one.state !== 'notApplicable');
  if (rules.length === 0) return [];
  const broken = rules.filter(isRow).map((one) => brokenText(second, one));
  const others = broken.length === rules.length ? [] : [broken.length > 0 ? say.othersHold : say.fitAllHolds];
  return [
    plainRun(say.fitUnder(standardTitles(context)[1]), true),
    ...richText(`${[...broken, ...others].join('; ')}.`, 'prose'),
  ];
};

/** What does not apply under the second standard and is not told already: by the table, or by the first standard for the same reason. */
export const secondAbsent = (context: Context, second: Second): SetRun[] => {
  const absent = second.input.report.checks.filter(({ id, state, reason, reasonText }) => {
    const first = context.input.report.checks.find((one) => one.id === id);
    const inTable = first && isRow(first) && !isFit(first) && reason === 'no-rule';
    const told = inTable || (first?.state === 'notApplicable' && first.reasonText === reasonText);
    return state === 'notApplicable' && !told;
  });
  if (absent.length === 0) return [];
  const lead = say.alsoNotApplicable(standardTitles(context)[1]);
  return [plainRun(lead, true), ...richText(`${byReason(absent).join('; ')}.`, 'prose')];
};

/** Titles of checks that do not apply, those of one reason together. */
export const byReason = (absent: readonly Check[]): string[] => {
  const reasons = [...new Set(absent.map(({ reasonText = '' }) => reasonText))];
  return reasons.map((reason) => {
    const titles = absent.filter(({ reasonText = '' }) => reasonText === reason).map((one) => lower(titleOf(one)));
    return reason ? `${titles.join(', ')} (${reason})` : titles.join(', ');
  });
};
