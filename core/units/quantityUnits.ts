import type { Dimension } from './dimension.ts';
import { INCH, KIP } from './systems.ts';

/** A unit as people write it. */
export interface WrittenUnit {
  readonly name: string;
  readonly dimension: Dimension;
  /** How many mm, N or MPa one of it is. */
  readonly size: number;
  /** Values are too small for grouped thousands, so a point is always the decimal sign. */
  readonly small?: true;
}

const POUND = KIP / 1000;

const inch: WrittenUnit = { name: 'in', dimension: '1,0', size: INCH, small: true };
const kip: WrittenUnit = { name: 'kip', dimension: '0,1', size: KIP };
const mpa: WrittenUnit = { name: 'MPa', dimension: '-2,1', size: 1 };

/** By spelling in lower case. A metre is read from a small m only, since M stands before bolt sizes. */
const bySpelling: ReadonlyMap<string, WrittenUnit> = new Map<string, WrittenUnit>([
  ['mm', { name: 'mm', dimension: '1,0', size: 1 }],
  ['cm', { name: 'cm', dimension: '1,0', size: 10, small: true }],
  ...['"', '″', '”', "''", 'in', 'in.', 'inch', 'inches'].map((it): [string, WrittenUnit] => [it, inch]),
  ['n', { name: 'N', dimension: '0,1', size: 1 }],
  ['kn', { name: 'kN', dimension: '0,1', size: 1e3 }],
  ['lb', { name: 'lb', dimension: '0,1', size: POUND }],
  ['lbf', { name: 'lb', dimension: '0,1', size: POUND }],
  ...['k', 'kip', 'kips'].map((it): [string, WrittenUnit] => [it, kip]),
  ...['mpa', 'n/mm2', 'n/mm²', 'n/mm^2'].map((it): [string, WrittenUnit] => [it, mpa]),
  ['ksi', { name: 'ksi', dimension: '-2,1', size: KIP / INCH ** 2 }],
  ['psi', { name: 'psi', dimension: '-2,1', size: POUND / INCH ** 2 }],
  ['%', { name: '%', dimension: '0,0', size: 0.01, small: true }],
]);

const metre: WrittenUnit = { name: 'm', dimension: '1,0', size: 1000, small: true };

/** The unit of that spelling; undefined where it is none. */
export const writtenUnit = (spelling: string): WrittenUnit | undefined =>
  spelling === 'm' ? metre : bySpelling.get(spelling.toLowerCase());

/** Names of the units in which a quantity of this dimension may be written. */
export const unitNames = (dimension: Dimension): string[] => [
  ...new Set([...bySpelling.values(), metre].filter((unit) => unit.dimension === dimension).map((unit) => unit.name)),
];
