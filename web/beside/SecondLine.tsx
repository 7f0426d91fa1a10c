import type { CheckName } from '../../core/end/checkNames.ts';
import type { Axis } from '../ladder/axis.ts';
import { Measure } from '../ladder/Measure.tsx';
import { RichText } from '../ladder/RichText.tsx';
import { Sign } from '../ladder/Sign.tsx';
import { markOf, stateSaid } from '../ladder/standing.ts';
import { besideShown } from './beside.ts';
import { secondOf, secondTitle, secondWeakest } from './second.ts';

interface Props {
  readonly id: CheckName;
  readonly axis: Axis;
  /** Unit of force. */
  readonly force: string;
}

/** The line of the second reaction, where one is stated. */
const axisOfSecond = (axis: Axis): Axis => {
  const found = besideShown.value;
  if (!found) return axis;
  const { reaction } = found.examined.report;
  return { ...axis, line: found.stated && reaction > 0 ? reaction : null };
};

/** What the second standard says of a rung, under what the first does: a thinner bar on the same axis. */
export const SecondLine = ({ id, axis, force }: Props) => {
  const check = secondOf(id);
  if (!check) return null;
  const mark = markOf(check);
  const said = stateSaid(check);
  return (
    <span class={`second second-${mark ?? 'none'}${id === secondWeakest() ? ' second-weakest' : ''}`}>
      <Sign mark={mark} />
      <span class="unseen">{` and by ${secondTitle()} ${said && `${said}, `}`}</span>
      <span />
      {check.state === 'notApplicable' ? (
        <span class="rung-reason">
          <RichText text={check.reasonText ?? ''} />
        </span>
      ) : (
        <Measure check={check} axis={axisOfSecond(axis)} force={force} />
      )}
    </span>
  );
};
