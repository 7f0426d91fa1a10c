import type { Facts } from '../end/facts.ts';
import type { StrengthPlan, WayPlan } from './plan.ts';
import { blank, firstMet, type Result, severity } from './result.ts';

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
export const evaluateStrength = (plan: StrengthPlan, facts: Facts, V: number): Result => {
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
