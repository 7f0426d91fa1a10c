import type { UnitSystem } from '../units/systems.ts';

/** What the drawing needs but the facts do not carry: names as they stand in the end, the trade's words of the region, room for words. */
export interface DrawingWords {
  readonly units: UnitSystem;
  /** Designation of the section, such as `UB 406 × 178 × 60`. */
  readonly section: string;
  /** Such as `M20` and `8.8`. */
  readonly boltSize: string;
  readonly boltGrade: string;
  /** Such as `drilled` or `punched`. */
  readonly holes: string;
  /** `notch` or `cope`. */
  readonly cope: string;
  /** `gauge` or `gage`. */
  readonly gauge: string;
  /** Of the part that the web is bolted to, such as `fin plate`, `single plate` or `ply`. */
  readonly plate: string;
  /** Beam drawn at least beyond the last cope or the plate, mm: words with leaders stand on it. */
  readonly beyond?: number;
}
