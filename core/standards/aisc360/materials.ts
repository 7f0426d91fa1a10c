import { astmGrade } from '../../steel/astmGrades.ts';
import { strengthAt as europeanStrength, strengthOf } from '../../steel/grades.ts';
import { INCH } from '../../units/systems.ts';
import { type Materials, namedIn, type Steels } from '../materials.ts';
import { boltGrades, boltOf, isInch, standardHole } from './boltTable.ts';
import { KSI } from './given.ts';

/** Grades of EN 10025-2: not listed by the standard. */
const european = ['S235JR', 'S275JR', 'S355JR'];

/** What people write for a grade: `ASTM A572 Gr. 50`, `S355J2`, `S275`. */
const readAs = (plain: string): string =>
  plain
    .replace(/^ASTM-?/, '')
    .replace(/^(A\d+)-?(?:GRADE|GR\.?)?-?(\d+)$/, '$1-$2')
    .replace(/^(S235|S275|S355)(?:J0|J2|K2)?$/, '$1JR');

const strengthAt: Steels['strengthAt'] = (name, thickness) => {
  const grade = astmGrade(name);
  return grade ? strengthOf(grade, thickness) : europeanStrength(name, thickness);
};

const noteOf = (name: string): string | undefined => {
  if (european.includes(name)) return 'grade-not-listed';
  return astmGrade(name)?.basis === 'memory' ? 'memory-grade' : undefined;
};

const steels = (own: readonly string[]): Steels => {
  const grades = [...own, ...european];
  return { grades, named: namedIn(grades, readAs), strengthAt, noteOf };
};

/** Materials of ANSI/AISC 360-22: ASTM steels and bolts; standard holes, which net areas take 1/16 in (2 mm) larger, drilled or punched. */
export const materials: Materials = {
  sections: steels(['A992', 'A572-50', 'A913-50', 'A588', 'A36']),
  plates: steels(['A36', 'A572-50', 'A588']),
  webStrengthAt: ({ tw }) => tw,
  boltGrades,
  bolt: boltOf,
  holeFor: standardHole,
  netHole: (hole, _made, diameter) => hole + (isInch(diameter) ? INCH / 16 : 2),
  holesAssumed: 'punched',
  electrode: 70 * KSI,
};
