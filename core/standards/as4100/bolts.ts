import { elasticForce } from '../../end/boltGroup.ts';
import { boltNotListed, fullDepthPlate, type Limit, oneBoltRefers, supportBoltNotListed } from '../../end/gates.ts';
import { d, flag, found, given, k, n, p, supportBolts } from '../../end/given.ts';
import { supportForce } from '../../end/supportGroup.ts';
import {
  all,
  atMost,
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
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import { oneSupportBoltRefers } from '../methods/supportPly.ts';
import type { StrengthRule } from '../standard.ts';
import { coreArea } from './coreArea.ts';
import { phiB } from './factors.ts';
import { fuf } from './given.ts';

const source = { clause: '9.2.2.1', basis: 'seen' } as const;
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

/** Bolts of one place: diameter, rows and pitch of a line, tensile strength, whether threads lie in the plane. */
interface Bolts {
  readonly d: Tree<Length>;
  readonly n: Tree<Pure>;
  readonly p: Tree<Length>;
  readonly fuf: Tree<Stress>;
  readonly threadsIn: Condition;
}

/** Bolts stronger than property class 8.8 with threads in the plane take k_rd. */
const factorFor = ({ threadsIn, fuf }: Bolts): Tree<Pure> => {
  const strong = below(constant('830 MPa', 830, '-2,1'), fuf);
  return step('k_rd', pick([[all(threadsIn, strong), constant('0.83', 0.83)]], constant('1', 1)), source);
};

const lapFactor = ({ n, p }: Bolts): Tree<Pure> => {
  const length = step('l_j', times(minus(n, 1), p));
  return step(
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
};

/** One bolt in shear, N, in so many planes. */
const strengthOf = (bolts: Bolts, planes: Tree<Pure> | 1): Tree<Force> => {
  const core = step(
    'A_c',
    found('2,0', 'core area, by the table', [bolts.d], (_, diameter) => coreArea(diameter!)),
    { clause: 'AS 1275', basis: 'memory' },
  );
  const shank = step('A_o', over(times(constant('π', Math.PI), squared(bolts.d)), 4), source);
  const onePlane = times(phiB, 0.62, bolts.fuf, factorFor(bolts), lapFactor(bolts));
  const stress = planes === 1 ? onePlane : times(onePlane, planes);
  const note = planes === 1 ? undefined : 'k shear planes';
  return step('φV_f', pick([[bolts.threadsIn, times(stress, core)]], times(stress, shank)), source, note);
};

const threadsIn = flag('threads in the shear plane', (f) => f.threadsIn);
/** One bolt through the web, N: in one plane, or in two between a pair of cleats. */
export const boltResistance = strengthOf({ d, n, p, fuf, threadsIn }, k);

const supportThreadsIn = flag('threads in the shear plane', (f) => f.supportBolts.threadsIn);
/** One bolt into the support, N, in one plane. */
const supportBoltResistance = strengthOf(
  { ...supportBolts, fuf: given('f_uf,s', '-2,1', (f) => f.supportBolts.fub), threadsIn: supportThreadsIn },
  1,
);

/** A size that the standard does not list has no core area. */
const noCoreArea = (threadsIn: Condition, notListed: Limit): Limit => ({
  ...notListed,
  when: all(threadsIn, notListed.when),
  noNumber: true,
});
export const boltLimits: readonly Limit[] = [noCoreArea(threadsIn, boltNotListed), boltNotListed];

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

/** Bolts into the support: V shared evenly by two lines; one line, as of one cleat, also holds V at its arm. */
export const supportBoltShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'R_s',
      load: 'V',
      demand: supportForce,
      resistance: supportBoltResistance,
      limits: [
        oneSupportBoltRefers,
        noCoreArea(supportThreadsIn, supportBoltNotListed),
        supportBoltNotListed,
        fullDepthPlate,
      ],
    },
  ],
};
