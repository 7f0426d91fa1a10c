import type { Check } from '../check/report.ts';
import type { Numbers } from './numbers.ts';

/** Whether a rule of fit sets a most; its use is then given over limit, not limit over given. */
const isMost = ({ demand, resistance, utilisation, reason }: Check): boolean => {
  if (reason === 'too-much' || reason === 'too-little') return reason === 'too-much';
  if (demand === null || resistance === null || utilisation === null || resistance === demand) return false;
  return Math.abs(resistance / demand - utilisation) < 1e-6 * Math.max(1, utilisation);
};

/** The limit of a rule of fit with its sign: ≥ 54, ≤ 20. */
export const limitText = (numbers: Numbers, check: Check): string =>
  `${isMost(check) ? '≤' : '≥'} ${numbers.amount(check.demand, check.unit)}`;
