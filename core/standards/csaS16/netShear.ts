import { copeLimits, fullDepthPlate } from '../../end/gates.ts';
import { dn, flag, ho, hp, k, n, tp, tw, V } from '../../end/given.ts';
import { minus, pick, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { phiU } from './factors.ts';
import { Fu } from './given.ts';
import { Fm, Fmp } from './meanStrength.ts';

/** Rupture in shear through one bolt column: CSA S16:19 cl. 13.11 without a tension plane, on the gross length. */
const source = { clause: '13.11', basis: 'seen' } as const;
const onNetLength = flag('option web-net-shear: net', (f) => f.options['web-net-shear'] === 'net');

const net = step('V_r', times(0.6, phiU, Fu, tw, minus(ho, times(n, dn))), {
  clause: 'net length',
  basis: 'practice',
});

/** Option `net` takes the holes off and the tensile strength, which is the safer where holes are many. */
export const webNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: pick([[onNetLength, net]], step('V_r', times(0.6, phiU, Fm, tw, ho), source)),
      limits: copeLimits,
    },
  ],
};

export const plateNetShear: StrengthRule = {
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(0.6, phiU, Fmp, tp, hp), source) }],
};

/** Of each cleat: the same in both legs, as the gross length counts. */
export const cleatNetShear: StrengthRule = {
  source,
  ways: [
    { of: '', symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(k, 0.6, phiU, Fmp, tp, hp), source) },
  ],
};

/** Through both lines of bolts of an end plate. */
export const endPlateNetShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(2, 0.6, phiU, Fmp, tp, hp), source, 'both sides of the web'),
      limits: [fullDepthPlate],
    },
  ],
};
