import {
  channelCope,
  copeLimits,
  cutEdgeInTension,
  type Gate,
  type Limit,
  noRectangle,
  noTee,
  uncoped,
} from '../../end/gates.ts';
import { cb, ct, dt, flag, found, g, h, ho, tee, tw, V } from '../../end/given.ts';
import { plainTee } from '../../end/netSections.ts';
import {
  all,
  atMost,
  below,
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
import {
  copeFactor,
  deeper,
  longer,
  methodLimits,
  nothingLeft,
  plateFactor,
  rectangleStress,
  teeStress,
} from '../methods/copeBuckling.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { barMoment } from './bar.ts';
import { manual } from './clauses.ts';
import { older, plainRectangle } from './copeBending.ts';
import { E, Fy } from './given.ts';
import { cutSlenderness, slenderCutWeb } from './limits.ts';
import { bending, type Method } from './method.ts';

const source = manual(9);

/** Top cope alone: plate with one free edge, yielding to buckling by its slenderness. */
const k1 = step('k_1', most(times(copeFactor, plateFactor), 1.61), source);
const plasticUpTo = step('λ_p', times(0.475, root(over(times(k1, E), Fy))), source);
const Mp = step('M_p', times(Fy, plainTee.Z), source);
const My = step('M_y', times(Fy, plainTee.S), source);
const teeMoment = step(
  'M_n',
  pick(
    [
      [older, times(least(teeStress(E), Fy), plainTee.S)],
      [atMost(cutSlenderness, plasticUpTo), Mp],
      [
        atMost(cutSlenderness, times(2, plasticUpTo)),
        minus(Mp, times(minus(Mp, My), minus(over(cutSlenderness, plasticUpTo), 1))),
      ],
    ],
    over(times(0.903, E, k1, plainTee.S), squared(cutSlenderness)),
  ),
  source,
);

/** Two copes: the web between them as a rectangular bar of the top cope's length. */
const growth = step(
  'k_c',
  found('0,0', '3 + ln(c_t/h)', [ct, h], (_, c, h) => 3 + Math.log(c! / h!)),
  source,
);
const gradient = times(growth, minus(1, over(dt, h)));
const Cb = step(
  'C_b',
  most(pick([[below(ct, cb), times(over(ct, cb), gradient)]], gradient), constant('1.84', 1.84)),
  source,
);
const rectangleMoment = pick(
  [[older, step('M_n', times(least(rectangleStress(E), Fy), plainRectangle.S), source)]],
  barMoment({ depth: ho, t: tw, Lb: ct, Cb, Fy }),
);
export const toTop = flag('option double-cope-arm: top', (f) => f.options['double-cope-arm'] === 'top');
const arm = step('e_c', plus(g, pick([[toTop, ct]], longer)), source);

const twoCopes: Gate = { when: not(noRectangle.when), reason: 'two-copes' };
const when = (limit: Limit, condition: Limit['when']): Limit => ({ ...limit, when: all(condition, limit.when) });
const common = [channelCope, ...copeLimits];

/**
 * Local buckling at the copes, Manual Part 9, 15th and 16th edition; option `cope-method: older` as in the 14th. The limits in length and
 * depth are the older edition's for a top cope, for two copes those of the tests behind the method (Dowswell and Whyte 2014).
 */
export const copeBuckling = ({ available }: Method): StrengthRule => {
  const way = (of: string, moment: typeof teeMoment, one: Pick<Way, 'demand' | 'off' | 'limits'>): Way => ({
    of,
    symbol: 'V e_c',
    load: 'V',
    resistance: available(moment, bending, source, 'M_n'),
    ...one,
  });
  return {
    source,
    ways: [
      way('rectangle', rectangleMoment, {
        demand: step('M', times(V, arm), source),
        off: [uncoped, noRectangle],
        limits: [
          when(nothingLeft, older),
          ...common,
          ...methodLimits(longer, deeper, 0.4),
          ...methodLimits(longer, deeper, 0.2).map((one) => when(one, older)),
        ],
      }),
      way('tee', teeMoment, {
        demand: step('M', times(V, tee.ec), source),
        off: [uncoped, noTee, twoCopes, cutEdgeInTension],
        limits: [...common, ...methodLimits(tee.c, tee.dc, 0.5), slenderCutWeb],
      }),
    ],
  };
};
