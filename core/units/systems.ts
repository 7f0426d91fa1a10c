import { type Dimension, powersOf } from './dimension.ts';

/** The two systems in which files, screen and sheet speak; inside the program everything is N, mm, MPa. */
export type UnitSystem = 'mm-kN' | 'in-kip';
export const unitSystems = ['mm-kN', 'in-kip'] as const;

/** mm in an inch, exact. */
export const INCH = 25.4;
/** N in a kip (1000 lb of force), exact: 0.453 592 37 kg x 9.806 65 m/s2 x 1000. */
export const KIP = 4448.2216152605;

interface Unit {
  readonly name: string;
  /** How many N, mm, MPa and their products one of this unit is. */
  readonly size: number;
}

const metric: Readonly<Record<string, Unit>> = {
  '0,0': { name: '', size: 1 },
  '1,0': { name: 'mm', size: 1 },
  '2,0': { name: 'mm²', size: 1 },
  '3,0': { name: 'mm³', size: 1 },
  '4,0': { name: 'mm⁴', size: 1 },
  '0,1': { name: 'kN', size: 1e3 },
  '1,1': { name: 'kN m', size: 1e6 },
  '-1,1': { name: 'N/mm', size: 1 },
  '-2,1': { name: 'MPa', size: 1 },
  '-1,0': { name: '1/mm', size: 1 },
  '-2,0': { name: '1/mm²', size: 1 },
};

const inch: Readonly<Record<string, Unit>> = {
  '0,0': { name: '', size: 1 },
  '1,0': { name: 'in', size: INCH },
  '2,0': { name: 'in²', size: INCH ** 2 },
  '3,0': { name: 'in³', size: INCH ** 3 },
  '4,0': { name: 'in⁴', size: INCH ** 4 },
  '0,1': { name: 'kip', size: KIP },
  '1,1': { name: 'kip in', size: KIP * INCH },
  '-1,1': { name: 'kip/in', size: KIP / INCH },
  '-2,1': { name: 'ksi', size: KIP / INCH ** 2 },
  '-1,0': { name: '1/in', size: 1 / INCH },
  '-2,0': { name: '1/in²', size: INCH ** -2 },
};

const units: Readonly<Record<UnitSystem, Readonly<Record<string, Unit>>>> = { 'mm-kN': metric, 'in-kip': inch };

/** The unit in which a system states a quantity of this dimension. */
export const unitOf = (dimension: Dimension, system: UnitSystem): Unit => {
  const known = units[system][dimension];
  if (known) return known;
  const [length, force] = powersOf(dimension);
  return system === 'mm-kN'
    ? { name: `N^${force} mm^${length}`, size: 1 }
    : { name: `kip^${force} in^${length}`, size: KIP ** force * INCH ** length };
};

/** A value held in N and mm, as the system states it (kN, kN m, N/mm, MPa, mm; kip, kip in, kip/in, ksi, in). */
export const toSystem = (value: number, dimension: Dimension, system: UnitSystem): number =>
  value / unitOf(dimension, system).size;

/** A value as the system states it, in N and mm. */
export const fromSystem = (value: number, dimension: Dimension, system: UnitSystem): number =>
  value * unitOf(dimension, system).size;
