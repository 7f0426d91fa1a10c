import { copeLimits } from '../../end/gates.ts';
import { dn, fu, fup, ho, hp, n, tp, tw, V } from '../../end/given.ts';
import { minus, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';

/** Rupture in shear through one bolt column: the net-shear term of SANS 10162-1:2011 cl. 13.11 on its own. */
const source = { clause: '13.11', basis: 'memory' } as const;

export const webNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(0.6, phi, fu, tw, minus(ho, times(n, dn))), source),
      limits: copeLimits,
    },
  ],
};

export const plateNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(0.6, phi, fup, tp, minus(hp, times(n, dn))), source),
    },
  ],
};
