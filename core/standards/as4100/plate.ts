import { fyp, hp, tp, V, z } from '../../end/given.ts';
import { least, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { withMoment } from './withMoment.ts';

export const shear = { clause: '5.11.3, 5.12.3', basis: 'seen' } as const;
export const bending = { clause: 'ASI Handbook 1', basis: 'seen' } as const;

/** Moment and shear of one rectangle of the plate's depth, or of a cleat's leg, N mm and N. */
export const moment = step('φM_s', times(0.25, phi, fyp, tp, squared(hp)), bending);
export const Vc = step('φV_c', times(0.5, phi, fyp, tp, hp), shear, 'rectangle: greatest 1.5 times the mean');

/** Shear of the plate's full depth, AS 4100:2020 cl. 5.11.3, with the moment V z of cl. 5.12.3. */
export const plateGrossShear: StrengthRule = {
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('φV_vm', least(Vc, withMoment(Vc, z, moment)), shear),
    },
  ],
};

/** Bending of the plate under V at the centroid of the bolts, fully plastic (ASI Design Guide Handbook 1). */
export const plateBending: StrengthRule = {
  source: bending,
  ways: [
    {
      of: '',
      symbol: 'V z',
      load: 'V',
      demand: step('M', times(V, z), bending),
      resistance: moment,
    },
  ],
};
