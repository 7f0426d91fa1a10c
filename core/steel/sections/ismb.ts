import type { SectionTable } from '../sectionTable.ts';

/**
 * Indian medium beams with tapered flanges. Where the series of 1989 has another shape of the same depth the label ends in the mass, so
 * that the depth alone never picks one of the two; the others are, from memory, the same in both.
 */
export const ismb: SectionTable = {
  family: 'ISMB',
  prefix: 'ISMB ',
  otherPrefix: 'MB ',
  market: 'India',
  shape: 'I',
  slope: 8,
  source: 'IS 808, series before 1989',
  readWithoutMass: true,
  rows: `
100x11.5 11.5 100 75 7.2 4 9 4.5
125x13 13 125 75 7.6 4.4 9 4.5
150x14.9 14.9 150 80 7.6 4.8 9 4.5
175x19.3 19.3 175 90 8.6 5.5 10 5
200x25.4 25.4 200 100 10.8 5.7 11 5.5
225 31.2 225 110 11.8 6.5 12 6
250 37.3 250 125 12.5 6.9 13 6.5
300x44.2 44.2 300 140 12.4 7.5 14 7
350 52.4 350 140 14.2 8.1 14 7
400 61.6 400 140 16 8.9 14 7
450 72.4 450 150 17.4 9.4 15 7.5
500 86.9 500 180 17.2 10.2 17 8.5
550 103.7 550 190 19.3 11.2 18 9
600 122.6 600 210 20.8 12 20 10
`,
};
