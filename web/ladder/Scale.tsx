import { roundedDown } from '../../core/units/figures.ts';
import { type Axis, shareOn } from './axis.ts';

const side = (share: number): string => (share < 0.01 ? 'start' : share > 0.99 ? 'end' : 'middle');

/** Marks and numbers under a stretch of the kN axis. */
export const Scale = ({ axis }: { axis: Axis }) => (
  <span class="scale">
    {axis.ticks.map((tick) => {
      const share = shareOn(axis, tick);
      return (
        <span class={`tick tick-${side(share)}`} style={{ left: `${(100 * share).toFixed(3)}%` }}>
          {roundedDown(tick).replace(/\.0$/, '')}
        </span>
      );
    })}
  </span>
);
