import { boltStrength } from '../../steel/bolts.ts';
import { indianGrades } from '../../steel/indianGrades.ts';
import type { Materials } from '../materials.ts';
import { steelsOf } from '../methods/steelsOf.ts';

/** Letters of quality, such as BR in E250BR, change no strength. */
const steels = steelsOf(indianGrades, (plain) => plain.replace(/^(E\d{3})(?:A|BR|B0|BO|C)$/, '$1'));

/**
 * Materials of IS 800:2007: grades of its Table 1, bolts of property classes 4.6, 8.8 and 10.9, holes 1 mm (up to M14), 2 mm (up to M24) or
 * 3 mm wider than the bolt, 2 mm more in net areas where punched (3.6.1, from memory).
 */
export const materials: Materials = {
  sections: steels,
  plates: steels,
  webStrengthAt: ({ tw }) => tw,
  boltGrades: ['4.6', '8.8', '10.9'],
  bolt: (grade, diameter) => {
    const fub = typeof grade === 'number' ? grade : boltStrength(grade, diameter);
    // Property classes, like tensile areas, are those of the metric sizes.
    const listed = boltStrength('8.8', diameter) !== undefined;
    return fub === undefined ? undefined : { fub, listed };
  },
  holeFor: (diameter) => diameter + (diameter <= 14 ? 1 : diameter <= 24 ? 2 : 3),
  netHole: (hole, made) => (made === 'punched' ? hole + 2 : hole),
  holesAssumed: 'punched',
  electrode: 410,
};
