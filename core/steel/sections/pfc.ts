import type { SectionTable } from '../sectionTable.ts';

/** Parallel-flange channels. Rolled for South Africa too. */
export const pfc: SectionTable = {
  family: 'PFC',
  prefix: 'PFC ',
  market: 'UK',
  shape: 'channel',
  source: 'SCI/BCSA steel section tables (BS EN 10365, BS 4-1)',
  readWithoutMass: true,
  rows: `
430x100x64 64.4 430 100 19 11 15
380x100x54 380 100 17.5 9.5 15
300x100x46 45.5 300 100 16.5 9 15
300x90x41 41.4 300 90 15.5 9 12
260x90x35 34.8 260 90 14 8 12
260x75x28 27.6 260 75 12 7 12
230x90x32 32.2 230 90 14 7.5 12
230x75x26 25.7 230 75 12.5 6.5 12
200x90x30 29.7 200 90 14 7 12
200x75x23 23.4 200 75 12.5 6 12
180x90x26 26.1 180 90 12.5 6.5 12
180x75x20 20.3 180 75 10.5 6 12
150x90x24 23.9 150 90 12 6.5 12
150x75x18 17.9 150 75 10 5.5 12
125x65x15 14.8 125 65 9.5 5.5 12
100x50x10 10.2 100 50 8.5 5 9
`,
};
