import type { Gate } from '../../end/gates.ts';
import { fyp, hp, tp, V, z, z1 } from '../../end/given.ts';
import {
  atMost,
  below,
  constant,
  least,
  minus,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  times,
} from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { from } from './bound.ts';
import { gammaM0, gammaM1 } from './factors.ts';
import { plateModulus } from './plate.ts';
import { guide, memory } from './sources.ts';

const table17 = memory('BS 5950-1 Table 17');
const Eb = constant('E_b', 205_000, '-2,1');
const pi = constant('π', Math.PI);

/** A plate so short that it cannot buckle, z to the centroid of the bolts. */
export const shortPlate: Gate = { when: atMost(z, over(tp, from(0.15))), reason: 'short-plate-z' };

const lambda = step('λ_LT', times(2.8, root(over(times(z1, hp), times(1.5, squared(tp))))), guide);
const first = step('λ_L0', times(0.4, pi, root(over(Eb, fyp))), table17);
const eta = step(
  'η',
  pick(
    [
      [below(lambda, times(2, first)), times(0.014, minus(lambda, first))],
      [atMost(lambda, times(3, first)), times(0.014, first)],
    ],
    times(0.007, minus(lambda, first)),
  ),
  table17,
);
const pE = step('p_E', over(times(squared(pi), Eb), squared(lambda)), table17);
const phi = step('φ', over(plus(fyp, times(plus(1, eta), pE)), 2), table17);

/** Bending strength by slenderness, welded sections: BS 5950-1 Table 17, as the joint guide takes it over. MPa */
const fp = step(
  'f_p',
  pick([[atMost(lambda, first), fyp]], over(times(pE, fyp), plus(phi, root(minus(squared(phi), times(pE, fyp)))))),
  table17,
);

const resistance = step(
  'M_Rd',
  least(over(times(plateModulus, fp), times(0.6, gammaM1)), over(times(plateModulus, fyp), gammaM0)),
  guide,
);

/** Buckling of a long plate between weld and first column; 0.6 for moments that fall from the weld to the bolts. */
export const plateBuckling: StrengthRule = {
  source: table17,
  ways: [
    {
      of: '',
      symbol: 'V z',
      load: 'V',
      demand: step('M', times(V, z), guide),
      resistance,
      off: [shortPlate],
    },
  ],
};
