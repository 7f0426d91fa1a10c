import { elasticForce } from '../../end/boltGroup.ts';
import { boltNotListed, type Limit, oneBoltRefers } from '../../end/gates.ts';
import { d, flag, fub, given, n, p, tp, tw } from '../../end/given.ts';
import {
  all,
  atMost,
  constant,
  least,
  minus,
  most,
  not,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  times,
} from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { gmb } from './factors.ts';

const source = { clause: '10.3.3', basis: 'seen' } as const;

const threadsIn = flag('threads in the shear plane', (f) => f.threadsIn);
const Anb = given('A_nb', '2,0', (f) => f.As);
const Asb = step('A_sb', over(times(constant('π', Math.PI), squared(d)), 4), source);

const joint = step('l_j', times(minus(n, 1), p));
const grip = step('l_g', plus(tw, tp));
const one = constant('1', 1);
/** Long joints. */
const beta = step(
  'β_lj',
  pick([[atMost(joint, times(15, d)), one]], most(minus(1.075, over(joint, times(200, d))), 0.75)),
  source,
);
/** Long grips; no larger than β_lj. */
const betaGrip = step(
  'β_lg',
  pick([[atMost(grip, times(5, d)), one]], least(over(times(8, d), plus(times(3, d), grip)), beta)),
  source,
);

/** One bolt in one plane, N. */
export const boltResistance = step(
  'V_dsb',
  pick(
    [[threadsIn, over(times(fub, Anb, beta, betaGrip), times(root(3), gmb))]],
    over(times(fub, Asb, beta, betaGrip), times(root(3), gmb)),
  ),
  source,
);

/** A size that the library has no tensile area for. */
const noArea: Limit = {
  when: all(threadsIn, boltNotListed.when),
  reason: 'bolt-not-listed',
  always: true,
  noNumber: true,
};
const longGrip: Limit = { when: not(atMost(grip, times(8, d))), reason: 'grip-too-long', always: false };
export const boltLimits: readonly Limit[] = [noArea, boltNotListed, longGrip];

/** Bolts in shear, IS 800:2007 cl. 10.3.3: threads in the plane or not, long joints, long grips up to 8 d. */
export const boltShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'R_max',
      load: 'V',
      demand: elasticForce,
      resistance: boltResistance,
      limits: [oneBoltRefers, ...boltLimits],
    },
  ],
};
