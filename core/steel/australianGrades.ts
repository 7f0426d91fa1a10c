import { type Grade, under } from './grades.ts';

/**
 * Grades of AS/NZS 3679.1 (rolled sections) and AS/NZS 3678 (plates), AS 4100:2020 Table 2.1 as published notes give it. The same name
 * stands for other strengths in a section than in a plate.
 */
const rolled = { source: 'AS/NZS 3679.1', basis: 'seen', fuUpTo: [150] } as const;
const plate = { source: 'AS/NZS 3678', basis: 'seen' } as const;

export const australianSections: readonly Grade[] = [
  { name: '300', ...rolled, fyUpTo: [under(11), 17, 150], fy: [320, 300, 280], fu: [440] },
  { name: '350', ...rolled, fyUpTo: [under(11), under(40), 150], fy: [360, 340, 330], fu: [480] },
];

export const australianPlates: readonly Grade[] = [
  { name: '250', ...plate, fyUpTo: [8, 12, 50], fy: [280, 260, 250], fuUpTo: [50], fu: [410] },
  { name: '300', ...plate, fyUpTo: [8, 12, 20, 50], fy: [320, 310, 300, 280], fuUpTo: [50], fu: [430] },
  { name: '350', ...plate, fyUpTo: [12, 20, 80], fy: [360, 350, 340], fuUpTo: [80], fu: [450] },
];
