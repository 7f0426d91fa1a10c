import type { CheckPage, Said, WayPage } from '../../core/check/standardPage.ts';
import type { FormulaCase, FormulaRow } from '../../core/formula/formulary.ts';
import { verifiedWords } from '../../core/words/verifiedWords.ts';
import { RichText } from '../ladder/RichText.tsx';

const When = ({ when }: Pick<FormulaCase, 'when'>) =>
  when === '' ? null : (
    <span class="rule-when">
      {when === 'otherwise' ? 'otherwise' : 'where '}
      {when !== 'otherwise' && <RichText text={when} />}
    </span>
  );

const Formula = ({ symbol, cases, under, note }: FormulaRow) => (
  <li>
    <span class="rule-symbol">
      <RichText text={symbol} manner="formula" />
    </span>
    <span class="rule-cases">
      {cases.map(({ expression, when }) => (
        <span key={`${expression} ${when}`} class="rule-case">
          {'= '}
          <RichText text={expression} manner="formula" /> <When when={when} />
        </span>
      ))}
      {under && (
        <span class="rule-note">
          for <RichText text={under} />
        </span>
      )}
      {note && (
        <span class="rule-note">
          <RichText text={note} />
        </span>
      )}
    </span>
  </li>
);

const Way = ({ of, formulas }: WayPage) => (
  <>
    {of && <h3>{of}</h3>}
    <ol class="rule-lines">
      {formulas.map((one, at) => (
        <Formula key={at} {...one} />
      ))}
    </ol>
  </>
);

const compares = (text: string): boolean => /[≤<>≥]/.test(text);

const Reasons = ({ word, all }: { readonly word: string; readonly all: readonly Said[] }) => {
  const reasons = new Map(all.map(({ when, reason }) => [`${reason} ${compares(when) ? when : ''}`, { when, reason }]));
  if (reasons.size === 0) return null;
  return (
    <p class="rule-reasons">
      <b>{word}:</b>{' '}
      {[...reasons.values()].map(({ when, reason }, at) => (
        <span key={reason + when}>
          {at > 0 && '; '}
          <RichText text={reason} />
          {compares(when) && (
            <>
              {' ('}
              <RichText text={when} />)
            </>
          )}
        </span>
      ))}
    </p>
  );
};

/** One check of a standard: its formulas in symbols with every branch, clause, basis, and when it refers or does not apply. */
export const CheckRules = ({ check }: { readonly check: CheckPage }) => {
  const { id, title, clause, basis, verified, noRule, ways, refers, notApplicable } = check;
  return (
    <section class="rule" id={`rule-${id}`} aria-labelledby={`rule-${id}-title`}>
      <h2 id={`rule-${id}-title`}>{title}</h2>
      <p class="rule-source">{noRule || `${clause}; ${basis}; ${verified && verifiedWords[verified]}`}</p>
      {ways.map((one, at) => (
        <Way key={at} {...one} />
      ))}
      <Reasons word="Refers" all={refers} />
      <Reasons word="Not applicable" all={notApplicable} />
    </section>
  );
};
