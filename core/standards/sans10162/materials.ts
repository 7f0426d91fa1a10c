import { boltStrength } from '../../steel/bolts.ts';
import { strengthAt } from '../../steel/grades.ts';
import type { Materials } from '../standard.ts';

/**
 * Materials as South African practice takes them: SANS 50025-2 grades at their minimum strengths, ISO 898-1 bolts,
 * holes of SANS 2001-CS1 (bolt + 2 mm up to M24, + 3 mm above), 2 mm more in net areas where punched.
 */
export const materials: Materials = {
  grades: ['S235JR', 'S275JR', 'S355JR', '300WA', '350WA'],
  strengthAt,
  boltGrades: ['4.8', '8.8', '10.9'],
  boltStrength,
  holeFor: (diameter) => diameter + (diameter <= 24 ? 2 : 3),
  netHole: (hole, made) => (made === 'punched' ? hole + 2 : hole),
  holesAssumed: 'punched',
  electrode: 480,
};
