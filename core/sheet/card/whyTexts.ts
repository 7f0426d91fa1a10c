import type { Card, Why } from '../../card/card.ts';
import { lower } from '../lower.ts';
import type { CardContext } from './cardContext.ts';
import { cardWords as say } from './cardWords.ts';

const whysOf = ({ sections }: Card, verdict: 'refer' | 'fails'): Why[] =>
  sections.flatMap(({ cells }) =>
    cells.flatMap((one) => (one.verdict !== 'holds' && one.verdict === verdict ? one.because : [])),
  );

type Told = Pick<CardContext, 'made' | 'words'>;

/** A fault in words that hold for every cell. */
const faultText = ({ words }: Told, code: string): string =>
  code === 'cope-too-deep' ? say.tooDeep(words.cope) : (say.faults[code] ?? say.otherFault);

/** Why cells have no number: each reason once, with the checks that give it. */
export const whyTexts = (context: Told, verdict: 'refer' | 'fails'): string[] => {
  const titles = new Map<string, Set<string>>();
  for (const { code, title, text } of whysOf(context.made.card, verdict)) {
    const reason = title ? lower(text.replace(/\.$/, '')) : faultText(context, code);
    const all = titles.get(reason) ?? new Set();
    titles.set(reason, title ? all.add(lower(title)) : all);
  }
  return [...titles].map(([reason, all]) => {
    const checks = [...all].join(', ');
    if (!reason || !checks) return reason || checks;
    return `${reason} (${checks})`;
  });
};
