import type { Source, Tree } from '../formula/tree.ts';
import { isNoRule } from '../standards/standard.ts';
import { type UnitSystem, unitOf } from '../units/systems.ts';
import type { Words } from '../words/words.ts';
import type { FitPlan, Plan, StrengthPlan } from './plan.ts';
import type { Check } from './report.ts';

/** Whose rules are spoken of, in which words and units. */
export interface Context {
  readonly plan: Plan;
  readonly units: UnitSystem;
  readonly words: Words;
}

/** What a check says whatever its numbers, and what these are stated in. */
export interface Said extends Pick<Check, 'title' | 'clause' | 'basis' | 'symbol' | 'unit' | 'verified'> {
  /** How many N, mm, MPa and their products one unit is; 0 where there is nothing to state. */
  readonly size: number;
  /** Name of the way or part, and the same in words; empty where the title tells. */
  readonly of: string;
  readonly ofText: string;
  /** True where a reaction at failure belongs to it. */
  readonly byReaction: boolean;
}

/** The way or part that numbers speak of. */
interface Subject {
  readonly source: Source | undefined;
  readonly stated: Tree | undefined;
  readonly of: string;
  readonly symbol: string;
  readonly byReaction: boolean;
}

const subjectOf = ({ rule }: StrengthPlan | FitPlan, at: number): Subject => {
  const nothing = { stated: undefined, of: '', symbol: '', byReaction: false };
  if (isNoRule(rule)) return { ...nothing, source: undefined };
  if ('parts' in rule) {
    const part = rule.parts[at];
    return part
      ? { source: part.source ?? rule.source, stated: part.given, of: part.of ?? '', symbol: '', byReaction: false }
      : { ...nothing, source: rule.source };
  }
  const way = rule.ways[at];
  if (!way) return { ...nothing, source: rule.source };
  const byReaction = way.load === 'V' && way.resistance !== undefined;
  return { source: way.source ?? rule.source, stated: way.demand, of: way.of ?? '', symbol: way.symbol, byReaction };
};

const say = ({ plan, units, words }: Context, one: StrengthPlan | FitPlan, at: number): Said => {
  const { source, stated, of, symbol, byReaction } = subjectOf(one, at);
  const own = of ? words.titles[`${one.id}, ${of}`] : undefined;
  const unit = stated && unitOf(stated.dimension, units);
  return {
    title: own || (words.titles[one.id] ?? one.id),
    clause: source?.clause ?? '',
    basis: source?.basis ?? '',
    symbol,
    unit: unit?.name ?? '',
    verified: plan.standard.verified[one.id] ?? 'none',
    size: unit?.size ?? 0,
    of,
    ofText: own ? '' : (words.ways[of] ?? of),
    byReaction,
  };
};

/** By way or part; -1, for none, comes first. */
type Ways = (Said | undefined)[];
type Known = WeakMap<StrengthPlan | FitPlan, Ways>;

const known = new WeakMap<Words, Readonly<Record<UnitSystem, Known>>>();

const knownIn = ({ words, units }: Context): Known => {
  const inWords = known.get(words) ?? { 'mm-kN': new WeakMap(), 'in-kip': new WeakMap() };
  known.set(words, inWords);
  return inWords[units];
};

const waysOf = (all: Known, one: StrengthPlan | FitPlan): Ways => {
  const ways = all.get(one) ?? [];
  if (ways.length === 0) all.set(one, ways);
  return ways;
};

/** What the checks of a plan say: a way's words are put together at its first use. */
export const sayings = (context: Context): ((one: StrengthPlan | FitPlan, at: number) => Said) => {
  const all = knownIn(context);
  return (one, at) => {
    const ways = waysOf(all, one);
    const said = ways[at + 1] ?? say(context, one, at);
    ways[at + 1] = said;
    return said;
  };
};
