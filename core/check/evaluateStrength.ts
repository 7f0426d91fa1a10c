import type { Facts } from '../end/facts.ts';
import type { StrengthPlan, WayPlan } from './plan.ts';
import { blank, firstMet, type Result, severity } from './result.ts';

/** A way for which the standard sets no limit: its demand at V, for information; no rule where a verdict is asked for. */
const inform = (plan: WayPlan, facts: Facts, V: number, into: Result): void => {
  into.demand = plan.demand(facts as never) * V;
  const told = plan.informs?.(facts as never) ?? true;
  into.state = told ? 'information' : 'notApplicable';
  if (!told) into.reason = 'no-rule';
};

/** Used up by any load at all. */
const useUp = (plan: WayPlan, reason: string, into: Result): void => {
  into.state = 'fails';
  into.reason = reason;
  into.utilisation = Number.POSITIVE_INFINITY;
  if (plan.load === 'V') into.reactionAtFailure = 0;
};

const measure = (plan: WayPlan, facts: Facts, V: number, into: Result): void => {
  if (plan.failsAt) {
    into.utilisation = V / into.reactionAtFailure;
    return;
  }
  const demand = plan.demand(facts as never);
  if (plan.load !== 'V') {
    into.demand = demand;
    into.utilisation = demand / into.resistance;
    return;
  }
  into.demand = demand * V;
  into.reactionAtFailure = into.resistance / demand;
  into.utilisation = V / into.reactionAtFailure;
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
    into.state = plan.informs?.(facts as never) ? 'information' : 'refer';
    into.reason = limit.reason;
    return;
  }
  if (!plan.resistance) {
    inform(plan, facts, V, into);
    return;
  }
  if (plan.unbounded?.(facts as never)) {
    into.resistance = plan.resistance(facts as never);
    useUp(plan, 'one-bolt', into);
    return;
  }
  if (plan.failsAt) into.reactionAtFailure = plan.failsAt(facts as never);
  else into.resistance = plan.resistance(facts as never);
  if (!(into.resistance > 0 || into.reactionAtFailure > 0)) {
    useUp(plan, 'nothing-left', into);
    return;
  }
  measure(plan, facts, V, into);
  const holds = into.utilisation <= 1;
  if (plan.informs?.(facts as never)) into.state = 'information';
  else if (limit && (limit.always || holds)) {
    into.state = 'refer';
    into.reason = limit.reason;
  } else into.state = holds ? 'holds' : 'fails';
};

const trial = blank('weld');

/** The worst state of the ways, with the numbers of the way used up first. */
export const evaluateStrength = (plan: StrengthPlan, facts: Facts, V: number): Result => {
  const result = blank(plan.id);
  if (plan.noRule) {
    result.reason = plan.noRule;
    return result;
  }
  const { ways } = plan;
  if (ways.length === 1) {
    evaluateWay(ways[0]!, facts, V, result);
    if (hasNumbers(result)) result.way = 0;
    return result;
  }
  for (let at = 0; at < ways.length; at += 1) {
    evaluateWay(ways[at]!, facts, V, trial);
    take(result, trial, at);
  }
  return result;
};

/** States demand and resistance at V (now in the facts) where they do not change in proportion. */
export const stateAtReaction = (plan: StrengthPlan, facts: Facts, result: Result): void => {
  const way = plan.ways[result.way];
  if (!way?.failsAt || Number.isNaN(result.utilisation)) return;
  result.demand = way.demand(facts as never);
  result.resistance = way.resistance!(facts as never);
};

/** False for a way that does not apply to the end and says nothing of it. */
const hasNumbers = ({ state, demand }: Result): boolean => state !== 'notApplicable' || !Number.isNaN(demand);

/** True where `found` is used up before what `result` holds; of two for information, the one with the larger demand. */
const sooner = (found: Result, result: Result): boolean => {
  if (Number.isNaN(found.utilisation)) return Number.isNaN(result.utilisation) && found.demand > result.demand;
  if (Number.isNaN(result.utilisation)) return true;
  const mixed = Number.isNaN(found.reactionAtFailure) || Number.isNaN(result.reactionAtFailure);
  return mixed ? found.utilisation > result.utilisation : found.reactionAtFailure < result.reactionAtFailure;
};

const take = (result: Result, found: Result, at: number): void => {
  const none = result.way < 0;
  if (!hasNumbers(found)) {
    if (none) result.reason = found.reason;
    return;
  }
  const first = none || sooner(found, result);
  const worse = severity[found.state] - severity[result.state];
  if (none || worse > 0 || (worse === 0 && first)) {
    result.state = found.state;
    result.reason = found.reason;
  }
  if (!first) return;
  result.way = at;
  result.demand = found.demand;
  result.resistance = found.resistance;
  result.reactionAtFailure = found.reactionAtFailure;
  result.utilisation = found.utilisation;
};
