import type { Gate, Limit } from '../../end/gates.ts';
import { flag, hp, k, leg, legSupport, tp, ts, V } from '../../end/given.ts';
import {
  atMost,
  below,
  constant,
  least,
  minus,
  not,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  times,
} from '../../formula/tree.ts';
import type { Way } from '../standard.ts';
import { clause, manual } from './clauses.ts';
import { cleatArm } from './cleatBending.ts';
import { FEXX, inches } from './given.ts';
import { leastLeg } from './leastLeg.ts';
import { type Method, rupture } from './method.ts';
import { pair } from './plies.ts';

const practice = manual(10);
const line = clause('J2.4');

const quarter = inches('1/4', 1 / 4);
/** A fillet along the toe of an angle: no larger than a thin edge, 1/16 in less than one of 1/4 in or more; J2.2b. */
const greatest = pick([[below(tp, quarter), tp]], minus(tp, inches('1/16', 1 / 16)));
const noise = constant('noise', 1e-9, '1,0');
export const edgeTooThin: Limit = {
  when: not(atMost(leg, plus(greatest, noise))),
  reason: 'weld-above-edge',
  always: true,
};

const notAngles: Gate = { when: flag('', (f) => f.legSupport === 0, 'no angles'), reason: 'no-weld' };
const thinner = step(
  't',
  pick([[flag('', (f) => f.ts === 0, 'thickness of the support not told'), tp]], least(tp, ts)),
  undefined,
  'the thinner part, as far as the support is told',
);
const legAsked = leastLeg(thinner);
const tooSmall = below(leg, legAsked);
const legSmall: Gate = { when: tooSmall, reason: 'weld-leg-below-least' };
const legEnough: Gate = { when: not(tooSmall), reason: 'weld-by-strength' };

const perLength = step('R_nw', over(times(0.6, FEXX, leg), root(2)), line, 'along one weld, k_ds = 1.0');
const share = over(V, k);
/** The pair: its legs bear on the support at the top, 3.6 e/L of its share; one angle: the whole weld turns elastically, 6 e/L. */
const turned = pick(
  [[pair, times(constant('3.6', 3.6), over(legSupport, hp))]],
  times(constant('6', 6), over(cleatArm, hp)),
);
const demand = step('v', times(over(share, hp), root(plus(1, squared(turned)))), practice, 'along the toe of one leg');

/** Welds of the angles' legs to the support: a vertical line along each toe; what returns across the top is not counted. */
export const supportLegWeld = ({ available }: Method): readonly Way[] => [
  {
    of: 'least leg',
    symbol: 's',
    load: 'none',
    demand: legAsked,
    resistance: step('s', leg),
    off: [notAngles, legEnough],
  },
  {
    of: 'support leg',
    symbol: 'v',
    load: 'V',
    demand,
    resistance: available(perLength, rupture, line, 'R_nw'),
    off: [notAngles, legSmall],
    limits: [edgeTooThin],
  },
];
