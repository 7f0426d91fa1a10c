import { absentText, basisText, demandText, isFit, isRow, isSecondRow, resistanceText, tableStyle } from './cells.ts';
import { besideLeft, type CheckRow, hasBar, heightOf, linesOf, MORE } from './checkRows.ts';
import type { Context, Second } from './context.ts';
import { drawBar } from './ladderBar.ts';
import { type Columns, type Group, NAME, TICK } from './numberColumns.ts';
import { HAIR, LEFT, small, WIDTH } from './page.ts';
import type { TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { drawSign } from './sign.ts';
import { setLines } from './textBlock.ts';

/** Base line of a row below its top, middle of its figures above that, mm. */
const BASE = 2.95;
const MIDDLE = 1.05;
const SIGN_X = 1.2;
/** Lines above and below the row that governs. */
const GOVERNS = 0.35;

/** One row of the table: the check under the first standard, and beside it under the second. */
export const drawCells = (context: Context, columns: Columns, row: CheckRow, top: number): void => {
  const { pen } = context;
  const { second, check, below } = row;
  const base = top + BASE;
  drawFirst(context, columns, row, base);
  if (context.second && second) drawSecond(context, context.second, columns, row, base);
  pen.box(LEFT + TICK, base - 2.3, 2.5, 2.5, { width: HAIR });
  setLines(pen, LEFT + NAME + 2, base + linesOf(row) * MORE - 0.1, below, small, MORE);
  const right = columns.second ? columns.second.rule : WIDTH;
  if (check.id === context.input.report.governing) drawEdges(context, 0, right, row, top);
  if (second && second.check.id === context.second?.input.report.governing && context.second.stated)
    drawEdges(context, right, WIDTH, row, top);
};

const drawEdges = (context: Context, left: number, right: number, row: CheckRow, top: number): void => {
  for (const y of [top, top + heightOf(context, row)]) context.pen.line(LEFT + left, y, LEFT + right, y, GOVERNS);
};

const drawFirst = (context: Context, columns: Columns, row: CheckRow, base: number): void => {
  const { pen, numbers, input } = context;
  const { check, name, clause, beside } = row;
  const { first, symbol } = columns;
  const bold = check.id === input.report.governing;
  const style: TextStyle = { ...tableStyle(context), bold };
  const right = (x: number, text: string): void => {
    pen.text(LEFT + x, base, text, { ...style, anchor: 'end' });
  };
  setLines(pen, LEFT + NAME, base, name, style, MORE);
  if (!isRow(check)) {
    pen.text(LEFT + first.failsAt, base, absentText(check), { ...small, anchor: 'end' });
    return;
  }
  drawSign(pen, LEFT + SIGN_X, base - MIDDLE, 1, check);
  if (symbol !== null) pen.text(LEFT + symbol, base, richText(check.symbol), { ...tableStyle(context), anchor: 'end' });
  right(columns.demand, demandText(context, check));
  right(columns.resistance, resistanceText(context, check));
  pen.text(LEFT + columns.unit, base, check.unit, style);
  if (beside) pen.text(LEFT + besideLeft(columns), base, beside, small);
  else right(first.ratio, numbers.ratio(check.utilisation));
  if (!beside && hasBar(row)) {
    right(first.failsAt, numbers.failsAt(check.reactionAtFailure));
    drawBar(pen, barOf(context, columns, 'first', base), input.report.reaction, check, bold);
  }
  drawSource(context, first, row.check, clause, bold, base);
};

const drawSource = (
  context: Context,
  group: Group,
  check: CheckRow['check'],
  clause: CheckRow['clause'],
  bold: boolean,
  base: number,
): void => {
  const { pen } = context;
  setLines(pen, LEFT + group.clause, base, clause, { ...small, bold }, MORE);
  pen.text(LEFT + group.basis, base, basisText(context, check), { ...small, bold, anchor: 'end' });
};

/** Alone in the row, or the first standard's above the second's, both on one axis. */
const barOf = ({ second }: Context, { bar, perV }: Columns, whose: 'first' | 'second', base: number) => {
  const place = { x: LEFT + bar, perV };
  if (!second?.stated) return { ...place, y: base - MIDDLE, height: 2 };
  return whose === 'first' ? { ...place, y: base - 1.75, height: 1.5 } : { ...place, y: base - 0.25, height: 0.9 };
};

/** Sign, ratio, reaction at failure and source under the second standard; strengths alone where it has no states. */
const drawSecond = (
  context: Context,
  second: Second,
  columns: Columns,
  { check: { id }, second: cell }: CheckRow,
  base: number,
): void => {
  const { pen, numbers, stated, input } = second;
  const group = columns.second;
  if (!group || !cell || isFit({ id })) return;
  const { check, clause } = cell;
  const bold = stated && id === input.report.governing;
  const right = (x: number, text: string): void => {
    pen.text(LEFT + x, base, text, { ...tableStyle(context), bold, anchor: 'end' });
  };
  if (!isSecondRow(second, check)) {
    pen.text(LEFT + group.failsAt, base, absentText(check), { ...small, anchor: 'end' });
    return;
  }
  if (stated) {
    drawSign(pen, LEFT + group.sign, base - MIDDLE, 1, check);
    right(group.ratio, numbers.ratio(check.utilisation));
    drawBar(pen, barOf(context, columns, 'second', base), context.input.report.reaction, check, false);
  }
  right(group.failsAt, numbers.failsAt(check.reactionAtFailure));
  drawSource(context, group, check, clause, bold, base);
};
