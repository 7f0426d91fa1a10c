import { flag } from '../../end/given.ts';
import { constant, pick, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';

const freely = flag(
  'option hole-deformation: not-considered',
  (f) => f.options['hole-deformation'] === 'not-considered',
);

/** Bearing and tear-out of one bolt, J3.11, N: where the deformation of the hole counts, 2.4 and 1.2, or does not, 3.0 and 1.5. */
export interface Shares {
  readonly borne: (d: Tree<Length>, t: Tree<Length>, Fu: Tree<Stress>) => Tree<Force>;
  readonly torn: (clear: Tree<Length>, t: Tree<Length>, Fu: Tree<Stress>) => Tree<Force>;
}
const shares = (said: readonly [string, string]): Shares => {
  const [b, t] = said.map((one) => constant(one, Number(one))) as [Tree<'0,0'>, Tree<'0,0'>];
  return { borne: (d, ply, Fu) => times(b, d, ply, Fu), torn: (clear, ply, Fu) => times(t, clear, ply, Fu) };
};
const counted = shares(['2.4', '1.2']);
const notCounted = shares(['3.0', '1.5']);

/** A force by either of the two, as the option says. */
export const either = (force: (by: Shares) => Tree<Force>): Tree<Force> =>
  pick([[freely, force(notCounted)]], force(counted));
