import type { Check } from '../check/report.ts';
import { type Row, rowsWithin } from './checkRows.ts';
import { tableZone } from './checkTable.ts';
import { closingDepth, closingLines, drawClosing } from './closing.ts';
import type { Context } from './context.ts';
import { standardName } from './head.ts';
import { body, FRAME, LEFT, NARROW, small, TOP, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { sheetWords as say } from './sheetWords.ts';
import { type Lines, oneLine, plainRun, wrap } from './textBlock.ts';
import { fingerprintText } from './titleBlock.ts';
import { titleOf } from './verdictSentence.ts';
import { type Step, stepsOf } from './workingLines.ts';
import { sourceText } from './workingZone.ts';

const style: TextStyle = { ...body, family: 'narrow' };
const LEADING = 3.95;
const HEAD = 11;
/** From the rule of the foot to its first base line, and from its last one to the line below, mm; air above the rule. */
const CLOSING = 3.6;
const BELOW = 3.4;
const OVER = 2;
const GUTTER = 6;
const COLUMN = (WIDTH - GUTTER) / 2;
const SYMBOL = 13;
/** Air above and below rows of the table, mm. */
const GAP = 2;

/** A line of a column: a heading, or one side of a step behind its symbol. */
interface Line {
  readonly symbol?: readonly SetRun[];
  readonly runs: readonly SetRun[];
  readonly inset: number;
  readonly height: number;
}

/** Lines that stay together in one column. */
type Block = readonly Line[];

const headingLines = (context: Context, check: Check): Line[] => {
  const runs = [plainRun(titleOf(check), true), plainRun(`  ${sourceText(check)}`)];
  return wrap(context.pen, runs, style, COLUMN).map((line, i) => ({
    runs: line,
    inset: 0,
    height: i === 0 ? LEADING + 2 : LEADING,
  }));
};

/** Sides one below the other, the equals signs in one column; the value follows on the line of the numbers where it fits. */
const stepBlock = ({ pen }: Context, step: Step): Block => {
  const room = COLUMN - SYMBOL;
  const wide = Math.max(SYMBOL, pen.width(step.symbol, style) + 1.5);
  const rows: SetRun[][] = [];
  for (const side of step.sides) {
    const runs = [plainRun('= '), ...side];
    const last = rows.at(-1);
    const closing = side === step.sides.at(-1);
    if (last && closing && pen.width([...last, plainRun(' '), ...runs], style) <= room)
      last.push(plainRun(' '), ...runs);
    else rows.push(...wrap(pen, runs, style, COLUMN - wide));
  }
  const notes = step.note.length > 0 ? wrap(pen, step.note, style, room) : [];
  return [...rows, ...notes].map((runs, i) => ({
    ...(i === 0 && { symbol: step.symbol }),
    runs,
    inset: i === 0 ? wide : SYMBOL,
    height: LEADING,
  }));
};

/** Steps that stand already, by symbol and value alone. */
const aboveBlock = ({ pen }: Context, steps: readonly Step[]): Block => {
  const runs = steps.flatMap(({ symbol, sides }, i) => [
    plainRun(i > 0 ? ', ' : `${say.asAbove} `),
    ...symbol,
    plainRun(' '),
    ...(sides.at(-1) ?? []),
  ]);
  return wrap(pen, runs, style, COLUMN).map((line) => ({ runs: line, inset: 0, height: LEADING }));
};

/** The working of one check; steps that an earlier one has shown are named with their value. */
const blocksOf = (context: Context, check: Check, shown: Set<string>): Block[] => {
  const steps = stepsOf(context, check);
  const fresh = steps.filter(({ key }) => !shown.has(key));
  const known = steps.filter(({ key }) => shown.has(key));
  for (const { key } of fresh) shown.add(key);
  const above = known.length > 0 ? aboveBlock(context, known) : [];
  const [first = [], ...rest] = fresh.map((step) => stepBlock(context, step));
  return [[...headingLines(context, check), ...above, ...first], ...rest];
};

const heightOf = (block: Block): number => block.reduce((sum, { height }) => sum + height, 0);

/** Columns of blocks; `room` gives the height of each column by its number. */
const columnsOf = (blocks: readonly Block[], room: (column: number) => number): Line[][] => {
  const columns: Line[][] = [[]];
  let left = room(0);
  for (const block of blocks) {
    const needs = heightOf(block);
    // A block higher than the room of a shortened page goes on; one higher than a whole page stays where it is.
    while (needs > left && (columns.at(-1)!.length > 0 || left < room(columns.length))) {
      columns.push([]);
      left = room(columns.length - 1);
    }
    columns.at(-1)!.push(...block);
    left -= needs;
  }
  return blocks.length > 0 ? columns : [];
};

const drawColumn = ({ pen }: Context, lines: readonly Line[], x: number, y: number): void => {
  let base = y;
  for (const { symbol, runs, inset, height } of lines) {
    base += height;
    if (symbol) pen.text(x, base, symbol, style);
    pen.text(x + inset, base, runs, style);
  }
};

/** Checks whose working goes on further sheets: those that stand in the table, in its order. */
export const workedChecks = ({ input }: Context): readonly Check[] =>
  input.report.checks.filter(({ state, working }) => state !== 'notApplicable' && (working?.length ?? 0) > 0);

/** One further sheet: rows of the table, and columns of workings below them. */
interface Page {
  rows: readonly Row[];
  columns: Line[][];
}

/** Rows that go on further sheets, as many on each as fit. */
const pagesOfRows = (rows: readonly Row[], room: number): Page[] => {
  const pages: Page[] = [];
  for (let rest = rows; rest.length > 0; ) {
    const count = Math.max(1, rowsWithin(rest, room - GAP));
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
  checks: readonly Check[],
  bottom: number,
): (() => void)[] => {
  const room = bottom - footOf(context).height - OVER - TOP - HEAD;
  const pages = pagesOfRows(rows, room);
  const last = Math.max(0, pages.length - 1);
  const tableHeight = (page: Page | undefined): number =>
    page && page.rows.length > 0 ? tableZone(context, page.rows).height + 2 * GAP : 0;
  const shown = new Set<string>();
  const columns = columnsOf(
    checks.flatMap((check) => blocksOf(context, check, shown)),
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
      drawColumn(context, lines, LEFT + k * (COLUMN + GUTTER), top);
    });
  });
};

/** Mark, standard and number of a further sheet, and what binds it to the first. */
export const drawFurtherFrame = (context: Context, bottom: number, sheet: number, of: number): void => {
  const { pen, input } = context;
  const { report, end } = input;
  pen.line(LEFT, TOP, LEFT + WIDTH, TOP, FRAME);
  pen.text(LEFT, TOP + 7.2, oneLine(pen, report.mark, { size: 16, bold: true }, 60), {
    size: 16,
    family: 'narrow',
    bold: true,
  });
  const job = [end.sheet?.job, standardName(context)].filter(Boolean).join('; ');
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
