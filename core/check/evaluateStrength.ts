import type { StrengthPlan, WayPlan } from './plan.ts';
import { blank, gateAt, type Result, severity } from './result.ts';

/** A way for which the standard sets no limit: its demand at V, for information; no rule where a verdict is asked for. */
const inform = (plan: WayPlan, cells: Float64Array, V: number, into: Result): void => {
  into.demand = cells[plan.demand]! * V;
  const told = plan.informs === undefined || cells[plan.informs] === 1;
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

const measure = (plan: WayPlan, cells: Float64Array, V: number, into: Result): void => {
  if (plan.failsAt !== undefined) {
    into.utilisation = V / into.reactionAtFailure;
    return;
  }
  const demand = cells[plan.demand]!;
  if (plan.load !== 'V') {
    into.demand = demand;
    into.utilisation = demand / into.resistance;
    return;
  }
  into.demand = demand * V;
  into.reactionAtFailure = into.resistance / demand;
  into.utilisation = V / into.reactionAtFailure;
};

/** One way at the reaction V: its demand grows in proportion, so it was measured at 1 N (or at the tie force itself). */
const evaluateWay = (plan: WayPlan, cells: Float64Array, V: number, into: Result): void => {
  into.reason = '';
  into.demand = into.resistance = into.reactionAtFailure = into.utilisation = Number.NaN;
  const gate = cells[plan.gate]!;
  const off = gateAt(plan.off, gate);
  if (off) {
    into.state = 'notApplicable';
    into.reason = off.reason;
    return;
  }
  const limit = gateAt(plan.limits, gate - plan.off.length);
  const informs = plan.informs !== undefined && cells[plan.informs] === 1;
  if (limit?.noNumber) {
    into.state = informs ? 'information' : 'refer';
    into.reason = limit.reason;
    return;
  }
  if (plan.failsAt !== undefined) into.reactionAtFailure = cells[plan.failsAt]!;
  else if (plan.resistance !== undefined) into.resistance = cells[plan.resistance]!;
  else {
    inform(plan, cells, V, into);
    return;
  }
  if (plan.unbounded !== undefined && cells[plan.unbounded] === 1) {
    useUp(plan, 'one-bolt', into);
    return;
  }
  if (!(into.resistance > 0 || into.reactionAtFailure > 0)) {
    useUp(plan, 'nothing-left', into);
    return;
  }
  measure(plan, cells, V, into);
  const holds = into.utilisation <= 1;
  if (informs) into.state = 'information';
  else if (limit && (limit.always || holds)) {
    into.state = 'refer';
    into.reason = limit.reason;
  } else into.state = holds ? 'holds' : 'fails';
};

const trial = blank('weld');

/** The worst state of the ways, with the numbers of the way used up first. */
export const evaluateStrength = (plan: StrengthPlan, cells: Float64Array, V: number): Result => {
  const result = blank(plan.id);
  if (plan.noRule) {
    result.reason = plan.noRule;
    return result;
  }
  const { ways } = plan;
  if (ways.length === 1) {
    evaluateWay(ways[0]!, cells, V, result);
    if (hasNumbers(result)) result.way = 0;
    return result;
  }
  for (let at = 0; at < ways.length; at += 1) {
    evaluateWay(ways[at]!, cells, V, trial);
    take(result, trial, at);
  }
  return result;
};

/** States demand and resistance at V (now in the facts) where they do not change in proportion. */
export const stateAtReaction = (plan: StrengthPlan, cells: Float64Array, result: Result): void => {
  const way = plan.ways[result.way];
  if (way?.failsAt === undefined || Number.isNaN(result.utilisation)) return;
  result.demand = cells[way.demand]!;
  result.resistance = cells[way.resistance!]!;
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
  const worse = none || found.state === result.state ? 0 : severity[found.state] - severity[result.state];
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
