import type { Check } from '../../core/check/report.ts';
import { isClose } from '../../core/sheet/sign.ts';
import { ratio } from '../../core/units/figures.ts';
import { stateWords } from '../../core/words/stateWords.ts';

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

/** State of a check as it is said aloud between its name and its numbers; empty for numbers without a verdict. */
export const stateSaid = (check: Check, weakest = false): string => {
  const { state } = check;
  const words = [
    state !== 'information' && stateWords[state],
    markOf(check) === 'close' && 'close',
    weakest && 'the weakest',
  ];
  return words.filter(Boolean).join(', ');
};

/** False for the reaction at which something fails where no reaction is given at its level. */
export const isCompared = ({ state, utilisation, reactionAtFailure }: Check): boolean =>
  state !== 'information' && !(state === 'refer' && utilisation === null && typeof reactionAtFailure === 'number');

/** A ratio as it stands beside a bar: without bound where nothing at all can be carried, a dash where none can be stated. */
export const ratioText = ({ state, utilisation }: Judged): string => {
  if (utilisation !== null) return ratio(utilisation);
  return state === 'fails' ? '∞' : '–';
};
