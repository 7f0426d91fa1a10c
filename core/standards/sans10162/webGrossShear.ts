import { fy, h, tf, tw, V } from '../../end/given.ts';
import { minus, over, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { shearStress } from './shearStress.ts';

/** Shear of the full I or channel, SANS 10162-1:2011 cl. 13.4.1.1: full depth times web, slenderness of the clear web. */
const source = { clause: '13.4.1.1', basis: 'memory' } as const;
const slenderness = step('λ_w', over(minus(h, times(2, tf)), tw), source, 'h_w = h − 2 t_f');

export const webGrossShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(phi, h, tw, shearStress(slenderness, fy)), source),
    },
  ],
};
