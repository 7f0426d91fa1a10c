import type { ExaminedNumbers } from '../check/examined.ts';
import type { Note, Report } from '../check/report.ts';
import type { FitName, StrengthName } from '../end/checkNames.ts';
import type { End } from '../end/schema.ts';

/** Why a cell has no number: a check that refers or fails, or a fault of the geometry. */
export interface Why {
  /** Name of the check, or code of the fault. */
  readonly code: string;
  /** Title of the check; empty for a fault. */
  readonly title: string;
  /** The sentence; empty for a strength that is used up. */
  readonly text: string;
}

/** What one section carries with one count of bolt rows. */
export type Cell =
  /** The largest whole reaction at which a full check of this end holds, and the check that comes next. */
  | { readonly verdict: 'holds'; readonly reaction: number; readonly governing: StrengthName }
  /**
   * `refer`: outside the limits of method or practice, so no number. `fails`: at any reaction; it does not fit, or a rule of fit or a tie fails.
   */
  | { readonly verdict: 'refer' | 'fails'; readonly because: readonly Why[] };

/** One row of the table: a section with a cell for each count of bolt rows. */
export interface CardRow {
  readonly section: string;
  readonly cells: readonly Cell[];
}

/** A check that every cell was examined for. */
export interface CardCheck {
  readonly id: StrengthName;
  readonly title: string;
  /** By which a cell of the printed card names it. */
  readonly letter: string;
  /** True where it governs some cell. */
  readonly governs: boolean;
}

/** The reactions that sections carry with one fitting and setback, under one standard. Values in the template's own units. */
export interface Card extends Pick<Report, 'standard' | 'level' | 'units' | 'words' | 'options' | 'version'> {
  readonly joint: End['joint']['kind'];
  /** Counts of bolt rows, the columns of the table. */
  readonly rows: readonly number[];
  /** Depth of plate or ply that goes with each count. */
  readonly plateDepths: readonly number[];
  readonly sections: readonly CardRow[];
  readonly checks: readonly CardCheck[];
  /** Rules of fit that every cell was examined for. */
  readonly fit: readonly { readonly id: FitName; readonly title: string }[];
  readonly assumptions: readonly Note[];
  readonly notes: readonly Note[];
  /** First 8 hex digits of SHA-256 over the canonical JSON of what is printed from, the standard's id and edition and the program's version. */
  readonly fingerprint: string;
}

/** A card with what a page needs besides. */
export interface MadeCard {
  readonly card: Card;
  /** The template, as read. */
  readonly end: End;
  /** An end of the card, looked at: what does not change from cell to cell. */
  readonly like: ExaminedNumbers;
  /** Every standing that a check has in some cell. */
  readonly standings: Report['checks'];
}
