import type { Check } from '../check/report.ts';
import { basisText, isFit, isRow, isSecondRow, tableStyle } from './cells.ts';
import { columnsOf } from './columns.ts';
import type { Context } from './context.ts';
import { CLAUSE_GAP, type Columns, type Group, NAME } from './numberColumns.ts';
import { small, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { clauseText, letterOf, type Shared, sharedReasons, tellsWhy } from './reasons.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { type Lines, plainRun, wrap } from './textBlock.ts';
import { shortTitleOf, titleOf } from './verdictSentence.ts';

/** A row of the table, or the heading of the rules of fit that are not held. */
export type Row = CheckRow | { readonly kind: 'fit' };

export interface CheckRow {
  readonly kind: 'check';
  readonly check: Check;
  readonly name: Lines;
  readonly clause: Lines;
  /** Why it refers or fails: in the place of the bar where there is no number and it is short, else below. */
  readonly beside: readonly SetRun[] | null;
  readonly below: Lines;
  /** The same check under the second standard; null for rules of fit, and where there is none. */
  readonly second: { readonly check: Check; readonly clause: Lines } | null;
}

/** Heights of the table's head, of the line that names two standards above it, of a row, and of each further line in it, mm. */
const HEADER = 4;
const NAMES = 3.9;
const ROW = 4.05;
const ROW_BESIDE = 3.85;
export const MORE = 3.5;

/** Height of a row of one line. */
const rowHeight = ({ second }: Context): number => (second ? ROW_BESIDE : ROW);

export const headerOf = ({ second }: Context): number => HEADER + (second ? NAMES : 0);

/** Where a reason starts that stands in the place of the bar: right of the line at V. */
export const besideLeft = ({ bar, perV }: Columns): number => bar + perV + 1.2;

/** What all rows of one table lean on. */
interface Table {
  readonly context: Context;
  readonly columns: Columns;
  readonly shared: Shared;
}

const nameOf = ({ context, columns, shared }: Table, check: Check, governs: boolean): Lines => {
  const { pen, words, second } = context;
  const marks = `${check.verified === 'none' ? ` ${say.unverifiedMark}` : ''}${letterOf(shared, check)}`;
  const lead = governs ? say.table.governs : '';
  const said = (title: string): string => `${lead}${title}${second ? '' : marks}`;
  const style: TextStyle = { ...tableStyle(context), bold: governs };
  if (pen.width(said(titleOf(check)), style) <= columns.nameWidth) return [[plainRun(said(titleOf(check)))]];
  return wrap(pen, [plainRun(said(shortTitleOf(words, check)))], style, columns.nameWidth);
};

/** A reason that several share stands below the table under its letter. */
const reasonOf = ({ context, columns, shared }: Table, check: Check): Pick<CheckRow, 'beside' | 'below'> => {
  const { reasonText = '', reactionAtFailure, utilisation } = check;
  if (!tellsWhy(check) || shared.has(reasonText)) return { beside: null, below: [] };
  const runs = richText(reasonText, 'prose');
  const empty = (reactionAtFailure ?? null) === null && utilisation === null;
  const fits = context.pen.width(runs, small) <= columns.first.clause - besideLeft(columns) - 1;
  if (empty && fits) return { beside: runs, below: [] };
  return { beside: null, below: wrap(context.pen, runs, small, WIDTH - NAME - 8) };
};

const clauseLines = ({ context, shared }: Table, check: Check, { clause, basis }: Group): Lines => {
  const width = basis - clause - CLAUSE_GAP - context.pen.width(basisText(context, check), small);
  return wrap(context.pen, [plainRun(clauseText(context, shared, check))], small, width);
};

const secondOf = (of: Table, { id }: Check): CheckRow['second'] => {
  const { second } = of.context;
  const check = isFit({ id }) ? undefined : second?.input.report.checks.find((one) => one.id === id);
  const group = of.columns.second;
  return check && group ? { check, clause: clauseLines(of, check, group) } : null;
};

const rowOf = (of: Table, check: Check): Row => {
  const second = secondOf(of, check);
  // What only the second standard makes has no part of its own in the first one's report.
  const named = isRow(check) || !second ? check : second.check;
  return {
    kind: 'check',
    check,
    name: nameOf(of, named, check.id === of.context.input.report.governing),
    clause: isRow(check) ? clauseLines(of, check, of.columns.first) : [],
    ...reasonOf(of, check),
    second,
  };
};

/** Checks that only the second standard makes, in its order. */
const addedChecks = ({ input, second }: Context): Check[] =>
  (second?.input.report.checks ?? [])
    .filter((one) => second && isSecondRow(second, one))
    .flatMap(({ id }) => input.report.checks.filter((one) => one.id === id && !isRow(one)));

/** Checks that stand as rows: strength that holds, fails or refers, weakest first; then what the second standard adds; then rules of fit that do not hold. */
export const rowsOf = (context: Context): Row[] => {
  const told = context.input.report.checks.filter(isRow);
  const fit = told.filter(isFit);
  const heading: Row[] = fit.length > 0 ? [{ kind: 'fit' }] : [];
  const of: Table = { context, columns: columnsOf(context), shared: sharedReasons(context) };
  const rows = (checks: readonly Check[]): Row[] => checks.map((one) => rowOf(of, one));
  return [...rows(told.filter((one) => !isFit(one))), ...rows(addedChecks(context)), ...heading, ...rows(fit)];
};

export const heightOf = (context: Context, row: Row): number => {
  if (row.kind === 'fit') return rowHeight(context);
  const { name, clause, second, below } = row;
  return rowHeight(context) + (linesOf({ name, clause, second }) - 1 + below.length) * MORE;
};

/** Lines of the cells, without the reason below. */
export const linesOf = ({ name, clause, second }: Pick<CheckRow, 'name' | 'clause' | 'second'>): number =>
  Math.max(name.length, clause.length, second?.clause.length ?? 0);

/** How many rows fit a height; a heading stays with what it heads. */
export const rowsWithin = (context: Context, rows: readonly Row[], height: number): number => {
  let left = height - headerOf(context);
  const count = rows.findIndex((row) => {
    left -= heightOf(context, row);
    return left < 0;
  });
  if (count < 0) return rows.length;
  return rows[count - 1]?.kind === 'fit' ? count - 1 : count;
};

/** Rules of fit have no bar. */
export const hasBar = (row: Row): boolean => row.kind === 'check' && !isFit(row.check);
