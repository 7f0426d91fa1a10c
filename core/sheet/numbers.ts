import { length } from '../drawing/sizes.ts';
import { fixed, plain, ratio, roundedDown } from '../units/figures.ts';
import { toSystem, type UnitSystem, unitOf } from '../units/systems.ts';

/** Numbers as the sheet prints them: the file's units, the job's decimal mark. */
export interface Numbers {
  readonly units: UnitSystem;
  readonly force: string;
  readonly length: string;
  readonly stress: string;
  /** Puts the job's decimal mark into a text that holds numbers; clauses and bolt grades keep their points. */
  marked(text: string): string;
  /** A demand or resistance in the named unit; a dash where there is none. */
  amount(value: number | null, unit: string): string;
  /** mm, as the drawing states lengths: inches in sixteenths where they are. */
  mm(value: number): string;
  /** MPa, as the file states stresses. */
  mpa(value: number): string;
  /** A force already in the file's unit. */
  load(value: number): string;
  /** A reaction at which something fails, in the file's unit, rounded down. */
  failsAt(value: number | null | undefined): string;
  ratio(value: number | null): string;
}

const NONE = '–';

/** A number that is no clause (cl. 22.3, 13.4.1.1), no edition and no bolt grade (M20 8.8). */
const decimal = /(?<![\d.])(?<!cl\. )(?<!M\d\d )(\d+)\.(\d+)(?![\d]*\.\d)/g;

/** Places after the point: one for the larger units, two where small values are common. */
const placesOf = (value: number, unit: string): number => {
  if (unit === '' || unit === 'kip/in') return 2;
  if (unit === 'kN' || unit === 'MPa' || unit === 'N/mm') return 1;
  return Math.abs(value) < 10 ? 2 : 1;
};

export const numbersOf = (units: UnitSystem, mark: '.' | ','): Numbers => {
  const marked = (text: string): string => (mark === '.' ? text : text.replace(decimal, '$1,$2'));
  const point = (text: string): string => (mark === '.' ? text : text.replace('.', ','));
  const places = units === 'mm-kN' ? 2 : 3;
  return {
    units,
    force: unitOf('0,1', units).name,
    length: unitOf('1,0', units).name,
    stress: unitOf('-2,1', units).name,
    marked,
    amount: (value, unit) => {
      if (value === null) return NONE;
      const isLength = unit === 'mm' || unit === 'in';
      return point(isLength ? plain(value, places) : fixed(value, placesOf(value, unit)));
    },
    mm: (value) => point(length(value, units)),
    mpa: (value) => point(plain(toSystem(value, '-2,1', units), 1)),
    load: (value) => point(plain(value, 2)),
    failsAt: (value) => (value === null || value === undefined ? NONE : point(roundedDown(value))),
    ratio: (value) => (value === null ? NONE : point(ratio(value))),
  };
};
