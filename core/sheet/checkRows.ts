import type { Check } from '../check/report.ts';
import { shortOf } from '../words/words.ts';
import { BAR, columnsOf, isFit, isRow, NAME } from './columns.ts';
import type { Context } from './context.ts';
import { PER_V } from './ladderBar.ts';
import { small, table, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { type Lines, plainRun, wrap } from './textBlock.ts';
import { titleOf } from './verdictSentence.ts';

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
}

/** Heights of the table's head, of a row, and of each further line in it, mm. */
export const HEADER = 4;
export const ROW = 4.05;
export const MORE = 3.5;

/** Right edges of right-aligned columns, left edges of the others, mm from the left of the window; the numbers stand between name and bar. */
export const at = {
  sign: 1.2,
  name: NAME,
  bar: BAR,
  ratio: 119.2,
  failsAt: 131.6,
  clause: 133.6,
  basis: WIDTH - 3.8,
  tick: WIDTH - 2.9,
} as const;
/** Where a reason starts that stands in the place of the bar: right of the line at V. */
export const BESIDE = at.bar + PER_V + 1.2;
/** Between clause and basis, mm. */
const CLAUSE_GAP = 0.9;

type Shared = ReadonlyMap<string, string>;

/** Letters of the reasons that several checks share, in the order of the rows. */
export const sharedReasons = ({ input }: Context): Shared => {
  const told = input.report.checks.filter(tellsWhy).map(({ reasonText = '' }) => reasonText);
  const shared = [...new Set(told)].filter((one) => told.indexOf(one) !== told.lastIndexOf(one));
  return new Map(shared.map((reason, i) => [reason, String.fromCharCode(97 + i)]));
};

/** Refers or fails for a reason in words; a rule of fit says why by its two sizes, unless it clashes. */
const tellsWhy = ({ id, state, reason, reasonText }: Check): boolean => {
  const bySizes = id.startsWith('fit-') && (reason === 'too-little' || reason === 'too-much');
  return (state === 'refer' || state === 'fails') && !!reasonText && !bySizes;
};

/** Marks after a title: not compared with numbers from outside; letter of a reason that several share. */
const marksOf = (shared: Shared, check: Check): string => {
  const letter = tellsWhy(check) ? shared.get(check.reasonText ?? '') : undefined;
  return `${check.verified === 'none' ? ' *' : ''}${letter ? ` (${letter})` : ''}`;
};

const nameOf = ({ pen, words }: Context, shared: Shared, check: Check, governs: boolean, width: number): Lines => {
  const marks = marksOf(shared, check);
  const lead = governs ? say.table.governs : '';
  const full = `${lead}${titleOf(check)}${marks}`;
  const style: TextStyle = { ...table, bold: governs };
  if (pen.width(full, style) <= width) return [[plainRun(full)]];
  const short = shortOf(words, check);
  return wrap(pen, [plainRun(`${lead}${titleOf({ ...check, title: short })}${marks}`)], style, width);
};

const rowOf = (context: Context, shared: Shared, check: Check, nameWidth: number): Row => {
  const { pen, input } = context;
  const governs = check.id === input.report.governing;
  return {
    kind: 'check',
    check,
    name: nameOf(context, shared, check, governs, nameWidth),
    clause: wrap(pen, [plainRun(check.clause)], small, clauseWidth(context, check)),
    ...reasonOf(context, shared, check),
  };
};

/** A reason that several share stands below the table under its letter. */
const reasonOf = ({ pen }: Context, shared: Shared, check: Check): Pick<CheckRow, 'beside' | 'below'> => {
  const { reasonText = '', reactionAtFailure, utilisation } = check;
  if (!tellsWhy(check) || shared.has(reasonText)) return { beside: null, below: [] };
  const runs = richText(reasonText, 'prose');
  const empty = (reactionAtFailure ?? null) === null && utilisation === null;
  const fits = pen.width(runs, small) <= at.clause - BESIDE - 1;
  if (empty && fits) return { beside: runs, below: [] };
  return { beside: null, below: wrap(pen, runs, small, WIDTH - at.name - 8) };
};

const clauseWidth = ({ pen }: Context, check: Check): number =>
  at.basis - at.clause - CLAUSE_GAP - pen.width(basisOf(check), small);

/** Left out where it would repeat the clause. */
export const basisOf = ({ basis, clause }: Check): string => (basis === clause ? '' : basis);

/** Checks that stand as rows: strength that holds, fails or refers, weakest first; then rules of fit that do not hold. */
export const rowsOf = (context: Context): Row[] => {
  const { checks } = context.input.report;
  const told = checks.filter(isRow);
  const strength = told.filter((one) => !isFit(one));
  const fit = told.filter(isFit);
  const heading: Row[] = fit.length > 0 ? [{ kind: 'fit' }] : [];
  const shared = sharedReasons(context);
  const { nameWidth } = columnsOf(context);
  const rows = (of: readonly Check[]): Row[] => of.map((one) => rowOf(context, shared, one, nameWidth));
  return [...rows(strength), ...heading, ...rows(fit)];
};

export const heightOf = (row: Row): number =>
  row.kind === 'fit' ? ROW : ROW + (Math.max(row.name.length, row.clause.length) - 1 + row.below.length) * MORE;

/** How many rows fit a height. */
export const rowsWithin = (rows: readonly Row[], height: number): number => {
  let left = height - HEADER;
  const count = rows.findIndex((row) => {
    left -= heightOf(row);
    return left < 0;
  });
  return count < 0 ? rows.length : count;
};

/** Rules of fit have no bar. */
export const hasBar = (row: Row): boolean => row.kind === 'check' && !isFit(row.check);
