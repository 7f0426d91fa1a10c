import { type Axis, runsOff, shareOn } from './axis.ts';
import type { Mark } from './standing.ts';

interface Props {
  readonly axis: Axis;
  /** Where the bar ends; null for one that never does. */
  readonly end: number | null;
  readonly mark: Mark | null;
}

const percent = (share: number): string => `${(100 * share).toFixed(3)}%`;

/** A bar from the foot of the axis: hollow where the check holds, half black where that is close, black where it fails, dashed where it refers. */
export const Bar = ({ axis, end, mark }: Props) => {
  const off = end === null || runsOff(axis, end);
  return (
    <span class="bar-space" aria-hidden="true">
      <span class={`bar bar-${mark ?? 'none'}`} style={{ width: percent(end === null ? 1 : shareOn(axis, end)) }}>
        {off && (
          <svg class="bar-break" aria-hidden="true" width="7" height="17" viewBox="0 0 7 17">
            <path d="M3 0v6l3 2-5 2 2 1v6" />
          </svg>
        )}
      </span>
      {axis.line !== null && <span class="bar-line" style={{ left: percent(shareOn(axis, axis.line)) }} />}
    </span>
  );
};
