import { encode, QrCodeDataType } from 'uqr';
import type { Pen } from './pen.ts';
import { bestMasked } from './qrMask.ts';

/** Module of the code: the least that an ordinary printer and camera manage, and the most that is of use, mm. */
const LEAST_MODULE = 0.33;
const MOST_MODULE = 0.5;

/** A square code ready to draw. */
export interface Code {
  readonly rows: readonly (readonly boolean[])[];
  readonly module: number;
}

/** The code of a text, error level M, no larger than `most` mm unless its modules then were too small; null where no code holds the text. */
export const codeOf = (text: string, most: number): Code | null => {
  try {
    // The library would weigh the eight masks itself, at many times the cost.
    const { data, types, size } = encode(text, { ecc: 'M', border: 0, boostEcc: false, maskPattern: 0 });
    const rows = bestMasked({ size, dark: data, isData: (x, y) => types[y]![x] === QrCodeDataType.Data });
    return { rows, module: Math.min(MOST_MODULE, Math.max(LEAST_MODULE, most / size)) };
  } catch {
    return null;
  }
};

/** Side of a code, mm. */
export const sideOf = ({ rows, module }: Code): number => rows.length * module;

/** Draws the code with its upper left corner here. */
export const drawCode = (pen: Pen, x: number, y: number, { rows, module }: Code): void => {
  pen.grid(x, y, module, rows);
};
