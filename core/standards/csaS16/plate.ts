import { fullDepthPlate } from '../../end/gates.ts';
import { hp, k, tp, ts, V, z } from '../../end/given.ts';
import { over, squared, step, times } from '../../formula/tree.ts';
import { supportShear as ofSupport } from '../methods/supportShear.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { Fyp, Fys } from './given.ts';

const gross = { clause: '13.4 mean', basis: 'memory' } as const;
const elastic = { clause: 'elastic', basis: 'memory' } as const;

/** Yielding in shear of the plate's full depth: mean stress 0.66 F_y, the plate being a joint's ply and no member. */
export const plateGrossShear: StrengthRule = {
  source: gross,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(0.66, phi, Fyp, tp, hp), gross) }],
};

/** Each cleat's full depth. */
export const cleatGrossShear: StrengthRule = {
  source: gross,
  ways: [
    { of: '', symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(k, 0.66, phi, Fyp, tp, hp), gross) },
  ],
};

/** Two planes of an end plate, beside the web. */
export const endPlateGrossShear: StrengthRule = {
  source: gross,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_r', times(2, 0.66, phi, Fyp, tp, hp), gross, 'both sides of the web'),
      limits: [fullDepthPlate],
    },
  ],
};

/** Two planes of the support's web, beside plate or cleats. */
export const supportShear: StrengthRule = ofSupport(
  gross,
  step('V_r', times(2, 0.66, phi, Fys, ts, hp), gross, 'both sides of the joint'),
);

/** First yield of the plate in bending under V at the centroid of the bolts. */
export const plateBending: StrengthRule = {
  source: elastic,
  ways: [
    {
      of: '',
      symbol: 'V z',
      load: 'V',
      demand: step('M', times(V, z), elastic),
      resistance: step('M_r', over(times(phi, Fyp, tp, squared(hp)), 6), elastic),
    },
  ],
};
