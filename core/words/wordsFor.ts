import { commonwealth } from './commonwealth.ts';
import { northAmerica } from './northAmerica.ts';
import type { Region } from './regions.ts';
import type { Words } from './words.ts';

const byRegion: Readonly<Record<Region, Words>> = { commonwealth, 'north-america': northAmerica };

/** Everything that is said to people, in a region's trade words. */
export const wordsFor = (region: Region): Words => byRegion[region];
