import { type Grade, under } from './grades.ts';

/** IS 2062 as IS 800:2007 Table 1 gives it, from memory. */
const table1 = {
  source: 'IS 2062 (IS 800 Table 1)',
  basis: 'memory',
  fyUpTo: [under(20), 40, 150],
  fuUpTo: [150],
} as const;

/** Structural steels of IS 2062, MPa. */
export const indianGrades: readonly Grade[] = [
  { name: 'E250', ...table1, fy: [250, 240, 230], fu: [410] },
  { name: 'E300', ...table1, fy: [300, 290, 280], fu: [440] },
  { name: 'E350', ...table1, fy: [350, 330, 320], fu: [490] },
  { name: 'E410', ...table1, fy: [410, 390, 380], fu: [540] },
  { name: 'E450', ...table1, fy: [450, 430, 420], fu: [570] },
];
