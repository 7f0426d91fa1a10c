import { nearest, type Unknown } from './nearest.ts';

/** A steel grade: its least strengths by the thickness of the element, MPa and mm. */
export interface Grade {
  readonly name: string;
  /** The product standard the strengths come from. */
  readonly source: string;
  /** Whether the strengths were read in a publication, or are from memory and want checking against the standard. */
  readonly basis: 'seen' | 'memory';
  /** Least yield strength up to and including each thickness. */
  readonly fyUpTo: readonly number[];
  readonly fy: readonly number[];
  /** Least tensile strength up to and including each thickness. */
  readonly fuUpTo: readonly number[];
  readonly fu: readonly number[];
  /** Least tensile strength below 3 mm, where the standard sets one apart. */
  readonly thin?: number;
}

/** Yield and tensile strength, MPa. */
export interface Strength {
  readonly fy: number;
  readonly fu: number;
}

/** End of a band, mm, that stops short of its limit: the limit itself belongs to the next band. */
export const under = (limit: number): number => limit * (1 - 1e-12);

/** Structural steels of EN 10025-2 Table 7, the same in SANS 50025-2: minimum values, not the rounded ones of design standards. */
const en10025 = {
  source: 'EN 10025-2 Table 7 (SANS 50025-2)',
  basis: 'seen',
  fyUpTo: [16, 40, 63, 80, 100, 150],
  fuUpTo: [100, 150],
} as const;

/** The South African grades that went before. */
const sans1431 = { source: 'SANS 1431', basis: 'memory', fyUpTo: [16, 40, 63], fuUpTo: [63] } as const;

const grades: readonly Grade[] = [
  { name: 'S235JR', ...en10025, fy: [235, 225, 215, 215, 215, 195], fu: [360, 350], thin: 360 },
  { name: 'S275JR', ...en10025, fy: [275, 265, 255, 245, 235, 225], fu: [410, 400], thin: 430 },
  { name: 'S355JR', ...en10025, fy: [355, 345, 335, 325, 315, 295], fu: [470, 450], thin: 510 },
  { name: '300WA', ...sans1431, fy: [300, 290, 280], fu: [450] },
  { name: '350WA', ...sans1431, fy: [350, 340, 330], fu: [480] },
];

const byName: ReadonlyMap<string, Grade> = new Map(grades.map((grade) => [grade.name, grade]));

/** Names of all grades in the library. */
export const gradeNames: readonly string[] = [...byName.keys()];

/** The grade of that name in any case and spacing, or the three nearest names. */
export const findGrade = (name: string): Grade | Unknown =>
  byName.get(name) ?? byName.get(name.replace(/\s+/g, '').toUpperCase()) ?? { nearest: nearest(name, gradeNames, 3) };

/** Strengths of the named grade for an element `thickness` mm thick; undefined for a name not in the library or outside the grade's range. */
export const strengthAt = (name: string, thickness: number): Strength | undefined => {
  const grade = byName.get(name);
  return grade && strengthOf(grade, thickness);
};

/** Strengths of a grade for an element `thickness` mm thick; undefined outside the range of its standard. */
export const strengthOf = (grade: Grade, thickness: number): Strength | undefined => {
  if (!(thickness > 0)) return undefined;
  const fy = grade.fy[bandOf(grade.fyUpTo, thickness)];
  const fu = thickness < 3 && grade.thin !== undefined ? grade.thin : grade.fu[bandOf(grade.fuUpTo, thickness)];
  return fy === undefined || fu === undefined ? undefined : { fy, fu };
};

const bandOf = (upTo: readonly number[], thickness: number): number => {
  const band = upTo.findIndex((limit) => thickness <= limit);
  return band < 0 ? upTo.length : band;
};
