import { supportBoltsOf, webBoltsOf } from '../../end/jointParts.ts';
import { capital } from '../../words/capital.ts';
import { choiceText } from '../../words/choiceWords.ts';
import { drawJob, drawStandard, STANDARD } from '../head.ts';
import { FRAME, LEFT, TOP, VERDICT_TOP, WIDE, WIDTH } from '../page.ts';
import type { TextStyle } from '../pen.ts';
import { sheetWords } from '../sheetWords.ts';
import { oneLine } from '../textBlock.ts';
import type { CardContext } from './cardContext.ts';
import { cardWords as say } from './cardWords.ts';

const NAME: TextStyle = { size: 25, family: 'wide', bold: true };
/** Sizes in which the fitting is tried, the largest first. */
const LEADS: readonly TextStyle[] = [13, 11.5, 10].map((size) => ({ size, bold: true }));
const AFTER: TextStyle = { size: 11 };

/** Height of head and heading, mm. */
export const HEAD = VERDICT_TOP - TOP + 11;

const copesText = ({ input, words, numbers }: CardContext): string => {
  const { facts } = input;
  const cut = (edge: 'top' | 'bottom', name: string, length: number, depth: number): string[] =>
    length > 0 ? [`${sheetWords[edge]}${name} ${numbers.mm(length)} × ${numbers.mm(depth)}`] : [];
  const top = cut('top', ` ${words.cope}`, facts.ct, facts.dt);
  const copes = [...top, ...cut('bottom', top.length > 0 ? '' : ` ${words.cope}`, facts.cb, facts.db)];
  return copes.length > 0 ? copes.join(', ') : say.uncoped(words.cope);
};

/** The fitting in short, as a person asks for the card. */
const fittingText = (context: CardContext): string => {
  const { input, words, numbers } = context;
  const { joint } = input.end;
  const bolts = webBoltsOf(joint)?.bolts ?? supportBoltsOf(joint)!;
  const plate = capital(choiceText(words, 'joint.kind', joint.kind));
  const columns = input.facts.m > 1 ? `${input.facts.m} ${say.columns} ` : '';
  const grade = typeof bolts.grade === 'string' ? ` ${bolts.grade}` : '';
  return `${plate} ${numbers.mm(input.facts.tp)}, ${columns}${bolts.size}${grade}`;
};

/** The fitting with its copes in the largest type that takes them; where none does the copes are left to the data below. */
const leadOf = (context: CardContext, room: number) => {
  const fitting = fittingText(context);
  const lead = `${fitting}, ${copesText(context)}`;
  const style = LEADS.find((one) => context.pen.width(lead, one) <= room);
  return style ? { lead, style } : { lead: fitting, style: LEADS[0]! };
};

/** Name, job, standard; and under it the fitting and what the numbers are. */
export const drawCardHead = (context: CardContext): void => {
  const { pen, numbers, made } = context;
  pen.line(LEFT, TOP, LEFT + WIDTH, TOP, FRAME);
  const used = pen.text(LEFT - 0.3, TOP + 11.2, say.name, NAME);
  const standardLeft = LEFT + WIDTH - STANDARD;
  const jobLeft = LEFT + used + 5;
  drawJob(context, jobLeft, standardLeft - jobLeft - 3);
  drawStandard(context, standardLeft, say.title);
  pen.line(LEFT, VERDICT_TOP, LEFT + WIDTH, VERDICT_TOP, WIDE);
  const base = VERDICT_TOP + 6.6;
  const carries = say.carries(numbers.force, made.card.level);
  const room = WIDTH - pen.width(carries, AFTER) - 4;
  const { lead, style } = leadOf(context, room);
  pen.text(LEFT, base, oneLine(pen, lead, style, room), style);
  pen.text(LEFT + WIDTH, base, carries, { ...AFTER, anchor: 'end' });
  pen.line(LEFT, VERDICT_TOP + 9.6, LEFT + WIDTH, VERDICT_TOP + 9.6, WIDE);
};
