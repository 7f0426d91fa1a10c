import type { FitName, PartName, StrengthName } from '../end/checkNames.ts';
import type { Gate, Limit } from '../end/gates.ts';
import type { Joint } from '../end/schema.ts';
import { type NumberReader, numberOf, testOf } from '../formula/number.ts';
import { markShared } from '../formula/shared.ts';
import { joints } from '../joints/index.ts';
import {
  type FitPart,
  type FitRule,
  isNoRule,
  type NoRule,
  type Standard,
  type StrengthRule,
  treesOf,
  type Way,
} from '../standards/standard.ts';

type Test = (facts: never) => boolean;

export interface GatePlan {
  readonly test: Test;
  readonly reason: string;
}

interface LimitPlan extends GatePlan {
  readonly always: boolean;
  readonly noNumber: boolean;
}

export interface WayPlan {
  readonly demand: NumberReader;
  readonly resistance?: NumberReader;
  readonly load: 'V' | 'T' | 'none';
  readonly failsAt?: NumberReader;
  readonly off: readonly GatePlan[];
  readonly limits: readonly LimitPlan[];
  readonly whereFirst?: GatePlan;
  readonly unbounded?: Test;
  readonly informs?: Test;
}

export interface StrengthPlan {
  readonly id: StrengthName;
  readonly part: PartName;
  readonly rule: StrengthRule | NoRule;
  /** Reason code where the standard has no rule; empty otherwise. */
  readonly noRule: string;
  readonly ways: readonly WayPlan[];
}

export interface FitPartPlan {
  readonly given: NumberReader;
  readonly least?: NumberReader;
  readonly most?: NumberReader;
  readonly off: readonly GatePlan[];
  readonly breach: 'fails' | 'refer';
  readonly clash?: Test;
}

export interface FitPlan {
  readonly id: FitName;
  readonly part: PartName;
  readonly rule: FitRule | NoRule;
  readonly noRule: string;
  readonly parts: readonly FitPartPlan[];
}

/** A joint's list joined with a standard's rules, composed once into closures. */
export interface Plan {
  readonly standard: Standard;
  readonly strength: readonly StrengthPlan[];
  readonly fit: readonly FitPlan[];
  /** Least reaction to check for, N; 0 where the standard asks for none. */
  readonly leastReaction: NumberReader;
  /** True where some way's demand or resistance has to be stated at V itself. */
  readonly atReaction: boolean;
}

const gatePlan = ({ when, reason }: Gate): GatePlan => ({ test: testOf(when), reason });
const limitPlan = (limit: Limit): LimitPlan => ({
  ...gatePlan(limit),
  always: limit.always,
  noNumber: limit.noNumber ?? false,
});

const wayPlan = (way: Way, off: Gate | undefined): WayPlan => ({
  demand: numberOf(way.demand),
  load: way.load,
  off: [...(off ? [off] : []), ...(way.off ?? [])].map(gatePlan),
  limits: (way.limits ?? []).map(limitPlan),
  ...(way.resistance && { resistance: numberOf(way.resistance) }),
  ...(way.whereFirst && { whereFirst: gatePlan(way.whereFirst) }),
  ...(way.failsAt && { failsAt: numberOf(way.failsAt) }),
  ...(way.unbounded && { unbounded: testOf(way.unbounded) }),
  ...(way.informs && { informs: testOf(way.informs) }),
});

const fitPartPlan = (part: FitPart, breach: 'fails' | 'refer', off: Gate | undefined): FitPartPlan => ({
  given: numberOf(part.given),
  ...(part.least && { least: numberOf(part.least) }),
  ...(part.most && { most: numberOf(part.most) }),
  off: [...(off ? [off] : []), ...(part.off ?? [])].map(gatePlan),
  breach: part.breach ?? breach,
  ...(part.clash && { clash: testOf(part.clash) }),
});

const reasonOf = (rule: StrengthRule | FitRule | NoRule): string =>
  isNoRule(rule) ? (rule.covered ? 'covered' : 'no-rule') : '';

/** Finds the steps that several rules of a standard lean on, before any of them is composed. */
const markSharedIn = ({ strength, fit, notes, leastReaction }: Standard): void => {
  for (const rule of [...Object.values(strength), ...Object.values(fit)]) {
    if (isNoRule(rule)) continue;
    for (const one of 'ways' in rule ? rule.ways : rule.parts) {
      const conditions = 'demand' in one ? [...(one.limits ?? []), ...(one.off ?? [])] : (one.off ?? []);
      const more =
        'demand' in one ? [...treesOf(one), one.unbounded, one.informs] : [one.given, one.least, one.most, one.clash];
      markShared(...conditions.map(({ when }) => when), ...more.filter((it) => it !== undefined));
    }
  }
  markShared(...notes.map(({ when }) => when), ...(leastReaction ? [leastReaction] : []));
};

const made = new Map<string, Plan>();
const marked = new Set<string>();

/** The plan of one standard and kind of joint, made at first use. */
export const planOf = (standard: Standard, kind: Joint['kind']): Plan => {
  const key = `${standard.id} ${kind}`;
  const known = made.get(key);
  if (known) return known;
  if (!marked.has(standard.id)) markSharedIn(standard);
  marked.add(standard.id);
  const list = joints[kind];
  const strength = list.strength.map(([id, part, off]) => {
    const rule = standard.strength[id];
    return {
      id,
      part,
      rule,
      noRule: reasonOf(rule),
      ways: isNoRule(rule) ? [] : rule.ways.map((way) => wayPlan(way, off)),
    };
  });
  const plan: Plan = {
    standard,
    strength,
    fit: list.fit.map(([id, part, off]) => {
      const rule = standard.fit[id];
      return {
        id,
        part,
        rule,
        noRule: reasonOf(rule),
        parts: isNoRule(rule) ? [] : rule.parts.map((part) => fitPartPlan(part, rule.breach, off)),
      };
    }),
    atReaction: strength.some(({ ways }) => ways.some(({ failsAt }) => failsAt)),
    leastReaction: standard.leastReaction ? numberOf(standard.leastReaction) : () => 0,
  };
  made.set(key, plan);
  return plan;
};
