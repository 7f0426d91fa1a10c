import { type Row, rowsOf, rowsWithin } from './checkRows.ts';
import { tableZone } from './checkTable.ts';
import type { Context, Zone } from './context.ts';
import { type Figure, type Figures, figuresOf } from './figure.ts';
import { type Choice, choices, type Showing } from './figureChoices.ts';
import { footingZones } from './footing.ts';
import { givenZone } from './given.ts';
import { limitsZones } from './limitsZone.ts';
import type { ViewsShown } from './piece.ts';
import type { Code } from './qr.ts';
import { figureTop } from './secondVerdict.ts';
import { stressNumbers, stressProfiles } from './stressZone.ts';
import { workingElsewhere, workingsInLines, workingWithAll, workingZones } from './workingZone.ts';

/** Widths of figure and data, mm. */
interface Widths {
  readonly figure: number;
  readonly data: number;
}

/** Beside a second standard the data are wider, for fewer lines. */
const widthsOf = ({ second }: Context): Widths => (second ? { figure: 108, data: 70 } : { figure: 113, data: 65 });
const STRESS_SCALES = [2, 5, 10, 20] as const;
/** Most that the stress profiles may take, the air above them, and what the figure may get beyond its need, mm. */
const STRESS_HEIGHT = 72;
const AIR = 1.2;
const SPARE = 6;

/** What stands on the first sheet, and what goes on further ones. */
export interface Plan {
  readonly widths: Widths;
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

/** Under the table, and under the working. */
interface Texts {
  readonly footing: Zone;
  readonly limits: Zone;
}

interface Parts {
  readonly context: Context;
  readonly rows: readonly Row[];
  readonly given: Zone;
  /** What stands around the working, the fullest first. */
  readonly texts: readonly Texts[];
  readonly figures: Figures;
  /** Profiles of the shear stress at standard scales, the largest first, and the same in numbers alone. */
  readonly profiles: readonly Zone[];
  readonly stressInNumbers: Zone;
  /** mm between verdict and title block. */
  readonly room: number;
  readonly widths: Widths;
}

/** The largest that fits a height; the smallest where none does. */
const stressWithin = ({ profiles, stressInNumbers }: Parts, showing: Showing, height: number): Zone => {
  if (showing === 'numbers') return stressInNumbers;
  return profiles.find((zone) => zone.height <= Math.min(height, STRESS_HEIGHT)) ?? profiles.at(-1)!;
};

/** What stands below figure and data. */
interface Below extends Texts {
  readonly rows: readonly Row[];
  readonly working: Zone | null;
}

/** Height left for figure and data, mm. */
const roomAbove = ({ context, room }: Parts, { rows, footing, working, limits }: Below): number =>
  room - (tableZone(context, rows).height + footing.height + (working?.height ?? 0) + limits.height);

/** Height that the data need at least. */
const dataHeight = (parts: Parts, showing: Showing): number =>
  parts.given.height + AIR + stressWithin(parts, showing, 0).height;

/** The first sheet with this figure, fit or not. */
const laidOut = (parts: Parts, figure: Figure, showing: Showing, below: Below): Plan => {
  const { context, given } = parts;
  const { rows, footing, working, limits } = below;
  const least = Math.max(figure.height, dataHeight(parts, showing));
  const upper = least + Math.max(0, Math.min(roomAbove(parts, below) - least, SPARE));
  const stress = stressWithin(parts, showing, upper - given.height - AIR);
  const later = parts.rows.slice(rows.length);
  const table = tableZone(context, rows);
  return {
    widths: parts.widths,
    figure,
    given,
    stress,
    table,
    footing,
    working,
    limits,
    upper,
    later,
    workingLater: false,
  };
};

/** The first sheet under these choices; null where it does not fit. Only figures that may fit are laid out. */
const planned = (parts: Parts, { showing, scale, labelled }: Choice, below: Below): Plan | null => {
  const { figures, widths } = parts;
  const height = roomAbove(parts, below);
  const fits = (one: { width: number; height: number }): boolean => one.height <= height && one.width <= widths.figure;
  if (dataHeight(parts, showing) > height || !fits(figures.least(scale))) return null;
  const figure = figures.at(scale, labelled);
  return fits(figure) ? laidOut(parts, figure, showing, below) : null;
};

/** What may stand below the figure, the fullest first: of text and working the text gives way first. */
const belows = ({ rows, texts }: Parts, workings: readonly (Zone | null)[]): Below[] =>
  workings.flatMap((working) => texts.map((text) => ({ rows, working, ...text })));

/** All on one sheet: the largest figure first, then the fullest text. */
const onOneSheet = (parts: Parts, workings: readonly (Zone | null)[]): Plan | null => {
  const all = belows(parts, workings);
  for (const choice of choices(parts.figures)) {
    for (const below of all) {
      const plan = planned(parts, choice, below);
      if (plan) return plan;
    }
  }
  return null;
};

/** The working on the next sheet; where that is not enough, the table goes on there too. */
const onMore = (parts: Parts): Plan => {
  const { context, rows, figures, room, texts } = parts;
  const working = workingElsewhere(context, 2);
  const plan = onOneSheet(parts, [working]);
  if (plan) return { ...plan, workingLater: true };
  const { footing, limits } = texts.at(-1)!;
  const figure = figures.smallest();
  const upper = Math.max(figure.height, dataHeight(parts, 'numbers'));
  const others = upper + footing.height + limits.height + working.height;
  const first = rows.slice(0, Math.max(1, rowsWithin(context, rows, room - others)));
  return { ...laidOut(parts, figure, 'numbers', { rows: first, working, footing, limits }), workingLater: true };
};

const textsOf = (context: Context): Texts[] => {
  const limits = limitsZones(context);
  return footingZones(context).map((footing, i) => ({ footing, limits: limits[i]! }));
};

/** Two standards on one sheet: rather the last lines of the working than a second sheet, rather none. */
const pairedOnOneSheet = (parts: Parts): Plan | null => {
  const { context } = parts;
  if (!context.second) return null;
  return onOneSheet(parts, workingsInLines(context)) ?? onOneSheet(parts, [workingWithAll(context)]);
};

const wholeOn = (parts: Parts): Plan | null =>
  onOneSheet(parts, workingZones(parts.context)) ?? pairedOnOneSheet(parts);

/**
 * Shares the first sheet out, with a square code beside the piece where there is room; text never gets smaller, what does not fit goes on
 * further sheets. The view on the support gives way before that.
 */
export const planOf = (context: Context, blockTop: number, code: Code | null): Plan => {
  const room = blockTop - figureTop(context) - 0.6;
  const widths = widthsOf(context);
  const figures = (shown: ViewsShown): Figures =>
    figuresOf(context, shown, { width: widths.figure, height: room }, code);
  const parts: Parts = {
    context,
    rows: rowsOf(context),
    given: givenZone(context, widths.data),
    texts: textsOf(context),
    profiles: stressProfiles(context, widths.data, STRESS_SCALES),
    stressInNumbers: stressNumbers(context, widths.data),
    figures: figures('all'),
    room,
    widths,
  };
  const plan = wholeOn(parts);
  if (plan || parts.figures.views === 1) return plan ?? onMore(parts);
  const side = { ...parts, figures: figures('side') };
  const { scales, smallest } = parts.figures;
  return wholeOn(side) ?? onMore(smallest().scale === scales.at(-1) ? parts : side);
};
