import type { MadeCard } from '../../core/card/card.ts';
import { cardWords as say } from '../../core/sheet/card/cardWords.ts';
import { whyTexts } from '../../core/sheet/card/whyTexts.ts';
import { lower } from '../../core/sheet/lower.ts';
import { sheetWords } from '../../core/sheet/sheetWords.ts';
import { unitOf } from '../../core/units/systems.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import { RichText } from '../ladder/RichText.tsx';

/** Checks and rules that no number from outside the program confirms. */
const unverified = ({ standings }: MadeCard): ReadonlySet<string> =>
  new Set(standings.filter(({ verified }) => verified === 'none').map(({ id }) => id));

const Led = ({ lead, after, texts }: { readonly lead: string; readonly after: string; readonly texts: string[] }) =>
  texts.length === 0 ? null : (
    <p>
      <b>{lead}</b>
      {after}
      <RichText text={`${texts.join('; ')}.`} />
    </p>
  );

/** What the letters, words and blanks of the table mean, what it does not promise, and what was taken as true. */
export const CardLegend = ({ made }: { readonly made: MadeCard }) => {
  const { card } = made;
  const words = wordsFor(card.words);
  const told = { made, words };
  const unsure = unverified(made);
  const mark = (id: string): string => (unsure.has(id) ? ` ${sheetWords.unverifiedMark}` : '');
  const force = unitOf('0,1', card.units).name;
  return (
    <section aria-labelledby="card-legend" class="card-legend">
      <h2 id="card-legend">What the table means</h2>
      <p>
        <b>{say.letter}</b>
        {say.legend}
      </p>
      <dl>
        {card.checks.map(({ id, letter, title, governs }) => (
          <div key={id} class={governs ? 'card-governs' : undefined}>
            <dt>{letter}</dt>
            <dd>
              {title}
              {mark(id)}
            </dd>
          </div>
        ))}
      </dl>
      <p>
        <b>{say.scope}</b>
        {say.numbers(say.whole[force] ?? force)}
        {say.fit}
        {card.fit.map(({ id, title }) => `${lower(title)}${mark(id)}`).join(', ')}.
      </p>
      <Led lead={say.referred} after={say.refers} texts={whyTexts(told, 'refer')} />
      <Led lead={say.blank} after={say.blanks} texts={whyTexts(told, 'fails')} />
      <p>
        <b>{sheetWords.limits}</b>
        <RichText text={[...card.assumptions, ...card.notes].map(({ text }) => text).join(' ')} />
      </p>
      {unsure.size > 0 && <p>{sheetWords.unverified}</p>}
      <p>
        <b>{words.cautions.join(' ')}</b>
      </p>
    </section>
  );
};
