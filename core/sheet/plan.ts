import { type Row, rowsOf, rowsWithin } from './checkRows.ts';
import { tableZone } from './checkTable.ts';
import type { Context, Zone } from './context.ts';
import { type Figure, type Figures, figuresOf } from './figure.ts';
import { footingZone } from './footing.ts';
import { givenZone } from './given.ts';
import { limitsZone } from './limitsZone.ts';
import { FIGURE_TOP } from './page.ts';
import type { Code } from './qr.ts';
import { stressNumbers, stressProfiles } from './stressZone.ts';
import { workingElsewhere, workingZones } from './workingZone.ts';

/** Widths of figure and data, mm. */
export const FIGURE_WIDTH = 113;
export const DATA_WIDTH = 65;
const STRESS_SCALES = [2, 5, 10, 20] as const;
/** Most that the stress profiles may take, the air above them, and what the figure may get beyond its need, mm. */
const STRESS_HEIGHT = 72;
const AIR = 1.2;
const SPARE = 6;

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
  /** Profiles of the shear stress at standard scales, the largest first, and the same in numbers alone. */
  readonly profiles: readonly Zone[];
  readonly stressInNumbers: Zone;
  /** mm between verdict and title block. */
  readonly room: number;
}

/** How the shear stress is shown: profiles, or numbers where these leave no room. */
type Showing = 'profiles' | 'numbers';

/** The largest that fits a height; the smallest where none does. */
const stressWithin = ({ profiles, stressInNumbers }: Parts, showing: Showing, height: number): Zone => {
  if (showing === 'numbers') return stressInNumbers;
  return profiles.find((zone) => zone.height <= Math.min(height, STRESS_HEIGHT)) ?? profiles.at(-1)!;
};

interface Choice {
  readonly showing: Showing;
  readonly scale: number;
  readonly labelled: boolean;
}

/** What stands below figure and data. */
interface Below {
  readonly rows: readonly Row[];
  readonly working: Zone | null;
}

/** Height left for figure and data, mm. */
const roomAbove = ({ context, room, footing, limits }: Parts, { rows, working }: Below): number =>
  room - (tableZone(context, rows).height + footing.height + (working?.height ?? 0) + limits.height);

/** Height that the data need at least. */
const dataHeight = (parts: Parts, showing: Showing): number =>
  parts.given.height + AIR + stressWithin(parts, showing, 0).height;

/** The first sheet with this figure, fit or not. */
const laidOut = (parts: Parts, figure: Figure, showing: Showing, below: Below): Plan => {
  const { context, given, footing, limits } = parts;
  const { rows, working } = below;
  const least = Math.max(figure.height, dataHeight(parts, showing));
  const upper = least + Math.max(0, Math.min(roomAbove(parts, below) - least, SPARE));
  const stress = stressWithin(parts, showing, upper - given.height - AIR);
  const later = parts.rows.slice(rows.length);
  const table = tableZone(context, rows);
  return { figure, given, stress, table, footing, working, limits, upper, later, workingLater: false };
};

/** The first sheet under these choices; null where it does not fit. Only figures that may fit are laid out. */
const planned = (parts: Parts, { showing, scale, labelled }: Choice, below: Below): Plan | null => {
  const { figures } = parts;
  const height = roomAbove(parts, below);
  const fits = (one: { width: number; height: number }): boolean => one.height <= height && one.width <= FIGURE_WIDTH;
  if (dataHeight(parts, showing) > height || !fits(figures.least(scale))) return null;
  const figure = figures.at(scale, labelled);
  return fits(figure) ? laidOut(parts, figure, showing, below) : null;
};

/** Every choice: a large figure matters more than profiles, these more than words that the data repeat. */
const choices = ({ figures }: Parts): Choice[] => {
  const [large, small] = [figures.scales.slice(0, 2), figures.scales.slice(2)];
  return [large, small].flatMap((scales) =>
    (['profiles', 'numbers'] as const).flatMap((showing) =>
      scales.flatMap((scale) => [true, false].map((labelled) => ({ showing, scale, labelled }))),
    ),
  );
};

/** All on one sheet: the largest figure first, then the fullest working. */
const onOneSheet = (parts: Parts): Plan | null => {
  const { rows } = parts;
  const workings = workingZones(parts.context);
  for (const choice of choices(parts)) {
    for (const working of workings) {
      const plan = planned(parts, choice, { rows, working });
      if (plan) return plan;
    }
  }
  return null;
};

/** The working on the next sheet; where that is not enough, the table goes on there too. */
const onMore = (parts: Parts): Plan => {
  const { context, rows, figures, room, footing, limits } = parts;
  const working = workingElsewhere(context, 2);
  for (const choice of choices(parts)) {
    const plan = planned(parts, choice, { rows, working });
    if (plan) return { ...plan, workingLater: true };
  }
  const figure = figures.smallest();
  const upper = Math.max(figure.height, dataHeight(parts, 'numbers'));
  const others = upper + footing.height + limits.height + working.height;
  const first = rows.slice(0, Math.max(1, rowsWithin(rows, room - others)));
  return { ...laidOut(parts, figure, 'numbers', { rows: first, working }), workingLater: true };
};

/** Shares the first sheet out, with a square code beside the piece where there is room; text never gets smaller, what does not fit goes on further sheets. */
export const planOf = (context: Context, blockTop: number, code: Code | null): Plan => {
  const room = blockTop - FIGURE_TOP - 0.6;
  const parts: Parts = {
    context,
    rows: rowsOf(context),
    given: givenZone(context, DATA_WIDTH),
    footing: footingZone(context),
    limits: limitsZone(context),
    profiles: stressProfiles(context, DATA_WIDTH, STRESS_SCALES),
    stressInNumbers: stressNumbers(context, DATA_WIDTH),
    figures: figuresOf(context, FIGURE_WIDTH, room, code),
    room,
  };
  return onOneSheet(parts) ?? onMore(parts);
};
