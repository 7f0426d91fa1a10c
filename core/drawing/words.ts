import type { UnitSystem } from '../units/systems.ts';
import type { WeldPractice } from './drawing.ts';

/** A bolt as it stands in the end. */
export interface BoltWords {
  /** Such as `M20` and `8.8`. */
  readonly boltSize: string;
  readonly boltGrade: string;
  /** Such as `drilled` or `punched`. */
  readonly holes: string;
}

/** What the drawing needs but the facts do not carry: names as they stand in the end, the trade's words of the region, room for words. */
export interface DrawingWords extends BoltWords {
  readonly units: UnitSystem;
  /** Designation of the section, such as `UB 406 × 178 × 60`. */
  readonly section: string;
  /** Bolts into the support; absent where there are none. */
  readonly inSupport?: BoltWords;
  /** `notch` or `cope`. */
  readonly cope: string;
  /** `gauge` or `gage`. */
  readonly gauge: string;
  /** Of the part that the web is fixed to, such as `fin plate`, `single plate`, `ply`, `cleat` or `end plate`. */
  readonly plate: string;
  /** How the trade of the standard draws the symbols of welds. */
  readonly weldSymbols: WeldPractice;
  /** Beam drawn at least beyond the last cope or the plate, mm: words with leaders stand on it. */
  readonly beyond?: number;
}
