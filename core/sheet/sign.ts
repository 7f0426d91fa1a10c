import type { State } from '../check/report.ts';
import type { Pen } from './pen.ts';

/** What a state looks like on paper: a hollow circle, half filled from 0.95 to 1.00, a solid square, a dashed circle; none for what has no verdict. */
export const drawSign = (
  pen: Pen,
  x: number,
  y: number,
  radius: number,
  { state, utilisation }: { state: State; utilisation: number | null },
): void => {
  const width = Math.max(0.2, radius * 0.22);
  switch (state) {
    case 'fails':
      pen.box(x - radius * 0.9, y - radius * 0.9, radius * 1.8, radius * 1.8, { fill: 'black' });
      return;
    case 'refer':
      pen.circle(x, y, radius, { width, dash: [radius * 0.55, radius * 0.495] });
      return;
    case 'holds':
      pen.circle(x, y, radius, { width });
      if (isClose(utilisation)) {
        const top = { x, y: y - radius };
        const bottom = { x, y: y + radius, radius, clockwise: false };
        pen.path(top, [bottom], { fill: 'black', closed: true });
      }
  }
};

/** Used up to 0.95 or more: said to be close. */
export const isClose = (utilisation: number | null): boolean =>
  utilisation !== null && utilisation >= 0.95 && utilisation <= 1;
