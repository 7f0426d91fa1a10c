import { INCH, KIP } from '../units/systems.ts';
import type { Grade } from './grades.ts';

const KSI = KIP / INCH ** 2;
const astm = (designation: string, fy: number, fu: number, basis: Grade['basis'], most: number): Grade => ({
  name: designation,
  source: `ASTM ${designation}`,
  basis,
  fyUpTo: [most * INCH],
  fy: [fy * KSI],
  fuUpTo: [most * INCH],
  fu: [fu * KSI],
});

/** American structural steels by their strengths in ksi and the thickness, in inches, up to which they have them. */
const grades: readonly Grade[] = [
  astm('A992', 50, 65, 'seen', 6),
  astm('A572-50', 50, 65, 'memory', 4),
  astm('A913-50', 50, 65, 'memory', 6),
  astm('A588', 50, 70, 'memory', 4),
  astm('A36', 36, 58, 'seen', 8),
];

/** The grade of that name; undefined where it is none of these. */
export const astmGrade = (name: string): Grade | undefined => grades.find((one) => one.name === name);
