import type { Check, Report } from '../../core/check/report.ts';
import { limitText } from '../../core/sheet/fitLimit.ts';
import type { Numbers } from '../../core/sheet/numbers.ts';
import { sheetWords as say } from '../../core/sheet/sheetWords.ts';

export const titleOf = ({ title, ofText }: Pick<Check, 'title' | 'ofText'>): string =>
  ofText ? `${title}, ${ofText}` : title;

const referring = (report: Report, governing: Check | undefined, numbers: Numbers): string => {
  const refers = report.checks.filter(({ state }) => state === 'refer');
  const reasons = [...new Set(refers.map(({ reasonText = '' }) => reasonText))].filter(Boolean);
  const least = governing && governing.state !== 'refer' && governing.reactionAtFailure;
  const others = least ? say.leastOthers(titleOf(governing), `${numbers.failsAt(least)} ${numbers.force}`) : '';
  return say.refers(refers.map(titleOf).join(', '), reasons.join('; ')) + others;
};

/** What decides, in one sentence. */
const sentence = (report: Report, governing: Check | undefined, numbers: Numbers): string => {
  if (report.verdict === 'refer') return referring(report, governing, numbers);
  if (!governing) return '';
  const { reactionAtFailure: at, unit } = governing;
  const title = titleOf(governing);
  if (governing.id.startsWith('fit-')) {
    const given = `${numbers.amount(governing.resistance, unit)} ${unit}`;
    return say.failsByRule(title, given, `${limitText(numbers, governing)} ${unit}`);
  }
  if (at === undefined || at === null)
    return say.governsWithoutReaction(
      title,
      `${numbers.amount(governing.demand, unit)} ${unit}`,
      `${numbers.amount(governing.resistance, unit)} ${unit}`,
    );
  const says = report.verdict === 'fails' ? say.governsFailing : say.governs;
  return says(title, `${numbers.load(report.reaction)} ${numbers.force}`, `${numbers.failsAt(at)} ${numbers.force}`);
};

/** The verdict's word, the ratio of what governs, and the sentence. */
export const verdictLine = (report: Report, numbers: Numbers): readonly [lead: string, sentence: string] => {
  const governing = report.checks.find(({ id }) => id === report.governing);
  const stated = report.verdict !== 'refer' && governing?.utilisation != null;
  const number = stated ? ` ${numbers.ratio(governing.utilisation)}` : '';
  return [`${say.verdict[report.verdict]}${number}  `, sentence(report, governing, numbers)];
};
