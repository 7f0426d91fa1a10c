import type { Gate } from '../../end/gates.ts';
import { flag, fys, hp, ts, V } from '../../end/given.ts';
import { over, root, step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { gammaM0 } from './factors.ts';
import { memory } from './sources.ts';

const source = memory('1-1 6.2.6');

/** The support is not there, or thickness or grade of what the plate is welded to is not told. */
export const supportGates: readonly Gate[] = [
  { when: flag('no support', (f) => f.supportKind === 'none'), reason: 'no-support' },
  { when: flag('the support is not told in full', (f) => !(f.ts > 0 && f.fys > 0)), reason: 'support-not-told' },
];

/** Two planes through the support beside the plate: its web, or a column's flange. */
export const supportShear: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('V_Rd', over(times(2, hp, ts, fys), times(root(3), gammaM0)), source),
      off: supportGates,
    },
  ],
};
