import type { FitName, PartName, StrengthName } from '../end/checkNames.ts';
import type { Gate, Limit } from '../end/gates.ts';
import { V } from '../end/given.ts';
import type { Joint } from '../end/schema.ts';
import { type Group, type Place, programOf } from '../formula/program.ts';
import type { Program } from '../formula/run.ts';
import { joints } from '../joints/index.ts';
import {
  type FitPart,
  type FitRule,
  isNoRule,
  type NoRule,
  type Standard,
  type StrengthRule,
  type Way,
} from '../standards/standard.ts';
import { reasonNumber } from './reasons.ts';
import { blankRow } from './row.ts';

/** A cell of the plan's program; undefined for what a rule has not got. */
type Cell = number | undefined;

export interface WayPlan {
  readonly load: 'V' | 'T' | 'none';
  /** Conditions under which the way does not apply, then its limits, in the order in which they are looked at. */
  readonly off: readonly Gate[];
  readonly limits: readonly Limit[];
  /** Numbers of their reasons. */
  readonly reasons: readonly number[];
  /** Holds the number of the first of them that is met; -1 where none is. */
  readonly gate: number;
  readonly failsAt: Cell;
  /** Of a way with `failsAt`: where demand and resistance at the reaction itself are worked out; else they are at 1 N. */
  readonly atReaction: number;
  readonly demand: number;
  readonly resistance: Cell;
  /** Holds 1 where any load at all uses it up. */
  readonly unbounded: Cell;
  /** Holds 1 where its numbers are without a verdict. */
  readonly informs: Cell;
  readonly whereFirst: Gate | undefined;
}

export interface StrengthPlan {
  readonly id: StrengthName;
  readonly part: PartName;
  readonly rule: StrengthRule | NoRule;
  /** Number of the reason where the standard has no rule; else 0. */
  readonly noRule: number;
  readonly ways: readonly WayPlan[];
}

export interface FitPartPlan {
  readonly off: readonly Gate[];
  readonly reasons: readonly number[];
  /** Holds the number of the first of them that is met; -1 where none is. */
  readonly gate: number;
  readonly given: number;
  readonly least: Cell;
  readonly most: Cell;
  /** Holds 1 where it cannot be built. */
  readonly clash: Cell;
  readonly breach: 'fails' | 'refer';
}

export interface FitPlan {
  readonly id: FitName;
  readonly part: PartName;
  readonly rule: FitRule | NoRule;
  readonly noRule: number;
  readonly parts: readonly FitPartPlan[];
}

/** A joint's list joined with a standard's rules, written once as one program. */
export interface Plan {
  readonly standard: Standard;
  /** Everything at a reaction of 1 N; after it, ways that are not in proportion to V at V itself. */
  readonly program: Program;
  /** A row for every check, strength before fit, of which nothing has been found out. */
  readonly blank: readonly number[];
  /** Place of the full section's shear among the strength checks. */
  readonly grossShear: number;
  readonly strength: readonly StrengthPlan[];
  /** Places of the strength checks that have ways not in proportion to V. */
  readonly notInProportion: readonly number[];
  readonly fit: readonly FitPlan[];
  /** Least reaction to check for, N. */
  readonly leastReaction: Cell;
}

const offOf = (off: Gate | undefined, own: readonly Gate[] = []): readonly Gate[] => (off ? [off, ...own] : own);

const numbersOf = (gates: readonly Gate[]): number[] => gates.map(({ reason }) => reasonNumber(reason));

const wayGroup = (way: Way, joint: Gate | undefined): Group => ({
  always: [way.informs],
  gates: [
    ...offOf(joint, way.off).map(({ when }) => ({ when, closes: true })),
    ...(way.limits ?? []).map(({ when, noNumber = false }) => ({ when, closes: noNumber })),
  ],
  of: way.failsAt ? [way.failsAt] : [undefined, way.unbounded, way.demand, way.resistance],
  after: way.failsAt ? [way.demand, way.resistance] : [],
});

const wayPlan = (way: Way, joint: Gate | undefined, place: Place): WayPlan => {
  const [failsAt, unbounded, ...atOne] = place.of;
  const [demand, resistance] = failsAt === undefined ? atOne : place.after;
  const { load, limits = [], whereFirst } = way;
  const [informs] = place.always;
  const { gate, from: atReaction } = place;
  const off = offOf(joint, way.off);
  const reasons = numbersOf([...off, ...limits]);
  return {
    load,
    off,
    limits,
    reasons,
    gate,
    demand: demand!,
    resistance,
    failsAt,
    atReaction,
    unbounded,
    informs,
    whereFirst,
  };
};

const partGroup = ({ off, given, least, most, clash }: FitPart, joint: Gate | undefined): Group => ({
  always: [],
  gates: offOf(joint, off).map(({ when }) => ({ when, closes: true })),
  of: [given, least, most, clash],
});

const partPlan = (part: FitPart, rule: FitRule, joint: Gate | undefined, { gate, of }: Place): FitPartPlan => {
  const [given, least, most, clash] = of;
  const breach = part.breach ?? rule.breach;
  const off = offOf(joint, part.off);
  return { off, reasons: numbersOf(off), gate, given: given!, least, most, clash, breach };
};

const reasonOf = (rule: StrengthRule | FitRule | NoRule): number =>
  reasonNumber(isNoRule(rule) ? (rule.covered ? 'covered' : 'no-rule') : '');

const waysOf = (rule: StrengthRule | NoRule): readonly Way[] => (isNoRule(rule) ? [] : rule.ways);
const partsOf = (rule: FitRule | NoRule): readonly FitPart[] => (isNoRule(rule) ? [] : rule.parts);

/** Hands out places in the order of their groups. */
const inTurn = (places: readonly Place[]): (() => Place) => {
  let at = 0;
  return () => places[at++]!;
};

const planFor = (standard: Standard, kind: Joint['kind']): Plan => {
  const strength = joints[kind].strength.map(([id, part, off]) => ({ id, part, off, rule: standard.strength[id] }));
  const fit = joints[kind].fit.map(([id, part, off]) => ({ id, part, off, rule: standard.fit[id] }));
  const { program, places } = programOf(
    [
      ...strength.flatMap(({ rule, off }) => waysOf(rule).map((way) => wayGroup(way, off))),
      ...fit.flatMap(({ rule, off }) => partsOf(rule).map((part) => partGroup(part, off))),
      { always: [standard.leastReaction], gates: [], of: [] },
    ],
    { kind, changing: V },
  );
  const next = inTurn(places);
  return {
    standard,
    program,
    blank: [...strength, ...fit].flatMap(blankRow),
    grossShear: strength.findIndex(({ id }) => id === 'web-gross-shear'),
    notInProportion: strength.flatMap(({ rule }, at) => (waysOf(rule).some((way) => way.failsAt) ? [at] : [])),
    strength: strength.map(({ id, part, off, rule }) => ({
      id,
      part,
      rule,
      noRule: reasonOf(rule),
      ways: waysOf(rule).map((way) => wayPlan(way, off, next())),
    })),
    fit: fit.map(({ id, part, off, rule }) => ({
      id,
      part,
      rule,
      noRule: reasonOf(rule),
      parts: partsOf(rule).map((one) => partPlan(one, rule as FitRule, off, next())),
    })),
    leastReaction: next().always[0],
  };
};

const made = new Map<string, Plan>();

/** The plan of one standard and kind of joint, made at first use. */
export const planOf = (standard: Standard, kind: Joint['kind']): Plan => {
  const key = `${standard.id} ${kind}`;
  const known = made.get(key);
  if (known) return known;
  const plan = planFor(standard, kind);
  made.set(key, plan);
  return plan;
};
