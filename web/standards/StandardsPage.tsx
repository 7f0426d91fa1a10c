import '../../core/words/otherEnds.ts';
import { Fragment, type TargetedEvent } from 'preact';
import { useEffect, useLayoutEffect } from 'preact/hooks';
import { type StandardPage, standardPage } from '../../core/check/standardPage.ts';
import { listed } from '../../core/standards/listed.ts';
import type { Standard } from '../../core/standards/standard.ts';
import { significant } from '../../core/units/figures.ts';
import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { RichText } from '../ladder/RichText.tsx';
import { standardAddress } from '../shell/address.ts';
import { PageHead } from '../shell/PageHead.tsx';
import { listedAs, rulesOf, titled } from '../state/rules.ts';
import { CheckRules } from './CheckRules.tsx';

interface Props {
  /** Id of the standard that is read. */
  readonly id: string;
  /** Check at which it opens; empty for its head. */
  readonly rule: string;
}

const Picker = ({ id }: Pick<Props, 'id'>) => (
  <label class="standards-picker">
    Standard
    <select
      class="input"
      value={id}
      onChange={(event: TargetedEvent<HTMLSelectElement>) => {
        location.hash = standardAddress(event.currentTarget.value);
      }}
    >
      {listed.map((one) => (
        <option key={one.id} value={one.id}>
          {titled(one)}
        </option>
      ))}
    </select>
  </label>
);

const Facts = ({ page }: { readonly page: StandardPage }) => (
  <dl class="standards-facts">
    <dt>Factors</dt>
    <dd>
      {page.factors.map(({ symbol, value }, at) => (
        <span key={symbol}>
          {at > 0 && ', '}
          <RichText text={symbol} manner="formula" /> {significant(value, 5)}
        </span>
      ))}
    </dd>
    {Object.entries(page.options).map(([key, [first, ...others]]) => (
      <Fragment key={key}>
        <dt>{optionName(key)}</dt>
        <dd>
          <b>{optionValue(first)}</b>, or {others.map(optionValue).join(', ')}
        </dd>
      </Fragment>
    ))}
    <dt>Steels of sections</dt>
    <dd>{page.grades.join(', ')}</dd>
    <dt>Steels of plates</dt>
    <dd>{page.plateGrades.join(', ')}</dd>
    <dt>Bolts</dt>
    <dd>{page.boltGrades.join(', ')}</dd>
  </dl>
);

const Rules = ({ standard, rule }: { readonly standard: Standard; readonly rule: string }) => {
  const page = standardPage(standard);
  useLayoutEffect(() => {
    if (rule) document.getElementById(`rule-${rule}`)?.scrollIntoView();
    else scrollTo(0, 0);
  }, [page.id, rule]);
  return (
    <>
      <p>
        The reaction is given at {page.level} level. What stands here is written from the rules that run: the formula
        that is read is the formula that is computed. Local codes govern; licensed practice decides.
      </p>
      <Facts page={page} />
      {page.checks.map((one) => (
        <CheckRules key={one.id} check={one} />
      ))}
    </>
  );
};

const said = {
  coming: 'The rules are on their way.',
  missed: 'The rules could not be loaded; they come once there is a network.',
} as const;

/** Everything that a design standard says here, generated from the rules that run: to read, to search, to print. */
export const StandardsPage = ({ id, rule }: Props) => {
  const rules = rulesOf(id);
  const known = listedAs(id);
  useEffect(() => {
    document.title = `${known ? titled(known) : 'Standards'} – Copewright`;
  }, [id]);
  return (
    <>
      <PageHead />
      <main class="standards" id="standards">
        <header class="standards-head">
          <h1>{known ? titled(known) : 'Standards'}</h1>
          <Picker id={id} />
        </header>
        {rules === undefined && <p role="status">This version does not have the standard {id}.</p>}
        {typeof rules === 'string' && <p role="status">{said[rules]}</p>}
        {typeof rules === 'object' && <Rules standard={rules} rule={rule} />}
      </main>
    </>
  );
};
