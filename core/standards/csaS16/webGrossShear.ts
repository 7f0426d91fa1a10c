import type { Gate } from '../../end/gates.ts';
import { h, tf, tw, V } from '../../end/given.ts';
import { atMost, minus, not, over, type Source, step, times } from '../../formula/tree.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';
import { Fy } from './given.ts';
import { firstLimit, shearStress } from './shearStress.ts';

/** Shear of the full I or channel, CSA S16:19 cl. 13.4.1.1: full depth times web, slenderness of the clear web. */
const source = { clause: '13.4.1.1', basis: 'seen' } as const;
/** The branches in which the web buckles are from memory. */
const buckles = { clause: '13.4.1.1', basis: 'memory' } as const;

const slenderness = step('λ_w', over(minus(h, times(2, tf)), tw), source, 'clear web, h_w = h − 2 t_f');
const stocky = atMost(slenderness, firstLimit(Fy));
const stockyWeb: Gate = { when: stocky, reason: 'stocky-web' };
const slenderWeb: Gate = { when: not(stocky), reason: 'slender-web' };

const way = (source: Source, off: Gate): Way => ({
  of: '',
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: step('V_r', times(phi, h, tw, shearStress(slenderness, Fy)), source),
  off: [off],
  source,
});

export const webGrossShear: StrengthRule = { source, ways: [way(source, slenderWeb), way(buckles, stockyWeb)] };
