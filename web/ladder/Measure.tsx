import type { Check } from '../../core/check/report.ts';
import { roundedDown } from '../../core/units/figures.ts';
import { verdictWords as say } from '../../core/words/verdictWords.ts';
import type { Axis } from './axis.ts';
import { Bar } from './Bar.tsx';
import { ownLoad } from './ownLoad.ts';
import { RichText } from './RichText.tsx';
import { isCompared, markOf, ratioText } from './standing.ts';

interface Props {
  readonly check: Check;
  readonly axis: Axis;
  /** Unit of force. */
  readonly force: string;
}

/** What stands right of the name: a bar with its number, a reason where there is no number, or a load of its own. */
export const Measure = ({ check, axis, force }: Props) => {
  const { reactionAtFailure: at, state, utilisation } = check;
  if (state === 'notApplicable' || (at === null && utilisation === null)) {
    return (
      <span class="rung-reason">
        <RichText text={check.reasonText ?? say.noNumber} />
      </span>
    );
  }
  if (at === undefined) return <Alone check={check} force={force} />;
  return (
    <>
      <Bar axis={axis} end={at} mark={markOf(check)} />
      <span class="rung-force">
        {at !== null && <span class="unseen">fails at </span>}
        {at === null ? '–' : roundedDown(at)}
        <Unit name={at === null ? '' : force} check={check} />
      </span>
      <Ratio check={check} />
    </>
  );
};

/** A way of failing by a load other than the reaction. */
const Alone = ({ check, force }: Pick<Props, 'check' | 'force'>) => {
  const { demand, resistance } = ownLoad(check, force);
  return (
    <>
      <span class="rung-alone">
        <RichText text={check.symbol} manner="formula" /> = {demand} of
      </span>
      <span class="rung-force">
        {resistance}
        <Unit name={check.unit || force} check={check} />
      </span>
      <Ratio check={check} />
    </>
  );
};

/** Said aloud between a number and its ratio. */
const Unit = ({ name, check }: { readonly name: string; readonly check: Check }) => (
  <span class="unseen">{` ${name}${isCompared(check) ? ', ratio ' : ''}`}</span>
);

/** Nothing where a number stands without a reaction to compare it with. */
const Ratio = ({ check }: { check: Check }) => (
  <span class="rung-ratio">{isCompared(check) && <span>{ratioText(check)}</span>}</span>
);
