import type { Check } from '../check/report.ts';
import { demandText, resistanceText } from './cells.ts';
import type { Context, Under } from './context.ts';
import { small, WIDTH } from './page.ts';
import type { SetRun } from './pen.ts';
import { sheetWords as say } from './sheetWords.ts';

/** Left edge of the names, right edge of the last basis, left edge of the boxes to tick; mm from the left of the window. */
export const NAME = 4.2;
export const BASIS = WIDTH - 3.8;
export const TICK = WIDTH - 2.9;
/** Air between columns, between a number and its unit, and between clause and basis, mm. */
export const AIR = 1.5;
const BEFORE_UNIT = 0.8;
export const CLAUSE_GAP = 0.9;

/** What one standard gives: right edges of numbers and basis, left edge of the clause; mm from the left of the window. */
export interface Group {
  readonly ratio: number;
  readonly failsAt: number;
  readonly clause: number;
  readonly basis: number;
}

/**
 * Of the table: right edges of right-aligned columns, left edges of units and bars, the width that is left for the names, and what the reaction V
 * takes on the axis of the bars; mm. Beside a second standard the symbols give their room.
 */
export interface Columns {
  readonly nameWidth: number;
  readonly symbol: number | null;
  readonly demand: number;
  readonly resistance: number;
  readonly unit: number;
  readonly bar: number;
  readonly perV: number;
  readonly first: Group;
  readonly second: (Group & { readonly rule: number; readonly sign: number }) | null;
}

type Says = (check: Check) => string | readonly SetRun[];

/** Measures the widest that one standard's rows say; the row that governs is bold. */
export type Widest = (says: Says, style?: { readonly size: number }) => number;

export const widestOf =
  ({ pen, input }: Under, rows: readonly Check[], usual: { readonly size: number }): Widest =>
  (says, style = usual) =>
    Math.max(0, ...rows.map((one) => pen.width(says(one), { ...style, bold: one.id === input.report.governing })));

/** Demand, resistance and unit, measured back from the left edge of the bars; `left`: what is before them. */
export const numbersBefore = (context: Context, widest: Widest, bar: number) => {
  const unit = bar - AIR - widest((one) => one.unit);
  const resistance = unit - BEFORE_UNIT;
  const headed = Math.max(
    widest((one) => resistanceText(context, one)),
    context.pen.width(say.table.resistance, small),
  );
  const demand = resistance - headed - AIR;
  return { unit, resistance, demand, left: demand - widest((one) => demandText(context, one)) - AIR };
};
