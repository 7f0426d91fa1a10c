import { elasticForce } from '../../end/boltGroup.ts';
import { oneBolt, pairOfCleats, wideHole } from '../../end/gates.ts';
import { d, flag, k, m, n, p, q, tp, tw } from '../../end/given.ts';
import { centreForce } from '../../end/instantaneousCentre.ts';
import {
  below,
  type Condition,
  constant,
  minus,
  over,
  pick,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { phiB, phiBr } from './factors.ts';
import { Fu, Fub, Fup } from './given.ts';

const shear = { clause: '13.12.1.2 c', basis: 'seen' } as const;
const bearing = { clause: '13.12.1.2 a', basis: 'seen' } as const;
const byCentre = flag(
  'option bolt-group: instantaneous-centre',
  (f) => f.options['bolt-group'] === 'instantaneous-centre',
);
/** Bolts of one place: diameter, strength, whether threads lie in the shear plane. */
interface Bolts {
  readonly d: Tree<Length>;
  readonly Fub: Tree<Stress>;
  readonly threadsIn: Condition;
}

/** Where joints are long, free of the noise that lengths in inches bring. */
const long = constant('760 mm', 760 * (1 - 1e-12), '1,0');

/**
 * One bolt in one plane, N, in a joint of the given length: shank area, 0.70 where threads lie in the plane, 0.50/0.60 in joints of 760 mm and
 * more.
 */
export const inOnePlane =
  ({ d, Fub, threadsIn }: Bolts) =>
  (length: Tree<Length>): Tree<Force> => {
    const area = step('A_b', over(times(constant('π', Math.PI), squared(d)), 4));
    const shank = times(0.6, phiB, area, Fub);
    const plain = pick([[threadsIn, times(shank, 0.7)]], shank);
    return pick(
      [[below(step('L', length), long), step('V_r', plain, shear)]],
      step('V_r', times(step('V_1', plain, shear), over(0.5, 0.6)), shear, 'long joint, L ≥ 760 mm'),
    );
  };

const onePlane = inOnePlane({ d, Fub, threadsIn: flag('threads in the shear plane', (f) => f.threadsIn) });

/** One bolt through the web, N: in one plane, in two between a pair of cleats. */
const throughWeb = (length: Tree<Length>): Tree<Force> => {
  const one = onePlane(length);
  return pick([[pairOfCleats.when, step('k V_r', times(k, one), shear, 'two planes')]], one);
};

/** Along the rows under V, along the columns under a tie force. */
export const boltInShear = throughWeb(times(minus(n, 1), p));
export const boltTied = throughWeb(times(minus(m, 1), q));

/** Bolts in shear, CSA S16:19 cl. 13.12.1.2 c). */
export const boltShear: StrengthRule = {
  source: shear,
  ways: [
    {
      of: '',
      symbol: 'R_max',
      load: 'V',
      demand: pick([[byCentre, centreForce]], elasticForce),
      resistance: boltInShear,
      unbounded: oneBolt,
    },
  ],
};

/** Bearing at one bolt in a round hole, cl. 13.12.1.2 a). N */
export const bearingAt = (t: Tree<Length>, d: Tree<Length>, Fu: Tree<Stress>): Tree<Force> =>
  step('B_r', times(3, phiBr, t, d, Fu), bearing);
export const bearingOn = (t: Tree<Length>, Fu: Tree<Stress>): Tree<Force> => bearingAt(t, d, Fu);

/** The force is the elastic one under either option. */
const rule = (t: Tree<Length>, Fu: Tree<Stress>, symbol = 'R_max', demand = elasticForce): StrengthRule => ({
  source: bearing,
  ways: [
    {
      of: '',
      symbol,
      load: 'V',
      demand,
      resistance: bearingOn(t, Fu),
      unbounded: oneBolt,
      limits: [wideHole],
    },
  ],
});

export const webBearing = rule(tw, Fu);
export const plateBearing = rule(tp, Fup);
/** Each cleat takes its share of the bolt's force. */
export const cleatBearing = rule(tp, Fup, 'R_max/k', step('R_max/k', over(elasticForce, k)));
