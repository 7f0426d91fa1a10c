import type { MadeCard } from '../../card/card.ts';
import { fromSystem } from '../../units/systems.ts';
import { wordsFor } from '../../words/wordsFor.ts';
import type { Context } from '../context.ts';
import { fittingName } from '../givenWords.ts';
import { numbersOf } from '../numbers.ts';
import type { Pen } from '../pen.ts';

/** What every zone of the card draws with and from. */
export interface CardContext extends Context {
  readonly made: MadeCard;
}

/** The card as the zones that it shares with the sheet read it: one end, with what holds for every cell in place of its own. */
export const contextOf = (made: MadeCard, pen: Pen): CardContext => {
  const { card, end, like, standings } = made;
  const { assumptions, notes, fingerprint } = card;
  return {
    made,
    pen,
    input: { ...like, end, report: { ...like.report, checks: standings, assumptions, notes, fingerprint } },
    numbers: numbersOf(card.units, end.sheet?.decimal ?? '.'),
    words: wordsFor(card.words),
    second: null,
    fault: '',
  };
};

/** A length in the template's own unit, as the drawing states it. */
export const size = ({ numbers }: CardContext, value: number): string =>
  numbers.mm(fromSystem(value, '1,0', numbers.units));

/** What the bolts pass through beside the web, in the region's word. */
export const plateName = ({ words, made }: CardContext): string => fittingName(words, made.card.joint);
