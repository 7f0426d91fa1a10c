import { flag, fyp, hp, tp, V, z } from '../../end/given.ts';
import { least, over, pick, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Modulus, Moment } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { gm0 } from './factors.ts';
import { yieldShear } from './given.ts';
import { withShear } from './withShear.ts';

export const shear = { clause: '8.4.1', basis: 'seen' } as const;
export const bending = { clause: '8.2.1, 9.2.2', basis: 'memory' } as const;
const plastic = flag('option plate-bending: plastic', (f) => f.options['plate-bending'] === 'plastic');

/** Shear of one rectangle of the plate's depth, or of a cleat's leg, N. */
export const Vd = step('V_d', yieldShear(times(tp, hp), fyp), shear, 'the whole area of a plate');

/** Shear of the plate's full depth, IS 800:2007 cl. 8.4.1. */
export const plateGrossShear: StrengthRule = {
  source: shear,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: Vd }],
};

const Ze = step('Z_e', over(times(tp, squared(hp)), 6), bending);
export const Zp = step('Z_p', over(times(tp, squared(hp)), 4), bending);
export const Z = step('Z', pick([[plastic, least(Zp, times(1.2, Ze))]], Ze), bending);

/** Moment at the arm of V, N mm, that moduli and shear strength allow: less where the shear is high. */
export const bendingUnder = (arm: Tree<Length>, Z: Tree<Modulus>, Zp: Tree<Modulus>, Vd: Tree<Force>): Tree<Moment> => {
  const Mp = step('M_p', over(times(fyp, Zp), gm0), bending);
  return step('M_d', least(over(times(fyp, Z), gm0), times(arm, withShear(Vd, arm, Mp))), bending);
};

/** Bending of the plate under V at the centroid of the bolts, as of what is left behind a cope. */
export const plateBending: StrengthRule = {
  source: bending,
  ways: [
    {
      of: '',
      symbol: 'V z',
      load: 'V',
      demand: step('M', times(V, z), bending),
      resistance: bendingUnder(z, Z, Zp, Vd),
    },
  ],
};
