import type { StrengthPlan, WayPlan } from './plan.ts';
import { reasonNumber } from './reasons.ts';
import {
  blankRow,
  DEMAND,
  FAILS,
  FAILS_AT,
  HOLDS,
  INFORMATION,
  NOT_APPLICABLE,
  REASON,
  REFER,
  RESISTANCE,
  STATE,
  UTILISATION,
  WAY,
} from './row.ts';

const [NO_RULE, ONE_BOLT, NOTHING_LEFT] = [
  reasonNumber('no-rule'),
  reasonNumber('one-bolt'),
  reasonNumber('nothing-left'),
];

/** A way for which the standard sets no limit: its demand at V, for information; no rule where a verdict is asked for. */
const inform = (plan: WayPlan, cells: Float64Array, V: number, rows: number[], row: number): void => {
  rows[row + DEMAND] = cells[plan.demand]! * V;
  const told = plan.informs === undefined || cells[plan.informs] === 1;
  rows[row + STATE] = told ? INFORMATION : NOT_APPLICABLE;
  if (!told) rows[row + REASON] = NO_RULE;
};

/** Used up by any load at all. */
const useUp = (plan: WayPlan, reason: number, rows: number[], row: number): void => {
  rows[row + STATE] = FAILS;
  rows[row + REASON] = reason;
  rows[row + UTILISATION] = Number.POSITIVE_INFINITY;
  if (plan.load === 'V') rows[row + FAILS_AT] = 0;
};

/** How much of the way is used: its demand grows in proportion to V, so it was measured at 1 N (or at the tie force itself). */
const measure = (plan: WayPlan, cells: Float64Array, V: number, rows: number[], row: number): number => {
  if (plan.failsAt !== undefined) return V / rows[row + FAILS_AT]!;
  const demand = cells[plan.demand]!;
  if (plan.load !== 'V') {
    rows[row + DEMAND] = demand;
    return demand / rows[row + RESISTANCE]!;
  }
  rows[row + DEMAND] = demand * V;
  const failsAt = rows[row + RESISTANCE]! / demand;
  rows[row + FAILS_AT] = failsAt;
  return V / failsAt;
};

/** One way that applies, at the reaction V, into a row whose numbers are blank. */
const evaluateWay = (plan: WayPlan, cells: Float64Array, V: number, rows: number[], row: number): void => {
  const { off, limits } = plan;
  const gate = cells[plan.gate]!;
  const limit = gate < 0 ? undefined : limits[gate - off.length]!;
  const informs = plan.informs !== undefined && cells[plan.informs] === 1;
  rows[row + REASON] = 0;
  if (limit?.noNumber) {
    rows[row + STATE] = informs ? INFORMATION : REFER;
    rows[row + REASON] = plan.reasons[gate]!;
    return;
  }
  if (plan.failsAt === undefined && plan.resistance === undefined) {
    inform(plan, cells, V, rows, row);
    return;
  }
  const column = plan.failsAt === undefined ? RESISTANCE : FAILS_AT;
  const held = cells[plan.failsAt ?? plan.resistance!]!;
  rows[row + column] = held;
  if (plan.unbounded !== undefined && cells[plan.unbounded] === 1) {
    useUp(plan, ONE_BOLT, rows, row);
    return;
  }
  if (!(held > 0)) {
    useUp(plan, NOTHING_LEFT, rows, row);
    return;
  }
  const utilisation = measure(plan, cells, V, rows, row);
  rows[row + UTILISATION] = utilisation;
  const holds = utilisation <= 1;
  if (informs) rows[row + STATE] = INFORMATION;
  else if (limit && (limit.always || holds)) {
    rows[row + STATE] = REFER;
    rows[row + REASON] = plan.reasons[gate]!;
  } else rows[row + STATE] = holds ? HOLDS : FAILS;
};

const trial = blankRow();

/** The worst state of the ways, with the numbers of the way used up first, into the blank row that begins at `row`. */
export const evaluateStrength = (
  { noRule, ways }: StrengthPlan,
  cells: Float64Array,
  V: number,
  rows: number[],
  row: number,
): void => {
  rows[row + REASON] = noRule;
  for (let at = 0; at < ways.length; at += 1) {
    const way = ways[at]!;
    const gate = cells[way.gate]!;
    const none = rows[row + WAY]! < 0;
    if (gate >= 0 && gate < way.off.length) {
      if (none) rows[row + REASON] = way.reasons[gate]!;
    } else if (none) {
      evaluateWay(way, cells, V, rows, row);
      if (hasNumbers(rows, row)) rows[row + WAY] = at;
    } else {
      trial[DEMAND] = trial[RESISTANCE] = trial[FAILS_AT] = trial[UTILISATION] = Number.NaN;
      evaluateWay(way, cells, V, trial, 0);
      if (hasNumbers(trial, 0)) take(rows, row, at);
    }
  }
};

/** False for a way that says nothing of the end. */
const hasNumbers = (rows: readonly number[], row: number): boolean =>
  rows[row + STATE] !== NOT_APPLICABLE || !Number.isNaN(rows[row + DEMAND]!);

/** True where the trial is used up before what the row holds; of two for information, the one with the larger demand. */
const sooner = (rows: readonly number[], row: number): boolean => {
  const utilisation = rows[row + UTILISATION]!;
  if (Number.isNaN(trial[UTILISATION]!)) return Number.isNaN(utilisation) && trial[DEMAND]! > rows[row + DEMAND]!;
  if (Number.isNaN(utilisation)) return true;
  const mixed = Number.isNaN(trial[FAILS_AT]!) || Number.isNaN(rows[row + FAILS_AT]!);
  return mixed ? trial[UTILISATION]! > utilisation : trial[FAILS_AT]! < rows[row + FAILS_AT]!;
};

const take = (rows: number[], row: number, at: number): void => {
  const first = sooner(rows, row);
  const worse = trial[STATE]! - rows[row + STATE]!;
  if (worse > 0 || (worse === 0 && first)) {
    rows[row + STATE] = trial[STATE]!;
    rows[row + REASON] = trial[REASON]!;
  }
  if (!first) return;
  rows[row + WAY] = at;
  for (let column = DEMAND as number; column <= UTILISATION; column += 1) rows[row + column] = trial[column]!;
};
