import type { Context } from './context.ts';
import { body, LEADING } from './page.ts';
import type { TextStyle } from './pen.ts';
import { sheetWords as say } from './sheetWords.ts';
import { type Lines, plainRun, setLines, wrap } from './textBlock.ts';

const style: TextStyle = { ...body, family: 'narrow' };

/** What the program asks everyone to keep in mind, never shortened, in lines of this width, mm; `codeless`: and that no square code stands here. */
export const closingLines = ({ pen, words }: Context, width: number, codeless = false): Lines =>
  wrap(pen, [plainRun([...words.cautions, ...(codeless ? [say.qrLeftOut] : [])].join(' '))], style, width);

/** mm from the first base line to the last. */
export const closingDepth = (lines: Lines): number => (lines.length - 1) * LEADING;

export const drawClosing = ({ pen }: Context, x: number, firstBase: number, lines: Lines): void =>
  setLines(pen, x, firstBase, lines, style, LEADING);
