import type { Check } from '../check/report.ts';
import { basisText, isRow, isSecondRow, tableStyle } from './cells.ts';
import type { Context, Second, Under } from './context.ts';
import { AIR, BASIS, CLAUSE_GAP, type Columns, type Group, NAME, numbersBefore, widestOf } from './numberColumns.ts';
import { small } from './page.ts';
import { clauseText, sharedReasons } from './reasons.ts';
import { sheetWords as say } from './sheetWords.ts';
import { shortTitleOf, titleOf } from './verdictSentence.ts';

/** mm that V takes on the axis at least and at most; 3 V and the break beyond have to find room. */
const LEAST_PER_V = 4.2;
const MOST_PER_V = 7;
const BREAK = 2.6;
/** From the basis of the first to the rule between the standards, and from there to the middle of the sign; the sign with its air, mm. */
const PARTED = 1.2;
const SIGN_AT = 1.8;
const SIGN = SIGN_AT + 1.7;
const LEAST_NAMES = 22;
/** Width of the arrow before the name of the check that governs. */
const ARROW = 3;

interface Widths {
  readonly ratio: number;
  readonly failsAt: number;
  readonly basis: number;
}

/** Widths of what one standard gives; without states it has no ratio. */
const widthsOf = (context: Context, under: Under, rows: readonly Check[], stated: boolean): Widths => {
  const { pen, numbers } = under;
  const widest = widestOf(under, rows, tableStyle(context));
  const heads = (...texts: readonly string[]): number => Math.max(...texts.map((one) => pen.width(one, small)));
  const ratio = Math.max(
    heads(say.table.ratio),
    widest((one) => numbers.ratio(one.utilisation)),
  );
  const failsAt = Math.max(
    heads(say.table.failsAt(numbers.force), say.table.noRule),
    widest((one) => numbers.failsAt(one.reactionAtFailure)),
  );
  const basis = widest((one) => basisText(context, one), small);
  return { ratio: stated ? ratio : 0, failsAt, basis };
};

/** Columns of one standard from their left edge. */
const groupFrom = (left: number, { ratio, failsAt, basis }: Widths, clause: number): Group => {
  const failsEnd = left + ratio + AIR + failsAt;
  const clauseLeft = failsEnd + AIR;
  return {
    ratio: left + ratio,
    failsAt: failsEnd,
    clause: clauseLeft,
    basis: clauseLeft + clause + CLAUSE_GAP + basis,
  };
};

const fixedOf = ({ ratio, failsAt, basis }: Widths): number => ratio + AIR + failsAt + AIR + CLAUSE_GAP + basis;

/** Widths of the three texts of one row that may break into lines, mm. */
interface Needs {
  readonly name: number;
  readonly first: number;
  readonly second: number;
}

const needsOf = (context: Context, second: Second): Needs[] => {
  const { pen, input, words } = context;
  const shared = sharedReasons(context);
  const clause = ({ input }: Under, check: Check | undefined, told: boolean): number => {
    const style = { ...small, bold: check?.id === input.report.governing };
    return check && told ? pen.width(clauseText(context, shared, check), style) : 0;
  };
  return input.report.checks.flatMap((one) => {
    const other = second.input.report.checks.find(({ id }) => id === one.id);
    const beside = other !== undefined && isSecondRow(second, other);
    if (!isRow(one) && !beside) return [];
    const bold = one.id === input.report.governing;
    const named = isRow(one) ? one : (other ?? one);
    const title = `${bold ? say.table.governs : ''}${shortTitleOf(words, named)}`;
    return [
      {
        name: pen.width(title, { ...tableStyle(context), bold }),
        first: clause(context, one, isRow(one)),
        second: clause(second, other, beside),
      },
    ];
  });
};

/** Shares the room out so that the fewest rows need a second line; what is left over goes to the names. */
const shareOut = (needs: readonly Needs[], room: number, least: number): Needs => {
  const widths = (of: (one: Needs) => number): number[] => [
    ...new Set([least, ...needs.map(of).filter((one) => one > least)]),
  ];
  let best: Needs = { name: room / 2, first: room / 4, second: room / 4 };
  let fewest = Number.POSITIVE_INFINITY;
  for (const first of widths((one) => one.first)) {
    for (const second of widths((one) => one.second)) {
      const name = room - first - second;
      if (name < LEAST_NAMES) continue;
      const broken = needs.filter((one) => one.name > name || one.first > first || one.second > second).length;
      if (broken < fewest || (broken === fewest && name > best.name)) best = { name, first, second };
      fewest = Math.min(fewest, broken);
    }
  }
  return best;
};

/** Names and clauses share what the numbers leave; names that have room in full give the rest to the bars. */
export const columnsBeside = (context: Context, second: Second): Columns => {
  const { pen } = context;
  const rows = context.input.report.checks.filter(isRow);
  const others = second.input.report.checks.filter((one) => isSecondRow(second, one));
  const one = widthsOf(context, context, rows, true);
  const two = widthsOf(context, second, others, second.stated);
  const widest = widestOf(context, rows, tableStyle(context));
  const numbers = -numbersBefore(context, widest, 0).left;
  const bars = 3 * LEAST_PER_V + BREAK;
  const room = BASIS - NAME - numbers - bars - fixedOf(one) - PARTED - SIGN - fixedOf(two);
  const share = shareOut(needsOf(context, second), room, pen.width(say.table.clause, small));
  const full =
    Math.max(0, ...[...rows, ...others].map((check) => pen.width(titleOf(check), tableStyle(context)))) + ARROW;
  const perV = Math.min(MOST_PER_V, LEAST_PER_V + Math.max(0, share.name - full) / 3);
  const nameWidth = share.name - 3 * (perV - LEAST_PER_V);
  const bar = NAME + nameWidth + numbers;
  const first = groupFrom(bar + 3 * perV + BREAK, one, share.first);
  const rule = first.basis + PARTED;
  const next = groupFrom(rule + SIGN, two, share.second);
  const { left: _, ...before } = numbersBefore(context, widest, bar);
  return { ...before, nameWidth, symbol: null, bar, perV, first, second: { ...next, rule, sign: rule + SIGN_AT } };
};
