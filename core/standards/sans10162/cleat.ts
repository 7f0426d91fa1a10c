import { pairOfCleats } from '../../end/gates.ts';
import { fyp, hp, k, tp, V } from '../../end/given.ts';
import { over, squared, step, times } from '../../formula/tree.ts';
import { cleatArm, freeLeg } from '../methods/cleatArm.ts';
import { plateBuckling } from '../methods/plateBuckling.ts';
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';

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
      resistance: step('M_r', over(times(phi, fyp, k, tp, squared(hp)), 6), elastic),
    },
  ],
};

const alone = plateBuckling((Q, fy, W) => times(phi, Q, fy, W), fyp, freeLeg);

/** The web leg of one cleat alone, as a long plate; a pair holds each other. */
export const cleatBuckling: StrengthRule = {
  ...alone,
  ways: alone.ways.map((way) => ({ ...way, off: [pairOfCleats, ...(way.off ?? [])] })),
};
