import type { Check } from '../check/report.ts';
import type { Context, Zone } from './context.ts';
import { body, LEFT, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { type Lines, plainRun, setLines, wrap } from './textBlock.ts';
import { governingOf } from './verdictLine.ts';
import { titleOf } from './verdictSentence.ts';
import { ratioText, type Step, shortLine, stepsOf, wholeLine } from './workingLines.ts';

const HEADING = 4.6;
const LEADING = 4;
const INDENT = 4;
const style: TextStyle = { ...body, family: 'narrow' };

/** Clause and basis, as they follow a title. */
export const sourceText = ({ clause, basis }: Check): string => {
  const named = /^[\d.]+$/.test(clause) ? `${say.clause} ${clause}` : clause;
  return [named, basis === clause ? '' : basis].filter(Boolean).join(', ');
};

const headingOf = (context: Context, check: Check): SetRun[] => {
  const { numbers } = context;
  const ratio = ratioText(context, check);
  const printed = numbers.ratio(check.utilisation);
  return [
    plainRun(`${say.working}${titleOf(check).charAt(0).toLowerCase()}${titleOf(check).slice(1)}`, true),
    plainRun(`  ${sourceText(check)}${ratio ? `;  ${say.ratioIs} ${ratio}, ${say.printed} ${printed}` : ''}`),
  ];
};

const broken = (context: Context, runs: readonly SetRun[]): SetRun[][] =>
  wrap(context.pen, runs, style, WIDTH - INDENT);

/** One line of the block, with a second step beside the first where both are short. */
interface Line {
  readonly left: readonly SetRun[];
  right?: readonly SetRun[];
}

/** Demand and resistance with their numbers, the steps before them by formula and value. */
const shortLines = (context: Context, steps: readonly Step[]): SetRun[][] => {
  const closing = steps.filter(({ closes }) => closes).flatMap((step) => broken(context, wholeLine(step, true)));
  const others = steps.filter(({ closes }) => !closes);
  if (others.length === 0) return closing;
  const list = others.flatMap((step, i) => [...(i > 0 ? [plainRun('; ')] : []), ...shortLine(step)]);
  return [...closing, ...broken(context, [plainRun(say.with), ...list])];
};

/** Every step with its numbers, one below the other; two short ones share a line. */
const fullLines = (context: Context, steps: readonly Step[]): Line[] => {
  const { pen } = context;
  const half = (WIDTH - INDENT) / 2;
  const lines: (Line & { open: boolean })[] = [];
  for (const step of steps) {
    const runs = wholeLine(step, true);
    const short = pen.width(runs, style) <= half - 3;
    const last = lines.at(-1);
    if (short && last?.open) {
      last.right = runs;
      last.open = false;
      continue;
    }
    broken(context, runs).forEach((left) => {
      lines.push({ left, open: short });
    });
  }
  return lines;
};

/** The working of the check that governs, in full and in short; null where it has none. */
export const workingZones = (context: Context): readonly (Zone | null)[] => {
  const check = governingOf(context);
  const steps = check ? stepsOf(context, check) : [];
  if (!check || steps.length === 0) return [null];
  const heading = wrap(context.pen, headingOf(context, check), style, WIDTH);
  return [fullLines(context, steps), shortLines(context, steps).map((left) => ({ left }))].map((lines) =>
    zoneOf(context, heading, lines),
  );
};

const zoneOf = ({ pen }: Context, heading: Lines, lines: readonly Line[]): Zone => ({
  height: HEADING + (heading.length - 1 + lines.length) * LEADING,
  draw: (_x, y) => {
    setLines(pen, LEFT, y + 3.3, heading, style, LEADING);
    const top = y + 3.3 + (heading.length - 1) * LEADING;
    lines.forEach((line, i) => {
      const base = top + (i + 1) * LEADING + 0.2;
      pen.text(LEFT + INDENT, base, line.left, style);
      if (line.right) pen.text(LEFT + INDENT + (WIDTH - INDENT) / 2, base, line.right, style);
    });
  },
});

/** Says on which sheet the working stands. */
export const workingElsewhere = ({ pen }: Context, sheet: number): Zone => ({
  height: HEADING,
  draw: (_x, y) => {
    const runs = [plainRun(say.working, true), ...richText(say.onSheet(sheet), 'prose')];
    pen.text(LEFT, y + 3.3, runs, style);
  },
});
