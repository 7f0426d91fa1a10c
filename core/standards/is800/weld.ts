import { flag, fup, hp, k, V, z } from '../../end/given.ts';
import { supportLegArm } from '../../end/weldGroup.ts';
import { constant, least, over, pick, plus, root, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { countedOf, filletStrength, limitsOf, source } from './fillet.ts';
import { fuw } from './given.ts';

const combined = { clause: '10.5.10', basis: 'memory' } as const;

const length = countedOf(hp);
const mild = step('f_u', least(fuw, fup), source, 'weld metal or plate');

const cleatLeg = flag('', (f) => f.legSupport > 0, "a cleat's leg");
/** Two fillets of a plate, one along the toe of each cleat's leg. */
const welds = pick([[cleatLeg, k]], constant('2', 2));
const arm = pick([[cleatLeg, supportLegArm]], z);
const q = step('q', over(V, times(welds, length)), source);
const f = step('f', over(times(6, V, arm), times(welds, squared(length))), source, 'at the ends of the weld');

/**
 * Weld to the support, elastic line of the depth, IS 800:2007 cl. 10.5, without a leg at each end: two upright fillets of a plate under V and
 * V z, or one along the toe of each cleat's leg under its share of V at the arm of that leg; the combination of 10.5.10 or, where that is
 * less, the plain sum that exempts from it.
 */
export const weld: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'q_e',
      load: 'V',
      demand: step('q_e', least(root(plus(squared(f), times(3, squared(q)))), plus(f, q)), combined),
      resistance: filletStrength(length, mild),
      limits: limitsOf(length),
    },
  ],
};
