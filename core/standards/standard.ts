import type { FitName, StrengthName } from '../end/checkNames.ts';
import type { Gate, Limit } from '../end/gates.ts';
import type { Condition, Constant, Source, Tree } from '../formula/tree.ts';
import type { Length } from '../units/dimension.ts';

/** One section, leg or direction in which a check is made. */
export interface Way {
  /** Names the way where a check has several: `up`, `along`, `rectangle`, `tee`; empty where it has one. */
  readonly of: string;
  /** Symbol under which the demand stands in tables, such as `R_max` or `V e_c`. */
  readonly symbol: string;
  /** Grows in proportion to its load (V, or T for tie forces). */
  readonly demand: Tree;
  readonly resistance: Tree;
  readonly load: 'V' | 'T';
  /** Not applicable under any of these. */
  readonly off?: readonly Gate[];
  readonly limits?: readonly Limit[];
  /** Used up by any load at all when this is met; no demand can then be stated. */
  readonly unbounded?: Condition;
  /** Numbers without a verdict while this is met. */
  readonly informs?: Condition;
  /** Where the way's source differs from the check's. */
  readonly source?: Source;
}

/** How a standard answers one way of failing. */
export interface StrengthRule {
  readonly source: Source;
  readonly ways: readonly Way[];
}

/** One comparison of a rule of geometry: what is given against the least or the most allowed, mm. */
export interface FitPart {
  readonly of: string;
  readonly given: Tree<Length>;
  readonly least?: Tree<Length>;
  readonly most?: Tree<Length>;
  readonly off?: readonly Gate[];
  /** Cannot be built while this is met: fails, whatever `else` says. */
  readonly clash?: Condition;
}

/** How a standard answers one rule of geometry; `breach` is the state of an end that breaks it. */
export interface FitRule {
  readonly source: Source;
  readonly breach: 'fails' | 'refer';
  readonly parts: readonly FitPart[];
}

/** The standard has no such check; `covered` names the one that contains it. */
export interface NoRule {
  readonly noRule: true;
  readonly covered?: StrengthName;
}

export const noRule = (covered?: StrengthName): NoRule => ({ noRule: true, ...(covered && { covered }) });
export const isNoRule = (rule: StrengthRule | FitRule | NoRule): rule is NoRule => 'noRule' in rule;

/** Materials, bolts and holes as a standard admits them. MPa, mm. */
export interface Materials {
  readonly grades: readonly string[];
  /** fy and fu of a grade at a thickness; undefined outside the grade's range. */
  readonly strengthAt: (grade: string, thickness: number) => { readonly fy: number; readonly fu: number } | undefined;
  readonly boltGrades: readonly string[];
  readonly boltStrength: (grade: string, diameter: number) => number | undefined;
  /** Nominal hole of a bolt. */
  readonly holeFor: (diameter: number) => number;
  /** Hole diameter in net areas. */
  readonly netHole: (hole: number, made: 'drilled' | 'punched') => number;
  /** How holes are taken when the file does not say. */
  readonly holesAssumed: 'drilled' | 'punched';
  /** Weld metal taken when the file does not say. */
  readonly electrode: number;
}

/** One design standard: every check name answered, the compiler sees to it. */
export interface Standard {
  readonly id: string;
  readonly title: string;
  readonly edition: string;
  readonly level: 'factored' | 'service';
  /** Values of each option, the default first. */
  readonly options: Readonly<Record<string, readonly [string, ...string[]]>>;
  /** Resistance factors, for print. */
  readonly factors: readonly Constant[];
  readonly materials: Materials;
  readonly strength: Readonly<Record<StrengthName, StrengthRule | NoRule>>;
  readonly fit: Readonly<Record<FitName, FitRule | NoRule>>;
  /** How far each check is verified against numbers that the program did not make. */
  readonly verified: Readonly<Partial<Record<StrengthName | FitName, 'published' | 'theory' | 'hand'>>>;
  /** Codes of notes (core/words) that the standard prints, each while its condition is met. */
  readonly notes: readonly { readonly code: string; readonly when: Condition }[];
}
