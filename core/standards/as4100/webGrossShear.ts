import type { Limit } from '../../end/gates.ts';
import { h, tf, tw, V } from '../../end/given.ts';
import { atMost, least, minus, not, over, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { byYield, fyw } from './given.ts';

const source = { clause: '5.11', basis: 'seen' } as const;

const slenderness = step('s', byYield(over(minus(h, times(2, tf)), tw), fyw), source, 'clear web');
const alpha = step('α_v', least(1, squared(over(82, slenderness))), source);
const beyondLeastWeb: Limit = { when: not(atMost(slenderness, 180)), reason: 'web-below-least', always: false };

/** φV_v of the full section, N. Bolt holes are not taken off. */
export const fullShear = step('φV_v', times(phi, alpha, 0.6, fyw, h, tw), source);

/** Shear of the full I or channel, AS 4100:2020 cl. 5.11.2, 5.11.4, 5.11.5: full depth times web; least web of 5.10.1, s <= 180. */
export const webGrossShear: StrengthRule = {
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: fullShear, limits: [beyondLeastWeb] }],
};
