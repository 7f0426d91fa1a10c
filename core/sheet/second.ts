import { type Beside, besideOf } from '../check/besideOf.ts';
import { complete } from '../check/complete.ts';
import type { Examined, ExaminedNumbers } from '../check/examined.ts';
import { withWorkings } from '../check/workings.ts';
import type { WorkingRow } from '../formula/working.ts';
import type { Context, Second, SheetInput, Under } from './context.ts';

/** One page speaks one region's words: those of the first standard. */
const inWordsOfFirst = (input: SheetInput): SheetInput => {
  const { end, report } = input;
  return { ...input, end: { ...end, sheet: { ...end.sheet, words: report.words } } };
};

/** Any reaction that is not 0, N. */
const SOME_REACTION = 1000;

/** Without a reaction: the steps that do not change with it. */
const withStrengths = (examined: ExaminedNumbers): Examined => {
  const at = (V: number) => withWorkings({ ...examined, facts: { ...examined.facts, V } }).report.checks;
  const key = ({ symbol, numbers, value }: WorkingRow): string => [symbol, numbers, value].join('|');
  const moved = at(SOME_REACTION);
  const { report, ...rest } = complete(examined, { working: false });
  const checks = at(0).map((check, i) => {
    const kept = new Set(moved[i]?.working?.map(key));
    return check.working ? { ...check, working: check.working.filter((row) => kept.has(key(row))) } : check;
  });
  return { ...rest, report: { ...report, checks } };
};

const inFull = ({ examined, stated }: Beside): Examined =>
  stated ? complete(examined, { working: true }) : withStrengths(examined);

/** What the sheet says under the second standard that its end names; or why it says nothing. */
export const withSecond = (under: Under): Context => {
  const found = besideOf(inWordsOfFirst(under.input));
  if (found === null) return { ...under, second: null, fault: '' };
  if ('faults' in found) return { ...under, second: null, fault: found.faults[0]?.text ?? '' };
  const second: Second = { ...under, input: inFull(found), stated: found.stated };
  return { ...under, second, fault: '' };
};

/** True where the second standard is checked at a reaction of its own: the other level's, or the least that it asks for. */
export const hasOwnReaction = ({ input, second }: Context): boolean => {
  if (!second?.stated) return false;
  const [one, other] = [input.report, second.input.report];
  return one.level !== other.level || Math.abs(one.reaction - other.reaction) > 1e-9 * one.reaction;
};
