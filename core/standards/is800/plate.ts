import { flag, fyp, hp, tp, V, z } from '../../end/given.ts';
import { least, over, pick, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { gm0 } from './factors.ts';
import { yieldShear } from './given.ts';
import { withShear } from './withShear.ts';

const shear = { clause: '8.4.1', basis: 'seen' } as const;
const bending = { clause: '8.2.1, 9.2.2', basis: 'memory' } as const;
const plastic = flag('option plate-bending: plastic', (f) => f.options['plate-bending'] === 'plastic');

const Vd = step('V_d', yieldShear(times(tp, hp), fyp), shear, 'the whole area of a plate');

/** Shear of the plate's full depth, IS 800:2007 cl. 8.4.1. */
export const plateGrossShear: StrengthRule = {
  source: shear,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: Vd }],
};

const Ze = step('Z_e', over(times(tp, squared(hp)), 6), bending);
const Zp = step('Z_p', over(times(tp, squared(hp)), 4), bending);
const Z = step('Z', pick([[plastic, least(Zp, times(1.2, Ze))]], Ze), bending);
const Mp = step('M_p', over(times(fyp, Zp), gm0), bending);

/** Bending of the plate under V at the centroid of the bolts, as of what is left behind a cope. */
export const plateBending: StrengthRule = {
  source: bending,
  ways: [
    {
      of: '',
      symbol: 'V z',
      load: 'V',
      demand: step('M', times(V, z), bending),
      resistance: step('M_d', least(over(times(fyp, Z), gm0), times(z, withShear(Vd, z, Mp))), bending),
    },
  ],
};
