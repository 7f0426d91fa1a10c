import type { FitPartPlan, FitPlan } from './plan.ts';
import { reasonNumber } from './reasons.ts';
import { DEMAND, FAILS, HOLDS, REASON, REFER, RESISTANCE, STATE, UTILISATION, WAY } from './row.ts';

const [CLASH, TOO_LITTLE, TOO_MUCH] = [reasonNumber('clash'), reasonNumber('too-little'), reasonNumber('too-much')];

/** What is needed over what is there; no room at all where something is needed uses it up without bound. */
const used = (needed: number, there: number): number => {
  if (there > 0) return needed / there;
  return needed > 0 ? Number.POSITIVE_INFINITY : 0;
};

/** Sizes that meet a bound exactly keep meeting it after conversion from inches. */
const CONVERSION_NOISE = 1e-9;

/** One comparison, put into the row where it is the worst so far: the nearer of its bounds stands as the requirement. */
const evaluatePart = (part: FitPartPlan, cells: Float64Array, rows: number[], row: number, at: number): void => {
  const given = cells[part.given]!;
  const least = part.least === undefined ? Number.NaN : cells[part.least]!;
  const most = part.most === undefined ? Number.NaN : cells[part.most]!;
  const toLeast = part.least === undefined ? Number.NEGATIVE_INFINITY : used(least, given);
  const toMost = part.most === undefined ? Number.NEGATIVE_INFINITY : used(given, most);
  const low = toLeast >= toMost;
  const utilisation = low ? toLeast : toMost;
  const holds = utilisation <= 1 + CONVERSION_NOISE;
  const clash = part.clash !== undefined && cells[part.clash] === 1;
  const breach = clash || part.breach === 'fails' ? FAILS : REFER;
  const state = holds ? HOLDS : breach;
  const worse = state - rows[row + STATE]!;
  if (rows[row + WAY]! >= 0 && worse <= 0 && !(worse === 0 && utilisation > rows[row + UTILISATION]!)) return;
  rows[row + WAY] = at;
  rows[row + STATE] = state;
  const reason = clash ? CLASH : low ? TOO_LITTLE : TOO_MUCH;
  rows[row + REASON] = holds ? 0 : reason;
  rows[row + DEMAND] = low ? least : most;
  rows[row + RESISTANCE] = given;
  rows[row + UTILISATION] = utilisation;
};

/** The worst state of the parts of one rule of geometry, with the part that is nearest to its bound, into the row that begins at `row`. */
export const evaluateFit = ({ noRule, parts }: FitPlan, cells: Float64Array, rows: number[], row: number): void => {
  rows[row + REASON] = noRule;
  for (let at = 0; at < parts.length; at += 1) {
    const part = parts[at]!;
    const gate = cells[part.gate]!;
    if (gate < 0) evaluatePart(part, cells, rows, row, at);
    else if (rows[row + WAY]! < 0 && rows[row + REASON] === 0) rows[row + REASON] = part.reasons[gate]!;
  }
};
