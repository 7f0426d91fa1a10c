import { byKind } from '../../end/byKind.ts';
import type { Gate, Limit } from '../../end/gates.ts';
import { flag, hp, leg, tp, V, z } from '../../end/given.ts';
import { all, below, constant, most, not, over, plus, root, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { clause, manual } from './clauses.ts';
import { FEXX, Fyp, KSI } from './given.ts';
import { leastLeg } from './leastLeg.ts';
import { type Method, rupture } from './method.ts';
import { supportLegWeld } from './supportLegWeld.ts';

const practice = manual(10);
const line = clause('J2.4');

const ksi = (strength: number) => constant(`${strength} ksi`, strength * KSI, '-2,1');
/** Leg with which the plate yields before its welds, both sides. */
const legAsked = step(
  's_req',
  most(times(constant('5/8', 0.625), tp, most(1, over(ksi(70), FEXX)), most(1, over(Fyp, ksi(50)))), leastLeg(tp)),
  practice,
);

const byStrength = flag('option weld: strength', (f) => f.options.weld === 'strength');
const tooSmall = below(leg, legAsked);
const notFinPlate: Gate = {
  when: byKind('', (kind) => kind !== 'fin-plate', 'no fin plate'),
  reason: 'fin-plates-only',
};
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

/**
 * Welds to the support. A plate's two fillets: sized so that it yields first; smaller ones as an elastic line under V and V z. Angles: a line
 * along the toe of each leg.
 */
export const weld = (method: Method): StrengthRule => ({
  source: practice,
  ways: [
    {
      of: 'size',
      symbol: 's',
      load: 'none',
      demand: legAsked,
      resistance: step('s', leg),
      off: [notFinPlate, notBySize],
    },
    {
      of: 'strength',
      symbol: 'v',
      load: 'V',
      demand: step('v', times(V, share), practice),
      resistance: method.available(perLength, rupture, line, 'R_nw'),
      off: [notFinPlate, bySize],
      limits: [belowLeast],
      source: line,
    },
    ...supportLegWeld(method),
  ],
});
