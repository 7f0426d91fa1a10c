import { boltStrength } from '../../steel/bolts.ts';
import { strengthAt } from '../../steel/grades.ts';
import { type Materials, namedIn, type Steels } from '../materials.ts';

const grades = ['S235JR', 'S275JR', 'S355JR', '300WA', '350WA'];
const steels: Steels = { grades, named: namedIn(grades), strengthAt };

/**
 * Materials as South African practice takes them: SANS 50025-2 grades at their minimum strengths, ISO 898-1 bolts,
 * holes of SANS 2001-CS1 (bolt + 2 mm up to M24, + 3 mm above), 2 mm more in net areas where punched.
 */
export const materials: Materials = {
  sections: steels,
  plates: steels,
  webStrengthAt: ({ tw }) => tw,
  boltGrades: ['4.8', '8.8', '10.9'],
  bolt: (grade, diameter) => {
    const fub = typeof grade === 'number' ? grade : boltStrength(grade, diameter);
    return fub === undefined ? undefined : { fub, listed: true };
  },
  holeFor: (diameter) => diameter + (diameter <= 24 ? 2 : 3),
  netHole: (hole, made) => (made === 'punched' ? hole + 2 : hole),
  holesAssumed: 'punched',
  electrode: 480,
};
