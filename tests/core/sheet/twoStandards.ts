import { end, fullest } from './ends.ts';

/** An invented end in inches under AISC 360 by load and resistance factors. */
export const inches = {
  mark: 'B12-L',
  standard: 'aisc-360-lrfd',
  units: 'in-kip',
  reaction: 36,
  beam: { section: 'W16x36', grade: 'A992' },
  top: { length: 4.5, depth: 1.5, radius: 0.5 },
  bottom: null,
  setback: 0.5,
  joint: {
    kind: 'fin-plate',
    firstRow: 3.5,
    endDistance: 1.75,
    bolts: { size: '3/4', grade: 'A325', rows: 3, pitch: 3 },
    plate: { thickness: 0.375, grade: 'A36', topEdge: 1.5, bottomEdge: 1.5, edge: 2 },
    weld: { leg: 0.25 },
  },
} as const;

const { level: _, ...levelless } = end;
/** An invented end under AS 4100. */
export const australian = {
  ...levelless,
  standard: 'as-4100',
  beam: { section: '410UB59.7', grade: '300' },
  joint: { ...end.joint, plate: { ...end.joint.plate, grade: '250' } },
} as const;

/** The same end with a second standard named on its sheet, and a reaction at that standard's level where one is given. */
export const beside = (base: object, standard: string, reaction?: number): object => {
  const { sheet = {} } = base as { sheet?: object };
  return { ...base, sheet: { ...sheet, beside: { standard, ...(reaction !== undefined && { reaction }) } } };
};

/** Sheets with two standards: at one level, at two with and without a reaction at the other, fullest, failing, referring, without a reaction. */
export const pairs: readonly (readonly [name: string, input: object])[] = [
  ['SANS beside CSA', beside(end, 'csa-s16')],
  ['SANS beside EN', beside(end, 'en-1993')],
  ['SANS beside AS, failing', beside({ ...end, reaction: 300 }, 'as-4100')],
  ['SANS beside AS, without a reaction', beside({ ...end, reaction: 0 }, 'as-4100')],
  ['SANS beside EN, two notches and a tie', beside(fullest, 'en-1993')],
  ['SANS beside CSA, two notches and a tie', beside(fullest, 'csa-s16')],
  ['AS beside EN', beside(australian, 'en-1993')],
  ['AISC LRFD beside ASD without its reaction', beside(inches, 'aisc-360-asd')],
  ['AISC LRFD beside ASD with its reaction', beside(inches, 'aisc-360-asd', 24)],
  ['AISC LRFD beside CSA', beside(inches, 'csa-s16')],
  ['SANS beside a standard that is not known', beside(end, 'nope')],
  ['SANS beside itself', beside(end, 'sans-10162-1')],
];

export const onPaper = (input: object, paper: 'A4' | 'Letter'): object => {
  const { sheet = {} } = input as { sheet?: object };
  return { ...input, sheet: { ...sheet, paper } };
};
