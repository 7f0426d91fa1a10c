import type { Check } from '../../core/check/report.ts';

/** How far a formula is held against numbers that the program did not make. */
export const verifiedText: Readonly<Record<Check['verified'], string>> = {
  published: 'held against published numbers',
  theory: 'held against theory',
  hand: 'held against numbers worked by hand',
  none: 'no outside number checks this formula',
};
