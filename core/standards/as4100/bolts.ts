import { elasticForce } from '../../end/boltGroup.ts';
import { boltNotListed, type Limit, oneBoltRefers } from '../../end/gates.ts';
import { d, flag, found, n, p } from '../../end/given.ts';
import { all, atMost, below, constant, minus, over, pick, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { coreArea } from './coreArea.ts';
import { phiB } from './factors.ts';
import { fuf } from './given.ts';

const source = { clause: '9.2.2.1', basis: 'seen' } as const;
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

const threadsIn = flag('threads in the shear plane', (f) => f.threadsIn);
const core = step(
  'A_c',
  found('2,0', 'core area, by the table', [d], (_, diameter) => coreArea(diameter!)),
  {
    clause: 'AS 1275',
    basis: 'memory',
  },
);
const shank = step('A_o', over(times(constant('π', Math.PI), squared(d)), 4), source);

/** Bolts stronger than property class 8.8 with threads in the plane. */
const strong = below(constant('830 MPa', 830, '-2,1'), fuf);
const kd = step('k_rd', pick([[all(threadsIn, strong), constant('0.83', 0.83)]], constant('1', 1)), source);

const length = step('l_j', times(minus(n, 1), p));
const kr = step(
  'k_r',
  pick(
    [
      [below(length, mm(300)), constant('1', 1)],
      [atMost(length, mm(1300)), minus(1.075, over(length, mm(4000)))],
    ],
    constant('0.75', 0.75),
  ),
  source,
  'a rule for laps, used here too',
);

/** One bolt in one plane, N. */
export const boltResistance = step(
  'φV_f',
  pick([[threadsIn, times(phiB, 0.62, fuf, kd, kr, core)]], times(phiB, 0.62, fuf, kd, kr, shank)),
  source,
);

/** A size that the standard does not list has no core area. */
const noCoreArea: Limit = {
  when: all(threadsIn, boltNotListed.when),
  reason: 'bolt-not-listed',
  always: true,
  noNumber: true,
};
export const boltLimits: readonly Limit[] = [noCoreArea, boltNotListed];

/** Bolts in shear, AS 4100:2020 cl. 9.2.2.1, on the elastic force of cl. 9.3. */
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
