import type { State } from './report.ts';

/**
 * What is found out about one check: numbers side by side in one list with those of all others, as an object each would cost more than all
 * formulas. N and mm; demand at V, `FAILS_AT` the reaction at which it is used up, NaN for checks that do not depend on V.
 */
export const [STATE, REASON, WAY, DEMAND, RESISTANCE, FAILS_AT, UTILISATION] = [0, 1, 2, 3, 4, 5, 6] as const;
export const WIDTH = 7;

/** States as numbers: the greater is the worse, and the worst of several parts stands for all. */
export const [NOT_APPLICABLE, INFORMATION, HOLDS, REFER, FAILS] = [0, 1, 2, 3, 4] as const;
export const states: readonly State[] = ['notApplicable', 'information', 'holds', 'refer', 'fails'];

/** A row of a check that nothing has been found out about. */
export const blankRow = (): number[] => [NOT_APPLICABLE, 0, -1, Number.NaN, Number.NaN, Number.NaN, Number.NaN];
