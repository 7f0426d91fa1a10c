import type { Check } from '../check/report.ts';
import { isFit, isSecondRow } from './cells.ts';
import type { Context } from './context.ts';

/** Refers or fails for a reason in words; a rule of fit says why by its two sizes, unless it clashes. */
export const tellsWhy = (check: Check): boolean => {
  const { state, reason, reasonText } = check;
  const bySizes = isFit(check) && (reason === 'too-little' || reason === 'too-much');
  return (state === 'refer' || state === 'fails') && !!reasonText && !bySizes;
};

export type Shared = ReadonlyMap<string, string>;

const reasonsOf = (checks: readonly Check[]): string[] =>
  checks.filter(tellsWhy).map(({ reasonText = '' }) => reasonText);

/** Letters of the reasons that several checks share, and of all that the second standard gives, in the order of the rows. */
export const sharedReasons = ({ input, second }: Context): Shared => {
  const others = second ? reasonsOf(second.input.report.checks.filter((one) => isSecondRow(second, one))) : [];
  const told = [...reasonsOf(input.report.checks), ...others];
  const shared = [...new Set(told)].filter(
    (one) => others.includes(one) || told.indexOf(one) !== told.lastIndexOf(one),
  );
  return new Map(shared.map((reason, i) => [reason, String.fromCharCode(97 + i)]));
};

/** Letter of a check's reason in brackets, after a blank. */
export const letterOf = (shared: Shared, check: Check): string => {
  const letter = tellsWhy(check) ? shared.get(check.reasonText ?? '') : undefined;
  return letter ? ` (${letter})` : '';
};

/** The clause; beside a second standard with the letter of the reason, which else follows the title. */
export const clauseText = (context: Context, shared: Shared, check: Check): string =>
  `${check.clause}${context.second ? letterOf(shared, check) : ''}`;
