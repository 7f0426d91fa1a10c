import { byKind, isCleat, isEndPlate } from '../../end/byKind.ts';
import type { Facts } from '../../end/facts.ts';
import { fullDepthPlate, type Gate } from '../../end/gates.ts';
import { d, flag, hp, m, n, supportBolts, tp, tw } from '../../end/given.ts';
import {
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
  squared,
  step,
  times,
} from '../../formula/tree.ts';
import type { FitRule } from '../standard.ts';
import { Cmoment } from './boltGroup.ts';
import { manual } from './clauses.ts';
import { conventional, endsHold, extended, fits, ploughed } from './conventional.ts';
import { Fnv, Fyp, inches } from './given.ts';
import { boltArea } from './oneBolt.ts';

const source = manual(10);

const few = atMost(n, 5);
const sixteenth = inches('1/16', 1 / 16);
const thinner = step('t', least(tp, tw), source, 'the thinner ply');
const ploughing = step('t_max', plus(over(d, 2), sixteenth), source);
const conventionalMost = step(
  't_max',
  pick([[few, plus(over(d, 2), sixteenth)]], minus(over(d, 2), sixteenth)),
  source,
);

/** An extended plate that turns by ploughing: 2 d to the ends, one column with one thin ply, or two with both. */
const ploughs = (f: Facts): boolean => {
  if (!endsHold(f)) return false;
  if (f.m === 1) return fits(Math.min(f.tp, f.tw), ploughed(f.d));
  return f.m === 2 && fits(Math.max(f.tp, f.tw), ploughed(f.d));
};
const exception = flag('bolts plough before they break', ploughs);
const counted = step('t', pick([[atMost(m, 1), least(tp, tw)]], most(tp, tw)), source, 'the ply that counts');

/** Thickness up to which the plate yields before the bolts break: 6 M_max/(F_y h_p²), M_max = F_nv/0.90 A_b C′. */
const Mmax = step('M_max', times(over(Fnv, constant('0.90', 0.9)), boltArea, Cmoment), source);
const weakerThanBolts = step('t_max', over(times(6, Mmax), times(Fyp, squared(hp))), source);

const off = (when: Condition, reason: string): Gate => ({ when, reason });
const unless = (called: string, is: (kind: Facts['kind']) => boolean, reason: string): Gate =>
  off(not(byKind('', is, called)), reason);

const notFinPlate = unless('fin plate', (kind) => kind === 'fin-plate', 'fin-plates-only');
const noAngles = unless('angles', isCleat, 'no-cleat');
const notOneAngle = unless('one angle', (kind) => kind === 'single-cleat', 'no-cleat');
const noEndPlate = unless('end plate', isEndPlate, 'no-end-plate');
const endPlateOff = [noEndPlate, fullDepthPlate];

/** One angle alone has 3/8 in, 1/2 in for bolts above 7/8 in. */
const angleLeast = step(
  't_min',
  pick([[atMost(most(d, supportBolts.d), inches('7/8', 7 / 8)), inches('3/8', 3 / 8)]], inches('1/2', 1 / 2)),
  source,
);

/**
 * The end turns as the beam does: by the rule of conventional plates, or the plate gives before the bolts do; angles and end plates of partial
 * depth are thin enough to bend, an end plate's lines near enough and far enough from the web.
 */
export const fitRotation: FitRule = {
  source,
  breach: 'fails',
  parts: [
    {
      of: 'thinner ply',
      given: thinner,
      most: conventionalMost,
      off: [fullDepthPlate, notFinPlate, off(extended, 'extended-plate')],
    },
    {
      of: 'ply',
      given: counted,
      most: ploughing,
      off: [notFinPlate, off(conventional, 'conventional-plate'), off(not(exception), 'bolts-first')],
    },
    {
      of: 'plate',
      given: tp,
      most: weakerThanBolts,
      off: [notFinPlate, off(conventional, 'conventional-plate'), off(exception, 'ploughing')],
    },
    { of: 'angle', given: tp, most: inches('5/8', 5 / 8), off: [noAngles], breach: 'refer' },
    { of: 'one angle', given: tp, least: angleLeast, off: [notOneAngle], breach: 'refer' },
    { of: 'end plate', given: tp, most: inches('3/8', 3 / 8), off: endPlateOff, breach: 'refer' },
    {
      of: 'cross centres',
      given: supportBolts.cc,
      least: inches('3-1/2', 3.5),
      most: inches('5-1/2', 5.5),
      off: endPlateOff,
      breach: 'refer',
    },
  ],
};
