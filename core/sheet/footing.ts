import type { Check } from '../check/report.ts';
import { sharedReasons } from './checkRows.ts';
import type { Context, Zone } from './context.ts';
import { limitText } from './fitLimit.ts';
import { foot, LEFT, WIDTH } from './page.ts';
import type { SetRun } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { plainRun, setLines, wrap } from './textBlock.ts';
import { titleOf } from './verdictSentence.ts';

const LEADING = 3.45;

const lower = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);

/** Clause, or the basis where the rule is no clause. */
const sourceOf = ({ clause, basis }: Check): string => (basis === 'practice' ? basis : `${say.clause} ${clause}`);

/** Rules of fit that hold, given and limit, those of one source together. */
const fitRuns = ({ input, numbers }: Context): SetRun[] => {
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
  const lead = broken ? say.otherFitHolds : say.fitHolds;
  return [plainRun(lead + mark, true), plainRun(`: ${groups.join('; ')}.`)];
};

/** What does not apply, each with its reason. */
const absentRuns = ({ input }: Context): SetRun[] => {
  const absent = input.report.checks.filter(({ state }) => state === 'notApplicable');
  if (absent.length === 0) return [];
  const reasons = [...new Set(absent.map(({ reasonText = '' }) => reasonText))];
  const groups = reasons.map((reason) => {
    const titles = absent.filter(({ reasonText = '' }) => reasonText === reason).map((one) => lower(titleOf(one)));
    return reason ? `${titles.join(', ')} (${reason})` : titles.join(', ');
  });
  return [plainRun(say.notApplicable, true), ...richText(`${groups.join('; ')}.`, 'prose')];
};

/** Reasons that several rows share, by their letters. */
const reasonRuns = (context: Context): SetRun[] => {
  const reasons = [...sharedReasons(context)].map(([reason, letter]) => `(${letter}) ${reason}`);
  return reasons.length > 0 ? [...richText(`${reasons.join('; ')}.`, 'prose')] : [];
};

/** Under the table: shared reasons, the rules of fit that hold, and what does not apply. */
export const footingZone = (context: Context): Zone => {
  const { pen } = context;
  const parts = [reasonRuns(context), fitRuns(context), absentRuns(context)].filter((part) => part.length > 0);
  const runs = parts.flatMap((part, i) => (i > 0 ? [plainRun(' '), ...part] : part));
  const lines = wrap(pen, runs, foot, WIDTH);
  return {
    height: lines.length === 0 ? 0 : 0.9 + lines.length * LEADING,
    draw: (_x, y) => setLines(pen, LEFT, y + 3.4, lines, foot, LEADING),
  };
};
