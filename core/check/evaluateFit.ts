import type { FitPartPlan, FitPlan } from './plan.ts';
import { blank, gateAt, type Result, severity } from './result.ts';

const trial = blank('fit-pitch');

/** What is needed over what is there; no room at all where something is needed uses it up without bound. */
const used = (needed: number, there: number): number => {
  if (there > 0) return needed / there;
  return needed > 0 ? Number.POSITIVE_INFINITY : 0;
};

/** Sizes that meet a bound exactly keep meeting it after conversion from inches. */
const CONVERSION_NOISE = 1e-9;

/** One comparison: the nearer of its bounds stands as the requirement. */
const evaluateFitPart = (part: FitPartPlan, cells: Float64Array, into: Result): void => {
  const given = cells[part.given]!;
  const least = part.least === undefined ? Number.NaN : cells[part.least]!;
  const most = part.most === undefined ? Number.NaN : cells[part.most]!;
  const toLeast = part.least === undefined ? Number.NEGATIVE_INFINITY : used(least, given);
  const toMost = part.most === undefined ? Number.NEGATIVE_INFINITY : used(given, most);
  const low = toLeast >= toMost;
  const clash = part.clash !== undefined && cells[part.clash] === 1;
  into.resistance = given;
  into.demand = low ? least : most;
  into.utilisation = low ? toLeast : toMost;
  if (into.utilisation <= 1 + CONVERSION_NOISE) {
    into.state = 'holds';
    into.reason = '';
  } else {
    into.state = clash ? 'fails' : part.breach;
    into.reason = clash ? 'clash' : low ? 'too-little' : 'too-much';
  }
};

/** The worst state of the parts of one rule of geometry, with the part that is nearest to its bound. */
export const evaluateFit = (plan: FitPlan, cells: Float64Array): Result => {
  const result = blank(plan.id);
  if (plan.noRule) {
    result.reason = plan.noRule;
    return result;
  }
  for (let at = 0; at < plan.parts.length; at += 1) {
    const part = plan.parts[at]!;
    const off = gateAt(part.off, cells[part.gate]!);
    if (off) {
      if (result.way < 0 && result.reason === '') result.reason = off.reason;
      continue;
    }
    evaluateFitPart(part, cells, trial);
    const worse = trial.state === result.state ? 0 : severity[trial.state] - severity[result.state];
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
