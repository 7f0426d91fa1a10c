import { at, BESIDE, basisOf, type CheckRow, HEADER, hasBar, heightOf, MORE, type Row } from './checkRows.ts';
import { type Columns, columnsOf, demandText, resistanceText } from './columns.ts';
import type { Context, Zone } from './context.ts';
import { drawBar, PER_V } from './ladderBar.ts';
import { DOTTED, HAIR, LEFT, NARROW, small, table, WIDE, WIDTH } from './page.ts';
import type { TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { drawSign } from './sign.ts';
import { plainRun, setLines } from './textBlock.ts';

/** The ladder in print: one row a check, the weakest first. */
export const tableZone = (context: Context, rows: readonly Row[]): Zone => {
  const body = rows.reduce((sum, row) => sum + heightOf(row), 0);
  const draw = (_x: number, y: number): void => {
    const { pen } = context;
    const columns = columnsOf(context);
    drawHeader(context, columns, y);
    let top = y + HEADER;
    rows.forEach((row, i) => {
      if (i > 0) pen.line(LEFT, top, LEFT + WIDTH, top, HAIR, DOTTED);
      drawRow(context, columns, row, top);
      top += heightOf(row);
    });
    const line = LEFT + at.bar + PER_V;
    if (context.input.report.reaction > 0 && rows.some(hasBar))
      pen.line(line, y + HEADER - 0.6, line, y + HEADER + strengthHeight(rows), WIDE);
    pen.line(LEFT, top, LEFT + WIDTH, top, NARROW);
  };
  return { height: HEADER + body, draw };
};

const strengthHeight = (rows: readonly Row[]): number =>
  rows.filter(hasBar).reduce((sum, row) => sum + heightOf(row), 0);

const drawHeader = ({ pen, input, numbers }: Context, { demand, resistance }: Columns, y: number): void => {
  const base = y + 2.9;
  const right = (x: number, text: string): void => {
    pen.text(LEFT + x, base, text, { ...small, anchor: 'end' });
  };
  pen.text(LEFT + at.name, base, say.table.check, small);
  right(demand, say.table.demand);
  right(resistance, say.table.resistance);
  const reaction = [...richText('V'), plainRun(` ${numbers.load(input.report.reaction)}`)];
  pen.text(LEFT + at.bar + PER_V, base, reaction, { size: 9, bold: true, anchor: 'middle' });
  right(at.ratio, say.table.ratio);
  right(at.failsAt, say.table.failsAt(numbers.force));
  pen.text(LEFT + at.clause, base, say.table.clause, small);
  right(at.basis, say.table.basis);
  pen.line(LEFT, y + HEADER, LEFT + WIDTH, y + HEADER, NARROW);
};

const drawRow = (context: Context, columns: Columns, row: Row, top: number): void => {
  const { pen, input } = context;
  if (row.kind === 'fit') {
    pen.line(LEFT, top, LEFT + WIDTH, top, NARROW);
    pen.text(LEFT + at.name, top + 3, say.table.fit, small);
    pen.text(LEFT + columns.demand, top + 3, say.table.limit, { ...small, anchor: 'end' });
    pen.text(LEFT + columns.resistance, top + 3, say.table.given, { ...small, anchor: 'end' });
    return;
  }
  const bold = row.check.id === input.report.governing;
  drawCells(context, columns, row, top + 3.05);
  if (bold) for (const y of [top, top + heightOf(row)]) pen.line(LEFT, y, LEFT + WIDTH, y, 0.35);
};

const drawCells = (context: Context, columns: Columns, row: CheckRow, base: number): void => {
  const { pen, numbers, input } = context;
  const { check, name, clause, beside, below } = row;
  const bold = check.id === input.report.governing;
  const style: TextStyle = { ...table, bold };
  const right = (x: number, text: string): void => {
    pen.text(LEFT + x, base, text, { ...style, anchor: 'end' });
  };
  drawSign(pen, LEFT + at.sign, base - 1.05, 1, check);
  setLines(pen, LEFT + at.name, base, name, style, MORE);
  pen.text(LEFT + columns.symbol, base, richText(check.symbol), { ...table, anchor: 'end' });
  right(columns.demand, demandText(context, check));
  right(columns.resistance, resistanceText(context, check));
  pen.text(LEFT + columns.unit, base, check.unit, style);
  if (beside) pen.text(LEFT + BESIDE, base, beside, small);
  else right(at.ratio, numbers.ratio(check.utilisation));
  if (!beside && hasBar(row)) {
    right(at.failsAt, numbers.failsAt(check.reactionAtFailure));
    drawBar(pen, LEFT + at.bar, base - 1.05, input.report.reaction, check, bold);
  }
  setLines(pen, LEFT + at.clause, base, clause, { ...small, bold }, MORE);
  pen.text(LEFT + at.basis, base, basisOf(check), { ...small, bold, anchor: 'end' });
  pen.box(LEFT + at.tick, base - 2.3, 2.5, 2.5, { width: HAIR });
  const next = base + Math.max(name.length, clause.length) * MORE - 0.1;
  setLines(pen, LEFT + at.name + 2, next, below, small, MORE);
};
