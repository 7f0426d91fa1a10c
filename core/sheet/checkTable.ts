import { drawCells } from './checkCells.ts';
import { hasBar, headerOf, heightOf, type Row } from './checkRows.ts';
import { columnsOf } from './columns.ts';
import type { Context, Zone } from './context.ts';
import { type Columns, NAME } from './numberColumns.ts';
import { DOTTED, HAIR, LEFT, NARROW, small, WIDE, WIDTH } from './page.ts';
import type { TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { hasOwnReaction } from './second.ts';
import { sheetWords as say } from './sheetWords.ts';
import { standardTitles } from './standardNames.ts';
import { oneLine, plainRun } from './textBlock.ts';

/** The ladder in print: one row a check, the weakest first; beside it the second standard's. */
export const tableZone = (context: Context, rows: readonly Row[]): Zone => {
  const header = headerOf(context);
  const body = rows.reduce((sum, row) => sum + heightOf(context, row), 0);
  const draw = (_x: number, y: number): void => {
    const { pen } = context;
    const columns = columnsOf(context);
    drawNames(context, columns, y);
    drawHeader(context, columns, y + header);
    let top = y + header;
    rows.forEach((row, i) => {
      if (i > 0) pen.line(LEFT, top, LEFT + WIDTH, top, HAIR, DOTTED);
      drawRow(context, columns, row, top);
      top += heightOf(context, row);
    });
    if (rows.some(hasBar)) drawReactions(context, columns, y + header, strengthHeight(context, rows));
    pen.line(LEFT, top, LEFT + WIDTH, top, NARROW);
  };
  return { height: header + body, draw };
};

const strengthHeight = (context: Context, rows: readonly Row[]): number =>
  rows.filter(hasBar).reduce((sum, row) => sum + heightOf(context, row), 0);

/** The line at V across the bars; dashed, one at the second standard's reaction where that is another; and the rule between the standards. */
const drawReactions = (context: Context, { bar, perV, second }: Columns, y: number, height: number): void => {
  const { pen, input } = context;
  const V = input.report.reaction;
  const other = context.second?.input.report.reaction ?? 0;
  const at = (times: number): number => LEFT + bar + times * perV;
  if (V > 0) pen.line(at(1), y - 0.6, at(1), y + height, WIDE);
  if (V > 0 && hasOwnReaction(context) && other <= 3 * V) {
    pen.line(at(other / V), y, at(other / V), y + height, NARROW, [1.4, 0.7]);
  }
  if (second) pen.line(LEFT + second.rule, y, LEFT + second.rule, y + height, NARROW);
};

/** Over the columns of each standard its name; the second with its reaction where that is its own, or that it gives strengths only. */
const drawNames = (context: Context, { first, second: group, bar }: Columns, y: number): void => {
  const { pen, second, numbers } = context;
  if (!second || !group) return;
  const style: TextStyle = { ...small, bold: true };
  // What follows a name stands beside the verdicts too: rather the whole name.
  const write = (title: string, after: string, left: number, right: number): void => {
    const whole = [plainRun(title), plainRun(after, false)];
    const room = right - left;
    pen.text(LEFT + left, y + 3, pen.width(whole, style) <= room ? whole : oneLine(pen, title, style, room), style);
  };
  const { reaction, level } = second.input.report;
  const own = hasOwnReaction(context) ? say.table.reaction(numbers.load(reaction), level) : '';
  const [one, two] = standardTitles(context);
  write(one, second.stated ? say.table.upperBar : '', bar, first.basis);
  write(two, second.stated ? own : say.table.strengths, group.rule + 1, WIDTH);
};

const drawHeader = (context: Context, columns: Columns, y: number): void => {
  const { pen, input, numbers, second } = context;
  const base = y - 1.1;
  const right = (x: number, text: string): void => {
    pen.text(LEFT + x, base, text, { ...small, anchor: 'end' });
  };
  pen.text(LEFT + NAME, base, say.table.check, small);
  right(columns.demand, say.table.demand);
  right(columns.resistance, say.table.resistance);
  const reaction = [...richText('V'), plainRun(` ${numbers.load(input.report.reaction)}`)];
  pen.text(LEFT + columns.bar + columns.perV, base, reaction, { size: 9, bold: true, anchor: 'middle' });
  for (const [group, stated] of [
    [columns.first, true],
    [columns.second, second?.stated],
  ] as const) {
    if (!group) continue;
    if (stated) right(group.ratio, say.table.ratio);
    right(group.failsAt, say.table.failsAt(numbers.force));
    pen.text(LEFT + group.clause, base, say.table.clause, small);
  }
  if (!second) right(columns.first.basis, say.table.basis);
  pen.line(LEFT, y, LEFT + WIDTH, y, NARROW);
};

const drawRow = (context: Context, columns: Columns, row: Row, top: number): void => {
  const { pen } = context;
  if (row.kind === 'fit') {
    pen.line(LEFT, top, LEFT + WIDTH, top, NARROW);
    pen.text(LEFT + NAME, top + 3, say.table.fit, small);
    pen.text(LEFT + columns.demand, top + 3, say.table.limit, { ...small, anchor: 'end' });
    pen.text(LEFT + columns.resistance, top + 3, say.table.given, { ...small, anchor: 'end' });
    return;
  }
  drawCells(context, columns, row, top);
};
