import type { Check } from '../check/report.ts';
import type { Context, Under, Zone } from './context.ts';
import { lower } from './lower.ts';
import { body, LEFT, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { sheetWords as say } from './sheetWords.ts';
import { standardTitles } from './standardNames.ts';
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

/** `lead`: what stands before the title. */
const headingOf = (context: Under, check: Check, lead: string): SetRun[] => {
  const { numbers } = context;
  const ratio = ratioText(context, check);
  const printed = numbers.ratio(check.utilisation);
  return [
    plainRun(`${lead}${lower(titleOf(check))}`, true),
    plainRun(`  ${sourceText(check)}${ratio ? `;  ${say.ratioIs} ${ratio}, ${say.printed} ${printed}` : ''}`),
  ];
};

const broken = (context: Under, runs: readonly SetRun[]): SetRun[][] => wrap(context.pen, runs, style, WIDTH - INDENT);

/** One line of the block, with a second step beside the first where both are short. */
interface Line {
  readonly left: readonly SetRun[];
  right?: readonly SetRun[];
}

/** Demand and resistance alone, with their numbers. */
const closingLines = (context: Under, steps: readonly Step[]): SetRun[][] =>
  steps.filter(({ closes }) => closes).flatMap((step) => broken(context, wholeLine(step, true)));

/** Demand and resistance with their numbers, the steps before them by formula and value. */
const shortLines = (context: Under, steps: readonly Step[]): SetRun[][] => {
  const closing = closingLines(context, steps);
  const others = steps.filter(({ closes }) => !closes);
  if (others.length === 0) return closing;
  const list = others.flatMap((step, i) => [...(i > 0 ? [plainRun('; ')] : []), ...shortLine(step)]);
  return [...closing, ...broken(context, [plainRun(say.with), ...list])];
};

/** Every step with its numbers, one below the other; two short ones share a line. */
const fullLines = (context: Under, steps: readonly Step[]): Line[] => {
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

/** The working of the check that governs, in full, in short, and its last lines alone; none where it has none. */
const zonesOf = (context: Under, lead: string): readonly Zone[] => {
  const check = governingOf(context);
  const steps = check ? stepsOf(context, check) : [];
  if (!check || steps.length === 0) return [];
  const heading = wrap(context.pen, headingOf(context, check, lead), style, WIDTH);
  const [short, closing] = [shortLines, closingLines].map((of) => of(context, steps).map((left) => ({ left })));
  return [fullLines(context, steps), short!, closing!].map((lines) => zoneOf(context, heading, lines));
};

const stacked = (above: Zone, below: Zone): Zone => ({
  height: above.height + below.height,
  draw: (x, y) => {
    above.draw(x, y);
    below.draw(x, y + above.height);
  },
});

/** Workings of the checks that govern, the fullest first: those of both standards, then the first's alone; null where there is none. */
export const workingZones = (context: Context): readonly (Zone | null)[] => {
  const { second } = context;
  const [one, two] = standardTitles(context);
  const [full, short] = zonesOf(context, second ? say.workingUnder(one) : say.working);
  if (!full || !short) return [null];
  if (!second) return [full, short];
  const [fullOther, shortOther] = second.stated ? zonesOf(second, say.workingUnder(two)) : [];
  const both =
    fullOther && shortOther ? [stacked(full, fullOther), stacked(full, shortOther), stacked(short, shortOther)] : [];
  return [...both, full, short];
};

const zoneOf = ({ pen }: Under, heading: Lines, lines: readonly Line[]): Zone => ({
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

/** The last lines alone of the working of the check that governs under the first of two standards; none where it has none. */
export const workingsInLines = (context: Context): readonly Zone[] =>
  zonesOf(context, say.workingUnder(standardTitles(context)[0])).slice(2);

const remark = ({ pen }: Under, text: string): Zone => ({
  height: HEADING,
  draw: (_x, y) => {
    pen.text(LEFT, y + 3.3, [plainRun(say.working, true), plainRun(text)], style);
  },
});

/** Says on which sheet the working stands. */
export const workingElsewhere = (context: Context, sheet: number): Zone => remark(context, say.onSheet(sheet));

/** Says that the working comes with those of all checks. */
export const workingWithAll = (context: Context): Zone => remark(context, say.withAll);
