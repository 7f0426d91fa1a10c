import type { Check } from '../check/report.ts';
import { RESULT_FIGURES, STEP_FIGURES } from '../formula/line.ts';
import type { WorkingRow } from '../formula/working.ts';
import { fixed, significant } from '../units/figures.ts';
import type { Under } from './context.ts';
import type { SetRun } from './pen.ts';
import { richText } from './richText.ts';
import { plainRun } from './textBlock.ts';

/** One step of a working as pieces between equals signs, and its note. */
export interface Step {
  /** The same for steps that say the same. */
  readonly key: string;
  readonly symbol: readonly SetRun[];
  /** Formula, numbers, value with unit; those that would repeat each other are left out. */
  readonly sides: readonly (readonly SetRun[])[];
  readonly note: readonly SetRun[];
  /** The demand or the resistance itself. */
  readonly closes: boolean;
}

const same = (a: number, b: number | null): boolean => b !== null && Math.abs(a - b) <= 1e-9 * Math.abs(b);

/** Closing steps of a check: the last one, and the one that comes to the demand. */
const closesOf = (check: Check, row: WorkingRow, last: boolean): boolean =>
  last || (row.unit === check.unit && same(row.value, check.demand) && row.symbol === check.symbol);

const sidesOf = (context: Under, row: WorkingRow, closes: boolean): SetRun[][] => {
  const { marked } = context.numbers;
  const value = significant(row.value, closes ? RESULT_FIGURES : STEP_FIGURES);
  const sides: SetRun[][] = [];
  if (row.expression !== row.symbol) sides.push(richText(marked(row.expression)));
  const isValue = (text: string): boolean => text === value || text === significant(row.value, STEP_FIGURES);
  if (row.numbers !== row.expression && !isValue(row.numbers)) sides.push(richText(marked(row.numbers)));
  if (sides.length === 0 || !isValue(row.expression) || row.unit) {
    sides.push([plainRun(`${marked(value)}${row.unit ? ` ${row.unit}` : ''}`, closes)]);
  }
  return sides;
};

/** The steps of a check's working. */
export const stepsOf = (context: Under, check: Check): Step[] => {
  const rows = check.working ?? [];
  return rows.map((row, i) => {
    const closes = closesOf(check, row, i === rows.length - 1);
    return {
      key: [row.symbol, row.expression, row.numbers, row.value, row.note].join('|'),
      symbol: richText(row.symbol),
      sides: sidesOf(context, row, closes),
      note: row.note ? richText(context.numbers.marked(row.note), 'prose') : [],
      closes,
    };
  });
};

const equals = plainRun(' = ');

/** A step on one line: symbol = formula = numbers = value (note). */
export const wholeLine = ({ symbol, sides, note }: Step, withNote: boolean): SetRun[] => [
  ...symbol,
  ...sides.flatMap((side) => [equals, ...side]),
  ...(withNote && note.length > 0 ? [plainRun('  ('), ...note, plainRun(')')] : []),
];

/** A step in short, as later lines need it: symbol = formula = value. */
export const shortLine = ({ symbol, sides }: Step): SetRun[] => {
  const kept = sides.length > 2 ? [sides[0]!, sides.at(-1)!] : sides;
  return [...symbol, ...kept.flatMap((side) => [equals, ...side])];
};

/** How the ratio comes about, where demand and resistance alone make it; else from the reaction. */
export const ratioText = ({ numbers, input }: Under, check: Check): string => {
  const { utilisation, demand, resistance, reactionAtFailure } = check;
  if (utilisation === null) return '';
  const shown = fixed(utilisation, 3);
  const linear = demand !== null && resistance !== null && same(demand / resistance, utilisation);
  if (linear) {
    const parts = [demand, resistance].map((one) => significant(one, RESULT_FIGURES));
    return numbers.marked(`${parts.join('/')} = ${shown}`);
  }
  if (reactionAtFailure === null || reactionAtFailure === undefined) return numbers.marked(shown);
  const parts = [input.report.reaction, reactionAtFailure].map((one) => significant(one, RESULT_FIGURES));
  return numbers.marked(`${parts.join('/')} = ${shown}`);
};
