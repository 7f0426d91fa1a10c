import type { Facts } from '../end/facts.ts';
import { Values } from '../formula/number.ts';
import { run } from '../formula/run.ts';
import { evaluateFit } from './evaluateFit.ts';
import { evaluateStrength, stateAtReaction } from './evaluateStrength.ts';
import type { Plan } from './plan.ts';
import type { Verdict } from './report.ts';
import type { Result } from './result.ts';

/** All numbers of one end under one standard. */
export interface Evaluation {
  readonly strength: readonly Result[];
  readonly fit: readonly Result[];
  readonly verdict: Verdict;
  readonly governing: Result;
  /** Least reaction at failure of checks that hold, fail or refer; NaN where there is none. */
  readonly capacity: number;
  /** The reaction that the numbers are for. */
  readonly reaction: number;
}

const worst = (...lists: readonly (readonly Result[])[]): Verdict => {
  let verdict: Verdict = 'holds';
  for (const results of lists) {
    for (const { state } of results) {
      if (state === 'fails') return 'fails';
      if (state === 'refer') verdict = 'refer';
    }
  }
  return verdict;
};

/** The check with the least reaction at failure, of those that hold, fail or refer. */
const firstUsedUp = (results: readonly Result[]): Result | undefined => {
  let first: Result | undefined;
  for (const one of results) {
    if (one.state === 'notApplicable' || one.state === 'information' || Number.isNaN(one.reactionAtFailure)) continue;
    if (!first || one.reactionAtFailure < first.reactionAtFailure) first = one;
  }
  return first;
};

/** A way that may not be the first to fail refers where it is. */
const referWhereFirst = (plan: Plan, facts: Facts, first: Result): void => {
  const way = plan.strength.find(({ id }) => id === first.id)?.ways[first.way];
  if (first.state !== 'holds' || !way?.whereFirst || !new Values(facts as never).met(way.whereFirst.when)) return;
  first.state = 'refer';
  first.reason = way.whereFirst.reason;
};

/** The worst failing check that no reaction is to blame for: a tie, a size, a clash. */
const worstWithoutV = (...lists: readonly (readonly Result[])[]): Result | undefined => {
  let found: Result | undefined;
  for (const results of lists) {
    for (const one of results) {
      if (one.state !== 'fails' || !Number.isNaN(one.reactionAtFailure)) continue;
      if (!found || one.utilisation > found.utilisation) found = one;
    }
  }
  return found;
};

/** Evaluates every check of a plan on one end at the reaction given, or at the least that the standard asks for. N */
export const evaluate = (plan: Plan, facts: Facts, given: number): Evaluation => {
  facts.V = 1;
  const { program, leastReaction } = plan;
  run(program, facts as never);
  const { cells } = program;
  const V = leastReaction === undefined ? given : Math.max(given, cells[leastReaction]!);
  const strength: Result[] = [];
  for (let at = 0; at < plan.strength.length; at += 1) strength.push(evaluateStrength(plan.strength[at]!, cells, V));
  const fit: Result[] = [];
  for (let at = 0; at < plan.fit.length; at += 1) fit.push(evaluateFit(plan.fit[at]!, cells));
  facts.V = V;
  if (plan.atReaction) {
    run(plan.atReaction, facts as never);
    const { cells } = plan.atReaction;
    for (let at = 0; at < plan.strength.length; at += 1) stateAtReaction(plan.strength[at]!, cells, strength[at]!);
  }
  const first = firstUsedUp(strength);
  if (first) referWhereFirst(plan, facts, first);
  return {
    strength,
    fit,
    verdict: worst(strength, fit),
    governing: worstWithoutV(strength, fit) ?? first ?? strength[0]!,
    capacity: first ? first.reactionAtFailure : Number.NaN,
    reaction: V,
  };
};
