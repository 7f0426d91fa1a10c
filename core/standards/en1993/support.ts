import { type Gate, noSupportBolts, oneSupportRow } from '../../end/gates.ts';
import { flag, fus, fys, hp, supportBolts, ts } from '../../end/given.ts';
import { least, minus, not, over, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Pure } from '../../units/dimension.ts';
import { onSupport } from '../methods/supportShear.ts';
import type { StrengthRule } from '../standard.ts';
import { gammaM0 } from './factors.ts';
import { oneCleat, supportHoleLimits } from './limits.ts';
import { memory } from './sources.ts';

const source = memory('1-1 6.2.6');
const between = { clause: '1-8 3.10.2 planes', basis: 'practice' } as const;

/** The support is not there, or thickness or grade of what the plate is welded to is not told. */
export const supportGates: readonly Gate[] = [
  { when: flag('no support', (f) => f.supportKind === 'none'), reason: 'no-support' },
  { when: flag('the support is not told in full', (f) => !(f.ts > 0 && f.fys > 0)), reason: 'support-not-told' },
];

const bolted: Gate = { when: not(noSupportBolts.when), reason: 'bolted-to-support' };
const { n, p, d0 } = supportBolts;
const B = step('B', times(minus(n, 1), p), between, 'between the outer rows');

/**
 * Shear of the support's web, or of a column's flange, on both sides of the joint. What is welded there shears the depth of plate or cleats;
 * what is bolted the length between the outer rows, on its gross or its net section: a lower bound of our own, no clause. A beam on the other
 * side of the same web is added.
 */
export const supportShear = (gammaM2n: Tree<Pure>): StrengthRule => ({
  source,
  ways: [
    ...onSupport({
      of: '',
      resistance: step('V_Rd', over(times(2, hp, ts, fys), times(root(3), gammaM0)), source),
      off: [...supportGates, bolted],
      limits: [oneCleat],
    }),
    ...onSupport({
      of: 'between the outer rows',
      resistance: step(
        'V_Rd',
        times(
          2,
          ts,
          least(
            over(times(fys, B), times(root(3), gammaM0)),
            over(times(fus, minus(B, times(minus(n, 1), d0))), times(root(3), gammaM2n)),
          ),
        ),
        between,
        'a lower bound, no clause',
      ),
      off: [...supportGates, noSupportBolts],
      limits: [
        oneCleat,
        { when: oneSupportRow.when, reason: 'rows-below-two', always: true, noNumber: true },
        ...supportHoleLimits,
      ],
      source: between,
    }),
  ],
});
