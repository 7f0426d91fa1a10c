import { fyp, hp, tp, V, z, z1 } from '../../end/given.ts';
import { atMost, constant, inMPa, minus, over, pick, plus, root, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';

const gross = { clause: '13.11', basis: 'memory' } as const;
const elastic = { clause: 'elastic', basis: 'memory' } as const;
const bar = { clause: 'US bar form', basis: 'research' } as const;

/** Yielding in shear of the plate's full depth, coefficient of cl. 13.11. */
export const plateGrossShear: StrengthRule = {
  source: gross,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(0.6, phi, fyp, tp, hp), gross) }],
};

/** First yield of the plate in bending under V at the centroid of the bolts. */
export const plateBending: StrengthRule = {
  source: elastic,
  ways: [
    {
      of: '',
      symbol: 'V z',
      load: 'V',
      demand: step('M', times(V, z), elastic),
      resistance: step('M_r', over(times(phi, fyp, tp, squared(hp)), 6), elastic),
    },
  ],
};

const lambda = step(
  'λ',
  over(times(hp, root(over(inMPa(fyp), 6.895))), times(10, tp, root(plus(475, times(280, squared(over(hp, z1))))))),
  bar,
);
const Q = step(
  'Q',
  pick(
    [
      [atMost(lambda, 0.7), constant('1', 1)],
      [atMost(lambda, 1.41), minus(1.34, times(0.486, lambda))],
    ],
    over(1.3, squared(lambda)),
  ),
  bar,
);

/** Buckling of a long plate between weld and first bolt column: published US form for a rectangular bar, no clause of this standard. */
export const plateBuckling: StrengthRule = {
  source: bar,
  ways: [
    {
      of: '',
      symbol: 'V z_1',
      load: 'V',
      demand: step('M', times(V, z1), bar),
      resistance: step('M_r', over(times(phi, Q, fyp, tp, squared(hp)), 6), bar),
      off: [{ when: atMost(z1, over(tp, 0.15)), reason: 'short-plate' }],
    },
  ],
};
