import { elasticForce } from '../../end/boltGroup.ts';
import { oneBolt, pairOfCleats, wideHole } from '../../end/gates.ts';
import { d, flag, fu, fub, fup, k, n, p, tp, tw } from '../../end/given.ts';
import { centreForce } from '../../end/instantaneousCentre.ts';
import {
  all,
  atMost,
  type Condition,
  constant,
  minus,
  most,
  over,
  pick,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { phiB, phiBr } from './factors.ts';

const shear = { clause: '13.12', basis: 'memory' } as const;
const bearing = { clause: '13.10', basis: 'memory' } as const;
const byCentre = flag(
  'option bolt-group: instantaneous-centre',
  (f) => f.options['bolt-group'] === 'instantaneous-centre',
);

/** Bolts of one place: diameter, strength, rows and pitch of a line, whether threads lie in the shear plane. */
interface Bolts {
  readonly d: Tree<Length>;
  readonly fub: Tree<Stress>;
  readonly n: Tree<Pure>;
  readonly p: Tree<Length>;
  readonly threadsIn: Condition;
}

/** One bolt in one plane, N: shank area, 0.70 where threads lie in the plane, less in long joints, L > 15 d. */
export const inOnePlane = ({ d, fub, n, p, threadsIn }: Bolts): Tree<Force> => {
  const area = step('A_b', over(times(constant('π', Math.PI), squared(d)), 4));
  const length = step('L', times(minus(n, 1), p));
  const plain = times(0.6, phiB, area, fub);
  const long = step('k_L', most(minus(1.075, times(0.005, over(length, d))), 0.75), shear);
  const short = atMost(length, times(15, d));
  return step(
    'V_r',
    pick(
      [
        [all(threadsIn, short), times(plain, 0.7)],
        [threadsIn, times(plain, 0.7, long)],
        [short, plain],
      ],
      times(plain, long),
    ),
    shear,
  );
};

const onePlane = inOnePlane({ d, fub, n, p, threadsIn: flag('threads in the shear plane', (f) => f.threadsIn) });

/** One bolt through the web, N: in one plane, in two between a pair of cleats. */
export const boltResistance: Tree<Force> = pick(
  [[pairOfCleats.when, step('k V_r', times(k, onePlane), shear, 'two planes')]],
  onePlane,
);

/** Bolts in shear, SANS 10162-1:2011 cl. 13.12. */
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

/** Bearing at one bolt, cl. 13.10. N */
export const bearingAt = (t: Tree<Length>, d: Tree<Length>, fu: Tree<Stress>): Tree<Force> =>
  step('B_r', times(3, phiBr, t, d, fu), bearing);
export const bearingOn = (t: Tree<Length>, fu: Tree<Stress>): Tree<Force> => bearingAt(t, d, fu);

/** The force is the elastic one under either option. */
const rule = (t: Tree<Length>, fu: Tree<Stress>, symbol = 'R_max', demand = elasticForce): StrengthRule => ({
  source: bearing,
  ways: [
    {
      of: '',
      symbol,
      load: 'V',
      demand,
      resistance: bearingOn(t, fu),
      unbounded: oneBolt,
      limits: [wideHole],
    },
  ],
});

export const webBearing = rule(tw, fu);
export const plateBearing = rule(tp, fup);
/** Each cleat takes its share of the bolt's force. */
export const cleatBearing = rule(tp, fup, 'R_max/k', step('R_max/k', over(elasticForce, k)));
