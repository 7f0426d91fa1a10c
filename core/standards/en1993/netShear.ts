import { copeLimits } from '../../end/gates.ts';
import { d0, fu, fup, hp, n, tp, V } from '../../end/given.ts';
import { minus, over, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { holeLimits } from './limits.ts';
import { netArea } from './shearArea.ts';
import { guide } from './sources.ts';

const rupture = (Anet: Tree<Area>, fu: Tree<Stress>, gamma: Tree<Pure>): Tree<Force> =>
  step('V_Rd,n', over(times(Anet, fu), times(root(3), gamma)), guide);

/** Net shear resistance of the web through one bolt column, N. */
export const webNet = (gammaM2n: Tree<Pure>): Tree<Force> => rupture(netArea, fu, gammaM2n);

const plateArea = step('A_v,net', times(tp, minus(hp, times(n, d0))), guide);

const rule = (resistance: Tree<Force>, limits: StrengthRule['ways'][number]['limits']): StrengthRule => ({
  source: guide,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance, limits: limits ?? [] }],
});

/** Rupture in shear through one bolt column: no clause of its own, as the joint guide has it. */
export const webNetShear = (net: Tree<Force>): StrengthRule => rule(net, [...copeLimits, ...holeLimits]);
export const plateNetShear = (gammaM2n: Tree<Pure>): StrengthRule =>
  rule(rupture(plateArea, fup, gammaM2n), holeLimits);
