import type { Check, Numbers } from '../check/report.ts';
import { shortOf, type Words } from '../words/words.ts';
import { limitText } from './fitLimit.ts';
import type { Numbers as Figures } from './numbers.ts';
import { sheetWords as say } from './sheetWords.ts';

/** Title of a check with the part that its numbers speak of. */
export const titleOf = ({ title, ofText }: Pick<Check, 'title' | 'ofText'>): string =>
  ofText ? `${title}, ${ofText}` : title;

/** The same for a narrow column. */
export const shortTitleOf = (words: Words, check: Check): string => {
  const { id, of = '', ofText } = check;
  const way = ofText && (say.shortWays[of] ?? ofText);
  return say.shortTitles[`${id}, ${of}`] ?? titleOf({ title: shortOf(words, check), ...(way && { ofText: way }) });
};

/** What refers and why: by name where one or two do for the same reason, else by their number. */
const refersText = (checks: readonly Check[]): string => {
  const refers = checks.filter(({ state }) => state === 'refer');
  const reasons = [...new Set(refers.map(({ reasonText = '' }) => reasonText))];
  return reasons
    .map((reason) => {
      const titles = refers.filter(({ reasonText = '' }) => reasonText === reason).map(titleOf);
      return say.refers(titles.length > 2 ? say.checks(titles.length) : titles.join(', '), reason);
    })
    .join('; ');
};

/** What decides, in one sentence: for the sheet and wherever else a verdict is read. */
export const verdictSentence = (report: Numbers, numbers: Figures): string => {
  const governing = report.checks.find(({ id }) => id === report.governing);
  const load = (text: string): string => `${text} ${numbers.force}`;
  const reaction = load(numbers.load(report.reaction));
  if (report.verdict === 'refer') {
    const least = governing && governing.state !== 'refer' && governing.reactionAtFailure;
    const others = least ? say.leastOthers(titleOf(governing), load(numbers.failsAt(least))) : '';
    return `${refersText(report.checks)}.${others}`;
  }
  if (!governing) return '';
  const title = titleOf(governing);
  if (governing.state === 'fails' && governing.id.startsWith('fit-')) {
    const { unit } = governing;
    const given = `${numbers.amount(governing.resistance, unit)} ${unit}`;
    return say.failsByRule(title, given, `${limitText(numbers, governing)} ${unit}`);
  }
  const at = governing.reactionAtFailure;
  if (at === undefined || at === null) {
    const amount = (value: number | null): string => `${numbers.amount(value, governing.unit)} ${governing.unit}`;
    return say.governsWithoutReaction(title, amount(governing.demand), amount(governing.resistance));
  }
  const failsAt = load(numbers.failsAt(at));
  return report.verdict === 'fails'
    ? say.governsFailing(title, reaction, failsAt)
    : say.governs(title, reaction, failsAt);
};
