import { flag, fup, fus, hp, leg, V, Xu, z } from '../../end/given.ts';
import {
  atMost,
  below,
  constant,
  inMPa,
  minus,
  most,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  times,
} from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { upTo } from './bound.ts';
import { gammaM2 } from './factors.ts';
import { leastOf } from './optional.ts';
import { guide, seen } from './sources.ts';

const source = seen('1-8 4.5.3.3');
const mm = (length: number) => constant(`${length} mm`, length, '1,0');
const beta = (value: number) => constant('β_w', value);

/** Throat of a fillet with equal legs, mm. */
export const throat = step('a', over(leg, root(2)), source);

/**
 * Correlation factor by the plate's tensile strength, Table 4.1. A weaker support would have a smaller one, and the larger of the two
 * stands with the weaker strength, so that it is always the plate's.
 */
export const betaW = step(
  'β_w',
  pick(
    [
      [atMost(inMPa(fup), upTo(360)), beta(0.8)],
      [atMost(inMPa(fup), upTo(430)), beta(0.85)],
      [atMost(inMPa(fup), upTo(510)), beta(0.9)],
    ],
    beta(1),
  ),
  source,
);

/** The least tensile strength of the parts joined and of the weld metal, as far as they are told, MPa. */
export const weldedFu = step(
  'f_u',
  leastOf(
    [fup],
    [
      [flag('', (f) => f.fus > 0, 'the grade of the support is told'), fus],
      [flag('', (f) => f.Xu > 0, 'the weld metal is told'), Xu],
    ],
  ),
  source,
);

/** Full-size length, without a throat at either end, mm. */
const l = step('l', minus(hp, times(2, throat)), source);

const resistance = step('f_vw,d', over(times(throat, weldedFu), times(root(3), betaW, gammaM2)), source);

/** Two upright fillets under V and V z, simplified method of EN 1993-1-8 4.5.3.3: one strength whatever the direction. */
export const weld: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'v',
      load: 'V',
      demand: step(
        'v',
        root(plus(squared(over(V, times(2, l))), squared(over(times(3, V, z), squared(l))))),
        guide,
        'elastic line: shear, and bending at its ends',
      ),
      resistance,
      limits: [
        { when: atMost(l, mm(0)), reason: 'weld-too-short', always: true, noNumber: true },
        { when: below(throat, mm(3)), reason: 'weld-throat-below-least', always: false },
        { when: below(l, most(mm(30), times(6, throat))), reason: 'weld-too-short', always: false },
      ],
    },
  ],
};
