import type { Check } from '../../core/check/report.ts';
import { verdictWords as say } from '../../core/words/verdictWords.ts';
import { type Axis, closeUpOf } from './axis.ts';
import { Bar } from './Bar.tsx';
import { Scale } from './Scale.tsx';
import { spareOf } from './spare.ts';
import { markOf } from './standing.ts';

interface Props {
  readonly weakest: Check;
  readonly reaction: number;
  readonly force: string;
}

/** The end of the weakest bar at ten times the scale, with what is to spare or short; nothing where the ladder shows it plainly. */
export const CloseUp = ({ weakest, reaction, force }: Props) => {
  const at = weakest.reactionAtFailure ?? null;
  const axis: Axis | null = closeUpOf(reaction, at);
  if (axis === null || at === null) return null;
  const spare = spareOf(reaction, at);
  return (
    <div class="close-up">
      <span class="close-up-name" aria-hidden="true">
        close-up, ten times
      </span>
      <Bar axis={axis} end={at} mark={markOf(weakest)} />
      <span class="close-up-spare">
        <b>
          {spare.amount} {force}
        </b>{' '}
        {spare.short ? say.short : say.toSpare}
      </span>
      <span class="close-up-scale" aria-hidden="true">
        <Scale axis={axis} />
      </span>
    </div>
  );
};
