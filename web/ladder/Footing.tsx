import type { Check } from '../../core/check/report.ts';
import { unitOf } from '../../core/units/systems.ts';
import { verdictWords as say } from '../../core/words/verdictWords.ts';
import { chosen } from '../state/bench.ts';
import { besideParts } from './besideParts.ts';
import { cited } from './cited.ts';
import { Heading } from './Heading.tsx';
import { NotApplicable } from './NotApplicable.tsx';
import { OpenWorking } from './OpenWorking.tsx';
import { RichText } from './RichText.tsx';
import { rungsOf } from './rungs.ts';
import { Sign } from './Sign.tsx';
import { Sizes } from './Sizes.tsx';
import { shown, stale, words } from './shown.ts';
import { markOf } from './standing.ts';
import { onRungKey, reached, touch } from './touch.ts';

/** Rules that carry no kN, given against required; one that is not held opens by itself. */
export const Footing = () => {
  const report = shown.value?.report;
  if (!report) return null;
  const Beside = besideParts();
  const { footing, notApplicable } = Beside ? Beside.pairedRungs(report) : rungsOf(report);
  const length = unitOf('1,0', report.units).name;
  const first = footing.find(({ id }) => id === reached.value) ?? footing[0];
  return (
    <section
      class={`footing${Beside ? ' footing-paired' : ''}${stale.value ? ' stale' : ''}`}
      aria-labelledby="footing-heading"
    >
      <Heading id="footing-heading" level={3} title="Footing">
        given / required, {length}; no force
      </Heading>
      <ul onKeyDown={onRungKey}>
        {footing.map((check) => (
          <Rule key={check.id} check={check} first={check === first} />
        ))}
      </ul>
      <NotApplicable checks={notApplicable} />
    </section>
  );
};

const Rule = ({ check, first }: { check: Check; first: boolean }) => {
  const Beside = besideParts();
  const { id, title, ofText, state, reasonText } = check;
  const open = chosen.value === id;
  const breach = state !== 'holds';
  const mark = markOf(check);
  return (
    <li class={`rule rule-${mark}${open || breach ? ' rule-wide' : ''}${open ? ' rule-open' : ''}`}>
      <button
        type="button"
        id={`rung-${id}`}
        data-rung
        aria-expanded={open}
        aria-controls={`working-${id}`}
        tabIndex={first ? 0 : -1}
        onFocus={() => {
          reached.value = id;
        }}
        onClick={() => touch(id)}
      >
        <Sign mark={mark} />
        <span>
          {title}
          {ofText && <span class="rule-of">, {ofText}</span>}
        </span>
        {state === 'notApplicable' ? <span class="rule-sizes">no rule</span> : <Sizes check={check} />}
        {Beside && <Beside.RuleSizes id={id} />}
      </button>
      {breach && reasonText && !open && (
        <p class="rule-reason">
          <b>{say.verdict[state === 'fails' ? 'fails' : 'refer']}</b> <RichText text={reasonText} />
          <span>; {sourceOf(check)}</span>
        </p>
      )}
      {open && <OpenWorking check={check} labelledBy={`rung-${id}`} />}
      {open && Beside && <Beside.SecondWorking id={id} />}
    </li>
  );
};

/** Clause and its standing; for practice, that it is no clause. */
const sourceOf = ({ clause, basis }: Check): string =>
  basis === 'practice' ? (words.value.bases.practice ?? basis) : `${cited(clause)}, ${basis}`;
