import type { ExaminedNumbers } from '../../core/check/examined.ts';
import type { Check } from '../../core/check/report.ts';
import { workingOfCheck } from '../../core/check/workings.ts';
import { roundedDown } from '../../core/units/figures.ts';
import { unitOf } from '../../core/units/systems.ts';
import { stateWords } from '../../core/words/stateWords.ts';
import { verifiedWords } from '../../core/words/verifiedWords.ts';
import { standardAddress } from '../shell/address.ts';
import { cited } from './cited.ts';
import { inUse } from './inUse.ts';
import { RichText } from './RichText.tsx';
import { fullName, isFooting } from './rungs.ts';
import { Sign } from './Sign.tsx';
import { shown, words } from './shown.ts';
import { markOf } from './standing.ts';
import { usedUp } from './usedUp.ts';
import { WorkingLines } from './WorkingLines.tsx';
import { workingLines } from './workingLines.ts';

export interface WorkingProps {
  readonly check: Check;
  /** The end that the check is of; absent = the one that is shown. */
  readonly of?: ExaminedNumbers;
  /** The standard it is under, where two are shown. */
  readonly under?: string;
  /** Id of what it belongs to. */
  readonly labelledBy: string;
}

/** Id of a working; two standards' workings of one check stand side by side. */
const workingId = ({ id }: Check, under: string | undefined): string => `working-${id}${under ? '-beside' : ''}`;

/** The first is named by its rung, the second by its standard too. */
const named = (check: Check, under: string | undefined, rung: string) =>
  under ? { 'aria-label': `${under}: ${fullName(check)}` } : { 'aria-labelledby': rung };

/** How a check comes to its number, line by line, with what it leans on and how far it is verified. */
export const Working = ({ check: bare, of = shown.value!, under, labelledBy }: WorkingProps) => {
  const check: Check = { ...bare, working: workingOfCheck(of, bare.id) };
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset groups controls; this groups text under the name of its rung.
    <div class="working" id={workingId(check, under)} role="group" {...named(check, under, labelledBy)}>
      <p class="working-head">
        <b>
          {under && `${under}: `}
          {fullName(check)}
        </b>
        <span>{sourceOf(check)}</span>
      </p>
      {check.reasonText && (
        <p class="working-reason">
          {stateWords[check.state]}: <RichText text={check.reasonText} />
        </p>
      )}
      <WorkingLines lines={workingLines(check)} />
      <Close check={check} of={of} />
      <Leaning check={check} of={of} />
      {!isFooting(check) && !under && (
        <button type="button" class="working-see" onClick={toPiece}>
          see it on the piece
        </button>
      )}
    </div>
  );
};

/** On a small screen the piece stands out of sight. */
const toPiece = (): void => {
  document.getElementById('piece-heading')?.scrollIntoView();
};

/** Clause or method, and its standing. */
const sourceOf = ({ clause, basis }: Check): string =>
  [...new Set([clause && cited(clause), basis])].filter(Boolean).join(', ');

interface Of {
  readonly check: Check;
  readonly of: ExaminedNumbers;
}

/** Demand over resistance, and the reaction at which it is used up. */
const Close = ({ check, of }: Of) => {
  const { report } = of;
  const used = usedUp(check, report);
  const at = check.reactionAtFailure;
  const force = unitOf('0,1', report.units).name;
  if (used === null && typeof at !== 'number') return null;
  return (
    <p class="working-close">
      <Sign mark={markOf(check)} />
      <span>
        {used && (
          <>
            <RichText text={used.symbols} manner={check.id.startsWith('fit-') ? 'prose' : 'formula'} /> = {used.numbers}{' '}
            = {used.value}
          </>
        )}
        {typeof at === 'number' && (
          <>
            {used && '; '}
            {check.state === 'information' ? 'reached at' : 'fails at'} <i class="symbol">V</i> ={' '}
            <b class="working-value">
              {roundedDown(at)} {force}
            </b>
          </>
        )}
      </span>
    </p>
  );
};

/** Factors and strengths in use, the standing of the formula, and what checks it from outside. */
const Leaning = ({ check, of }: Of) => {
  const leans = inUse(of, check);
  const basis = check.basis && words.value.bases[check.basis];
  return (
    <div class="working-foot">
      {leans.length > 0 && (
        <p>
          with{' '}
          {leans.map(({ symbol, value }, at) => (
            <>
              {at > 0 && ', '}
              <RichText text={symbol} manner="formula" /> {value}
            </>
          ))}
        </p>
      )}
      <p>
        {basis && `${check.basis}: ${basis}; `}
        {verifiedWords[check.verified]}; <a href={standardAddress(of.report.standard.id, check.id)}>the rule in full</a>
      </p>
    </div>
  );
};
