import { type Row, rowsWithin } from './checkRows.ts';
import { tableZone } from './checkTable.ts';
import { closingDepth, closingLines, drawClosing } from './closing.ts';
import type { Context } from './context.ts';
import { FRAME, LEFT, NARROW, small, TOP, WIDTH } from './page.ts';
import { sheetWords as say } from './sheetWords.ts';
import { standardName } from './standardNames.ts';
import { type Lines, oneLine } from './textBlock.ts';
import { fingerprintText } from './titleBlock.ts';
import { blocksUnder, COLUMN_STEP, columnsOf, drawColumn, type Line, style, type Worked } from './workingBlocks.ts';

const HEAD = 11;
/** From the rule of the foot to its first base line, and from its last one to the line below, mm; air above the rule. */
const CLOSING = 3.6;
const BELOW = 3.4;
const OVER = 2;
/** Air above and below rows of the table, mm. */
const GAP = 2;

/** One further sheet: rows of the table, and columns of workings below them. */
interface Page {
  rows: readonly Row[];
  columns: Line[][];
}

/** Rows that go on further sheets, as many on each as fit. */
const pagesOfRows = (context: Context, rows: readonly Row[], room: number): Page[] => {
  const pages: Page[] = [];
  for (let rest = rows; rest.length > 0; ) {
    const count = Math.max(1, rowsWithin(context, rest, room - GAP));
    pages.push({ rows: rest.slice(0, count), columns: [] });
    rest = rest.slice(count);
  }
  return pages;
};

const footOf = (context: Context): { lines: Lines; height: number } => {
  const lines = closingLines(context, WIDTH);
  return { lines, height: CLOSING + closingDepth(lines) + BELOW };
};

/** What the further sheets hold; each function draws one page below its head. The workings begin below the last rows. */
export const furtherPages = (
  context: Context,
  rows: readonly Row[],
  worked: readonly Worked[],
  bottom: number,
): (() => void)[] => {
  const room = bottom - footOf(context).height - OVER - TOP - HEAD;
  const pages = pagesOfRows(context, rows, room);
  const last = Math.max(0, pages.length - 1);
  const tableHeight = (page: Page | undefined): number =>
    page && page.rows.length > 0 ? tableZone(context, page.rows).height + 2 * GAP : 0;
  const columns = columnsOf(
    worked.flatMap((one) => blocksUnder(one, context.second !== null)),
    (column) => room - (column < 2 ? tableHeight(pages[last]) : 0),
  );
  columns.forEach((lines, i) => {
    const page = last + Math.floor(i / 2);
    pages[page] ??= { rows: [], columns: [] };
    pages[page].columns.push(lines);
  });
  return pages.map((page) => () => {
    const top = TOP + HEAD + tableHeight(page);
    if (page.rows.length > 0) tableZone(context, page.rows).draw(LEFT, TOP + HEAD + GAP);
    page.columns.forEach((lines, k) => {
      drawColumn(context, lines, LEFT + k * COLUMN_STEP, top);
    });
  });
};

/** Mark, standard and number of a further sheet, and what binds it to the first. */
export const drawFurtherFrame = (context: Context, bottom: number, sheet: number, of: number): void => {
  const { pen, input, second } = context;
  const { report, end } = input;
  pen.line(LEFT, TOP, LEFT + WIDTH, TOP, FRAME);
  pen.text(LEFT, TOP + 7.2, oneLine(pen, report.mark, { size: 16, bold: true }, 60), {
    size: 16,
    family: 'narrow',
    bold: true,
  });
  const standards = [context, ...(second ? [second] : [])].map(standardName);
  const job = [...standards, end.sheet?.job].filter(Boolean).join('; ');
  pen.text(LEFT + 64, TOP + 6.8, oneLine(pen, `${say.workings}: ${job}`, style, WIDTH - 64), style);
  pen.line(LEFT, TOP + HEAD - 0.8, LEFT + WIDTH, TOP + HEAD - 0.8, NARROW);
  const foot = footOf(context);
  const line = bottom - foot.height;
  pen.line(LEFT, line, LEFT + WIDTH, line, NARROW);
  drawClosing(context, LEFT, line + CLOSING, foot.lines);
  const revision = end.sheet?.revision || say.unchecked;
  const parts = [
    `${say.revision} ${revision}`,
    fingerprintText(report.fingerprint),
    `${say.programName} ${report.version}`,
    `${say.sheet} ${sheet} ${say.of} ${of}`,
  ];
  pen.text(LEFT + WIDTH, bottom, parts.join('   '), { ...small, anchor: 'end' });
};
