import type { SectionTable } from '../sectionTable.ts';

/** European I beams, heavy series. */
export const ipeO: SectionTable = {
  family: 'IPE O',
  prefix: 'IPE O ',
  market: 'Europe',
  shape: 'I',
  source: 'European mill section table (EN 10365)',
  rows: `
180 21.3 182 92 9 6 9
200 25.1 202 102 9.5 6.2 12
220 29.4 222 112 10.2 6.6 12
240 34.3 242 122 10.8 7 15
270 42.3 274 136 12.2 7.5 15
300 49.3 304 152 12.7 8 15
330 57 334 162 13.5 8.5 18
360 66 364 172 14.7 9.2 18
400 75.7 404 182 15.5 9.7 21
450 92.4 456 192 17.6 11 21
500 107 506 202 19 12 21
550 123 556 212 20.2 12.7 24
600 154 610 224 24 15 24
`,
};
