import { minus, over, pick, plus, root, squared, step, times } from '../formula/tree.ts';
import { flag, supportBolts, V } from './given.ts';

const { n, lines, p, cc } = supportBolts;

/** One line of bolts, as one cleat alone has: V then stands at an arm from it. */
export const oneLine = flag(
  'one line of support bolts',
  (f) => f.supportBolts.lines === 1,
  'one line of support bolts',
);
export const oneRowOfSupport = flag('', (f) => f.supportBolts.n === 1, 'one row of support bolts');

/** Arm of V to the line of bolts of one cleat, from the middle of the web, mm. */
export const supportArm = step('e_s', over(cc, 2), undefined, 'middle of the web to the line of bolts');

/** Half the height of the line, mm, and the sum of squares about its middle, mm2. */
export const supportYMax = step('y_max', over(times(minus(n, 1), p), 2));
export const supportSquares = step('Σy²', over(times(n, minus(squared(n), 1), squared(p)), 12));

/** Force along the support of V at the arm of one cleat on an outer bolt, N. */
export const supportH = step('H_s', over(times(V, supportArm, supportYMax), supportSquares));

/** Upright force on one bolt, N: V shared evenly. */
export const supportUpright = step('R_v,s', over(V, times(lines, n)));

/**
 * Force on the farthest bolt into the support, N. Two lines: V shared evenly, the eccentricities of the two sides balance. One line: elastic
 * vector sum with V at the arm from the web's middle; not defined for one bolt alone.
 */
export const supportForce = step(
  'R_s',
  pick([[oneLine, root(plus(squared(supportUpright), squared(supportH)))]], supportUpright),
);
