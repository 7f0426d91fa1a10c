import type { Check } from '../../core/check/report.ts';
import { plain, roundedDown } from '../../core/units/figures.ts';

/**
 * What a way of failing carries by a load of its own, as it stands on its rung: forces as all forces, the resistance rounded down; sizes to
 * the thousandth, so that 1/4 in is not cut to 0.2.
 */
export const ownLoad = (
  { demand, resistance, unit }: Pick<Check, 'demand' | 'resistance' | 'unit'>,
  force: string,
): { readonly demand: string; readonly resistance: string } => {
  const isForce = unit === '' || unit === force;
  return {
    demand: plain(demand ?? 0, isForce ? 2 : 3),
    resistance: resistance === null ? '–' : isForce ? roundedDown(resistance) : plain(resistance, 3),
  };
};
