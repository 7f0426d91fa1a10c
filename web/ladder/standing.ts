import type { Check, State } from '../../core/check/report.ts';
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

/** The word of a state, as it is read out. */
export const stateWord = (state: State): string => {
  switch (state) {
    case 'holds':
      return 'holds';
    case 'fails':
      return 'fails';
    case 'refer':
      return 'refers';
    case 'information':
      return 'for information';
    case 'notApplicable':
      return 'not applicable';
  }
};

/** A ratio as it stands beside a bar: without bound where nothing at all can be carried, a dash where none can be stated. */
export const ratioText = ({ state, utilisation }: Judged): string => {
  if (utilisation !== null) return ratio(utilisation);
  return state === 'fails' ? '∞' : '–';
};
