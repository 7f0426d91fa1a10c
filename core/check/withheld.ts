import type { Words } from '../words/words.ts';
import type { Check, Numbers } from './report.ts';

const counts = ({ state }: Check): boolean => state !== 'notApplicable' && state !== 'information';

/** Of checks with a reaction at failure, the one with the least. */
const firstOf = (checks: readonly Check[]): Check | undefined => {
  const known = checks.filter((one) => counts(one) && typeof one.reactionAtFailure === 'number');
  return known.reduce<Check | undefined>(
    (first, one) => (first && first.reactionAtFailure! <= one.reactionAtFailure! ? first : one),
    undefined,
  );
};

/**
 * Numbers of an end without those checks that change with something not known, here told apart by numbers for another value of it: they
 * refer without a number, but what fails already fails. The first of the others governs.
 */
export const withheld = (numbers: Numbers, other: Numbers, reason: string, { reasons }: Words): Numbers => {
  const changes = ({ id, state, reactionAtFailure }: Check): boolean => {
    const there = other.checks.find((one) => one.id === id);
    return there?.state !== state || there.reactionAtFailure !== reactionAtFailure;
  };
  const unknown = new Set(numbers.checks.filter((one) => one.state !== 'fails' && changes(one)).map(({ id }) => id));
  if (unknown.size === 0) return numbers;
  const nothing = { demand: null, resistance: null, utilisation: null, reactionAtFailure: null };
  const checks = numbers.checks.map(
    (one): Check =>
      unknown.has(one.id) ? { ...one, ...nothing, state: 'refer', reason, reasonText: reasons[reason] ?? '' } : one,
  );
  const first = firstOf(checks);
  return {
    ...numbers,
    checks,
    verdict: numbers.verdict === 'holds' ? 'refer' : numbers.verdict,
    capacity: first?.reactionAtFailure ?? null,
    governing: unknown.has(numbers.governing) && first ? first.id : numbers.governing,
  };
};
