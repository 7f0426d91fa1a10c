import { commonwealth } from './commonwealth.ts';
import { type Instead, respoken } from './respoken.ts';
import type { Words } from './words.ts';

const instead: Instead = [
  ['notched', 'coped'],
  ['notch', 'cope'],
  ['fin plate', 'single plate'],
  ['gauge', 'gage'],
  ['a cleat', 'an angle'],
  ['cleat', 'angle'],
];

/** The same texts in the words of Canada and the United States: cope, single plate, gage. */
export const saidThere = <T>(texts: T): T => respoken(texts, instead);

/** Words of Canada and the United States. */
export const northAmerica: Words = saidThere(commonwealth);
