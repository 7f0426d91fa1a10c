import { useSignal } from '@preact/signals';
import type { TargetedEvent } from 'preact';
import { useEffect } from 'preact/hooks';
import { type Compared, comparedIn, type Example } from '../../core/check/proof.ts';
import { fitNames, strengthNames } from '../../core/end/checkNames.ts';
import { RESULT_FIGURES } from '../../core/formula/line.ts';
import { standards } from '../../core/standards/index.ts';
import { listed } from '../../core/standards/listed.ts';
import { isNoRule } from '../../core/standards/standard.ts';
import { fixed, significant } from '../../core/units/figures.ts';
import { wordsFor } from '../../core/words/wordsFor.ts';
import { RichText } from '../ladder/RichText.tsx';
import { PageHead } from '../shell/PageHead.tsx';
import '../state/reader.ts';
import { titled } from '../state/rules.ts';
import { examples } from './examples.ts';

const standings = {
  published: 'Published in the source named',
  theory: 'Exact by theory',
  hand: "Summed by hand from the standard's formula as remembered",
} as const;

const figure = (value: number): string => significant(value, RESULT_FIGURES + 1);

const Row = ({ expectation, ours, check }: Compared) => {
  const { row, way, field, value, unit, within, why, sum } = expectation;
  const difference = value === 0 ? '' : `${fixed(((ours - value) / value) * 100, 2)} %`;
  const inside = Math.abs(ours - value) <= within;
  return (
    <tr>
      <th scope="row">
        {check.title}
        {(way ?? check.ofText) && `, ${way ?? check.ofText}`}
        {row && (
          <>
            , <RichText text={row} manner="formula" />
          </>
        )}
        {field && !row && field !== 'resistance' && `, ${field === 'reactionAtFailure' ? 'fails at' : field}`}
        {sum && (
          <span class="proof-sum">
            <RichText text={sum} manner="formula" />
          </span>
        )}
      </th>
      <td>
        {figure(value)} {unit}
      </td>
      <td>{figure(ours)}</td>
      <td>{difference}</td>
      <td>
        ±{significant(within, 3)}: <RichText text={why} />
        {!inside && <b> OUTSIDE</b>}
      </td>
    </tr>
  );
};

const ExampleShown = ({ example }: { readonly example: Example }) => (
  <section class="rule" aria-label={example.says}>
    <h3>{example.says}</h3>
    <p class="rule-source">{example.source}</p>
    <div class="proof-scroll">
      <table class="proof-table">
        <thead>
          <tr>
            <th scope="col">number</th>
            <th scope="col">source</th>
            <th scope="col">here</th>
            <th scope="col">difference</th>
            <th scope="col">allowed, and why</th>
          </tr>
        </thead>
        <tbody>
          {comparedIn(example).map((one, at) => (
            <Row key={at} {...one} />
          ))}
        </tbody>
      </table>
    </div>
  </section>
);

/** Checks of a standard that no number from outside holds. */
const without = (id: string): string[] => {
  const standard = standards[id]!;
  const words = wordsFor(standard.region);
  return [...strengthNames, ...fitNames]
    .filter((name) => {
      const rule = name in standard.strength ? standard.strength[name as never] : standard.fit[name as never];
      return !isNoRule(rule) && !standard.verified[name];
    })
    .map((name) => words.titles[name] ?? name);
};

/** Numbers from outside beside the program's own, worked out here and now from the examples that the tests hold it to. */
export const ProofPage = () => {
  const chosen = useSignal(listed[0].id as string);
  useEffect(() => {
    document.title = 'Proof – Copewright';
    scrollTo(0, 0);
  }, []);
  const own = examples.filter(({ standard }) => standard === chosen.value);
  const none = without(chosen.value);
  return (
    <>
      <PageHead />
      <main class="standards" id="proof">
        <header class="standards-head">
          <h1>Proof</h1>
          <label class="standards-picker">
            Standard
            <select
              class="input"
              value={chosen.value}
              onChange={(event: TargetedEvent<HTMLSelectElement>) => {
                chosen.value = event.currentTarget.value;
              }}
            >
              {listed.map((one) => (
                <option key={one.id} value={one.id}>
                  {titled(one)}
                </option>
              ))}
            </select>
          </label>
        </header>
        <p>
          Numbers that the program did not make, beside its own, worked out in this page. No test on real beams stands
          behind them; local codes govern, licensed practice decides.
        </p>
        <p>
          {none.length === 0
            ? 'Every check of this standard has at least one such number.'
            : `Without any number from outside: ${none.join(', ').toLowerCase()}.`}
        </p>
        {(['published', 'theory', 'hand'] as const).map((standing) => {
          const these = own.filter((one) => one.standing === standing);
          return these.length === 0 ? null : (
            <section key={standing} aria-label={standings[standing]}>
              <h2 class="proof-standing">{standings[standing]}</h2>
              {these.map((one) => (
                <ExampleShown key={one.id} example={one} />
              ))}
            </section>
          );
        })}
      </main>
    </>
  );
};
