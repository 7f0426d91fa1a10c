import type { Check } from '../../core/check/report.ts';
import { RESULT_FIGURES, STEP_FIGURES } from '../../core/formula/line.ts';
import type { WorkingRow } from '../../core/formula/working.ts';
import { significant } from '../../core/units/figures.ts';
import { hanging, WIDTH, widthOf, wrap } from './wrap.ts';

const SET_IN = '  ';

/** Formula, numbers, value with unit; those that would repeat each other are left out. */
const sidesOf = ({ symbol, expression, numbers, value, unit }: WorkingRow, figures: number): string[] => {
  const stated = significant(value, figures);
  const sides = [expression, numbers].filter(
    (text, at, all) => text !== symbol && text !== stated && text !== all[at - 1],
  );
  return [...sides, unit ? `${stated} ${unit}` : stated];
};

/** A step on one line where it fits, else one line for each side of it. */
const stepLines = (row: WorkingRow, figures: number): string[] => {
  const sides = sidesOf(row, figures);
  const lead = `${SET_IN}${row.symbol} = `;
  const whole = lead + sides.join(' = ');
  const below = ' '.repeat(widthOf(lead) - 2);
  const lines =
    widthOf(whole) <= WIDTH ? [whole] : sides.flatMap((side, at) => hanging(at === 0 ? lead : `${below}= `, side));
  const note = row.note ? wrap(row.note, WIDTH - 6).map((line) => `      ${line}`) : [];
  return [...lines, ...note];
};

/** The steps of one check, as a pencil would follow them; none where the report carries no working. */
export const printWorking = ({ working = [], clause, basis }: Check, title: string): string[] => {
  if (working.length === 0) return [];
  const source = [clause, basis].filter(Boolean).join(', ');
  return [
    ...wrap(`${title} (${source})`, WIDTH),
    ...working.flatMap((row, at) => stepLines(row, at === working.length - 1 ? RESULT_FIGURES : STEP_FIGURES)),
  ];
};
