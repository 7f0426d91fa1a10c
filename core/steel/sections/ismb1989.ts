import type { SectionTable } from '../sectionTable.ts';

/**
 * Indian medium beams of the series of 1989 whose shape differs from the earlier one of the same depth; from memory, their areas and
 * moduli agree with the dimensions within 0.8 %.
 */
export const ismb1989: SectionTable = {
  family: 'ISMB 1989',
  prefix: 'ISMB ',
  otherPrefix: 'MB ',
  market: 'India',
  shape: 'I',
  slope: 8,
  source: 'IS 808:1989, from memory',
  readWithoutMass: true,
  rows: `
100x8.9 8.9 100 50 7 4.7 9 4.5
125x13.3 13.3 125 70 8 5 9 4.5
150x15 15 150 75 8 5 9 4.5
175x19.6 19.6 175 85 9 5.8 10 5
200x24.2 24.2 200 100 10 5.7 11 5.5
300x46 46 300 140 13.1 7.7 14 7
`,
};
