import type { Check } from '../../core/check/report.ts';
import { isClose } from '../../core/sheet/sign.ts';
import { ratio } from '../../core/units/figures.ts';

/** What is drawn for a standing: the sign, and the fill of the bar. */
export type Mark = 'holds' | 'close' | 'fails' | 'refer' | 'incomplete';

type Judged = Pick<Check, 'state' | 'utilisation'>;

/** null for what has no verdict. */
export const markOf = ({ state, utilisation }: Judged): Mark | null => {
  switch (state) {
    case 'holds':
      return isClose(utilisation) ? 'close' : 'holds';
    case 'fails':
    case 'refer':
      return state;
    default:
      return null;
  }
};

/** A ratio as it stands beside a bar: without bound where nothing at all can be carried, a dash where none can be stated. */
export const ratioText = ({ state, utilisation }: Judged): string => {
  if (utilisation !== null) return ratio(utilisation);
  return state === 'fails' ? '∞' : '–';
};
