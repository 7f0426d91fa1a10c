import type { Check } from '../check/report.ts';
import type { Under } from './context.ts';
import { body, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { sheetWords as say } from './sheetWords.ts';
import { standardName } from './standardNames.ts';
import { plainRun, wrap } from './textBlock.ts';
import { titleOf } from './verdictSentence.ts';
import { type Step, stepsOf } from './workingLines.ts';
import { sourceText } from './workingZone.ts';

export const style: TextStyle = { ...body, family: 'narrow' };
const LEADING = 3.95;
const GUTTER = 6;
const COLUMN = (WIDTH - GUTTER) / 2;
/** From the left edge of one column to that of the next, mm. */
export const COLUMN_STEP = COLUMN + GUTTER;
const SYMBOL = 13;

/** A line of a column: a heading, or one side of a step behind its symbol. */
export interface Line {
  readonly symbol?: readonly SetRun[];
  readonly runs: readonly SetRun[];
  readonly inset: number;
  readonly height: number;
  /** Type that is not the column's own. */
  readonly style?: TextStyle;
}

/** Lines that stay together in one column. */
export type Block = readonly Line[];

const headingLines = (context: Under, check: Check): Line[] => {
  const runs = [plainRun(titleOf(check), true), plainRun(`  ${sourceText(check)}`)];
  return wrap(context.pen, runs, style, COLUMN).map((line, i) => ({
    runs: line,
    inset: 0,
    height: i === 0 ? LEADING + 2 : LEADING,
  }));
};

/** Sides one below the other, the equals signs in one column; the value follows on the line of the numbers where it fits. */
const stepBlock = ({ pen }: Under, step: Step): Block => {
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
const aboveBlock = ({ pen }: Under, steps: readonly Step[]): Block => {
  const runs = steps.flatMap(({ symbol, sides }, i) => [
    plainRun(i > 0 ? ', ' : `${say.asAbove} `),
    ...symbol,
    plainRun(' '),
    ...(sides.at(-1) ?? []),
  ]);
  return wrap(pen, runs, style, COLUMN).map((line) => ({ runs: line, inset: 0, height: LEADING }));
};

/** The working of one check; steps that an earlier one has shown are named with their value. */
const blocksOf = (context: Under, check: Check, shown: Set<string>): Block[] => {
  const steps = stepsOf(context, check);
  const fresh = steps.filter(({ key }) => !shown.has(key));
  const known = steps.filter(({ key }) => shown.has(key));
  for (const { key } of fresh) shown.add(key);
  const above = known.length > 0 ? aboveBlock(context, known) : [];
  const [first = [], ...rest] = fresh.map((step) => stepBlock(context, step));
  return [[...headingLines(context, check), ...above, ...first], ...rest];
};

/** Checks whose workings go on further sheets, and the standard that they are made under. */
export interface Worked {
  readonly under: Under;
  readonly checks: readonly Check[];
}

/** Those of all checks that stand in the table, in its order. */
export const allWorked = (under: Under): Worked => ({
  under,
  checks: under.input.report.checks.filter(({ state, working }) => state !== 'notApplicable' && !!working?.length),
});

/** The workings under one standard, each step once; `named`: with the standard as a heading. */
export const blocksUnder = ({ under, checks }: Worked, named: boolean): Block[] => {
  const shown = new Set<string>();
  const blocks = checks.flatMap((check) => blocksOf(under, check, shown));
  const [first, ...rest] = blocks;
  return named && first ? [[...standardLines(under), ...first], ...rest] : blocks;
};

const heading: TextStyle = { size: 11, family: 'narrow', bold: true };

const standardLines = (under: Under): Line[] =>
  wrap(under.pen, [plainRun(standardName(under))], heading, COLUMN).map((runs) => ({
    runs,
    inset: 0,
    height: LEADING + 3,
    style: heading,
  }));

const heightOf = (block: Block): number => block.reduce((sum, { height }) => sum + height, 0);

/** Columns of blocks; `room` gives the height of each column by its number. */
export const columnsOf = (blocks: readonly Block[], room: (column: number) => number): Line[][] => {
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

export const drawColumn = ({ pen }: Under, lines: readonly Line[], x: number, y: number): void => {
  let base = y;
  for (const { symbol, runs, inset, height, style: own } of lines) {
    base += height;
    if (symbol) pen.text(x, base, symbol, style);
    pen.text(x + inset, base, runs, own ?? style);
  }
};
