/** Yield and tensile strength of steel, MPa. */
export interface Steel {
  readonly fy: number;
  readonly fu: number;
}

/** Steels that a standard admits for one kind of product. */
export interface Steels {
  readonly grades: readonly string[];
  /** The grade that a written name means, such as `S355` for `S355J2`; undefined where it is none of them. */
  readonly named: (written: string) => string | undefined;
  /** Strengths of a grade in an element of this thickness, mm; undefined outside the grade's range. */
  readonly strengthAt: (grade: string, thickness: number) => Steel | undefined;
  /** Code of a note (core/words) to print for a grade: its strengths are from memory, or the standard does not list it. */
  readonly noteOf?: (grade: string) => string | undefined;
}

/** Strengths of a bolt, MPa. */
export interface BoltSteel {
  /** Tensile strength. */
  readonly fub: number;
  /** Nominal shear strength with threads in and out of the plane, where the standard lists it; else 0. */
  readonly shear?: { readonly in: number; readonly out: number };
  /** False for a bolt that the standard does not list: its numbers refer. */
  readonly listed: boolean;
}

/** Materials, bolts and holes as a standard admits them. MPa, mm. */
export interface Materials {
  readonly sections: Steels;
  readonly plates: Steels;
  /** Steels of cleats, where they are not those of plates. */
  readonly cleats?: Steels;
  /** Thickness by which the strength of a beam's web is read: the web's own, or the thickest part's. */
  readonly webStrengthAt: (section: { readonly tf: number; readonly tw: number }) => number;
  readonly boltGrades: readonly string[];
  /** A bolt by the name of its grade, or by a tensile strength of its own; undefined where the name has none for this diameter. */
  readonly bolt: (grade: string | number, diameter: number) => BoltSteel | undefined;
  /** Nominal hole of a bolt. */
  readonly holeFor: (diameter: number) => number;
  /** Hole diameter in net areas. */
  readonly netHole: (hole: number, made: 'drilled' | 'punched', diameter: number) => number;
  /** How holes are taken when the file does not say. */
  readonly holesAssumed: 'drilled' | 'punched';
  /** Weld metal taken when the file does not say; 0 where the standard needs none. */
  readonly electrode: number;
}

/** Spellings of a grade are without number, so what is kept of them has a bound. */
const MET_MOST = 256;

/** A name without blanks, in capitals. */
const plain = (name: string): string => name.trim().toUpperCase().replace(/\s+/g, '');

/** Finds a grade by its name in any case and spacing; `readAs` first turns what people write into the name listed. */
export const namedIn = (grades: readonly string[], readAs: (plain: string) => string = (name) => name) => {
  const byName = new Map(grades.map((one) => [plain(one), one]));
  const met = new Map<string, string | undefined>(grades.map((one) => [one, one]));
  return (written: string): string | undefined => {
    if (met.has(written)) return met.get(written);
    const wanted = plain(written);
    const found = byName.get(wanted) ?? byName.get(plain(readAs(wanted)));
    if (met.size < MET_MOST) met.set(written, found);
    return found;
  };
};
