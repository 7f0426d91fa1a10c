import type { Check } from '../../core/check/report.ts';
import { chosen } from '../state/bench.ts';
import type { Axis } from './axis.ts';
import { besideParts } from './besideParts.ts';
import { Measure } from './Measure.tsx';
import { OpenWorking } from './OpenWorking.tsx';
import { shortName } from './rungs.ts';
import { Sign } from './Sign.tsx';
import { words } from './shown.ts';
import { markOf, stateSaid } from './standing.ts';
import { reached, touch } from './touch.ts';

interface RungProps {
  readonly check: Check;
  readonly axis: Axis;
  readonly force: string;
  /** The first to fail: set heavier. */
  readonly weakest?: boolean;
  /** The one that the Tab key comes to. */
  readonly first: boolean;
}

/** One way of failing: a button that opens its working where it lies and draws its path on the piece. */
export const Rung = ({ check, axis, force, weakest = false, first }: RungProps) => {
  const { id } = check;
  const open = chosen.value === id;
  const mark = markOf(check);
  const name = shortName(check, words.value);
  const Beside = besideParts();
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
        <span class="rung-name">{name}</span>
        <span class="unseen">{` ${stateSaid(check, weakest)}, `}</span>
        <Measure check={check} axis={axis} force={force} />
        {Beside && <Beside.SecondLine id={id} axis={axis} force={force} />}
      </button>
      {open && check.state !== 'notApplicable' && <OpenWorking check={check} labelledBy={`rung-${id}`} />}
      {open && Beside && <Beside.SecondWorking id={id} />}
    </li>
  );
};
