import { isRow } from './cells.ts';
import { columnsBeside } from './columnsBeside.ts';
import type { Context } from './context.ts';
import { AIR, BASIS, type Columns, NAME, numbersBefore, widestOf } from './numberColumns.ts';
import { table } from './page.ts';
import { richText } from './richText.ts';

/** Where the bars stand and what follows them, with one standard; mm from the left of the window. */
const ALONE = {
  bar: 84.6,
  perV: 8.5,
  first: { ratio: 119.2, failsAt: 131.6, clause: 133.6, basis: BASIS },
  second: null,
} as const;

const columnsAlone = (context: Context): Columns => {
  const widest = widestOf(context, context.input.report.checks.filter(isRow), table);
  const { left: symbol, ...numbers } = numbersBefore(context, widest, ALONE.bar);
  const nameWidth = symbol - widest((one) => richText(one.symbol)) - AIR - NAME;
  return { ...ALONE, ...numbers, symbol, nameWidth };
};

/** Each column as wide as its widest number: the longest takes no other's room. */
export const columnsOf = (context: Context): Columns =>
  context.second ? columnsBeside(context, context.second) : columnsAlone(context);
