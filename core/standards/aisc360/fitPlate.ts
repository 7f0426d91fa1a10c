import type { Facts } from '../../end/facts.ts';
import type { Gate } from '../../end/gates.ts';
import { d, eBot, eTop, flag, g, h, hp, m, n, p, r, tf, tp, tw, y1 } from '../../end/given.ts';
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

const copedAbove: Gate = { when: flag('', (f) => f.dt > 0, 'coped above'), reason: 'coped-above' };
const copedBelow: Gate = { when: flag('', (f) => f.db > 0, 'coped below'), reason: 'coped-below' };
const root = step('t_f + r', plus(tf, r), source);

/** A plate of half the clear web's depth at least, between the fillets where the flanges stand. */
export const fitPlateDepth: FitRule = {
  source,
  breach: 'fails',
  parts: [
    {
      of: 'depth',
      given: hp,
      least: step('h_min', over(minus(h, times(2, plus(tf, r))), 2), source, 'half the clear web'),
    },
    { of: 'top', given: step('y_p', minus(y1, eTop), source, 'top of the plate'), least: root, off: [copedAbove] },
    {
      of: 'bottom',
      given: step('y_q', minus(h, plus(y1, times(minus(n, 1), p), eBot)), source, 'foot of the plate, from below'),
      least: root,
      off: [copedBelow],
    },
  ],
};

const longPlate: Gate = { when: extended, reason: 'extended-plate' };

/** Gap between support and beam; long plates have no upper limit. */
export const fitSetback: FitRule = {
  source: { clause: 'practice', basis: 'practice' },
  breach: 'refer',
  parts: [
    { of: '', given: g, least: inches('1/4', 1 / 4) },
    { of: '', given: g, most: inches('1', 1), off: [longPlate] },
  ],
};

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
const notFinPlate = off(
  flag('', (f) => f.kind !== 'fin-plate', 'no fin plate'),
  'fin-plates-only',
);

/** The end turns as the beam does: by the rule of conventional plates, or the plate gives before the bolts do. */
export const fitRotation: FitRule = {
  source,
  breach: 'fails',
  parts: [
    { of: 'thinner ply', given: thinner, most: conventionalMost, off: [notFinPlate, off(extended, 'extended-plate')] },
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
  ],
};
