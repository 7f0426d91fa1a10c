import { shortOf } from '../../words/words.ts';
import type { Zone } from '../context.ts';
import { lower } from '../lower.ts';
import { FOOT_LEADING, foot, LEFT, WIDTH } from '../page.ts';
import type { SetRun } from '../pen.ts';
import { richText } from '../richText.ts';
import { sheetWords } from '../sheetWords.ts';
import { plainRun, setLines, wrap } from '../textBlock.ts';
import type { CardContext } from './cardContext.ts';
import { cardWords as say } from './cardWords.ts';
import { whyTexts } from './whyTexts.ts';

/** Between the columns of letters, and from a letter to its check, mm. */
const GAP = 3.5;
const INSET = 3.4;
/** Below the letters, mm. */
const AIR = 0.9;

/** Checks with a mark where no number from outside the program confirms them. */
const marksOf = ({ made }: CardContext) => {
  const none = new Set(made.standings.filter(({ verified }) => verified === 'none').map(({ id }) => String(id)));
  return (id: string): string => (none.has(id) ? ` ${sheetWords.unverifiedMark}` : '');
};

/** Letters with their checks, in columns. */
const lettersZone = (context: CardContext): Zone => {
  const { pen, made, words } = context;
  const mark = marksOf(context);
  const entries = made.card.checks.map((one) => ({ ...one, text: `${shortOf(words, one)}${mark(one.id)}` }));
  const widest = Math.max(0, ...entries.map(({ text }) => pen.width(text, { ...foot, bold: true })));
  const columns = Math.max(1, Math.floor((WIDTH + GAP) / (INSET + widest + GAP)));
  const high = Math.ceil(entries.length / columns);
  const step = (WIDTH + GAP) / Math.ceil(entries.length / Math.max(1, high));
  return {
    height: (1 + high) * FOOT_LEADING + AIR,
    draw: (_x, y) => {
      pen.text(LEFT, y + 3.3, [plainRun(say.letter, true), plainRun(say.legend)], foot);
      entries.forEach(({ letter, text, governs }, i) => {
        const x = LEFT + Math.floor(i / high) * step;
        const base = y + 3.3 + (1 + (i % high)) * FOOT_LEADING;
        pen.text(x, base, letter, { ...foot, bold: governs });
        pen.text(x + INSET, base, text, { ...foot, bold: governs });
      });
    },
  };
};

const ledBy = (lead: string, after: string, texts: readonly string[]): SetRun[] =>
  texts.length === 0 ? [] : [plainRun(lead, true), plainRun(after), ...richText(`${texts.join('; ')}.`, 'prose')];

const paragraphs = (context: CardContext): SetRun[][] => {
  const { made, numbers } = context;
  const mark = marksOf(context);
  const fit = made.card.fit.map(({ id, title }) => `${lower(title)}${mark(id)}`).join(', ');
  const whole = say.numbers(say.whole[numbers.force] ?? numbers.force);
  const all = [
    [plainRun(say.scope, true), plainRun(`${whole}${say.fit}${fit}.`)],
    ledBy(say.referred, say.refers, whyTexts(context, 'refer')),
    ledBy(say.blank, say.blanks, whyTexts(context, 'fails')),
  ];
  return all.filter(({ length }) => length > 0);
};

/** What the letters, words and blanks of the table mean. */
export const legendZone = (context: CardContext): Zone => {
  const { pen } = context;
  const letters = lettersZone(context);
  const lines = paragraphs(context).flatMap((runs) => wrap(pen, runs, foot, WIDTH));
  return {
    height: letters.height + lines.length * FOOT_LEADING + AIR,
    draw: (x, y) => {
      letters.draw(x, y);
      setLines(pen, LEFT, y + letters.height + 3.3, lines, foot, FOOT_LEADING);
    },
  };
};
