import { least, minus, over, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import { gmb } from './factors.ts';

export const source = { clause: '10.3.4', basis: 'seen' } as const;

/** A bolt of diameter d and strength f_ub in a hole d_0, mm and MPa. */
interface BoltInHole {
  readonly d: Tree<Length>;
  readonly d0: Tree<Length>;
  readonly fub: Tree<Stress>;
}

/** Bearing of a ply on one bolt, IS 800:2007 cl. 10.3.4, with edge and pitch along the force. */
export const inPly = ({ d, d0, fub }: BoltInHole) => ({
  /** What an edge at the distance e along the force, or the next hole, allows of k_b. */
  byEdge: (e: Tree<Length>): Tree<Pure> => over(e, times(3, d0)),
  bySpacing: (spacing: Tree<Length>): Tree<Pure> => minus(over(spacing, times(3, d0)), 0.25),
  /** k_b: the least of the strengths' ratio, 1 and what the distances allow. */
  kb: (fu: Tree<Stress>, ...distances: Tree<Pure>[]): Tree<Pure> => least(over(fub, fu), 1, ...distances),
  /** One bolt against a ply, N. */
  bearingOn: (kb: Tree<Pure>, t: Tree<Length>, fu: Tree<Stress>): Tree<Force> =>
    step('V_dpb', over(times(2.5, factor(kb), d, t, fu), gmb), source),
});

const factor = (value: Tree<Pure>): Tree<Pure> => step('k_b', value, source);
