import type { Check } from '../../../core/check/report.ts';
import { reportOf } from '../../support/compare.ts';

export type Json = Record<string, unknown>;

const bolts = { size: 'M20', grade: '8.8', threads: 'in', rows: 4, columns: 1, pitch: 70, gauge: 0 };
const plate = { thickness: 10, grade: 'S275', topEdge: 40, bottomEdge: 40, edge: 50 };
export const cope = { length: 120, depth: 50, radius: 10 };
export const end: Json = {
  standard: 'en-1993',
  units: 'mm-kN',
  reaction: 250,
  beam: { section: 'UB 406x178x60', grade: 'S275' },
  top: cope,
  setback: 10,
  joint: { kind: 'fin-plate', firstRow: 90, endDistance: 50, bolts, plate, weld: { leg: 8 } },
};
export const joint = (changes: {
  bolts?: Json;
  plate?: Json;
  weld?: Json;
  firstRow?: number;
  endDistance?: number;
}) => ({
  joint: {
    kind: 'fin-plate',
    firstRow: changes.firstRow ?? 90,
    endDistance: changes.endDistance ?? 50,
    bolts: { ...bolts, ...changes.bolts },
    plate: { ...plate, ...changes.plate },
    weld: { leg: 8, ...changes.weld },
  },
});
export const report = (changes: Json = {}) => reportOf({ ...end, ...changes });
export const check = (id: string, changes: Json = {}): Check => report(changes).checks.find((one) => one.id === id)!;
export const notes = (changes: Json = {}) => report(changes).notes.map(({ code }) => code);
