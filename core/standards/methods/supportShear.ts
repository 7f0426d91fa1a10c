import type { Gate } from '../../end/gates.ts';
import { flag, V } from '../../end/given.ts';
import type { Source, Tree } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';

const noSupport: Gate = { when: flag('no support is given', (f) => f.supportKind === 'none'), reason: 'no-support' };
const columnFlange: Gate = {
  when: flag("fixed to a column's flange", (f) => f.supportKind === 'column-flange'),
  reason: 'support-flange',
};
const notTold: Gate = {
  when: flag('thickness or grade of the support not told', (f) => f.ts === 0 || f.fys === 0),
  reason: 'support-not-told',
};

/** Shear of the web that carries the joint, on both sides of the plate: N; the webs of beams and columns, not a column's flange. */
export const supportShear = (source: Source, resistance: Tree<Force>): StrengthRule => ({
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance, off: [noSupport, columnFlange, notTold] }],
});
