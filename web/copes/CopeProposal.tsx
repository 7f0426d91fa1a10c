/// <reference types="vite/client" />
import type { CopeAdvice, ProposedCope, ProposedSize } from '../../core/advice/copeFromSupport.ts';
import { showQuantity } from '../../core/units/printQuantity.ts';
import { unitOf } from '../../core/units/systems.ts';
import { adviceWordsFor } from '../../core/words/adviceWords.ts';
import { capital } from '../../core/words/capital.ts';
import { RichText } from '../ladder/RichText.tsx';
import { WorkingLines } from '../ladder/WorkingLines.tsx';
import { workingLines } from '../ladder/workingLines.ts';
import { singleKeys } from '../shell/singleKeys.ts';
import { region, units, words } from '../state/bench.ts';
import { isTaken, proposal, takeable } from './proposal.ts';
import { takeProposal } from './takeProposal.ts';

const names = { length: 'Length', depth: 'Depth', radius: 'Corner R' } as const;

const size = (value: number): string => showQuantity(value, '1,0', units.value);

const SizeRow = ({ field, value, rule, working }: ProposedSize) => (
  <li>
    <p>
      <b>
        {names[field.split('.')[1] as keyof typeof names]} {size(value)} {unitOf('1,0', units.value).name}
      </b>{' '}
      {adviceWordsFor(region.value).rules[rule]}
    </p>
    <WorkingLines lines={workingLines({ working, symbol: '', clause: '' })} />
  </li>
);

const Cope = ({ edge, proposed }: { readonly edge: 'Top' | 'Bottom'; readonly proposed: ProposedCope | null }) => (
  <>
    <h4>
      {edge} {words.value.cope}: {proposed ? `${size(proposed.cope.length)} by ${size(proposed.cope.depth)}` : 'none'}
    </h4>
    {proposed ? (
      <ul class="proposed-sizes">
        {proposed.sizes.map((one) => (
          <SizeRow key={one.field} {...one} />
        ))}
      </ul>
    ) : (
      <p>{adviceWordsFor(region.value).noneNeeded}</p>
    )}
  </>
);

/** What no size can meet. */
const Unmet = ({ unmet, faults }: CopeAdvice) => (
  <>
    {unmet.length > 0 && (
      <div class="field-fault">
        {adviceWordsFor(region.value).unmet}
        <ul>
          {unmet.map(({ id, title, reasonText }) => (
            <li key={id}>
              {title}
              {reasonText && (
                <>
                  {': '}
                  <RichText text={reasonText} />
                </>
              )}
            </li>
          ))}
        </ul>
      </div>
    )}
    {faults.map(({ code, path, text }) => (
      <p key={code + path} class="field-fault">
        {capital(text)}
      </p>
    ))}
  </>
);

const TakeButton = () => (
  <p class="proposed-take">
    <button
      type="button"
      class="button"
      aria-disabled={isTaken.value}
      aria-keyshortcuts={singleKeys.value ? 'C' : undefined}
      onClick={takeProposal}
    >
      Take this cut
    </button>{' '}
    {isTaken.value ? 'The end has this cut.' : singleKeys.value && 'or press C while no field has focus'}
  </p>
);

/** The copes that the support asks for, size by size with rule and numbers, to be taken as one step. */
export const CopeProposal = () => {
  const it = proposal.value;
  if (!it) return null;
  return (
    <section class="proposed" aria-labelledby="proposed-title">
      <h3 id="proposed-title">Cut that the support asks for</h3>
      {'sentences' in it ? (
        it.sentences.map((text) => <p key={text}>{text}</p>)
      ) : (
        <>
          <Cope edge="Top" proposed={it.advice.top} />
          <Cope edge="Bottom" proposed={it.advice.bottom} />
          <Unmet {...it.advice} />
          {takeable.value && <TakeButton />}
        </>
      )}
    </section>
  );
};
