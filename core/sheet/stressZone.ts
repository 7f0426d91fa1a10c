import type { Check, SectionStress } from '../check/report.ts';
import { fromSystem } from '../units/systems.ts';
import type { Context, Zone } from './context.ts';
import { body, DOTTED, HAIR, NARROW, WIDE } from './page.ts';
import type { Pen, TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { plainRun, setLines, wrap } from './textBlock.ts';

const HEADING = 4.4;
const LEADING = 3.6;
const LABELS = 3.7;
/** Between ordinates, mm of paper. */
const ORDINATES = 2.4;
/** Between a profile and the number of its peak, mm. */
const PEAK = 1;
const style: TextStyle = { ...body, family: 'narrow' };

/** Standard's own limit and the reaction that reaches it, where the standard has one. */
const limitOf = ({ input, numbers }: Context, section: SectionStress): string[] => {
  const wanted = section.name === 'full' ? 'stress-full' : 'stress-cope';
  const check = input.report.checks.find(({ id }) => id === wanted);
  if (!check || !speaksOf(check, section) || check.resistance === null) return [];
  const limit = say.limitAt(numbers.amount(check.resistance, 'MPa'));
  return [`${limit} ${numbers.failsAt(check.reactionAtFailure)}`];
};

const speaksOf = ({ of = '' }: Check, { name }: SectionStress): boolean => !of || name.startsWith(of);

const captionOf = (context: Context, section: SectionStress): string[] => {
  const { numbers } = context;
  return [
    `${say.mean} ${numbers.amount(section.meanStress, 'MPa')}`,
    `${say.yieldAt} ${numbers.failsAt(section.firstYieldReaction)}`,
    ...limitOf(context, section),
  ];
};

const drawHeading = ({ pen, numbers }: Context, x: number, y: number): void => {
  const note = ` ${say.stressNote(numbers.stress, numbers.force)}`;
  pen.text(x, y + 3.2, [plainRun(`${say.stress} `, true), ...richText('V Q/(I t)'), plainRun(note)], style);
};

/** Shear stress over the depth of each section, levels to each of the scales 1:`scale`; `width` mm wide. */
export const stressProfiles = (context: Context, width: number, scales: readonly number[]): Zone[] => {
  const { pen, input, numbers } = context;
  const { sections } = input.report.shape;
  const column = width / sections.length;
  const captions = sections.map((one) =>
    captionOf(context, one).flatMap((line) => wrap(pen, richText(line, 'prose'), style, column - 1)),
  );
  const captionLines = Math.max(...captions.map((lines) => lines.length));
  const depth = Math.max(...sections.map(({ profile }) => profile.at(-1)![0]));
  const most = Math.max(...sections.map(({ peakStress }) => peakStress), 1e-9);
  const label = pen.width(numbers.amount(most, 'MPa'), style) + PEAK + 0.5;
  const perStress = (Math.min(column, 31) - label - 2) / most;
  return scales.map((scale): Zone => {
    const toPaper = (level: number): number => fromSystem(level, '1,0', numbers.units) / scale;
    const draw = (x: number, y: number): void => {
      drawHeading(context, x, y);
      sections.forEach((section, i) => {
        const left = x + i * column;
        pen.text(left, y + HEADING + 3, say.sections[section.name], style);
        drawProfile(context, section, left, y + HEADING + LABELS, toPaper, perStress);
        setLines(pen, left, y + HEADING + LABELS + toPaper(depth) + 4, captions[i]!, style, LEADING);
      });
    };
    return { height: HEADING + LABELS + toPaper(depth) + 1.5 + captionLines * LEADING, draw };
  });
};

/** The same in numbers alone, one line a section, where the page has no room for profiles. */
export const stressNumbers = (context: Context, width: number): Zone => {
  const { pen, input, numbers } = context;
  const lines = input.report.shape.sections.flatMap((section) => {
    const peak = `${say.peak} ${numbers.amount(section.peakStress, 'MPa')}`;
    const text = `${say.sections[section.name]}: ${[peak, ...captionOf(context, section)].join(', ')}`;
    return wrap(pen, richText(text, 'prose'), style, width);
  });
  return {
    height: HEADING + lines.length * LEADING,
    draw: (x, y) => {
      drawHeading(context, x, y);
      setLines(pen, x, y + HEADING + 2.9, lines, style, LEADING);
    },
  };
};

const drawProfile = (
  { pen, numbers }: Context,
  section: SectionStress,
  left: number,
  top: number,
  toPaper: (level: number) => number,
  perStress: number,
): void => {
  const points = section.profile.map(([level, tau]) => ({ x: left + tau * perStress, y: top + toPaper(level) }));
  const [first, last] = [points[0]!, points.at(-1)!];
  drawOrdinates(pen, points, left);
  pen.path({ x: left, y: first.y }, [...points, { x: left, y: last.y }], { width: 0.35 });
  pen.line(left, first.y, left, last.y, WIDE);
  const mean = left + section.meanStress * perStress;
  pen.line(mean, first.y, mean, last.y, NARROW, [2.2, 0.8]);
  const peak = { x: left + section.peakStress * perStress, y: top + toPaper(section.peakAt) };
  // No stroke before the number, which would read as a minus sign.
  pen.line(left - 1.2, peak.y, peak.x, peak.y, HAIR, [3, 0.7, 0.3, 0.7]);
  pen.text(peak.x + PEAK, peak.y + 1.1, numbers.amount(section.peakStress, 'MPa'), style);
};

/** Fine ordinates that show the area as stress. */
const drawOrdinates = (pen: Pen, points: readonly { x: number; y: number }[], left: number): void => {
  const last = points.at(-1)!.y;
  let k = 1;
  for (let y = points[0]!.y + ORDINATES / 2; y < last; y += ORDINATES) {
    while (k < points.length - 1 && points[k]!.y < y) k += 1;
    const [a, b] = [points[k - 1]!, points[k]!];
    const share = b.y === a.y ? 1 : (y - a.y) / (b.y - a.y);
    const x = a.x + share * (b.x - a.x);
    if (x - left > 0.3) pen.line(left, y, x, y, HAIR, DOTTED);
  }
};
