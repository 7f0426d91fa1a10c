import type { SectionTable } from '../sectionTable.ts';

/**
 * Australian parallel-flange channels; the masses are from memory.
 */
export const auPfc: SectionTable = {
  family: 'PFC (AU)',
  prefix: '',
  market: 'Australia',
  shape: 'channel',
  source: 'AS/NZS 3679.1 section tables',
  rows: `
380PFC 55.2 380 100 17.5 10 14
300PFC 40.1 300 90 16 8 14
250PFC 35.5 250 90 15 8 12
230PFC 25.1 230 75 12 6.5 12
200PFC 22.9 200 75 12 6 12
180PFC 20.9 180 75 11 6 12
150PFC 17.7 150 75 9.5 6 10
125PFC 11.9 125 65 7.5 4.7 8
100PFC 8.33 100 50 6.7 4.2 8
75PFC 5.92 75 40 6.1 3.8 8
`,
};
