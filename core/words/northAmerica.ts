import { commonwealth } from './commonwealth.ts';
import { respoken } from './respoken.ts';
import type { Words } from './words.ts';

/** Words of Canada and the United States: cope, single plate, gage. */
export const northAmerica: Words = respoken(commonwealth, [
  ['notched', 'coped'],
  ['notch', 'cope'],
  ['fin plate', 'single plate'],
  ['gauge', 'gage'],
]);
