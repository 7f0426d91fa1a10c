import type { CheckName, PartName } from '../end/checkNames.ts';
import { unitOf } from '../units/systems.ts';
import type { Words } from '../words/words.ts';
import type { Evaluation } from './evaluate.ts';
import type { FitPlan, StrengthPlan } from './plan.ts';
import type { Check } from './report.ts';
import { type Result, resultAt } from './result.ts';
import { type Context, type Said, sayings } from './saidOf.ts';

/** Nothing that is not finite leaves the program. */
const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

/** Optional fields are set only where they say something; spreading them in costs a hundred times more. */
type Draft = { -readonly [K in keyof Check]: Check[K] };

const draft = (id: CheckName, part: PartName, said: Said, result: Result): Draft => ({
  id,
  part,
  title: said.title,
  clause: said.clause,
  basis: said.basis,
  symbol: said.symbol,
  demand: said.size > 0 ? finite(result.demand / said.size) : null,
  resistance: said.size > 0 ? finite(result.resistance / said.size) : null,
  unit: said.unit,
  utilisation: finite(result.utilisation),
  state: result.state,
  verified: said.verified,
});

const checkOf = (one: StrengthPlan | FitPlan, said: Said, result: Result, words: Words, force: number): Check => {
  const check = draft(one.id, one.part, said, result);
  const { reason } = result;
  if (reason) {
    check.reason = reason;
    check.reasonText = words.reasons[reason] ?? reason;
  }
  if (said.of) check.of = said.of;
  if (said.ofText) check.ofText = said.ofText;
  if (said.byReaction) check.reactionAtFailure = finite(result.reactionAtFailure / force);
  return check;
};

/** Strength first, then fit, information, and what does not apply. */
const rank = ({ state, id }: Check): number => {
  if (state === 'notApplicable') return 3;
  if (state === 'information') return 2;
  return id.startsWith('fit-') ? 1 : 0;
};

/** Least reaction at failure first. */
const byReaction = (a: Check, b: Check): number => {
  const left = a.reactionAtFailure ?? Number.POSITIVE_INFINITY;
  const right = b.reactionAtFailure ?? Number.POSITIVE_INFINITY;
  return left === right ? 0 : left - right;
};

/** Weakest first: least reaction at failure, then those without V by use. */
const weakest = (a: Check, b: Check): number => byReaction(a, b) || (b.utilisation ?? 0) - (a.utilisation ?? 0);

/** Checks of like rank together, in the order of the plan. */
const ranked = (context: Context, { rows }: Evaluation): Check[][] => {
  const { plan, units, words } = context;
  const said = sayings(context);
  const force = unitOf('0,1', units).size;
  const ranks: Check[][] = [[], [], [], []];
  [...plan.strength, ...plan.fit].forEach((one, at) => {
    const result = resultAt(rows, at);
    const check = checkOf(one, said(one, result.way), result, words, force);
    ranks[rank(check)]!.push(check);
  });
  return ranks;
};

/** Every check of the report, weakest first; fit next, then information, then what does not apply. */
export const checksOf = (context: Context, evaluation: Evaluation): Check[] => {
  const [strength = [], fit = [], information = [], none = []] = ranked(context, evaluation);
  return [...strength.sort(weakest), ...fit, ...information.sort(byReaction), ...none.sort(byReaction)];
};
