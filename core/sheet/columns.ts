import type { Check } from '../check/report.ts';
import type { Context } from './context.ts';
import { limitText } from './fitLimit.ts';
import { small, table } from './page.ts';
import type { SetRun } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';

/** Left edge of the bars, from which the columns before them are measured back, mm from the left of the window. */
export const BAR = 84.6;
/** Left edge of the names. */
export const NAME = 4.2;
/** Air between columns, and between a number and its unit, mm. */
const AIR = 1.5;
const BEFORE_UNIT = 0.8;

/** Of the numbers of the table: right edges of right-aligned columns, the left edge of the units, and the width that is left for the names; mm. */
export interface Columns {
  readonly nameWidth: number;
  readonly symbol: number;
  readonly demand: number;
  readonly resistance: number;
  readonly unit: number;
}

/** Rules of fit, which give limit and size where the others give demand and resistance. */
export const isFit = ({ id }: Check): boolean => id.startsWith('fit-');

/** What stands as a row of the table: rules of fit only where they do not hold. */
export const isRow = (check: Check): boolean =>
  check.state === 'fails' || check.state === 'refer' || (check.state === 'holds' && !isFit(check));

export const demandText = ({ numbers }: Context, check: Check): string =>
  isFit(check) ? limitText(numbers, check) : numbers.amount(check.demand, check.unit);

export const resistanceText = ({ numbers }: Context, { resistance, unit }: Check): string =>
  numbers.amount(resistance, unit);

/** Each column as wide as its widest number: the longest takes no other's room. */
export const columnsOf = (context: Context): Columns => {
  const { pen, input } = context;
  const { checks, governing } = input.report;
  const rows = checks.filter(isRow);
  const widest = (of: (check: Check) => string | readonly SetRun[]): number =>
    Math.max(0, ...rows.map((one) => pen.width(of(one), { ...table, bold: one.id === governing })));
  const unit = BAR - AIR - widest((one) => one.unit);
  const resistance = unit - BEFORE_UNIT;
  const headed = Math.max(
    widest((one) => resistanceText(context, one)),
    pen.width(say.table.resistance, small),
  );
  const demand = resistance - headed - AIR;
  const symbol = demand - widest((one) => demandText(context, one)) - AIR;
  const nameWidth = symbol - widest((one) => richText(one.symbol)) - AIR - NAME;
  return { nameWidth, symbol, demand, resistance, unit };
};
