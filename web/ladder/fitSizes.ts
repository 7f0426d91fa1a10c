import type { Check } from '../../core/check/report.ts';
import { plain } from '../../core/units/figures.ts';
import type { UnitSystem } from '../../core/units/systems.ts';

/** A size in decimals, which may stand beside another across a slash; small ones, such as throats, to the thousandth of a millimetre. */
export const size = (value: number, units: UnitSystem): string =>
  plain(value, units === 'mm-kN' && value >= 10 ? 2 : 3);

/** True where the nearer bound of a rule of fit is the most that is allowed. */
export const isMost = ({ demand, resistance, utilisation }: Check): boolean => {
  if (demand === null || resistance === null || utilisation === null) return false;
  return Math.abs(resistance - utilisation * demand) < Math.abs(demand - utilisation * resistance);
};
