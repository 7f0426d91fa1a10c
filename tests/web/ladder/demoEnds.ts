import { type Examined, examine } from '../../../core/check/examine.ts';

/** An invented end that holds by little, as JSON; parts of it are replaced by the tests. */
export const demoEnd = {
  mark: 'T-1/L',
  standard: 'sans-10162-1',
  units: 'mm-kN',
  reaction: 165,
  level: 'factored',
  beam: { section: 'UB 406x178x60', grade: 'S355JR' },
  top: { length: 110, depth: 45, radius: 10 },
  bottom: null,
  setback: 10,
  joint: {
    kind: 'fin-plate',
    firstRow: 90,
    endDistance: 45,
    bolts: { size: 'M20', grade: '8.8', threads: 'in', rows: 3, columns: 1, pitch: 70, holes: 'drilled' },
    plate: { thickness: 10, grade: 'S355JR', topEdge: 40, bottomEdge: 40, edge: 50 },
    weld: { leg: 8, electrode: 480 },
  },
} as const;

/** Looks at an end that is known to have no fault. */
export const examined = (end: unknown): Examined => {
  const found = examine(end);
  if ('faults' in found) throw new Error(found.faults.map(({ text }) => text).join(' '));
  return found.examined;
};

/** The invented end with some of its parts replaced. */
export const demo = (parts: Record<string, unknown> = {}): Examined => examined({ ...demoEnd, ...parts });

/** The invented end with parts of its joint replaced. */
export const demoJoint = (parts: Record<string, unknown>, more: Record<string, unknown> = {}): Examined =>
  demo({ joint: { ...demoEnd.joint, ...parts }, ...more });
