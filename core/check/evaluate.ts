import type { CheckName } from '../end/checkNames.ts';
import type { Facts } from '../end/facts.ts';
import { newRun } from '../formula/number.ts';
import type { FitPartPlan, FitPlan, GatePlan, Plan, StrengthPlan, WayPlan } from './plan.ts';
import type { State, Verdict } from './report.ts';

/** The numbers of one check: N and mm; demand at V, capacity as the reaction at which it is used up. */
export interface Result {
  readonly id: CheckName;
  state: State;
  /** Code of the reason, where it refers or does not apply. */
  reason: string;
  /** Which of the rule's ways or parts the numbers speak of; -1 where none applies. */
  way: number;
  demand: number;
  resistance: number;
  /** NaN for checks that do not depend on V. Inside core only: reports turn what is not finite into null. */
  reactionAtFailure: number;
  utilisation: number;
}

/** All numbers of one end under one standard. */
export interface Evaluation {
  readonly strength: readonly Result[];
  readonly fit: readonly Result[];
  readonly verdict: Verdict;
  readonly governing: Result;
  /** Least reaction at failure of checks that hold, fail or refer; NaN where there is none. */
  readonly capacity: number;
  readonly reaction: number;
}

const severity: Readonly<Record<State, number>> = {
  fails: 4,
  refer: 3,
  holds: 2,
  information: 1,
  notApplicable: 0,
};

const blank = (id: CheckName): Result => ({
  id,
  state: 'notApplicable',
  reason: '',
  way: -1,
  demand: Number.NaN,
  resistance: Number.NaN,
  reactionAtFailure: Number.NaN,
  utilisation: Number.NaN,
});

const firstMet = <G extends GatePlan>(gates: readonly G[], facts: Facts): G | undefined => {
  for (let at = 0; at < gates.length; at += 1) if (gates[at]!.test(facts as never)) return gates[at];
  return undefined;
};

/** One way at the reaction V: its demand grows in proportion, so it is measured at 1 N (or at the tie force itself). */
const evaluateWay = (plan: WayPlan, facts: Facts, V: number, into: Result): void => {
  into.reason = '';
  into.demand = into.resistance = into.reactionAtFailure = into.utilisation = Number.NaN;
  const off = firstMet(plan.off, facts);
  if (off) {
    into.state = 'notApplicable';
    into.reason = off.reason;
    return;
  }
  const limit = firstMet(plan.limits, facts);
  if (limit?.noNumber) {
    into.state = 'refer';
    into.reason = limit.reason;
    return;
  }
  into.resistance = plan.resistance(facts as never);
  const noMoment = plan.unbounded?.(facts as never) ?? false;
  if (noMoment || !(into.resistance > 0)) {
    into.state = 'fails';
    into.reason = noMoment ? 'one-bolt' : 'nothing-left';
    into.utilisation = Number.POSITIVE_INFINITY;
    if (plan.load === 'V') into.reactionAtFailure = 0;
    return;
  }
  const demand = plan.demand(facts as never);
  if (plan.load === 'T') {
    into.demand = demand;
    into.utilisation = demand / into.resistance;
  } else {
    into.demand = demand * V;
    into.reactionAtFailure = into.resistance / demand;
    into.utilisation = V / into.reactionAtFailure;
  }
  const holds = into.utilisation <= 1;
  if (plan.informs?.(facts as never)) into.state = 'information';
  else if (limit && (limit.always || holds)) {
    into.state = 'refer';
    into.reason = limit.reason;
  } else into.state = holds ? 'holds' : 'fails';
};

const trial = blank('weld');

/** The worst state of the ways, with the numbers of the way used up first. */
const evaluateStrength = (plan: StrengthPlan, facts: Facts, V: number): Result => {
  const result = blank(plan.id);
  if (plan.noRule) {
    result.reason = plan.noRule;
    return result;
  }
  const { ways } = plan;
  if (ways.length === 1) {
    evaluateWay(ways[0]!, facts, V, result);
    if (result.state !== 'notApplicable') result.way = 0;
    return result;
  }
  for (let at = 0; at < ways.length; at += 1) {
    evaluateWay(ways[at]!, facts, V, trial);
    take(result, trial, at);
  }
  return result;
};

/** True where `found` is used up before what `result` holds. */
const sooner = (found: Result, result: Result): boolean => {
  if (Number.isNaN(found.resistance)) return false;
  if (Number.isNaN(result.resistance)) return true;
  return Number.isNaN(found.reactionAtFailure)
    ? found.utilisation > result.utilisation
    : found.reactionAtFailure < result.reactionAtFailure;
};

const take = (result: Result, found: Result, at: number): void => {
  const none = result.way < 0;
  if (found.state === 'notApplicable') {
    if (none) result.reason = found.reason;
    return;
  }
  if (none || severity[found.state] > severity[result.state]) {
    result.state = found.state;
    result.reason = found.reason;
  }
  if (none || sooner(found, result)) {
    result.way = at;
    result.demand = found.demand;
    result.resistance = found.resistance;
    result.reactionAtFailure = found.reactionAtFailure;
    result.utilisation = found.utilisation;
  }
};

/** What is needed over what is there; no room at all where something is needed uses it up without bound. */
const used = (needed: number, there: number): number => {
  if (there > 0) return needed / there;
  return needed > 0 ? Number.POSITIVE_INFINITY : 0;
};

/** Sizes that meet a bound exactly keep meeting it after conversion from inches. */
const CONVERSION_NOISE = 1e-9;

/** One comparison: the nearer of its bounds stands as the requirement. */
const evaluateFitPart = (part: FitPartPlan, breach: 'fails' | 'refer', facts: Facts, into: Result): void => {
  const given = part.given(facts as never);
  const toLeast = part.least ? used(part.least(facts as never), given) : Number.NEGATIVE_INFINITY;
  const toMost = part.most ? used(given, part.most(facts as never)) : Number.NEGATIVE_INFINITY;
  const low = toLeast >= toMost;
  const clash = part.clash?.(facts as never) ?? false;
  into.resistance = given;
  into.demand = (low ? part.least : part.most)?.(facts as never) ?? Number.NaN;
  into.utilisation = low ? toLeast : toMost;
  if (into.utilisation <= 1 + CONVERSION_NOISE) {
    into.state = 'holds';
    into.reason = '';
  } else {
    into.state = clash ? 'fails' : breach;
    into.reason = clash ? 'clash' : low ? 'too-little' : 'too-much';
  }
};

const evaluateFit = (plan: FitPlan, facts: Facts): Result => {
  const result = blank(plan.id);
  if (plan.noRule) {
    result.reason = plan.noRule;
    return result;
  }
  for (let at = 0; at < plan.parts.length; at += 1) {
    const part = plan.parts[at]!;
    const off = firstMet(part.off, facts);
    if (off) {
      if (result.way < 0) result.reason = off.reason;
      continue;
    }
    evaluateFitPart(part, plan.breach, facts, trial);
    const worse = severity[trial.state] - severity[result.state];
    if (result.way < 0 || worse > 0 || (worse === 0 && trial.utilisation > result.utilisation)) {
      result.way = at;
      result.state = trial.state;
      result.reason = trial.reason;
      result.demand = trial.demand;
      result.resistance = trial.resistance;
      result.utilisation = trial.utilisation;
    }
  }
  return result;
};

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

/** Evaluates every check of a plan on one end; V and T in N. */
export const evaluate = (plan: Plan, facts: Facts, V: number): Evaluation => {
  facts.V = 1;
  newRun();
  const strength: Result[] = [];
  for (let at = 0; at < plan.strength.length; at += 1) strength.push(evaluateStrength(plan.strength[at]!, facts, V));
  const fit: Result[] = [];
  for (let at = 0; at < plan.fit.length; at += 1) fit.push(evaluateFit(plan.fit[at]!, facts));
  facts.V = V;
  const first = firstUsedUp(strength);
  return {
    strength,
    fit,
    verdict: worst(strength, fit),
    governing: worstWithoutV(strength, fit) ?? first ?? strength[0]!,
    capacity: first ? first.reactionAtFailure : Number.NaN,
    reaction: V,
  };
};
