import { k, V } from '../../end/given.ts';
import { step, times } from '../../formula/tree.ts';
import { cleatArm } from '../methods/cleatArm.ts';
import type { StrengthRule } from '../standard.ts';
import { bending, bendingUnder, shear, Vd, Z, Zp } from './plate.ts';

const inShear = step('ΣV_d', times(k, Vd), shear);

/** Shear of the cleats' whole depth, IS 800:2007 cl. 8.4.1. */
export const cleatGrossShear: StrengthRule = {
  source: shear,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: inShear }],
};

/** Bending of the cleats, as of a plate. */
export const cleatBending: StrengthRule = {
  source: bending,
  ways: [
    {
      of: '',
      symbol: 'V e',
      load: 'V',
      demand: step('M', times(V, cleatArm), bending),
      resistance: bendingUnder(cleatArm, step('ΣZ', times(k, Z)), step('ΣZ_p', times(k, Zp)), inShear),
    },
  ],
};
