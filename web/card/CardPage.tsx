import { useEffect, useState } from 'preact/hooks';
import { capital } from '../../core/words/capital.ts';
import { Confirm } from '../shell/Confirm.tsx';
import { Notices } from '../shell/Notices.tsx';
import { PageHead } from '../shell/PageHead.tsx';
import { listing, words } from '../state/bench.ts';
import { carried } from '../state/carried.ts';
import { notice } from '../state/notice.ts';
import { titled } from '../state/rules.ts';
import { type Answer, answerTo, asked } from './asked.ts';
import { CardChoices } from './CardChoices.tsx';
import { CardLegend } from './CardLegend.tsx';
import { CardTable } from './CardTable.tsx';

/** The answer to what is asked; null until it is made. The page is drawn first, since a large family takes a while. */
const useAnswer = (): Answer | null => {
  const now = asked.value;
  const json = typeof now === 'object' && 'json' in now ? now.json : '';
  const [known, setKnown] = useState<{ readonly json: string; readonly answer: Answer } | null>(null);
  useEffect(() => {
    if (!json) return undefined;
    const timer = setTimeout(() => setKnown({ json, answer: answerTo(json) }), 20);
    return () => clearTimeout(timer);
  }, [json]);
  if (typeof now === 'object' && 'sentences' in now) return now;
  return known && known.json === json ? known.answer : null;
};

const Shown = ({ answer }: { readonly answer: Answer | null }) => {
  if (!answer) return <p role="status">The card is being made.</p>;
  if ('sentences' in answer) {
    return (
      <section class="fault-list" aria-labelledby="card-faults">
        <h2 id="card-faults">No card can be made</h2>
        <ul>
          {answer.sentences.map((text) => (
            <li key={text}>{text}</li>
          ))}
        </ul>
      </section>
    );
  }
  const { made } = answer;
  return (
    <>
      <p>
        <button type="button" class="button" onClick={() => void carried(({ issueCard }) => issueCard(made))}>
          Issue card
        </button>
      </p>
      <CardTable card={made.card} plate={made.card.joint === 'fin-plate' ? capital(words.value.finPlate) : 'Ply'} />
      <CardLegend made={made} />
    </>
  );
};

/** The shop card of the end on the bench: what each section carries with each count of bolt rows, to read and to issue as a PDF. */
export const CardPage = () => {
  const answer = useAnswer();
  const standard = listing.value;
  useEffect(() => {
    document.title = 'Shop card – Copewright';
    scrollTo(0, 0);
  }, []);
  return (
    <>
      <PageHead />
      <main class="standards" id="card">
        <Notices />
        <header class="standards-head">
          <h1>Shop card</h1>
          {standard && <p>{titled(standard)}</p>}
        </header>
        <p>
          The end on the bench is the template: its joint, cut and setback stay the same in every cell. Section, count
          of bolt rows and reaction are the card's.
        </p>
        <CardChoices />
        <p class="told" role="status">
          {notice.value?.kind === 'done' && notice.value.title}
        </p>
        <Shown answer={answer} />
      </main>
      <Confirm />
    </>
  );
};
