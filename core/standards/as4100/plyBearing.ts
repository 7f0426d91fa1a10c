import { minus, over, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import { phi } from './factors.ts';

export const source = { clause: '9.2.2.4', basis: 'seen' } as const;

/** Bearing of a ply on a bolt of diameter d in a hole d_0, mm, AS 4100:2020 cl. 9.2.2.4. */
export const inPly = ({ d, d0 }: { readonly d: Tree<Length>; readonly d0: Tree<Length> }) => ({
  /** One bolt against a ply, whatever the direction, N. */
  crushing: (t: Tree<Length>, fu: Tree<Stress>): Tree<Force> => step('φV_b', times(phi, 3.2, d, t, fu), source),
  /** Edge of the hole to an edge of the ply, plus d/2: from the centre's distance e. */
  toEdge: (e: Tree<Length>): Tree<Length> => minus(e, over(minus(d0, d), 2)),
  /** Edge of the hole to the next hole, plus d/2. */
  toNext: (spacing: Tree<Length>): Tree<Length> => plus(minus(spacing, d0), over(d, 2)),
});

export const nearest = (distance: Tree<Length>): Tree<Length> => step('a_e', distance, source);

/** Tear-out over the length a_e, N. */
export const tearing = (ae: Tree<Length>, t: Tree<Length>, fu: Tree<Stress>): Tree<Force> =>
  step('φV_b', times(phi, ae, t, fu), source);
