import { k, V } from '../../end/given.ts';
import { least, step, times } from '../../formula/tree.ts';
import { cleatArm } from '../methods/cleatArm.ts';
import type { StrengthRule } from '../standard.ts';
import { bending, moment, shear, Vc } from './plate.ts';
import { withMoment } from './withMoment.ts';

const inShear = step('ΣφV_c', times(k, Vc), shear);
const inBending = step('ΣφM_s', times(k, moment), bending);

/** Shear of the cleats' whole depth, with the moment that comes with it, as of a plate. */
export const cleatGrossShear: StrengthRule = {
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('φV_vm', least(inShear, withMoment(inShear, cleatArm, inBending)), shear),
    },
  ],
};

/** Bending of the cleats, fully plastic, as of a plate. */
export const cleatBending: StrengthRule = {
  source: bending,
  ways: [{ of: '', symbol: 'V e', load: 'V', demand: step('M', times(V, cleatArm), bending), resistance: inBending }],
};
