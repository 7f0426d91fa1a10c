import { below, least, minus, over, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Moment } from '../../units/dimension.ts';

const source = { clause: '9.2.2', basis: 'memory' } as const;

/**
 * The largest V, N, that meets cl. 9.2.2 on a plastic moment M_p where the moment is V times an arm e, no flange sharing in it: above
 * 0.6 V_d, V e = M_p (1 − (2 V/V_d − 1)²), whose root is V_d (1 − e V_d/(4 M_p)).
 */
export const withShear = (Vd: Tree<Force>, arm: Tree<Length>, Mp: Tree<Moment>): Tree<Force> => {
  const high = step('V_i', times(Vd, minus(1, over(times(arm, Vd), times(4, Mp)))), source, 'root of the clause');
  const low = times(0.6, Vd);
  return step('V_L', pick([[below(low, high), high]], least(over(Mp, arm), low)), source, 'moment with high shear');
};
