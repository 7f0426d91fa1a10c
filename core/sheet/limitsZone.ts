import type { Check } from '../check/report.ts';
import type { Basis } from '../formula/tree.ts';
import type { Context, Zone } from './context.ts';
import { optionsFit } from './head.ts';
import { body, FOOT_LEADING, foot, LEADING, LEFT, WIDTH } from './page.ts';
import type { SetRun, TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { secondLimits } from './secondLimits.ts';
import { sheetWords as say } from './sheetWords.ts';
import { optionsText } from './standardNames.ts';
import { plainRun, setLines, wrap } from './textBlock.ts';

const order: readonly Basis[] = ['seen', 'memory', 'research', 'practice'];

/** Checks of both standards that say something. */
const applied = ({ input, second }: Context): Check[] =>
  [...input.report.checks, ...(second?.input.report.checks ?? [])].filter(({ state }) => state !== 'notApplicable');

/** What each standing of a formula means, for those that the sheet prints; beside a second standard with its letter. */
const basesText = (context: Context): string => {
  const { words, second } = context;
  const used = new Set(applied(context).map(({ basis }) => basis));
  const lines = order
    .filter((one) => used.has(one))
    .map((one) => `${second ? `${one.charAt(0)} ` : ''}${one}, ${words.bases[one] ?? ''}`);
  return lines.length > 0 ? `${say.basis}${lines.join('; ')}.` : '';
};

const unverified = (context: Context): boolean => applied(context).some(({ verified }) => verified === 'none');

/** Assumed values that the data beside the figure mark as assumed. */
const marked = new Set([
  'level',
  'top.radius',
  'bottom.radius',
  'joint.bolts.threads',
  'joint.bolts.holes',
  'joint.weld.electrode',
]);

/** `whole`: with what the data beside the figure say too. */
const zoneOf = (context: Context, whole: boolean): Zone => {
  const { pen, input, second } = context;
  const assumptions = input.report.assumptions.filter(({ path = '' }) => whole || !marked.has(path));
  const options = optionsFit(context) ? '' : `${say.options}${optionsText(context)}.`;
  const texts = [...assumptions, ...input.report.notes].map(({ text }) => text);
  const runs: SetRun[] = [
    plainRun(say.limits, true),
    ...richText([...texts, options].filter(Boolean).join(' '), 'prose'),
    plainRun(` ${[basesText(context), unverified(context) ? say.unverified : ''].filter(Boolean).join(' ')}`),
    ...(second ? secondLimits(context, second) : []),
  ];
  const style: TextStyle = { ...(second ? foot : body), family: 'narrow' };
  const leading = second ? FOOT_LEADING : LEADING;
  const lines = wrap(pen, runs, style, WIDTH);
  return {
    height: 0.8 + lines.length * leading,
    draw: (_x, y) => setLines(pen, LEFT, y + 3.2, lines, style, leading),
  };
};

/**
 * What was taken as true, notes, options where the head has no room, and what the marks of the table mean; beside a second standard its own too, and
 * for its room once more without what the page has said.
 */
export const limitsZones = (context: Context): readonly Zone[] =>
  (context.second ? [true, false] : [true]).map((whole) => zoneOf(context, whole));
