import { boltStrength } from '../../steel/bolts.ts';
import { canadianGrade, canadianGradeNames } from '../../steel/canadianGrades.ts';
import { strengthAt as europeanStrength, strengthOf } from '../../steel/grades.ts';
import { type Materials, namedIn, type Steels } from '../materials.ts';

/** Grades of EN 10025-2: not listed by the standard. */
const european = ['S235', 'S275', 'S355'];
const grades = [...canadianGradeNames, ...european];

/** `G40.21-350W` as `350W`, `A572 Gr. 50` as `A572-50`, `S355J2` as `S355`. */
const readAs = (plain: string): string =>
  plain
    .replace(/^(?:CSA)?G40\.21-?/, '')
    .replace(/^(?:ASTM)?(A\d+)/, '$1')
    .replace(/^A572(?:GRADE|GR\.?|-GR\.?)?50$/, 'A572-50')
    .replace(/^(S(?:235|275|355))(?:JR|J0|J2|K2)\S*$/, '$1');

const strengthAt: Steels['strengthAt'] = (name, thickness) => {
  const grade = canadianGrade(name);
  return grade ? strengthOf(grade, thickness) : europeanStrength(`${name}JR`, thickness);
};

const noteOf = (name: string): string | undefined => {
  if (european.includes(name)) return 'grade-not-listed';
  return canadianGrade(name)?.basis === 'memory' ? 'memory-grade' : undefined;
};

const steels: Steels = { grades, named: namedIn(grades, readAs), strengthAt, noteOf };

/** Least tensile strength of bolts by their American names, MPa, and the thread series that each is made in. */
const american: Readonly<Record<string, { readonly fub: number; readonly thread: 'metric' | 'inch' }>> = {
  A325M: { fub: 830, thread: 'metric' },
  A325: { fub: 825, thread: 'inch' },
  A490M: { fub: 1040, thread: 'metric' },
  A490: { fub: 1035, thread: 'inch' },
  A307: { fub: 410, thread: 'inch' },
};

const isInch = (diameter: number): boolean => boltStrength('8.8', diameter) === undefined;

const boltOf = (grade: string, diameter: number): number | undefined => {
  const named = american[grade];
  if (!named) return boltStrength(grade, diameter);
  return isInch(diameter) === (named.thread === 'inch') ? named.fub : undefined;
};

/**
 * Materials of Canadian practice: G40.21 and ASTM grades in metric figures, EN 10025-2 grades at their minimum strengths, bolts of F3125,
 * A307 and ISO 898-1, holes of bolt + 2 mm up to 24 mm, + 3 mm above (from memory), 2 mm more in net areas where punched (cl. 12.3.2).
 */
export const materials: Materials = {
  sections: steels,
  plates: steels,
  webStrengthAt: ({ tw }) => tw,
  boltGrades: [...Object.keys(american), '4.6', '4.8', '8.8', '10.9'],
  bolt: (grade, diameter) => {
    const fub = typeof grade === 'number' ? grade : boltOf(grade, diameter);
    return fub === undefined ? undefined : { fub, listed: true };
  },
  holeFor: (diameter) => diameter + (diameter <= 24 ? 2 : 3),
  netHole: (hole, made) => (made === 'punched' ? hole + 2 : hole),
  holesAssumed: 'punched',
  electrode: 490,
};
