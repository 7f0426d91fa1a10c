import { atMost, least, minus, over, pick, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Moment, Pure } from '../../units/dimension.ts';
import { clause } from './clauses.ts';
import { E } from './given.ts';

const source = clause('F11');

/** A rectangular bar bent about its strong axis: depth, thickness, unbraced length, C_b, yield strength. */
export interface Bar {
  readonly depth: Tree<Length>;
  readonly t: Tree<Length>;
  readonly Lb: Tree<Length>;
  readonly Cb: Tree<Pure>;
  readonly Fy: Tree<'-2,1'>;
}

/** Nominal moment of a rectangular bar, ANSI/AISC 360-22 F11: yielding, and lateral-torsional buckling by x = L_b d/t². N mm */
export const barMoment = ({ depth, t, Lb, Cb, Fy }: Bar): Tree<Moment> => {
  const x = step('x', over(times(Lb, depth), squared(t)), source);
  const Mp = step('M_p', over(times(Fy, t, squared(depth)), 4), source);
  const S = step('S', over(times(t, squared(depth)), 6), source);
  const My = step('M_y', times(Fy, S), source);
  return step(
    'M_n',
    pick(
      [
        [atMost(x, times(0.08, over(E, Fy))), Mp],
        [atMost(x, times(1.9, over(E, Fy))), least(times(Cb, minus(1.52, times(0.274, x, over(Fy, E))), My), Mp)],
      ],
      least(over(times(1.9, E, Cb, S), x), Mp),
    ),
    source,
  );
};
