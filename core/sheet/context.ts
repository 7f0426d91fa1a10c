import type { Examined } from '../check/examined.ts';
import type { Words } from '../words/words.ts';
import type { Numbers } from './numbers.ts';
import type { Pen } from './pen.ts';

/** An end looked at in full, with the working of its checks; `link` is the text that the square code holds. */
export interface SheetInput extends Examined {
  readonly link?: string;
}

/** What the sheet says under one standard. */
export interface Under {
  readonly pen: Pen;
  readonly input: SheetInput;
  readonly numbers: Numbers;
  /** The region's own words. */
  readonly words: Words;
}

/** The same end under the second standard that the sheet names. */
export interface Second extends Under {
  /** False where no reaction at that standard's level is given: strengths only, without states. */
  readonly stated: boolean;
}

/** What every zone of the sheet draws with and from. */
export interface Context extends Under {
  /** Null where the sheet names no second standard, or one that has nothing to say of this end. */
  readonly second: Second | null;
  /** Why the second standard that is named has nothing to say; empty where it has or none is named. */
  readonly fault: string;
}

/** A part of the page that knows how high it is before it is drawn. */
export interface Zone {
  /** mm */
  readonly height: number;
  /** Draws with the upper left corner here. */
  readonly draw: (x: number, y: number) => void;
}
