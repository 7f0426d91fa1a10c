import type { Check, Numbers } from '../../core/check/report.ts';
import { RESULT_FIGURES, STEP_FIGURES } from '../../core/formula/line.ts';
import { significant } from '../../core/units/figures.ts';
import type { UnitSystem } from '../../core/units/systems.ts';
import { isMost, size } from './fitSizes.ts';

/** How far a check is used up, as a fraction in symbols and in numbers, and its value. */
export interface UsedUp {
  readonly symbols: string;
  readonly numbers: string;
  readonly value: string;
}

/** Required over given, or given over allowed where there is too much of it. */
const ofFooting = (check: Check, required: number, given: number, units: UnitSystem): UsedUp => {
  const [top, under] = isMost(check) ? [given, required] : [required, given];
  return {
    symbols: isMost(check) ? 'given / allowed' : 'required / given',
    numbers: `${size(top, units)} / ${size(under, units)}`,
    value: significant(check.utilisation!, RESULT_FIGURES),
  };
};

/** Demand over resistance, as the working closes; where shear and bending interact, the reaction over the one at failure. */
export const usedUp = (check: Check, { units, reaction }: Pick<Numbers, 'units' | 'reaction'>): UsedUp | null => {
  const { demand, resistance, utilisation, symbol, reactionAtFailure, working = [] } = check;
  if (demand === null || resistance === null || utilisation === null) return null;
  if (check.id.startsWith('fit-')) return ofFooting(check, demand, resistance, units);
  const value = significant(utilisation, RESULT_FIGURES);
  const linear = Math.abs(demand / resistance - utilisation) <= 1e-9 * utilisation;
  if (!linear && typeof reactionAtFailure === 'number') {
    const numbers = `${significant(reaction, STEP_FIGURES)} / ${significant(reactionAtFailure, RESULT_FIGURES)}`;
    return { symbols: 'V / V_failure', numbers, value };
  }
  const figures = symbol === 'V' || symbol === 'T' ? STEP_FIGURES : RESULT_FIGURES;
  return {
    symbols: `${grouped(symbol)} / ${grouped(working.at(-1)?.symbol ?? 'R')}`,
    numbers: `${significant(demand, figures)} / ${significant(resistance, RESULT_FIGURES)}`,
    value,
  };
};

/** A product or quotient within a fraction. */
const grouped = (symbol: string): string => (/[ /]/.test(symbol) ? `(${symbol})` : symbol);
