import { elasticForce } from '../../end/boltGroup.ts';
import { boltNotListed, fullDepthPlate, type Limit, oneBoltRefers, supportBoltNotListed } from '../../end/gates.ts';
import { d, flag, fub, given, k, n, p, supportBolts, tp, ts, tw } from '../../end/given.ts';
import { supportForce } from '../../end/supportGroup.ts';
import {
  all,
  atMost,
  type Condition,
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
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Area, Force, Length, Pure, Stress } from '../../units/dimension.ts';
import { oneSupportBoltRefers } from '../methods/supportPly.ts';
import type { StrengthRule } from '../standard.ts';
import { gmb } from './factors.ts';

const source = { clause: '10.3.3', basis: 'seen' } as const;

/** Bolts of one place: diameter, rows and pitch of a line, strength, tensile area, what they clamp, whether threads lie in the plane. */
interface Bolts {
  readonly d: Tree<Length>;
  readonly n: Tree<Pure>;
  readonly p: Tree<Length>;
  readonly fub: Tree<Stress>;
  readonly As: Tree<Area>;
  readonly grip: Tree<Length>;
  readonly threadsIn: Condition;
}

const one = constant('1', 1);

/** Factors of long joints and of long grips, the second no larger than the first. */
const reductions = ({ d, n, p, grip }: Bolts) => {
  const joint = step('l_j', times(minus(n, 1), p));
  const beta = step(
    'β_lj',
    pick([[atMost(joint, times(15, d)), one]], most(minus(1.075, over(joint, times(200, d))), 0.75)),
    source,
  );
  const betaGrip = step(
    'β_lg',
    pick([[atMost(grip, times(5, d)), one]], least(over(times(8, d), plus(times(3, d), grip)), beta)),
    source,
  );
  return times(beta, betaGrip);
};

/** One bolt in shear, N, in so many planes. */
const strengthOf = (bolts: Bolts, planes: Tree<Pure> | 1): Tree<Force> => {
  const shank = step('A_sb', over(times(constant('π', Math.PI), squared(bolts.d)), 4), source);
  const stress = times(bolts.fub, reductions(bolts));
  const share = planes === 1 ? stress : times(stress, planes);
  const by = (area: Tree<Area>): Tree<Force> => over(times(share, area), times(root(3), gmb));
  const note = planes === 1 ? undefined : 'k shear planes';
  return step('V_dsb', pick([[bolts.threadsIn, by(bolts.As)]], by(shank)), source, note);
};

/** A size that the library has no tensile area for, a bolt not listed, a grip beyond 8 d. */
const limitsOf = ({ threadsIn, grip, d }: Bolts, notListed: Limit): readonly Limit[] => [
  { ...notListed, when: all(threadsIn, notListed.when), noNumber: true },
  notListed,
  { when: not(atMost(grip, times(8, d))), reason: 'grip-too-long', always: false },
];

const web: Bolts = {
  d,
  n,
  p,
  fub,
  As: given('A_nb', '2,0', (f) => f.As),
  grip: step('l_g', plus(tw, times(k, tp)), undefined, 'web and plate, or cleats'),
  threadsIn: flag('threads in the shear plane', (f) => f.threadsIn),
};
/** One bolt through the web, N: in one plane, or in two between a pair of cleats. */
export const boltResistance = strengthOf(web, k);
export const boltLimits = limitsOf(web, boltNotListed);

const intoSupport: Bolts = {
  ...supportBolts,
  grip: step('l_g', plus(tp, ts), undefined, "leg or plate and, where told, the support's ply"),
  threadsIn: flag('threads in the shear plane', (f) => f.supportBolts.threadsIn),
};

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

/** Bolts into the support: V shared evenly by two lines; one line, as of one cleat, also holds V at its arm. */
export const supportBoltShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'R_s',
      load: 'V',
      demand: supportForce,
      resistance: strengthOf(intoSupport, 1),
      limits: [oneSupportBoltRefers, ...limitsOf(intoSupport, supportBoltNotListed), fullDepthPlate],
    },
  ],
};
