import type { CheckName } from '../end/checkNames.ts';
import type { Facts } from '../end/facts.ts';
import { Values } from '../formula/number.ts';
import { run, runAgain } from '../formula/run.ts';
import { evaluateFit } from './evaluateFit.ts';
import { evaluateStrength } from './evaluateStrength.ts';
import type { Plan } from './plan.ts';
import { reasonNumber } from './reasons.ts';
import type { Verdict } from './report.ts';
import {
  DEMAND,
  FAILS,
  FAILS_AT,
  HOLDS,
  INFORMATION,
  REASON,
  REFER,
  RESISTANCE,
  STATE,
  UTILISATION,
  WAY,
  WIDTH,
} from './row.ts';

/** All numbers of one end under one standard. */
export interface Evaluation {
  /** A row for each check of the plan, strength before fit. */
  readonly rows: readonly number[];
  readonly verdict: Verdict;
  readonly governing: CheckName;
  /** Least reaction at failure of checks that hold, fail or refer; NaN where there is none. */
  readonly capacity: number;
  /** The reaction that the numbers are for. */
  readonly reaction: number;
}

/** States demand and resistance at V where they do not change in proportion; `check` numbers the strength checks. */
const stateAtReaction = (plan: Plan, facts: Facts, rows: number[], check: number): void => {
  const row = check * WIDTH;
  const at = rows[row + WAY]!;
  if (at < 0 || Number.isNaN(rows[row + UTILISATION]!)) return;
  const way = plan.strength[check]!.ways[at]!;
  if (way.failsAt === undefined) return;
  runAgain(plan.program, facts as never, way.atReaction, facts.V);
  const { cells } = plan.program;
  rows[row + DEMAND] = cells[way.demand]!;
  rows[row + RESISTANCE] = cells[way.resistance!]!;
};

/** The check with the least reaction at failure, of those that hold, fail or refer; -1 where there is none. */
const firstUsedUp = (strength: number, rows: readonly number[]): number => {
  let first = -1;
  let least = Number.POSITIVE_INFINITY;
  for (let row = 0; row < strength * WIDTH; row += WIDTH) {
    const failsAt = rows[row + FAILS_AT]!;
    if (rows[row + STATE]! <= INFORMATION || !(failsAt < least || (first < 0 && failsAt === least))) continue;
    first = row / WIDTH;
    least = failsAt;
  }
  return first;
};

/** A way that may not be the first to fail refers where it is. */
const referWhereFirst = (plan: Plan, facts: Facts, rows: number[], first: number): void => {
  const row = first * WIDTH;
  const whereFirst = plan.strength[first]!.ways[rows[row + WAY]!]?.whereFirst;
  if (rows[row + STATE] !== HOLDS || !whereFirst || !new Values(facts as never).met(whereFirst.when)) return;
  rows[row + STATE] = REFER;
  rows[row + REASON] = reasonNumber(whereFirst.reason);
};

/** The worst failing check that no reaction is to blame for: a tie, a size, a clash; -1 where there is none. */
const worstWithoutV = (rows: readonly number[]): number => {
  let found = -1;
  for (let row = 0; row < rows.length; row += WIDTH) {
    if (rows[row + STATE] !== FAILS || !Number.isNaN(rows[row + FAILS_AT]!)) continue;
    if (found < 0 || rows[row + UTILISATION]! > rows[found * WIDTH + UTILISATION]!) found = row / WIDTH;
  }
  return found;
};

const verdictOf = (rows: readonly number[]): Verdict => {
  let worst: number = HOLDS;
  for (let row = STATE; row < rows.length; row += WIDTH) worst = Math.max(worst, rows[row]!);
  if (worst === FAILS) return 'fails';
  return worst === REFER ? 'refer' : 'holds';
};

const idAt = ({ strength, fit }: Plan, check: number): CheckName =>
  check < strength.length ? strength[check]!.id : fit[check - strength.length]!.id;

/** Evaluates every check of a plan on one end at the reaction given, or at the least that the standard asks for. N */
export const evaluate = (plan: Plan, facts: Facts, given: number): Evaluation => {
  facts.V = 1;
  const { program, leastReaction, strength, fit } = plan;
  run(program, facts as never);
  const { cells } = program;
  const V = leastReaction === undefined ? given : Math.max(given, cells[leastReaction]!);
  const rows = plan.blank.slice();
  let row = 0;
  for (let at = 0; at < strength.length; at += 1, row += WIDTH) evaluateStrength(strength[at]!, cells, V, rows, row);
  for (let at = 0; at < fit.length; at += 1, row += WIDTH) evaluateFit(fit[at]!, cells, rows, row);
  facts.V = V;
  for (const check of plan.notInProportion) stateAtReaction(plan, facts, rows, check);
  const first = firstUsedUp(strength.length, rows);
  if (first >= 0) referWhereFirst(plan, facts, rows, first);
  const worst = worstWithoutV(rows);
  return {
    rows,
    verdict: verdictOf(rows),
    governing: idAt(plan, worst >= 0 ? worst : Math.max(first, 0)),
    capacity: first < 0 ? Number.NaN : rows[first * WIDTH + FAILS_AT]!,
    reaction: V,
  };
};
