import type { SectionTable } from '../sectionTable.ts';

/**
 * Australian universal columns. Depth and width to whole millimetres, as the older tables print them; the later ones differ by less than
 * half a millimetre.
 */
export const auUc: SectionTable = {
  family: 'UC (AU)',
  prefix: '',
  market: 'Australia',
  shape: 'I',
  source: 'AS/NZS 3679.1 section tables',
  rows: `
310UC158 158 327 311 25 15.7 16.5
310UC137 137 321 309 21.7 13.8 16.5
310UC118 118 315 307 18.7 11.9 16.5
310UC96.8 96.8 308 305 15.4 9.9 16.5
250UC89.5 89.5 260 256 17.3 10.5 14
250UC72.9 72.9 254 254 14.2 8.6 14
200UC59.5 59.5 210 205 14.2 9.3 11.4
200UC52.2 52.2 206 204 12.5 8 11.4
200UC46.2 46.2 203 203 11 7.3 11.4
150UC37.2 37.2 162 154 11.5 8.1 8.9
150UC30.0 30 158 153 9.4 6.6 8.9
150UC23.4 23.4 152 152 6.8 6.1 8.9
100UC14.8 14.8 97 99 7 5 10
`,
};
