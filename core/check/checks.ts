import type { Source, Tree } from '../formula/tree.ts';
import { isNoRule } from '../standards/standard.ts';
import { toSystem, type UnitSystem, unitOf } from '../units/systems.ts';
import type { Words } from '../words/words.ts';
import type { Evaluation } from './evaluate.ts';
import type { FitPlan, Plan, StrengthPlan } from './plan.ts';
import type { Check } from './report.ts';
import type { Result } from './result.ts';

interface Context {
  readonly plan: Plan;
  readonly units: UnitSystem;
  readonly words: Words;
}

/** Nothing that is not finite leaves the program. */
const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

const stated = (value: number, like: Tree, units: UnitSystem): number | null =>
  finite(toSystem(value, like.dimension, units));

/** Optional fields are set only where they say something; spreading them in costs a hundred times more. */
type Draft = { -readonly [K in keyof Check]: Check[K] };

const draft = (
  context: Context,
  result: Result,
  part: Check['part'],
  source: Source | undefined,
  unit: string,
): Draft => ({
  id: result.id,
  part,
  title: context.words.titles[result.id] ?? result.id,
  clause: source?.clause ?? '',
  basis: source?.basis ?? '',
  symbol: '',
  demand: null,
  resistance: null,
  unit,
  utilisation: finite(result.utilisation),
  state: result.state,
  verified: context.plan.standard.verified[result.id] ?? 'none',
});

const sayWhy = (check: Draft, { reason }: Result, of: string, words: Words): void => {
  if (reason) {
    check.reason = reason;
    check.reasonText = words.reasons[reason] ?? reason;
  }
  if (!of) return;
  check.of = of;
  const own = words.titles[`${check.id}, ${of}`];
  if (own) check.title = own;
  else check.ofText = words.ways[of] ?? of;
};

const strengthCheck = (context: Context, plan: StrengthPlan, result: Result): Check => {
  const { units, words } = context;
  const rule = isNoRule(plan.rule) ? undefined : plan.rule;
  const way = rule?.ways[result.way];
  const unit = way ? unitOf(way.demand.dimension, units).name : '';
  const check = draft(context, result, plan.part, way?.source ?? rule?.source, unit);
  sayWhy(check, result, way?.of ?? '', words);
  if (!way) return check;
  check.symbol = way.symbol;
  check.demand = stated(result.demand, way.demand, units);
  check.resistance = stated(result.resistance, way.demand, units);
  if (way.load === 'V' && way.resistance)
    check.reactionAtFailure = finite(toSystem(result.reactionAtFailure, '0,1', units));
  return check;
};

const fitCheck = (context: Context, plan: FitPlan, result: Result): Check => {
  const { units, words } = context;
  const rule = isNoRule(plan.rule) ? undefined : plan.rule;
  const part = rule?.parts[result.way];
  const check = draft(context, result, plan.part, part?.source ?? rule?.source, part ? unitOf('1,0', units).name : '');
  sayWhy(check, result, part?.of ?? '', words);
  if (!part) return check;
  check.demand = stated(result.demand, part.given, units);
  check.resistance = stated(result.resistance, part.given, units);
  return check;
};

const rank = (one: Check): number => {
  if (one.state === 'notApplicable') return 3;
  if (one.state === 'information') return 2;
  return one.id.startsWith('fit-') ? 1 : 0;
};

/** Weakest first: least reaction at failure, then those without V by use. */
const order = (a: Check, b: Check): number => {
  if (rank(a) !== rank(b)) return rank(a) - rank(b);
  const [left, right] = [
    a.reactionAtFailure ?? Number.POSITIVE_INFINITY,
    b.reactionAtFailure ?? Number.POSITIVE_INFINITY,
  ];
  if (left !== right) return left - right;
  return rank(a) === 0 ? (b.utilisation ?? 0) - (a.utilisation ?? 0) : 0;
};

/** Every check of the report, weakest first; fit next, then information, then what does not apply. */
export const checksOf = (context: Context, evaluation: Evaluation): Check[] => {
  const { plan } = context;
  const strength = plan.strength.map((one, at) => strengthCheck(context, one, evaluation.strength[at]!));
  const fit = plan.fit.map((one, at) => fitCheck(context, one, evaluation.fit[at]!));
  return [...strength, ...fit].sort(order);
};
