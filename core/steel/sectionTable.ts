import type { Section } from '../shape/section.ts';

/**
 * One family of rolled sections as its source lists it. Only what cannot be computed is kept; areas and moduli follow from the dimensions.
 *
 * A row reads `label mass h b tf tw r`, without the mass where the label ends in it; the toe radius follows where the flanges taper, and a
 * last word where another list labels the same shape otherwise.
 */
export interface SectionTable {
  readonly family: string;
  /** What stands before the label in the full designation. */
  readonly prefix: string;
  /** What others write before the same label. */
  readonly otherPrefix?: string;
  /** Where the family is sold first. */
  readonly market: string;
  readonly shape: Section['family'];
  /** The published table the rows go back to. */
  readonly source: string;
  /** mm and kg/m where absent; otherwise inches and lb/ft. */
  readonly units?: 'in-lb';
  /** Slope of the inner flange faces, degrees; absent for parallel flanges. */
  readonly slope?: number;
  /** The list whose labels stand in the last word. */
  readonly otherList?: string;
  /** The label is read without its mass too, where that names one section of the library alone. */
  readonly readWithoutMass?: true;
  readonly rows: string;
  /** Some of the family's rows alone. */
  readonly excerpt?: true;
}

/** A section found by name. */
export interface SectionRecord {
  /** As this library writes it: `UB 406x178x60`, `IPE 300`, `HEA 200`, `W18x40`, `410UB53.7`, `ISMB 400`. */
  readonly designation: string;
  readonly family: string;
  readonly market: string;
  /** kg/m. */
  readonly mass: number;
  readonly section: Section;
  /** The published table behind the dimensions. */
  readonly source: string;
  /** The label it was asked for by, where that belongs to another list than `source`: `UB 305x165x41` for `UB 305x165x40`. */
  readonly readAs?: string;
  /** Whose list that label belongs to: South Africa or Canada. */
  readonly readFrom?: string;
}

/** A row of a table: the section, its label and its label in the table's other list. */
export interface SectionRow {
  readonly record: SectionRecord;
  readonly label: string;
  readonly otherLabel?: string;
}

const millimetresPerInch = 25.4;
const kilogramsPerMetre = 0.45359237 / 0.3048;

/** Reads the rows of a table. */
export const readTable = (table: SectionTable): SectionRow[] =>
  table.rows
    .trim()
    .split('\n')
    .map((row) => readRow(table, row));

const readRow = (table: SectionTable, row: string): SectionRow => {
  const [label = '', ...rest] = row.split(' ');
  const [length, weight] = table.units === 'in-lb' ? [millimetresPerInch, kilogramsPerMetre] : [1, 1];
  const sizes = rest.filter((one) => !one.includes('x')).map(Number);
  const taper = table.slope === undefined ? {} : { slope: (table.slope * Math.PI) / 180, toe: sizes.pop()! * length };
  const mass = sizes.length === 6 ? sizes.shift()! : Number(label.slice(label.lastIndexOf('x') + 1));
  const [h = 0, b = 0, tf = 0, tw = 0, r = 0] = sizes;
  const otherLabel = rest.find((one) => one.includes('x'));
  return {
    label,
    ...(otherLabel !== undefined && { otherLabel }),
    record: {
      designation: table.prefix + label,
      family: table.family,
      market: table.market,
      mass: mass * weight,
      section: {
        family: table.shape,
        h: h * length,
        b: b * length,
        tf: tf * length,
        tw: tw * length,
        r: r * length,
        ...taper,
      },
      source: table.source,
    },
  };
};
