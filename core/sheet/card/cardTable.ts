import type { CardRow, Cell } from '../../card/card.ts';
import type { StrengthName } from '../../end/checkNames.ts';
import { capital } from '../../words/capital.ts';
import { sectionName } from '../given.ts';
import { DOTTED, HAIR, LEFT, NARROW, small, WIDTH } from '../page.ts';
import type { TextStyle } from '../pen.ts';
import { type CardContext, plateName, size } from './cardContext.ts';
import { cardWords as say } from './cardWords.ts';

export const HEADER = 10.4;
const ROW = 4.5;
/** Base line of a row below its top, mm. */
const BASE = 3.6;
const NAME = 1.2;
const AFTER_NAME = 5;
const BEFORE_LETTER = 1.1;
/** Widest column, and from its middle to the right edge of its numbers, mm. */
const WIDEST = 30;
const AFTER_MIDDLE = 2.4;
/** From the right edge of the numbers to that of a word in their place. */
const AFTER_WORD = 2.6;

const figures: TextStyle = { size: 11 };
const count: TextStyle = { size: 12, bold: true };
const letter: TextStyle = { size: 8 };
const name: TextStyle = { size: 10 };

/** Height of so many rows with their head, mm. */
export const tableHeight = (rows: number): number => HEADER + rows * ROW;

export const rowsWithin = (height: number): number => Math.max(1, Math.floor((height - HEADER) / ROW));

/** What precedes the last number of a designation: sections of one size. */
export const stemOf = (designation: string): string => designation.replace(/x[^x]*$/, '');

const depthText = (context: CardContext): string => say.depth(capital(plateName(context)), context.numbers.length);

/** Right edges of the numbers, one a column, mm from the left of the window. */
const edgesOf = (context: CardContext): readonly number[] => {
  const { pen, made } = context;
  const { sections, rows } = made.card;
  const names = sections.map(({ section }) => pen.width(sectionName(section), name));
  const left = NAME + Math.max(...names, pen.width(depthText(context), small)) + AFTER_NAME;
  const step = Math.min(WIDEST, (WIDTH - left) / rows.length);
  return rows.map((_, i) => left + i * step + step / 2 + AFTER_MIDDLE);
};

const numberOf = ({ numbers }: CardContext, reaction: number): string => {
  const digits = numbers.units === 'mm-kN' ? 0 : 1;
  return numbers.marked(reaction.toFixed(digits));
};

const drawCell = (
  context: CardContext,
  letters: ReadonlyMap<StrengthName, string>,
  cell: Cell,
  edge: number,
  base: number,
): void => {
  const { pen } = context;
  if (cell.verdict === 'refer') pen.text(edge + AFTER_WORD, base, say.refer, { ...letter, anchor: 'end' });
  if (cell.verdict !== 'holds') return;
  pen.text(edge, base, numberOf(context, cell.reaction), { ...figures, anchor: 'end' });
  pen.text(edge + BEFORE_LETTER, base, letters.get(cell.governing) ?? '', letter);
};

/** Counts of bolt rows, and the depth of plate that goes with each. */
const drawHead = (context: CardContext, edges: readonly number[], y: number): void => {
  const { pen, made } = context;
  const { rows, plateDepths } = made.card;
  const [upper, lower] = [y + 4.4, y + HEADER - 1.6];
  pen.text(LEFT + NAME, upper, say.rows, small);
  pen.text(LEFT + NAME, lower, depthText(context), small);
  edges.forEach((edge, i) => {
    pen.text(LEFT + edge, upper, String(rows[i]), { ...count, anchor: 'end' });
    pen.text(LEFT + edge, lower, size(context, plateDepths[i]!), { ...small, anchor: 'end' });
  });
  pen.line(LEFT, y + HEADER, LEFT + WIDTH, y + HEADER, NARROW);
};

/** Sections below each other, a cell for each count of bolt rows; a full rule where another size of section begins. */
export const drawTable = (context: CardContext, rows: readonly CardRow[], y: number): void => {
  const { pen, made } = context;
  const letters = new Map(made.card.checks.map((one) => [one.id, one.letter]));
  const edges = edgesOf(context);
  const sizes = new Set(rows.map(({ section }) => stemOf(section)));
  const grouped = sizes.size < rows.length;
  drawHead(context, edges, y);
  rows.forEach(({ section, cells }, i) => {
    const top = y + HEADER + i * ROW;
    const begins = grouped && i > 0 && stemOf(section) !== stemOf(rows[i - 1]!.section);
    if (i > 0) pen.line(LEFT, top, LEFT + WIDTH, top, HAIR, begins ? undefined : DOTTED);
    pen.text(LEFT + NAME, top + BASE, sectionName(section), name);
    cells.forEach((cell, k) => {
      drawCell(context, letters, cell, LEFT + edges[k]!, top + BASE);
    });
  });
  const bottom = y + tableHeight(rows.length);
  pen.line(LEFT, bottom, LEFT + WIDTH, bottom, NARROW);
};
