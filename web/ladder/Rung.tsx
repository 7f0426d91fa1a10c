import type { Check } from '../../core/check/report.ts';
import { plain, roundedDown } from '../../core/units/figures.ts';
import { stateWords } from '../../core/words/stateWords.ts';
import { verdictWords as say } from '../../core/words/verdictWords.ts';
import { chosen } from '../state/bench.ts';
import type { Axis } from './axis.ts';
import { Bar } from './Bar.tsx';
import { OpenWorking } from './OpenWorking.tsx';
import { RichText } from './RichText.tsx';
import { shortName } from './rungs.ts';
import { Sign } from './Sign.tsx';
import { words } from './shown.ts';
import { markOf, ratioText } from './standing.ts';
import { reached, touch } from './touch.ts';

interface Props {
  readonly check: Check;
  readonly axis: Axis;
  readonly force: string;
  /** The first to fail: set heavier. */
  readonly weakest?: boolean;
  /** The one that the Tab key comes to. */
  readonly first: boolean;
}

/** One way of failing: a button that opens its working where it lies and draws its path on the piece. */
export const Rung = ({ check, axis, force, weakest = false, first }: Props) => {
  const { id } = check;
  const open = chosen.value === id;
  const mark = markOf(check);
  return (
    <li class={`rung rung-${mark}${weakest ? ' rung-weakest' : ''}${open ? ' rung-open' : ''}`}>
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
        <span class="rung-name">{shortName(check, words.value)}</span>
        <span class="unseen">
          {`, ${stateWords[check.state]}${mark === 'close' ? ', close' : ''}${weakest ? ', the weakest' : ''}; `}
        </span>
        <Measure check={check} axis={axis} force={force} />
      </button>
      {open && <OpenWorking check={check} labelledBy={`rung-${id}`} />}
    </li>
  );
};

/** What stands right of the name: a bar with its number, a reason where there is no number, or a load of its own. */
const Measure = ({ check, axis, force }: Pick<Props, 'check' | 'axis' | 'force'>) => {
  const at = check.reactionAtFailure;
  if (at === undefined) return <Alone check={check} force={force} />;
  if (at === null && check.utilisation === null) {
    return (
      <span class="rung-reason">
        <RichText text={check.reasonText ?? say.noNumber} />
      </span>
    );
  }
  return (
    <>
      <Bar axis={axis} end={at} mark={markOf(check)} />
      <span class="rung-force">
        {at === null ? (
          '–'
        ) : (
          <>
            <span class="unseen">fails at </span>
            {roundedDown(at)}
            <span class="unseen">{` ${force}`}</span>
          </>
        )}
      </span>
      <Ratio check={check} />
    </>
  );
};

/** A way of failing by a load other than the reaction. */
const Alone = ({ check, force }: Pick<Props, 'check' | 'force'>) => (
  <>
    <span class="rung-alone">
      <RichText text={check.symbol} manner="formula" /> = {plain(check.demand ?? 0)} of
    </span>
    <span class="rung-force">
      {check.resistance === null ? '–' : roundedDown(check.resistance)}
      <span class="unseen">{` ${check.unit || force}`}</span>
    </span>
    <Ratio check={check} />
  </>
);

const Ratio = ({ check }: { check: Check }) => (
  <span class="rung-ratio">
    <span class="unseen">; ratio </span>
    <span>{ratioText(check)}</span>
  </span>
);
