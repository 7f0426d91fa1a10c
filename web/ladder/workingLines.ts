import type { Check } from '../../core/check/report.ts';
import { RESULT_FIGURES, STEP_FIGURES } from '../../core/formula/line.ts';
import type { WorkingRow } from '../../core/formula/working.ts';
import { significant } from '../../core/units/figures.ts';
import { cited } from './cited.ts';

/** One line of a working as it is set: symbol, what it equals in symbols, in numbers, and its value. */
export interface WorkingLine {
  readonly symbol: string;
  /** Empty where it would only repeat the symbol. */
  readonly expression: string;
  /** Empty where it would only repeat the value. */
  readonly numbers: string;
  readonly value: string;
  readonly unit: string;
  /** Clause where it is another than the check's own. */
  readonly clause: string;
  readonly note: string;
  /** Closes the demand or the resistance. */
  readonly result: boolean;
}

/** What the lines of a check are set by. */
type Worked = Pick<Check, 'working' | 'symbol' | 'clause'>;

const lineOf = (row: WorkingRow, check: Worked, last: boolean): WorkingLine => {
  const result = last || row.symbol === check.symbol;
  const value = significant(row.value, result ? RESULT_FIGURES : STEP_FIGURES);
  return {
    symbol: row.symbol,
    expression: row.expression === row.symbol ? '' : row.expression,
    numbers: row.numbers === value || row.numbers === row.expression ? '' : row.numbers,
    value,
    unit: row.unit,
    clause: row.clause === check.clause ? '' : cited(row.clause),
    note: row.note ?? '',
    result,
  };
};

/** A working, line by line. */
export const workingLines = (check: Worked): WorkingLine[] => {
  const rows = check.working ?? [];
  return rows.map((row, at) => lineOf(row, check, at === rows.length - 1));
};
