import { nearest, type Unknown } from './nearest.ts';

/** A bolt by the nominal diameter of its shank, mm. */
export interface BoltSize {
  /** `M20`, or the fraction of an inch: `3/4`, `1-1/8`. */
  readonly name: string;
  readonly diameter: number;
  readonly thread: 'metric' | 'inch';
  /** Tensile stress area, mm2 (ISO 898-1); 0 for inch threads, which have areas by their own standards. */
  readonly tensileArea: number;
}

const metric = [12, 16, 20, 22, 24, 27, 30, 36];
const tensileAreas = [84.3, 157, 245, 303, 353, 459, 561, 817];
const inch: readonly (readonly [name: string, diameter: number])[] = [
  ['1/2', 12.7],
  ['5/8', 15.875],
  ['3/4', 19.05],
  ['7/8', 22.225],
  ['1', 25.4],
  ['1-1/8', 28.575],
  ['1-1/4', 31.75],
];

const sizes: readonly BoltSize[] = [
  ...metric.map(
    (diameter, at): BoltSize => ({
      name: `M${diameter}`,
      diameter,
      thread: 'metric',
      tensileArea: tensileAreas[at]!,
    }),
  ),
  ...inch.map(([name, diameter]): BoltSize => ({ name, diameter, thread: 'inch', tensileArea: 0 })),
];

const byName: ReadonlyMap<string, BoltSize> = new Map(sizes.map((size) => [size.name, size]));

/** Names of all sizes in the library: M12 to M36, then 1/2 to 1-1/4 inch. */
export const boltSizeNames: readonly string[] = [...byName.keys()];

/** The bolt size of that name, or the three nearest names. Read as people write it: `M20`, `m 20`, `3/4`, `3/4"`, `1 1/8 in`. */
export const findBoltSize = (name: string): BoltSize | Unknown =>
  byName.get(name) ?? byName.get(plain(name)) ?? { nearest: nearest(name, boltSizeNames, 3) };

const plain = (name: string): string =>
  name.length > 20
    ? ''
    : name
        .trim()
        .toUpperCase()
        .replace(/\s*(?:"|″|''|IN\.?|INCH)$/, '')
        .replace(/^M\s+/, 'M')
        .replace(/^(\d+)(?:\s+|\s*-\s*)(?=\d)/, '$1-')
        .replace(/\s*\/\s*/, '/');

/**
 * Least tensile strength f_u of a bolt of the given property class and diameter in mm, MPa (ISO 898-1). Undefined for other classes and
 * for diameters that are no metric size of this library: the property classes are not defined for inch threads.
 */
export const boltStrength = (propertyClass: string, diameter: number): number | undefined => {
  if (!metric.includes(diameter)) return undefined;
  switch (propertyClass) {
    case '4.6':
      return 400;
    case '4.8':
      return 420;
    case '8.8':
      return diameter <= 16 ? 800 : 830;
    case '10.9':
      return 1040;
    default:
      return undefined;
  }
};
