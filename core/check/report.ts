import type { CheckName, PartName } from '../end/checkNames.ts';
import type { Fault } from '../end/fault.ts';
import type { Basis } from '../formula/tree.ts';
import type { WorkingRow } from '../formula/working.ts';
import type { UnitSystem } from '../units/systems.ts';
import type { Region } from '../words/regions.ts';

/** `refer`: outside the limits of the method or of practice; never a pass. `information`: numbers without a verdict. */
export type State = 'holds' | 'fails' | 'refer' | 'notApplicable' | 'information';
export type Verdict = 'holds' | 'fails' | 'refer';

/** One way of failing, or one rule of fit. Values in the report's own units. */
export interface Check {
  readonly id: CheckName;
  readonly part: PartName;
  /** In the trade's words. */
  readonly title: string;
  readonly clause: string;
  readonly basis: Basis | '';
  /** Symbol of the demand, such as V, R_max, V e_c. */
  readonly symbol: string;
  /** Demand and resistance at V, in `unit`; null where nothing can be computed. For rules of fit: required and given. */
  readonly demand: number | null;
  readonly resistance: number | null;
  readonly unit: string;
  /** V / reactionAtFailure; for checks without V required / given. Null where it has no finite value. */
  readonly utilisation: number | null;
  /** End reaction at which this would be exactly used up, all else equal. Absent for checks without V. */
  readonly reactionAtFailure?: number | null;
  readonly state: State;
  /** Why it refers or does not apply: code, and the sentence in words. */
  readonly reason?: string;
  readonly reasonText?: string;
  /** Which section, leg or edge the numbers speak of, where a check has several parts. */
  readonly of?: string;
  /** The same in words. */
  readonly ofText?: string;
  /** How far this formula is checked against numbers that the program did not make. */
  readonly verified: 'published' | 'theory' | 'hand' | 'none';
  readonly working?: readonly WorkingRow[];
}

/** Shear stress V Q/(I t) through one section, for information. Report's units (mm, MPa, kN or in, ksi, kip). */
export interface SectionStress {
  readonly name: 'full' | 'tee-top' | 'tee-bottom' | 'rectangle';
  /** From the support's face. */
  readonly at: number;
  readonly area: number;
  /** From top of steel. */
  readonly centroid: number;
  readonly inertia: number;
  /** Elastic modulus to the cut edge (full: to either flange). */
  readonly modulusCut: number;
  readonly plasticModulus: number;
  /** First moment above the level of the peak. */
  readonly firstMoment: number;
  readonly peakStress: number;
  /** Level of the peak, from top of steel. */
  readonly peakAt: number;
  /** V / (t_w x depth). */
  readonly meanStress: number;
  readonly firstYieldStress: number;
  readonly firstYieldReaction: number;
  /** Pairs of level and stress, from top to bottom. */
  readonly profile: readonly (readonly [number, number])[];
}

export interface Note {
  readonly code: string;
  readonly text: string;
  readonly path?: string;
}

export interface Report {
  readonly mark: string;
  readonly standard: { readonly id: string; readonly title: string; readonly edition: string };
  readonly level: 'factored' | 'service';
  readonly units: UnitSystem;
  /** Whose trade words titles, reasons and notes are in. */
  readonly words: Region;
  readonly verdict: Verdict;
  /** The check that comes first; see methods of the standard. */
  readonly governing: CheckName;
  readonly reaction: number;
  /** Least reaction at failure of all checks that hold, fail or refer; null where none has one. */
  readonly capacity: number | null;
  readonly shareOfWebShear: number;
  /** Strength checks weakest first, then rules of fit, then what does not apply. */
  readonly checks: readonly Check[];
  readonly shape: { readonly sections: readonly SectionStress[] };
  readonly assumptions: readonly Note[];
  readonly notes: readonly Note[];
  readonly options: Readonly<Record<string, string>>;
  readonly version: string;
  /** First 8 hex digits of SHA-256 over the canonical JSON of the end without `sheet`, the standard's id and edition and the program's version. */
  readonly fingerprint: string;
}

/** A report without the fingerprint, which belongs to what is issued. */
export type Numbers = Omit<Report, 'fingerprint'>;

/** A fault with its sentence. */
export interface SaidFault extends Fault {
  readonly text: string;
}

export type Outcome = { readonly report: Report } | { readonly faults: readonly SaidFault[] };
