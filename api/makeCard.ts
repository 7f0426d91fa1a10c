import type { MadeCard } from '../core/card/card.ts';
import { cardOf } from '../core/card/cardOf.ts';
import { said } from '../core/check/examine.ts';
import { read } from './checkText.ts';

/** What a card is asked for beside its template. */
export interface CardChoice {
  readonly family?: string;
  readonly sections?: readonly string[];
  readonly rows?: readonly number[];
}

type Found = ReturnType<typeof cardOf>;

/** The card that a text asks for. */
export const cardJson = (bytes: Uint8Array): Found => {
  const json = read(bytes);
  return 'fault' in json ? said([json.fault]) : cardOf(json.value);
};

/** The card of a template that is still text. */
export const cardOfEnd = (bytes: Uint8Array, choice: CardChoice): Found => {
  const json = read(bytes);
  return 'fault' in json ? said([json.fault]) : cardOf({ ...choice, end: json.value });
};

/** The card, printed, and a name for its file. */
export const printCard = async (
  made: MadeCard,
): Promise<{ readonly bytes: Uint8Array<ArrayBuffer>; readonly name: string }> => {
  // Loaded when it is first needed: most runs print no card.
  const { cardPdf } = await import('../core/sheet/card/card.ts');
  return { bytes: new Uint8Array(await cardPdf(made)), name: `shop-card-${made.card.fingerprint}.pdf` };
};
