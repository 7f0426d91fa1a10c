import { type Row, rowsOf, rowsWithin, tableZone } from './checkTable.ts';
import type { Context, Zone } from './context.ts';
import { type Figure, type Figures, figuresOf } from './figure.ts';
import { footingZone } from './footing.ts';
import { givenZone } from './given.ts';
import { limitsZone } from './limitsZone.ts';
import { BLOCK_HEIGHT, FIGURE_TOP } from './page.ts';
import { stressZone } from './stressZone.ts';
import { workingElsewhere, workingZone } from './workingZone.ts';

/** Widths of figure and data, mm. */
export const FIGURE_WIDTH = 113;
export const DATA_WIDTH = 65;
const STRESS_SCALES = [2, 5, 10, 20, 50] as const;
/** Most that the stress profiles may stand high, and the air between data and profiles. */
const STRESS_DEPTH = 48;
const AIR = 1.2;
/** Rows that the first sheet holds at least where the table goes on. */
const LEAST_ROWS = 8;

/** What stands on the first sheet, and what goes on further ones. */
export interface Plan {
  readonly figure: Figure;
  readonly given: Zone;
  readonly stress: Zone;
  readonly table: Zone;
  readonly footing: Zone;
  readonly working: Zone | null;
  readonly limits: Zone;
  /** Height of figure and data. */
  readonly upper: number;
  /** Rows of the table for further sheets. */
  readonly later: readonly Row[];
  /** True where the working of the governing check has no room here. */
  readonly workingLater: boolean;
}

interface Parts {
  readonly context: Context;
  readonly rows: readonly Row[];
  readonly given: Zone;
  readonly footing: Zone;
  readonly limits: Zone;
  readonly figures: Figures;
  /** mm between verdict and title block. */
  readonly room: number;
}

/** The largest profiles that fit a height, at a standard scale. */
const stressWithin = (context: Context, height: number): Zone => {
  const zones = STRESS_SCALES.map((scale) => stressZone(context, DATA_WIDTH, scale));
  return zones.find((zone) => zone.height <= Math.min(height, STRESS_DEPTH + 22)) ?? zones.at(-1)!;
};

/** Height that figure and data need at least. */
const upperOf = ({ context, given }: Parts, figure: Figure): number => {
  const least = stressWithin(context, 0).height;
  return Math.max(figure.height, given.height + AIR + stressZone(context, DATA_WIDTH, 20).height, least);
};

const planned = (parts: Parts, figure: Figure, rows: readonly Row[], working: Zone | null): Plan | null => {
  const { context, given, footing, limits, room } = parts;
  const table = tableZone(context, rows);
  const below = table.height + footing.height + (working?.height ?? 0) + limits.height;
  const least = upperOf(parts, figure);
  if (least + below > room || figure.width > FIGURE_WIDTH) return null;
  const spare = room - below - least;
  const upper = least + Math.min(spare, 6);
  const stress = stressWithin(context, Math.max(upper, figure.height) - given.height - AIR);
  const later = parts.rows.slice(rows.length);
  return { figure, given, stress, table, footing, working, limits, upper, later, workingLater: false };
};

/** All on one sheet: the largest figure first, then the fullest working. */
const onOneSheet = (parts: Parts): Plan | null => {
  const { context, rows, figures } = parts;
  for (const scale of figures.scales) {
    const figure = figures.at(scale);
    for (const fullness of ['full', 'short'] as const) {
      const plan = planned(parts, figure, rows, workingZone(context, fullness));
      if (plan) return plan;
    }
  }
  return null;
};

/** The working on the next sheet; where that is not enough, the table goes on there too. */
const onMore = (parts: Parts): Plan => {
  const { context, rows, figures, room, footing, limits } = parts;
  const elsewhere = workingElsewhere(context, 2);
  for (const scale of figures.scales) {
    const plan = planned(parts, figures.at(scale), rows, elsewhere);
    if (plan) return { ...plan, workingLater: true };
  }
  const others = footing.height + limits.height + elsewhere.height;
  for (const scale of figures.scales) {
    const figure = figures.at(scale);
    const count = rowsWithin(rows, room - upperOf(parts, figure) - others);
    if (count < LEAST_ROWS) continue;
    const plan = planned(parts, figure, rows.slice(0, count), elsewhere);
    if (plan) return { ...plan, workingLater: true };
  }
  const figure = figures.at(figures.scales.at(-1)!);
  const count = Math.max(1, rowsWithin(rows, room - upperOf(parts, figure) - others));
  const plan = planned(
    { ...parts, room: Number.POSITIVE_INFINITY },
    { ...figure, width: 0 },
    rows.slice(0, count),
    elsewhere,
  );
  return { ...plan!, workingLater: true };
};

/** Shares the first sheet out; text never gets smaller, what does not fit goes on further sheets. */
export const planOf = (context: Context, bottom: number, qrLeftOut: boolean): Plan => {
  const room = bottom - BLOCK_HEIGHT - FIGURE_TOP - 0.6;
  const parts: Parts = {
    context,
    rows: rowsOf(context),
    given: givenZone(context, DATA_WIDTH),
    footing: footingZone(context),
    limits: limitsZone(context, qrLeftOut),
    figures: figuresOf(context, FIGURE_WIDTH, room),
    room,
  };
  return onOneSheet(parts) ?? onMore(parts);
};
