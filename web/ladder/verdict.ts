import type { Check, Numbers, SaidFault } from '../../core/check/report.ts';
import { roundedDown } from '../../core/units/figures.ts';
import { unitOf } from '../../core/units/systems.ts';
import { verdictWords as say } from '../../core/words/verdictWords.ts';
import { inSentence, isFooting } from './rungs.ts';
import { spareText } from './spare.ts';
import { type Mark, markOf, ratioText } from './standing.ts';

/** The verdict in words: sign, word, number, what comes first, and whatever else does not hold. */
export interface VerdictLine {
  readonly mark: Mark;
  readonly word: string;
  /** Empty where there is none. */
  readonly ratio: string;
  readonly close: boolean;
  /** Stands before the weakest; empty for an incomplete end. */
  readonly lead: string;
  /** The weakest way of failing and the reaction at which it fails; for an incomplete end, what is missing. */
  readonly first: string;
  /** What the reaction may still grow by, or by how much it is too large; empty where no way of failing gives it. */
  readonly spare: string;
  /** Everything else that fails or refers, in one or two sentences; empty where nothing does. */
  readonly others: string;
}

/** An end that cannot be examined as it stands. */
export const incompleteLine = (faults: readonly SaidFault[]): VerdictLine => ({
  mark: 'incomplete',
  word: say.incomplete,
  ratio: '',
  close: false,
  lead: '',
  first: faults[0]?.text ?? '',
  spare: '',
  others: faults.length > 1 ? say.more(faults.length - 1) : '',
});

/** The strength check with the least reaction at failure, as the report lists it. */
const weakestOf = ({ checks }: Numbers): Check | undefined =>
  checks.find((one) => !isFooting(one) && typeof one.reactionAtFailure === 'number' && one.state !== 'information');

const named = (checks: readonly Check[]): string => checks.map(({ title }) => inSentence(title)).join(', ');

/** What refers and why: by name where one or two do for the same reason, else by their number. */
const referring = (checks: readonly Check[]): string => {
  const reasons = [...new Set(checks.map(({ reasonText = '' }) => reasonText))];
  return reasons
    .map((reason) => {
      const alike = checks.filter(({ reasonText = '' }) => reasonText === reason);
      return say.because(alike.length > 2 ? say.checks(alike.length) : named(alike), reason);
    })
    .join('; ');
};

/** What fails beside the weakest, and all that refers. */
const othersOf = (report: Numbers, weakest: Check | undefined): string => {
  const fails = report.checks.filter((one) => one.state === 'fails' && one !== weakest);
  const refers = report.checks.filter(({ state }) => state === 'refer');
  const failing = weakest?.state === 'fails' ? say.alsoFails : say.fails;
  return [fails.length > 0 && failing(named(fails)), refers.length > 0 && say.refers(referring(refers))]
    .filter(Boolean)
    .join(' ');
};

/** The verdict of a report. */
export const verdictLine = (report: Numbers): VerdictLine => {
  const governing = report.checks.find(({ id }) => id === report.governing);
  const weakest = weakestOf(report);
  const utilisation = governing?.utilisation ?? null;
  const mark = markOf({ state: report.verdict, utilisation }) ?? 'refer';
  const force = unitOf('0,1', report.units).name;
  return {
    mark,
    word: say.verdict[report.verdict],
    ratio: utilisation === null ? '' : ratioText({ state: report.verdict, utilisation }),
    close: mark === 'close',
    lead: weakest ? say.weakest : '',
    first: weakest ? say.failsAt(inSentence(weakest.title), `${roundedDown(weakest.reactionAtFailure!)} ${force}`) : '',
    spare: weakest ? spareText(report.reaction, weakest.reactionAtFailure!, force) : '',
    others: othersOf(report, weakest),
  };
};
