import { WIDTH, widthOf, wrap } from './wrap.ts';

export interface Column {
  readonly align: 'left' | 'right';
  /** Blanks before it. */
  readonly gap: number;
  /** Share of the room left by the others; without one a column is as wide as what stands in it. */
  readonly share?: number;
}

/** A line of a table: its cells, which may hold line breaks, and a sentence that belongs under it. */
export interface Row {
  readonly cells: readonly string[];
  readonly under?: string;
}

const UNDER = '        ';

const linesIn = (cell: string): string[] => cell.split('\n');

const widthsOf = (columns: readonly Column[], rows: readonly Row[]): number[] => {
  const natural = columns.map((_, at) =>
    Math.max(0, ...rows.flatMap(({ cells }) => linesIn(cells[at] ?? '').map(widthOf))),
  );
  const shared = columns.map(({ share }) => share ?? 0);
  const fixed = natural.reduce((sum, width, at) => sum + (shared[at] ? 0 : width), 0);
  let room = WIDTH - fixed - columns.reduce((sum, { gap }) => sum + gap, 0);
  let shares = shared.reduce((sum, share) => sum + share, 0);
  // From the last: what a column leaves of its share goes to those before it.
  for (let at = columns.length - 1; at >= 0; at -= 1) {
    const share = shared[at];
    if (!share) continue;
    natural[at] = Math.min(natural[at]!, Math.max(8, Math.floor((room * share) / shares)));
    room -= natural[at]!;
    shares -= share;
  }
  return natural;
};

const padded = (text: string, width: number, { align, gap }: Column): string => {
  const blanks = ' '.repeat(Math.max(0, width - widthOf(text)));
  return ' '.repeat(gap) + (align === 'left' ? text + blanks : blanks + text);
};

const setRow = ({ cells, under }: Row, columns: readonly Column[], widths: readonly number[]): string[] => {
  const broken = cells.map((cell, at) => (columns[at]?.share ? wrap(cell, widths[at]!) : linesIn(cell)));
  const height = Math.max(...broken.map(({ length }) => length));
  const lines = Array.from({ length: height }, (_, line) =>
    columns
      .map((column, at) => padded(broken[at]?.[line] ?? '', widths[at]!, column))
      .join('')
      .trimEnd(),
  );
  return under ? [...lines, ...wrap(under, WIDTH - UNDER.length).map((line) => UNDER + line)] : lines;
};

/** Sets blocks of rows in the same columns, each block a list of lines. */
export const setColumns = (columns: readonly Column[], blocks: readonly (readonly Row[])[]): string[][] => {
  const widths = widthsOf(columns, blocks.flat());
  return blocks.map((rows) => rows.flatMap((row) => setRow(row, columns, widths)));
};
