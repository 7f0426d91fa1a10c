import type { CardRow } from '../../card/card.ts';
import type { Lines } from '../textBlock.ts';
import type { CardContext } from './cardContext.ts';
import { rowsWithin, tableHeight } from './cardTable.ts';
import { elsewhereLine, linesWithin, listedRows, unlistedLines, unlistedZone } from './unlisted.ts';

/** What one sheet of a card holds that the others do not. */
export interface CardSheet {
  readonly rows: readonly CardRow[];
  /** Sections without a number, or the sheet on which they stand. */
  readonly lines: Lines;
}

const split = <T>(all: readonly T[], count: number): (readonly T[])[] =>
  Array.from({ length: Math.ceil(all.length / count) }, (_, i) => all.slice(i * count, (i + 1) * count));

/** As many rows on each sheet as fit, fewer on the last, which has at least one. */
const splitRows = (rows: readonly CardRow[], most: number, mostOnLast: number): (readonly CardRow[])[] => {
  const sheets = 1 + Math.max(0, Math.ceil((rows.length - mostOnLast) / most));
  const last = Math.min(rows.length - 1, (sheets - 1) * most);
  return [...split(rows.slice(0, last), most), rows.slice(last)];
};

/** The sheets of a card; `room`: height for the table and what stands under it, mm. A long list of sections without a number has sheets of its own. */
export const sheetsOf = (context: CardContext, room: number): readonly CardSheet[] => {
  const rows = listedRows(context);
  const lines = unlistedLines(context);
  const roomFor = (some: Lines): number => room - unlistedZone(context, some).height;
  const most = rowsWithin(roomFor(elsewhereLine(1)));
  const apart = roomFor(lines) < tableHeight(1);
  const tables = apart ? split(rows, most) : splitRows(rows, most, rowsWithin(roomFor(lines)));
  const lists = apart ? split(lines, linesWithin(room)) : [];
  const told = lines.length === 0 ? [] : elsewhereLine(apart ? tables.length + 1 : tables.length);
  const ends = (i: number): boolean => !apart && i + 1 === tables.length;
  return [
    ...tables.map((some, i) => ({ rows: some, lines: ends(i) ? lines : told })),
    ...lists.map((some) => ({ rows: [], lines: some })),
  ];
};
