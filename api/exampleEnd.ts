import type { End } from '../core/end/schema.ts';

/** An invented end, as the API's description shows it: a notched beam on a fin plate. */
export const exampleEnd = {
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
} as const satisfies End;
