import type { Check } from '../check/report.ts';
import type { Context, Zone } from './context.ts';
import { limitText } from './fitLimit.ts';
import { lower } from './lower.ts';
import { FOOT_LEADING, foot, LEFT, WIDTH } from './page.ts';
import type { SetRun } from './pen.ts';
import { sharedReasons } from './reasons.ts';
import { richText } from './richText.ts';
import { byReason, secondAbsent, secondFit } from './secondFooting.ts';
import { sheetWords as say } from './sheetWords.ts';
import { standardTitles } from './standardNames.ts';
import { plainRun, setLines, wrap } from './textBlock.ts';
import { titleOf } from './verdictSentence.ts';

/** Clause, or the basis where the rule is no clause. */
const sourceOf = ({ clause, basis }: Check): string => (basis === 'practice' ? basis : `${say.clause} ${clause}`);

/** Rules of fit that hold; given and limit, those of one source together, where `sizes` are told. */
const fitRuns = (context: Context, sizes: boolean): SetRun[] => {
  const { input, numbers, second } = context;
  const held = input.report.checks.filter(({ id, state }) => id.startsWith('fit-') && state === 'holds');
  if (held.length === 0) return [];
  const sources = [...new Set(held.map(sourceOf))];
  const groups = sources.map((source) => {
    const items = held
      .filter((one) => sourceOf(one) === source)
      .map((one) => {
        return `${lower(titleOf(one))} ${numbers.amount(one.resistance, one.unit)} ${limitText(numbers, one)}`;
      });
    return `${items.join('; ')} (${source})`;
  });
  const mark = held.some(({ verified }) => verified === 'none') ? ' *' : '';
  const broken = input.report.checks.some(
    ({ id, state }) => id.startsWith('fit-') && (state === 'fails' || state === 'refer'),
  );
  const whole = second ? say.fitHoldsUnder(standardTitles(context)[0]) : say.fitHolds;
  const lead = broken ? say.otherFitHolds : whole;
  return [plainRun(lead + mark, true), plainRun(sizes ? `: ${groups.join('; ')}.` : '.')];
};

/** What does not apply, each with its reason. */
const absentRuns = ({ input }: Context): SetRun[] => {
  const absent = input.report.checks.filter(({ state }) => state === 'notApplicable');
  if (absent.length === 0) return [];
  return [plainRun(say.notApplicable, true), ...richText(`${byReason(absent).join('; ')}.`, 'prose')];
};

/** Reasons that several rows share, by their letters. */
const reasonRuns = (context: Context): SetRun[] =>
  [...sharedReasons(context)].flatMap(([reason, letter], i, all) => [
    plainRun(`${i > 0 ? ' ' : ''}(${letter}) `),
    ...richText(`${reason}${i + 1 < all.length ? ';' : '.'}`, 'prose'),
  ]);

const zoneOf = (context: Context, sizes: boolean): Zone => {
  const { pen, second } = context;
  const others = second ? [secondFit(context, second), secondAbsent(context, second)] : [];
  const [own, absent] = [fitRuns(context, sizes), absentRuns(context)];
  const parts = [reasonRuns(context), own, absent, ...others].filter(({ length }) => length > 0);
  const runs = parts.flatMap((part, i) => (i > 0 ? [plainRun(' '), ...part] : part));
  const lines = wrap(pen, runs, foot, WIDTH);
  return {
    height: lines.length === 0 ? 0 : 0.9 + lines.length * FOOT_LEADING,
    draw: (_x, y) => setLines(pen, LEFT, y + 3.4, lines, foot, FOOT_LEADING),
  };
};

/**
 * Under the table: shared reasons, the rules of fit that hold, and what does not apply; the same in short under a second standard, for whose room the
 * sizes of what holds may be left out.
 */
export const footingZones = (context: Context): readonly Zone[] =>
  (context.second ? [true, false] : [true]).map((sizes) => zoneOf(context, sizes));
