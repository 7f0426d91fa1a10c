import type { Facts } from '../end/facts.ts';
import type { Source, Tree } from '../formula/tree.ts';
import { workingOf } from '../formula/working.ts';
import { isNoRule } from '../standards/standard.ts';
import { toSystem, type UnitSystem, unitOf } from '../units/systems.ts';
import type { Words } from '../words/words.ts';
import type { Evaluation, Result } from './evaluate.ts';
import type { FitPlan, Plan, StrengthPlan } from './plan.ts';
import type { Check } from './report.ts';

interface Context {
  readonly plan: Plan;
  readonly facts: Facts;
  readonly units: UnitSystem;
  readonly words: Words;
  readonly working: boolean;
}

/** Nothing that is not finite leaves the program. */
const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

const stated = (value: number, like: Tree | undefined, units: UnitSystem): number | null =>
  like ? finite(toSystem(value, like.dimension, units)) : null;

const common = (context: Context, result: Result, part: Check['part'], source: Source | undefined) => {
  const { words, plan } = context;
  return {
    id: result.id,
    part,
    title: words.titles[result.id] ?? result.id,
    clause: source?.clause ?? '',
    basis: source?.basis ?? ('' as const),
    state: result.state,
    ...(result.reason && { reason: result.reason, reasonText: words.reasons[result.reason] ?? result.reason }),
    verified: plan.standard.verified[result.id] ?? ('none' as const),
  };
};

const strengthCheck = (context: Context, plan: StrengthPlan, result: Result): Check => {
  const { facts, units, words } = context;
  const rule = isNoRule(plan.rule) ? undefined : plan.rule;
  const way = rule?.ways[result.way];
  const byV = way?.load === 'V';
  return {
    ...common(context, result, plan.part, way?.source ?? rule?.source),
    symbol: way?.symbol ?? '',
    demand: stated(result.demand, way?.demand, units),
    resistance: stated(result.resistance, way?.resistance, units),
    unit: way ? unitOf(way.resistance.dimension, units).name : '',
    utilisation: finite(result.utilisation),
    ...(byV && { reactionAtFailure: finite(toSystem(result.reactionAtFailure, '0,1', units)) }),
    ...(way?.of && { of: way.of, ofText: words.ways[way.of] ?? way.of }),
    ...(context.working &&
      way && {
        working: workingOf(
          way.unbounded && result.reactionAtFailure === 0 ? [way.resistance] : [way.demand, way.resistance],
          facts,
          units,
        ),
      }),
  };
};

const fitCheck = (context: Context, plan: FitPlan, result: Result): Check => {
  const { facts, units, words } = context;
  const rule = isNoRule(plan.rule) ? undefined : plan.rule;
  const part = rule?.parts[result.way];
  const bounds = part ? [part.given, part.least, part.most].filter((one) => one !== undefined) : [];
  return {
    ...common(context, result, plan.part, rule?.source),
    symbol: '',
    demand: stated(result.demand, part?.given, units),
    resistance: stated(result.resistance, part?.given, units),
    unit: part ? unitOf('1,0', units).name : '',
    utilisation: finite(result.utilisation),
    ...(part?.of && { of: part.of, ofText: words.ways[part.of] ?? part.of }),
    ...(context.working && part && { working: workingOf(bounds, facts, units) }),
  };
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
