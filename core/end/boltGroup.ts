import { minus, over, pick, plus, root, squared, step, times } from '../formula/tree.ts';
import { oneColumn, oneRow } from './gates.ts';
import { m, n, p, q, V, z } from './given.ts';

/** Number of bolts. */
export const N = step('N', times(n, m));

/** Half the height of the pattern: the outer row's distance from the centroid, mm. */
export const yMax = step('y_max', over(times(minus(n, 1), p), 2));

/** Half the width of the pattern, mm. */
export const xMax = step('x_max', over(times(minus(m, 1), q), 2));

const ySquares = over(times(m, n, minus(squared(n), 1), squared(p)), 12);
const xSquares = over(times(n, m, minus(squared(m), 1), squared(q)), 12);

/** Sum of the squared distances of the bolts from their centroid, mm2: Σy² of a full grid plus Σx². */
export const J = step(
  'J',
  pick(
    [
      [oneColumn, ySquares],
      [oneRow, xSquares],
    ],
    plus(ySquares, xSquares),
  ),
  undefined,
  'Σ(x² + y²) of the bolts about their centroid',
);

/** Horizontal force of V at arm z on a bolt of an outer row, N: elastic vector sum. */
export const H = step('H', over(times(V, z, yMax), J));

/** Upright force of V at arm z on a bolt of the column that carries most, N: V shared evenly, and its share of V z. */
export const upright = step(
  'R_v',
  pick([[oneColumn, over(V, N)]], times(V, plus(over(1, N), over(times(z, xMax), J)))),
);

/** What the bolt column nearest the support takes of V at arm z, N: its even share, and what holds V z about the centroid. */
export const nearColumn = step('V_c', times(n, upright));

/**
 * Force on the farthest bolt, N: elastic vector sum of V shared evenly and of V z turned about the centroid.
 * Not defined for one bolt alone, which holds no moment.
 */
export const elasticForce = step(
  'R_max',
  pick(
    [
      [oneColumn, times(V, root(plus(squared(over(times(z, yMax), J)), squared(over(1, N)))))],
      [oneRow, times(V, plus(over(1, N), over(times(z, xMax), J)))],
    ],
    times(V, root(plus(squared(over(times(z, yMax), J)), squared(plus(over(1, N), over(times(z, xMax), J)))))),
  ),
);
