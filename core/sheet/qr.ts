import { encode } from 'uqr';
import type { Pen, SquaresMark } from './pen.ts';

/**
 * Side of the square code at most, and the least module that an ordinary printer and camera manage, mm. Around the box more than the
 * four modules stay white that a reader needs: the page's edge, the frame of the block and the gap before the sign-off boxes see to that.
 */
const BOX = 24.4;
const LEAST_MODULE = 0.33;
const MOST_MODULE = 0.5;

/** A square code ready to draw. */
export interface Code {
  readonly rows: readonly (readonly boolean[])[];
  readonly module: number;
}

/** The code of a text, error level M; null where its modules would be too small for the box. */
export const codeOf = (text: string): Code | null => {
  try {
    const { data, size } = encode(text, { ecc: 'M', border: 0, boostEcc: false });
    const module = Math.min(MOST_MODULE, BOX / size);
    return module < LEAST_MODULE ? null : { rows: data, module };
  } catch {
    return null;
  }
};

/** Draws the code with its upper left corner here; runs of dark modules are one rectangle. */
export const drawCode = (pen: Pen, x: number, y: number, { rows, module }: Code): void => {
  const dark: SquaresMark['rows'][number][] = [];
  rows.forEach((row, j) => {
    let from = -1;
    for (let i = 0; i <= row.length; i += 1) {
      if (row[i] && from < 0) from = i;
      if (!row[i] && from >= 0) {
        const width = (i - from) * module;
        dark.push({ x: x + from * module, y: y + j * module, width, height: module });
        from = -1;
      }
    }
  });
  pen.squares(dark);
};
