import type { Gate, Limit } from '../../end/gates.ts';
import { flag, hp, leg, tp, V, z } from '../../end/given.ts';
import {
  all,
  atMost,
  below,
  constant,
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
import { clause, manual } from './clauses.ts';
import { FEXX, Fyp, inches, KSI } from './given.ts';
import { type Method, rupture } from './method.ts';

const practice = manual(10);
const table = clause('Table J2.4');
const line = clause('J2.4');

const ksi = (strength: number) => constant(`${strength} ksi`, strength * KSI, '-2,1');
/** Least leg by the plate's thickness. */
const leastLeg = step(
  's_min',
  pick(
    [
      [atMost(tp, inches('1/4', 1 / 4)), inches('1/8', 1 / 8)],
      [atMost(tp, inches('1/2', 1 / 2)), inches('3/16', 3 / 16)],
      [atMost(tp, inches('3/4', 3 / 4)), inches('1/4', 1 / 4)],
    ],
    inches('5/16', 5 / 16),
  ),
  table,
);
/** Leg with which the plate yields before its welds, both sides. */
const legAsked = step(
  's_req',
  most(times(constant('5/8', 0.625), tp, most(1, over(ksi(70), FEXX)), most(1, over(Fyp, ksi(50)))), leastLeg),
  practice,
);

const byStrength = flag('option weld: strength', (f) => f.options.weld === 'strength');
const tooSmall = below(leg, legAsked);
const bySize: Gate = { when: all(not(byStrength), not(tooSmall)), reason: 'weld-by-size' };
const notBySize: Gate = { when: not(bySize.when), reason: 'weld-by-strength' };
const belowLeast: Limit = { when: tooSmall, reason: 'weld-leg-below-least', always: false };

const perLength = step('R_nw', over(times(0.6, FEXX, leg), root(2)), line, 'along one weld, k_ds = 1.0');
const share = step(
  'k_w',
  root(plus(squared(over(1, times(2, hp))), squared(over(times(6, z), times(2, squared(hp)))))),
  practice,
  'on a length of weld, of each unit of V',
);

/** Two fillets of the plate's depth: sized so that the plate yields first; smaller ones as an elastic line under V and V z. */
export const weld = ({ available }: Method): StrengthRule => ({
  source: practice,
  ways: [
    { of: 'size', symbol: 's', load: 'none', demand: legAsked, resistance: step('s', leg), off: [notBySize] },
    {
      of: 'strength',
      symbol: 'v',
      load: 'V',
      demand: step('v', times(V, share), practice),
      resistance: available(perLength, rupture, line, 'R_nw'),
      off: [bySize],
      limits: [belowLeast],
      source: line,
    },
  ],
});
