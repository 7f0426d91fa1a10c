import { over, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Moment } from '../../units/dimension.ts';

const source = { clause: '5.12.3', basis: 'seen' } as const;

/**
 * The largest V, N, that meets cl. 5.12.3 where the moment is V times an arm: V = V_c (2.2 − 1.6 V e/M) solved for V. It rules where the
 * moment passes 0.75 of M.
 */
export const withMoment = (Vc: Tree<Force>, arm: Tree<Length>, M: Tree<Moment>): Tree<Force> =>
  step('V_i', over(2.2, plus(over(1, Vc), over(times(1.6, arm), M))), source, 'with the moment that comes with V');
