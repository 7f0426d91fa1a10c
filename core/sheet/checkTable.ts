import type { Check } from '../check/report.ts';
import type { Context, Zone } from './context.ts';
import { limitText } from './fitLimit.ts';
import { drawBar, PER_V } from './ladderBar.ts';
import { DOTTED, HAIR, LEFT, NARROW, small, table, WIDE, WIDTH } from './page.ts';
import type { TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { drawSign } from './sign.ts';
import { type Lines, plainRun, setLines, wrap } from './textBlock.ts';
import { titleOf } from './verdictLine.ts';

/** A row of the table, or the heading of the rules of fit that are not held. */
export type Row =
  | {
      readonly kind: 'check';
      readonly check: Check;
      readonly name: Lines;
      readonly clause: Lines;
      readonly reason: Lines;
    }
  | { readonly kind: 'fit' };

const HEADER = 4;
const ROW = 4.05;
const MORE = 3.5;

/** Right edges of right-aligned columns, left edges of the others, mm from the left of the window. */
const at = {
  sign: 1.2,
  name: 4.2,
  symbol: 52.4,
  demand: 62.6,
  resistance: 74.2,
  unit: 75,
  bar: 84.6,
  ratio: 119.2,
  failsAt: 131.6,
  clause: 133.6,
  basis: WIDTH - 3.8,
  tick: WIDTH - 2.9,
} as const;
const NAME_WIDTH = 41;
/** Between clause and basis, mm. */
const CLAUSE_GAP = 0.9;

const nameOf = (context: Context, check: Check, governs: boolean): Lines => {
  const { pen, words } = context;
  const mark = check.verified === 'none' ? ' *' : '';
  const lead = governs ? say.table.governs : '';
  const full = `${lead}${titleOf(check)}${mark}`;
  const style: TextStyle = { ...table, bold: governs };
  if (pen.width(full, style) <= NAME_WIDTH) return [[plainRun(full)]];
  const short = words.short[check.id] ?? check.title;
  return wrap(pen, [plainRun(`${lead}${titleOf({ ...check, title: short })}${mark}`)], style, NAME_WIDTH);
};

const rowOf = (context: Context, check: Check): Row => {
  const { pen, input } = context;
  const governs = check.id === input.report.governing;
  return {
    kind: 'check',
    check,
    name: nameOf(context, check, governs),
    clause: wrap(pen, [plainRun(check.clause)], small, clauseWidth(context, check)),
    reason: reasonLines(context, check),
  };
};

/** Why a check refers or fails, below its row; a rule of fit says so by its two sizes, unless it clashes. */
const reasonLines = ({ pen }: Context, { id, state, reason, reasonText = '' }: Check): Lines => {
  const told = state === 'refer' || state === 'fails';
  const bySizes = id.startsWith('fit-') && (reason === 'too-little' || reason === 'too-much');
  return told && reasonText && !bySizes ? wrap(pen, richText(reasonText, 'prose'), small, WIDTH - at.name - 8) : [];
};

const clauseWidth = ({ pen }: Context, check: Check): number =>
  at.basis - at.clause - CLAUSE_GAP - pen.width(basisOf(check), small);

/** Left out where it would repeat the clause. */
const basisOf = ({ basis, clause }: Check): string => (basis === clause ? '' : basis);

/** Checks that stand as rows: strength that holds, fails or refers, weakest first; then rules of fit that do not hold. */
export const rowsOf = (context: Context): Row[] => {
  const { checks } = context.input.report;
  const told = checks.filter(({ state }) => state === 'holds' || state === 'fails' || state === 'refer');
  const strength = told.filter(({ id }) => !id.startsWith('fit-'));
  const fit = told.filter(({ id, state }) => id.startsWith('fit-') && state !== 'holds');
  const heading: Row[] = fit.length > 0 ? [{ kind: 'fit' }] : [];
  return [...strength.map((one) => rowOf(context, one)), ...heading, ...fit.map((one) => rowOf(context, one))];
};

const heightOf = (row: Row): number =>
  row.kind === 'fit' ? ROW : ROW + (Math.max(row.name.length, row.clause.length) - 1 + row.reason.length) * MORE;

/** How many rows fit a height. */
export const rowsWithin = (rows: readonly Row[], height: number): number => {
  let left = height - HEADER;
  const count = rows.findIndex((row) => {
    left -= heightOf(row);
    return left < 0;
  });
  return count < 0 ? rows.length : count;
};

/** The ladder in print: one row a check, the weakest first. */
export const tableZone = (context: Context, rows: readonly Row[]): Zone => {
  const body = rows.reduce((sum, row) => sum + heightOf(row), 0);
  const draw = (_x: number, y: number): void => {
    const { pen } = context;
    drawHeader(context, y);
    let top = y + HEADER;
    for (const row of rows) {
      drawRow(context, row, top);
      top += heightOf(row);
    }
    const line = LEFT + at.bar + PER_V;
    if (context.input.report.reaction > 0 && rows.some(hasBar))
      pen.line(line, y + HEADER - 0.6, line, y + HEADER + strengthHeight(rows), WIDE);
    pen.line(LEFT, top, LEFT + WIDTH, top, NARROW);
  };
  return { height: HEADER + body, draw };
};

const hasBar = (row: Row): boolean => row.kind === 'check' && !row.check.id.startsWith('fit-');
const strengthHeight = (rows: readonly Row[]): number =>
  rows.filter(hasBar).reduce((sum, row) => sum + heightOf(row), 0);

const drawHeader = ({ pen, input, numbers }: Context, y: number): void => {
  const base = y + 2.9;
  const right = (x: number, text: string): void => {
    pen.text(LEFT + x, base, text, { ...small, anchor: 'end' });
  };
  pen.text(LEFT + at.name, base, say.table.check, small);
  right(at.demand - 1.8, say.table.demand);
  right(at.resistance, say.table.resistance);
  const reaction = [...richText('V'), plainRun(` ${numbers.load(input.report.reaction)}`)];
  pen.text(LEFT + at.bar + PER_V, base, reaction, { size: 9, bold: true, anchor: 'middle' });
  right(at.ratio, say.table.ratio);
  right(at.failsAt, say.table.failsAt(numbers.force));
  pen.text(LEFT + at.clause, base, say.table.clause, small);
  right(at.basis, say.table.basis);
  pen.line(LEFT, y + HEADER, LEFT + WIDTH, y + HEADER, NARROW);
};

const drawRow = (context: Context, row: Row, top: number): void => {
  const { pen, input } = context;
  if (row.kind === 'fit') {
    pen.line(LEFT, top, LEFT + WIDTH, top, NARROW);
    pen.text(LEFT + at.name, top + 3, say.table.fit, small);
    pen.text(LEFT + at.demand, top + 3, say.table.limit, { ...small, anchor: 'end' });
    pen.text(LEFT + at.resistance, top + 3, say.table.given, { ...small, anchor: 'end' });
    return;
  }
  const bold = row.check.id === input.report.governing;
  if (bold) pen.line(LEFT, top, LEFT + WIDTH, top, 0.35);
  else pen.line(LEFT, top, LEFT + WIDTH, top, HAIR, DOTTED);
  drawCells(context, row, top + 3.05, bold);
  if (bold) pen.line(LEFT, top + heightOf(row), LEFT + WIDTH, top + heightOf(row), 0.35);
};

const drawCells = (context: Context, row: Row & { kind: 'check' }, base: number, bold: boolean): void => {
  const { pen, numbers, input } = context;
  const { check, name, clause, reason } = row;
  const style: TextStyle = { ...table, bold };
  const right = (x: number, text: string): void => {
    pen.text(LEFT + x, base, text, { ...style, anchor: 'end' });
  };
  drawSign(pen, LEFT + at.sign, base - 1.05, 1, check);
  setLines(pen, LEFT + at.name, base, name, style, MORE);
  pen.text(LEFT + at.symbol, base, richText(check.symbol), { ...table, anchor: 'end' });
  right(at.demand, hasBar(row) ? numbers.amount(check.demand, check.unit) : limitText(numbers, check));
  right(at.resistance, numbers.amount(check.resistance, check.unit));
  pen.text(LEFT + at.unit, base, check.unit, style);
  right(at.ratio, numbers.ratio(check.utilisation));
  if (hasBar(row)) {
    right(at.failsAt, numbers.failsAt(check.reactionAtFailure));
    drawBar(pen, LEFT + at.bar, base - 1.05, input.report.reaction, check, bold);
  }
  setLines(pen, LEFT + at.clause, base, clause, { ...small, bold }, MORE);
  pen.text(LEFT + at.basis, base, basisOf(check), { ...small, bold, anchor: 'end' });
  pen.box(LEFT + at.tick, base - 2.3, 2.5, 2.5, { width: HAIR });
  const below = base + Math.max(name.length, clause.length) * MORE - 0.1;
  setLines(pen, LEFT + at.name + 2, below, reason, small, MORE);
};
