import type { FitName, StrengthName } from '../end/checkNames.ts';
import type { Gate, Limit } from '../end/gates.ts';
import type { Condition, Constant, Source, Tree } from '../formula/tree.ts';
import type { Force, Length } from '../units/dimension.ts';
import type { Listed } from './listed.ts';
import type { Materials } from './materials.ts';

/** One section, leg or direction in which a check is made. */
export interface Way {
  /** Names the way where a check has several: `up`, `along`, `rectangle`, `tee`; empty where it has one. */
  readonly of: string;
  /** Symbol under which the demand stands in tables, such as `R_max` or `V e_c`. */
  readonly symbol: string;
  /** In proportion to its load: V, the tie force T, or none where a size is compared. */
  readonly demand: Tree;
  /** Absent where the standard sets no limit: the demand then stands for information. */
  readonly resistance?: Tree;
  readonly load: 'V' | 'T' | 'none';
  /**
   * The reaction at which the way is used up, where resistance or demand change with V otherwise than in proportion. Not dependent on V;
   * demand and resistance are then stated at V.
   */
  readonly failsAt?: Tree<Force>;
  /** Not applicable under any of these. */
  readonly off?: readonly Gate[];
  readonly limits?: readonly Limit[];
  /** Refers, where it would hold, if of all ways of the end this one is used up first and this is met. */
  readonly whereFirst?: Gate;
  /** Used up by any load at all when this is met; no demand can then be stated. */
  readonly unbounded?: Condition;
  /** Numbers without a verdict while this is met. */
  readonly informs?: Condition;
  /** Where the way's source differs from the check's. */
  readonly source?: Source;
}

/** Every tree of a way, in the order of its working: what it fails at, demand, resistance. */
export const treesOf = ({ failsAt, demand, resistance }: Way): Tree[] =>
  [failsAt, demand, resistance].filter((one) => one !== undefined);

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
  /** State of an end that breaks this part, where it is not the rule's. */
  readonly breach?: 'fails' | 'refer';
  /** Cannot be built while this is met: fails, whatever `breach` says. */
  readonly clash?: Condition;
  /** Where the part's source differs from the rule's. */
  readonly source?: Source;
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

/** One design standard: every check name answered, the compiler sees to it. */
export interface Standard extends Listed {
  /** Values of each option, the default first. */
  readonly options: Readonly<Record<string, readonly [string, ...string[]]>>;
  /** Resistance factors, for print. */
  readonly factors: readonly Constant[];
  readonly materials: Materials;
  /** The least reaction that an end is checked for, whatever is given; absent where the standard asks for none. */
  readonly leastReaction?: Tree<Force>;
  readonly strength: Readonly<Record<StrengthName, StrengthRule | NoRule>>;
  readonly fit: Readonly<Record<FitName, FitRule | NoRule>>;
  /** How far each check is verified against numbers that the program did not make. */
  readonly verified: Readonly<Partial<Record<StrengthName | FitName, 'published' | 'theory' | 'hand'>>>;
  /** Codes of notes (core/words) that the standard prints, each while its condition is met. */
  readonly notes: readonly { readonly code: string; readonly when: Condition }[];
}
