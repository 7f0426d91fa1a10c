import type { CardRow } from '../../card/card.ts';
import type { Zone } from '../context.ts';
import { sectionName } from '../given.ts';
import { FOOT_LEADING, foot, LEFT, WIDTH } from '../page.ts';
import type { SetRun } from '../pen.ts';
import { type Lines, plainRun, setLines, wrap } from '../textBlock.ts';
import type { CardContext } from './cardContext.ts';
import { stemOf } from './cardTable.ts';
import { cardWords as say } from './cardWords.ts';

const hasNumber = ({ cells }: CardRow): boolean => cells.some(({ verdict }) => verdict === 'holds');

/** The rows that the table prints: those with a number. */
export const listedRows = ({ made }: CardContext): readonly CardRow[] => made.card.sections.filter(hasNumber);

/** A designation stays on one line. */
const kept = (designation: string): string => designation.replaceAll(' ', '\u00a0');

/** Sections of one size together: UB 1016 × 305 × 584, 494; W18 × 50, 46. */
const named = (rows: readonly CardRow[]): string => {
  const sizes = new Map<string, string[]>();
  for (const { section } of rows) sizes.set(stemOf(section), [...(sizes.get(stemOf(section)) ?? []), section]);
  return [...sizes]
    .map(([stem, [first = '', ...others]]) =>
      [kept(sectionName(first)), ...others.map((one) => one.slice(stem.length + 1))].join(', '),
    )
    .join('; ');
};

const runsOf = (context: CardContext): SetRun[][] => {
  const rest = context.made.card.sections.filter((one) => !hasNumber(one));
  const referred = rest.filter(({ cells }) => cells.some(({ verdict }) => verdict === 'refer'));
  const left = rest.filter((one) => !referred.includes(one));
  return [[say.referredRows, referred] as const, [say.blankRows, left] as const].flatMap(([lead, rows]) =>
    rows.length > 0 ? [[plainRun(lead, true), plainRun(`${named(rows)}.`)]] : [],
  );
};

/** The sections that the table leaves out, in words. */
export const unlistedLines = (context: CardContext): Lines =>
  runsOf(context).flatMap((one) => wrap(context.pen, one, foot, WIDTH));

/** That they stand on another sheet. */
export const elsewhereLine = (sheet: number): Lines => [[plainRun(say.elsewhere(sheet))]];

const AIR = 0.9;

export const unlistedZone = ({ pen }: CardContext, lines: Lines): Zone => ({
  height: lines.length * FOOT_LEADING + (lines.length > 0 ? AIR : 0),
  draw: (_x, y) => setLines(pen, LEFT, y + 3.3, lines, foot, FOOT_LEADING),
});

/** How many lines fit a height. */
export const linesWithin = (height: number): number => Math.max(1, Math.floor((height - AIR) / FOOT_LEADING));
