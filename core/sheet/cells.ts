import type { Check } from '../check/report.ts';
import type { Context, Second, Under } from './context.ts';
import { limitText } from './fitLimit.ts';
import { foot, table } from './page.ts';
import { sheetWords as say } from './sheetWords.ts';

/** Type of the table; smaller beside a second standard, whose columns take room. */
export const tableStyle = ({ second }: Context): { readonly size: number } => (second ? foot : table);

/** Rules of fit, which give limit and size where the others give demand and resistance. */
export const isFit = ({ id }: Pick<Check, 'id'>): boolean => id.startsWith('fit-');

/** What stands as a row of the table: rules of fit only where they do not hold. */
export const isRow = (check: Check): boolean =>
  check.state === 'fails' || check.state === 'refer' || (check.state === 'holds' && !isFit(check));

/** A strength that stands for information, as all do where the standard has no reaction at its level; elastic stresses have a figure of their own. */
const isStrength = ({ id, state, reactionAtFailure }: Check): boolean =>
  state === 'information' && typeof reactionAtFailure === 'number' && !id.startsWith('stress-');

/** What the second standard adds to the table; its rules of fit stand below. */
export const isSecondRow = ({ stated }: Second, check: Check): boolean =>
  !isFit(check) && (isRow(check) || (!stated && isStrength(check)));

/** Limit or demand; nothing for a check that only the second standard makes. */
export const demandText = ({ numbers }: Under, check: Check): string => {
  if (isFit(check)) return limitText(numbers, check);
  return isRow(check) ? numbers.amount(check.demand, check.unit) : '';
};

export const resistanceText = ({ numbers }: Under, check: Check): string =>
  isRow(check) ? numbers.amount(check.resistance, check.unit) : '';

/** The basis, left out where it would repeat the clause; beside a second standard its letter, with the mark of what no outside number confirms. */
export const basisText = ({ second }: Context, { basis, clause, verified }: Check): string => {
  if (!second) return basis === clause ? '' : basis;
  return basis ? `${basis.charAt(0)}${verified === 'none' ? say.unverifiedMark : ''}` : '';
};

/** What stands in place of the numbers where a standard gives none. */
export const absentText = ({ reason }: Check): string => (reason === 'no-rule' ? say.table.noRule : say.table.absent);
