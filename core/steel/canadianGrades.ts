import type { Grade } from './grades.ts';

/** CSA G40.21, to 100 mm; thicker plates and shapes of some grades yield less. */
const g40 = { source: 'CSA G40.21', fyUpTo: [100], fuUpTo: [100] } as const;
/** American grades in the metric figures of Canadian lists, one strength for every thickness that is rolled. */
const astm = { fyUpTo: [150], fuUpTo: [150] } as const;

/** Structural steels of Canadian lists, MPa. */
const grades: readonly Grade[] = [
  { name: '260W', ...g40, basis: 'memory', fy: [260], fu: [410] },
  { name: '300W', ...g40, basis: 'seen', fy: [300], fu: [450] },
  { name: '350W', ...g40, basis: 'seen', fy: [350], fu: [450] },
  { name: 'A992', source: 'ASTM A992, metric', ...astm, basis: 'seen', fy: [345], fu: [450] },
  { name: 'A572-50', source: 'ASTM A572 grade 50, metric', ...astm, basis: 'memory', fy: [345], fu: [450] },
  { name: 'A36', source: 'ASTM A36, metric', ...astm, basis: 'memory', fy: [250], fu: [400] },
];

/** Names of all of them. */
export const canadianGradeNames: readonly string[] = grades.map(({ name }) => name);

/** The grade of that name; undefined where it is none of these. */
export const canadianGrade = (name: string): Grade | undefined => grades.find((one) => one.name === name);
