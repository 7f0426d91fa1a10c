import type { SectionTable } from '../sectionTable.ts';

/** European parallel-flange channels. */
export const upe: SectionTable = {
  family: 'UPE',
  prefix: 'UPE ',
  market: 'Europe',
  shape: 'channel',
  source: 'European mill section table (EN 10365)',
  rows: `
80 7.9 80 50 7 4 10
100 9.82 100 55 7.5 4.5 10
120 12.1 120 60 8 5 12
140 14.5 140 65 9 5 12
160 17 160 70 9.5 5.5 12
180 19.7 180 75 10.5 5.5 12
200 22.8 200 80 11 6 13
220 26.6 220 85 12 6.5 13
240 30.2 240 90 12.5 7 15
270 35.2 270 95 13.5 7.5 15
300 44.4 300 100 15 9.5 15
330 53.2 330 105 16 11 18
360 61.2 360 110 17 12 18
400 72.2 400 115 18 13.5 18
`,
};
