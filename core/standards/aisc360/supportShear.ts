import type { Gate } from '../../end/gates.ts';
import { flag, hp, ts, V } from '../../end/given.ts';
import { step, times } from '../../formula/tree.ts';
import type { StrengthRule } from '../standard.ts';
import { clause } from './clauses.ts';
import { Fus } from './given.ts';
import { type Method, rupture } from './method.ts';

const source = clause('J4.2, J4-4');
const noSupport: Gate = { when: flag('', (f) => f.supportKind === 'none', 'no support given'), reason: 'no-support' };
const notTold: Gate = {
  when: flag('', (f) => f.ts === 0 || f.fus === 0, 'thickness or grade of the support not told'),
  reason: 'support-not-told',
};
const strength = step('R_n', times(0.6, Fus, ts, 2, hp), source);

/** Rupture in shear of the support on both sides of the plate: a web, or a column's flange. */
export const supportShear = ({ available }: Method): StrengthRule => ({
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: available(strength, rupture, source),
      off: [noSupport, notTold],
    },
  ],
});
