import { type Examined, examine } from '../../../core/check/examine.ts';

/** An invented end with one top notch that holds closely. */
export const end = {
  mark: 'K-207/L',
  standard: 'sans-10162-1',
  units: 'mm-kN',
  reaction: 165,
  level: 'factored',
  tie: 0,
  beam: { section: 'UB 406x178x60', grade: 'S355JR' },
  top: { length: 110, depth: 45, radius: 10 },
  bottom: null,
  setback: 10,
  joint: {
    kind: 'fin-plate',
    firstRow: 90,
    endDistance: 45,
    bolts: { size: 'M20', grade: '8.8', threads: 'in', rows: 3, columns: 1, pitch: 70, gauge: 0, holes: 'drilled' },
    plate: { thickness: 10, grade: 'S355JR', topEdge: 40, bottomEdge: 40, edge: 50 },
    weld: { leg: 8, electrode: 480 },
  },
  sheet: { job: 'Grain terminal, transfer tower TT2 (demo)', revision: 'P1', reason: 'first, for checking' },
} as const;

/** Notches above and below, two columns, a tie: the fullest table of one joint. Invented. */
export const fullest = {
  ...end,
  mark: 'K-311/R',
  reaction: 230,
  tie: 75,
  beam: { section: 'UB 533x210x92', grade: 'S355JR' },
  top: { length: 150, depth: 50, radius: 12 },
  bottom: { length: 120, depth: 50, radius: 12 },
  joint: { ...end.joint, bolts: { ...end.joint.bolts, rows: 4, columns: 2, gauge: 60 } },
} as const;

export const withSheet = (sheet: Record<string, unknown>, base: object = end): object => ({ ...base, sheet });

/** An end looked at in full; a fault is a mistake of the test. */
export const examined = (input: unknown): Examined => {
  const found = examine(input);
  if ('faults' in found) throw new Error(found.faults.map(({ text }) => text).join(' '));
  return found.examined;
};
