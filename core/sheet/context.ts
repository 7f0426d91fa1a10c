import type { Examined } from '../check/examine.ts';
import type { Words } from '../words/words.ts';
import type { Numbers } from './numbers.ts';
import type { Pen } from './pen.ts';

/** An end looked at in full, with the working of its checks; `link` is the text that the square code holds. */
export interface SheetInput extends Examined {
  readonly link?: string;
}

/** What every zone of the sheet draws with and from. */
export interface Context {
  readonly pen: Pen;
  readonly input: SheetInput;
  readonly numbers: Numbers;
  /** The region's own words. */
  readonly words: Words;
}

/** A part of the page that knows how high it is before it is drawn. */
export interface Zone {
  /** mm */
  readonly height: number;
  /** Draws with the upper left corner here. */
  readonly draw: (x: number, y: number) => void;
}
