import { elasticForce } from '../../end/boltGroup.ts';
import { oneBolt, wideHole } from '../../end/gates.ts';
import { d, flag, fu, fub, fup, n, p, tp, tw } from '../../end/given.ts';
import { centreForce } from '../../end/instantaneousCentre.ts';
import { all, atMost, constant, minus, most, over, pick, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { phiB, phiBr } from './factors.ts';

const shear = { clause: '13.12', basis: 'memory' } as const;
const bearing = { clause: '13.10', basis: 'memory' } as const;
const byCentre = flag(
  'option bolt-group: instantaneous-centre',
  (f) => f.options['bolt-group'] === 'instantaneous-centre',
);
const threadsIn = flag('threads in the shear plane', (f) => f.threadsIn);

const area = step('A_b', over(times(constant('π', Math.PI), squared(d)), 4));
const length = step('L', times(minus(n, 1), p));

const plainBolt = times(0.6, phiB, area, fub);

/** Long joints, L > 15 d. */
const long = step('k_L', most(minus(1.075, times(0.005, over(length, d))), 0.75), shear);

/** One bolt in one plane: 0.70 where threads lie in it, less in long joints. */
export const boltResistance = step(
  'V_r',
  pick(
    [
      [all(threadsIn, atMost(length, times(15, d))), times(plainBolt, 0.7)],
      [threadsIn, times(plainBolt, 0.7, long)],
      [atMost(length, times(15, d)), plainBolt],
    ],
    times(plainBolt, long),
  ),
  shear,
);

/** Bolts in shear, SANS 10162-1:2011 cl. 13.12: shank area, 0.70 with threads in the plane, less in long joints. */
export const boltShear: StrengthRule = {
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'R_max',
      load: 'V',
      demand: pick([[byCentre, centreForce]], elasticForce),
      resistance: boltResistance,
      unbounded: oneBolt,
    },
  ],
};

export const bearingOn = (t: Tree<Length>, fu: Tree<Stress>): Tree<Force> =>
  step('B_r', times(3, phiBr, t, d, fu), bearing);

/** Bearing at one bolt, cl. 13.10; the force is the elastic one under either option. */
const rule = (t: Tree<Length>, fu: Tree<Stress>): StrengthRule => ({
  source: bearing,
  ways: [
    {
      of: '',
      symbol: 'R_max',
      load: 'V',
      demand: elasticForce,
      resistance: bearingOn(t, fu),
      unbounded: oneBolt,
      limits: [wideHole],
    },
  ],
});

export const webBearing = rule(tw, fu);
export const plateBearing = rule(tp, fup);
