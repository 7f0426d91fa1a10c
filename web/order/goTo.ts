import { signal } from '@preact/signals';
import { type LineName, lineNames, lineOf } from '../state/tradeOrder.ts';

/** The line that is open. */
export const openLine = signal<LineName | null>(null);

/** What gets focus once the open line is on the page: a field by its path, or its first or last field. */
let wanted: { readonly path: string } | { readonly back: boolean } | null = null;

export const takeWanted = (): typeof wanted => {
  const taken = wanted;
  wanted = null;
  return taken;
};

/** Tells an open line that a field of it is wanted. */
export const wants = signal(0);

const open = (line: LineName, focus: NonNullable<typeof wanted>): void => {
  wanted = focus;
  openLine.value = line;
  wants.value += 1;
};

/** Opens the line of a field and puts focus there. */
export const goTo = (path: string): void => {
  const line = lineOf(path);
  if (line) open(line, { path });
};

/** Opens a line at its first field, or closes it where it is open. */
export const turnTo = (line: LineName): void => {
  if (openLine.value === line) openLine.value = null;
  else open(line, { back: false });
};

/** Opens the next line, or the one before, and puts focus on its first or last field; at the end of the order nothing happens. */
export const goOn = (from: LineName, back: boolean): void => {
  const line = lineNames[lineNames.indexOf(from) + (back ? -1 : 1)];
  if (line) open(line, { back });
};
