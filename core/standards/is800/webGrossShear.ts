import { h, tf, tw, V } from '../../end/given.ts';
import { atMost, below, constant, minus, over, pick, root, squared, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { E, gm0 } from './factors.ts';
import { epsilon, fyw } from './given.ts';

const source = { clause: '8.4.1', basis: 'seen' } as const;
const buckling = { clause: '8.4.2.2', basis: 'memory' } as const;
const pi = constant('π', Math.PI);
const nu = constant('ν', 0.3);

const depth = step('d', minus(h, times(2, tf)), source, 'clear web');
const slenderness = over(depth, tw);
const critical = step(
  'τ_cr',
  times(over(times(5.35, squared(pi), E), times(12, minus(1, squared(nu)))), squared(over(tw, depth))),
  buckling,
);
const lambda = step('λ_w', root(over(fyw, times(root(3), critical))), buckling);
const share = step(
  'τ_b/τ_y',
  pick(
    [
      [atMost(lambda, 0.8), constant('1', 1)],
      [below(lambda, 1.2), minus(1, times(0.8, minus(lambda, 0.8)))],
    ],
    over(1, squared(lambda)),
  ),
  buckling,
);
const stress = step(
  'τ',
  pick([[atMost(slenderness, times(67, epsilon(fyw))), over(fyw, root(3))]], times(over(fyw, root(3)), share)),
  source,
);

/** Shear of the full I or channel, IS 800:2007 cl. 8.4.1: depth times web; webs beyond 67 ε by the simple post-critical method, 8.4.2.2. */
export const webGrossShear: StrengthRule = {
  source,
  ways: [
    { of: '', symbol: 'V', load: 'V', demand: V, resistance: step('V_d', over(times(h, tw, stress), gm0), source) },
  ],
};
