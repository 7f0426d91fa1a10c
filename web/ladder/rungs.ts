import type { Check, Numbers } from '../../core/check/report.ts';
import { shortOf, type Words } from '../../core/words/words.ts';

/** The checks of a report as the ladder groups them. */
export interface Rungs {
  /** Ways of failing that have a reaction at failure: strongest first, so that the weakest stands at the foot. */
  readonly rungs: readonly Check[];
  /** Ways that refer without a number. */
  readonly unmeasured: readonly Check[];
  /** Ways that no end reaction is to blame for: the tie force, acting alone. */
  readonly alone: readonly Check[];
  /** Rules that carry no kN: what is not held first. */
  readonly footing: readonly Check[];
  readonly notApplicable: readonly Check[];
}

export const isFooting = ({ id }: Check): boolean => id.startsWith('fit-');

/** Measured by the end reaction: the check has a place for the reaction at failure, filled or not. */
const byReaction = ({ reactionAtFailure }: Check): boolean => reactionAtFailure !== undefined;

/** Nothing of it can be computed. */
const isUnmeasured = ({ reactionAtFailure, utilisation }: Check): boolean =>
  typeof reactionAtFailure !== 'number' && utilisation === null;

/** A way that no reaction uses up stands above all others. */
const strength = ({ reactionAtFailure }: Check): number => reactionAtFailure ?? Number.POSITIVE_INFINITY;

const severity = ({ state }: Check): number => ['fails', 'refer', 'holds'].indexOf(state);

export const rungsOf = ({ checks }: Pick<Numbers, 'checks'>): Rungs => {
  const judged = checks.filter(({ state }) => state === 'holds' || state === 'fails' || state === 'refer');
  const ways = judged.filter((one) => !isFooting(one));
  const measured = ways.filter((one) => !isUnmeasured(one));
  return {
    // Of equals the one that the report names first is the weaker.
    rungs: measured.filter(byReaction).reverse().sort(stronger),
    unmeasured: ways.filter(isUnmeasured),
    alone: measured.filter((one) => !byReaction(one)),
    footing: judged.filter(isFooting).sort((a, b) => severity(a) - severity(b)),
    notApplicable: checks.filter(({ state }) => state === 'notApplicable'),
  };
};

const stronger = (a: Check, b: Check): number => {
  const [left, right] = [strength(a), strength(b)];
  return left === right ? 0 : right - left;
};

/** Name of a check in a narrow column. */
export const shortName = (check: Check, words: Words): string => shortOf(words, check);

/** Name of a check in full, with the section, leg or edge that its numbers speak of. */
export const fullName = ({ title, ofText }: Check): string => (ofText ? `${title}, ${ofText}` : title);

/** A name within a sentence. */
export const inSentence = (name: string): string => name.charAt(0).toLowerCase() + name.slice(1);
