import { pairOfCleats } from '../../end/gates.ts';
import { hp, k, tp, V } from '../../end/given.ts';
import { over, squared, step, times } from '../../formula/tree.ts';
import { cleatArm, freeLeg } from '../methods/cleatArm.ts';
import { plateBuckling } from '../methods/plateBuckling.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';
import { Fyp } from './given.ts';

const elastic = { clause: 'elastic', basis: 'memory' } as const;

/** First yield of the cleats in bending. */
export const cleatBending: StrengthRule = {
  source: elastic,
  ways: [
    {
      of: '',
      symbol: 'V e',
      load: 'V',
      demand: step('M', times(V, cleatArm), elastic),
      resistance: step('M_r', over(times(phi, Fyp, k, tp, squared(hp)), 6), elastic),
    },
  ],
};

const alone = plateBuckling((Q, fy, W) => times(phi, Q, fy, W), Fyp, freeLeg);

/** The web leg of one cleat alone, as a long plate; a pair holds each other. */
export const cleatBuckling: StrengthRule = {
  ...alone,
  ways: alone.ways.map((way) => ({ ...way, off: [pairOfCleats, ...(way.off ?? [])] })),
};
