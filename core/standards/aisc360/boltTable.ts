import { boltStrength } from '../../steel/bolts.ts';
import { INCH } from '../../units/systems.ts';
import type { BoltSteel } from '../materials.ts';
import { KSI } from './given.ts';

/** A bolt size: diameter, standard hole (Table J3.3), least edge distance (Table J3.4). */
type Row = readonly [diameter: number, hole: number, edge: number];

/** ANSI/AISC 360-22, inches. From memory. */
const inchRows: readonly Row[] = [
  [1 / 2, 9 / 16, 3 / 4],
  [5 / 8, 11 / 16, 7 / 8],
  [3 / 4, 13 / 16, 1],
  [7 / 8, 15 / 16, 1 + 1 / 8],
  [1, 1 + 1 / 8, 1 + 1 / 4],
  [1 + 1 / 8, 1 + 1 / 4, 1 + 1 / 2],
  [1 + 1 / 4, 1 + 3 / 8, 1 + 5 / 8],
];

/** Tables J3.3M and J3.4M, mm. From memory; M16 to M30 holes seen. */
const metricRows: readonly Row[] = [
  [12, 14, 18],
  [16, 18, 22],
  [20, 22, 26],
  [22, 24, 28],
  [24, 27, 30],
  [27, 30, 34],
  [30, 33, 38],
  [36, 39, 46],
];

/** Sizes in inches and in mm never meet; to the micrometre, as inches turn into mm with a rounding error. */
const key = (diameter: number): number => Math.round(diameter * 1e3);
const rows = new Map<number, Row>([
  ...metricRows.map((row): [number, Row] => [key(row[0]), row]),
  ...inchRows.map(([d, hole, edge]): [number, Row] => [key(d * INCH), [d * INCH, hole * INCH, edge * INCH]]),
]);
const inchSizes = new Set(inchRows.map(([d]) => key(d * INCH)));

export const isInch = (diameter: number): boolean => inchSizes.has(key(diameter));
/** Standard hole, mm. */
export const standardHole = (diameter: number): number => rows.get(key(diameter))?.[1] ?? diameter;
/** Least distance from the centre of a standard hole to an edge, mm. */
export const leastEdge = (diameter: number): number => rows.get(key(diameter))?.[2] ?? 1.25 * diameter;

/** Tensile and nominal shear strength, threads in and out of the plane, ksi: Table J3.2, from memory. F1852 as A325, F2280 as A490. */
const grades: Readonly<Record<string, readonly [fu: number, threadsIn: number, threadsOut: number]>> = {
  A325: [120, 54, 68],
  F1852: [120, 54, 68],
  A490: [150, 68, 84],
  F2280: [150, 68, 84],
  A307: [60, 27, 27],
};

export const boltGrades: readonly string[] = [...Object.keys(grades), '8.8', '10.9'];

/** A threaded part that the table does not list: shares of its tensile strength, MPa. */
const unlisted = (fub: number): BoltSteel => ({ fub, shear: { in: 0.45 * fub, out: 0.563 * fub }, listed: false });

/** Strengths of a bolt of this grade, or of a tensile strength of its own, and of this diameter in mm. */
export const boltOf = (grade: string | number, diameter: number): BoltSteel | undefined => {
  if (typeof grade === 'number') return unlisted(grade);
  const found = grades[grade];
  if (found) {
    const [fu, threadsIn, threadsOut] = found;
    return { fub: fu * KSI, shear: { in: threadsIn * KSI, out: threadsOut * KSI }, listed: true };
  }
  const fub = boltStrength(grade, diameter);
  return fub === undefined ? undefined : unlisted(fub);
};
