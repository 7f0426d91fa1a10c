import { fyp, hp, tp, V, z } from '../../end/given.ts';
import { over, root, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { gammaM0 } from './factors.ts';
import { guide } from './sources.ts';

/** Shear of the plate's full depth; 1.27 stands for the bending that goes with it. N */
export const plateGross = step('V_Rd', over(times(hp, tp, fyp), times(1.27, root(3), gammaM0)), guide);

export const plateGrossShear: StrengthRule = {
  source: guide,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: plateGross }],
};

/** Elastic modulus of the plate, mm3. */
export const plateModulus = step('W', over(times(tp, squared(hp)), 6));

/** First yield of the plate under V at the centroid of the bolts; the gross shear of a plate deeper than 2.73 z contains it. */
export const plateBending: StrengthRule = {
  source: guide,
  ways: [
    {
      of: '',
      symbol: 'V z',
      load: 'V',
      demand: step('M', times(V, z), guide),
      resistance: step('M_Rd', over(times(fyp, plateModulus), gammaM0), guide),
    },
  ],
};
