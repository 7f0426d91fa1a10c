import type { Check, Report, SaidFault } from '../../core/check/report.ts';
import { roundedDown } from '../../core/units/figures.ts';
import { unitOf } from '../../core/units/systems.ts';
import { inSentence, isFooting } from './rungs.ts';
import { spareText } from './spare.ts';
import { type Mark, markOf, ratioText } from './standing.ts';

/** The verdict in words: sign, word, number, what comes first, and whatever else does not hold. */
export interface VerdictLine {
  readonly mark: Mark;
  readonly word: 'HOLDS' | 'FAILS' | 'REFER' | 'INCOMPLETE';
  /** Empty where there is none. */
  readonly ratio: string;
  readonly close: boolean;
  /** The weakest way of failing and the reaction at which it fails; for an incomplete end, what is missing. */
  readonly first: string;
  /** What the reaction may still grow by, or by how much it is too large; empty where no way of failing gives it. */
  readonly spare: string;
  /** Everything else that fails or refers, in one or two sentences; empty where nothing does. */
  readonly others: string;
}

const verdictWords = { holds: 'HOLDS', fails: 'FAILS', refer: 'REFER' } as const;

/** An end that cannot be examined as it stands. */
export const incompleteLine = (faults: readonly SaidFault[]): VerdictLine => ({
  mark: 'incomplete',
  word: 'INCOMPLETE',
  ratio: '',
  close: false,
  first: faults[0]?.text ?? '',
  spare: '',
  others: faults.length > 1 ? `And ${faults.length - 1} more.` : '',
});

/** The strength check with the least reaction at failure, as the report lists it. */
const weakestOf = ({ checks }: Report): Check | undefined =>
  checks.find((one) => !isFooting(one) && typeof one.reactionAtFailure === 'number' && one.state !== 'information');

/** Names of checks; why a way of failing refers is said once for all it holds of, while a rule of fit says so in the footing. */
const named = (checks: readonly Check[]): string => {
  const byReason = new Map<string, string[]>();
  for (const one of checks) {
    const reason = one.state === 'refer' && !isFooting(one) ? (one.reasonText ?? '') : '';
    byReason.set(reason, [...(byReason.get(reason) ?? []), inSentence(one.title)]);
  }
  return [...byReason].map(([reason, names]) => `${names.join(', ')}${reason && ` (${reason})`}`).join('; ');
};

/** What fails beside the weakest, and all that refers. */
const othersOf = (report: Report, weakest: Check | undefined): string => {
  const fails = report.checks.filter((one) => one.state === 'fails' && one !== weakest);
  const refers = report.checks.filter(({ state }) => state === 'refer');
  return [
    fails.length > 0 && `${weakest?.state === 'fails' ? 'Also fails' : 'Fails'}: ${named(fails)}.`,
    refers.length > 0 && `Refers: ${named(refers)}.`,
  ]
    .filter(Boolean)
    .join(' ');
};

/** The verdict of a report. */
export const verdictLine = (report: Report): VerdictLine => {
  const governing = report.checks.find(({ id }) => id === report.governing);
  const weakest = weakestOf(report);
  const utilisation = governing?.utilisation ?? null;
  const mark = markOf({ state: report.verdict, utilisation }) ?? 'refer';
  const force = unitOf('0,1', report.units).name;
  return {
    mark,
    word: verdictWords[report.verdict],
    ratio: utilisation === null ? '' : ratioText({ state: report.verdict, utilisation }),
    close: mark === 'close',
    first: weakest
      ? `Weakest: ${inSentence(weakest.title)}, fails at ${roundedDown(weakest.reactionAtFailure!)} ${force}`
      : '',
    spare: weakest ? spareText(report.reaction, weakest.reactionAtFailure!, force) : '',
    others: othersOf(report, weakest),
  };
};
