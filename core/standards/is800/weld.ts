import type { Gate, Limit } from '../../end/gates.ts';
import { flag, fup, hp, leg, V, z } from '../../end/given.ts';
import {
  atMost,
  below,
  constant,
  least,
  minus,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  times,
} from '../../formula/tree.ts';
import { leastLeg, legBelow } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { gmw } from './factors.ts';
import { fuw } from './given.ts';

const source = { clause: '10.5', basis: 'seen' } as const;
const combined = { clause: '10.5.10', basis: 'memory' } as const;

const throat = step('t_t', times(0.7, leg), source);
const length = step('L', minus(hp, times(2, leg)), source, 'without a leg at each end');
const long = step(
  'β_lw',
  pick(
    [[atMost(length, times(150, throat)), constant('1', 1)]],
    minus(1.2, over(times(0.2, length), times(150, throat))),
  ),
  source,
);
const mild = step('f_u', least(fuw, fup), source, 'weld metal or plate');

const q = step('q', over(V, times(2, length)), source);
const f = step('f', over(times(6, V, z), times(2, squared(length))), source, 'at the ends of the weld');

const noWeld: Gate = { when: flag('no weld', (f) => f.kind === 'web-bolts'), reason: 'no-weld' };
const mm = (size: number) => constant(`${size} mm`, size, '1,0');
const limits: readonly Limit[] = [
  { when: atMost(length, mm(0)), reason: 'short-weld', always: true, noNumber: true },
  { when: below(length, times(4, leg)), reason: 'short-weld', always: true },
  legBelow(
    leastLeg(
      [
        [10, 3],
        [20, 5],
        [32, 6],
      ],
      8,
      source,
    ),
  ),
  { when: below(throat, mm(3)), reason: 'thin-throat', always: false },
];

/**
 * Two upright fillets of the plate's depth under V and V z, elastic line, IS 800:2007 cl. 10.5: length without a leg at each end, the
 * combination of 10.5.10 or, where that is less, the plain sum that exempts from it.
 */
export const weld: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'q_e',
      load: 'V',
      demand: step('q_e', least(root(plus(squared(f), times(3, squared(q)))), plus(f, q)), combined),
      resistance: step('q_d', over(times(throat, mild, long), times(root(3), gmw)), source),
      off: [noWeld],
      limits,
    },
  ],
};
