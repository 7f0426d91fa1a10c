import { coped, type Gate, isChannel, type Limit, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { type Cut, flag, fy, rectangle, tee, V, whole } from '../../end/given.ts';
import { all, not, over, root, step, times } from '../../formula/tree.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { gammaM0 } from './factors.ts';
import { memory } from './sources.ts';

/** Elastic shear stress V Q/(I t), EN 1993-1-1 6.2.6(4): information, unless option `elastic-shear: verdict` makes it count. */
const source = memory('1-1 6.2.6(4)');
const informs = not(flag('option elastic-shear: verdict', (f) => f.options['elastic-shear'] === 'verdict'));
const resistance = step('τ_Rd', over(fy, times(root(3), gammaM0)), source);
const copedChannel: Limit = { when: all(isChannel, coped), reason: 'channel-cope', always: true, noNumber: true };

const way = (of: string, section: Pick<Cut, 'I' | 'Q' | 't'>, off: readonly Gate[], limits: readonly Limit[]): Way => ({
  of,
  symbol: 'τ',
  load: 'V',
  demand: step('τ', over(times(V, section.Q), times(section.I, section.t)), source),
  resistance,
  off,
  limits,
  informs,
});

export const stressFull: StrengthRule = { source, ways: [way('', whole, [], [])] };
export const stressCope: StrengthRule = {
  source,
  ways: [
    way('rectangle', rectangle, [uncoped, noRectangle], [copedChannel]),
    way('tee', tee, [uncoped, noTee], [copedChannel]),
  ],
};
