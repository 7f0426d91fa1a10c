import { minus, over, pick, plus, root, squared, step, times } from '../formula/tree.ts';
import { pairOfCleats } from './gates.ts';
import { hp, k, legSupport, legWeb, tw, V, weldReturn } from './given.ts';

/** Length of the C-shaped weld of a cleat's web leg, mm: the line along its toe and the two returns. */
export const legWeldLength = step(
  'L_w',
  plus(hp, times(2, weldReturn)),
  undefined,
  'line along the toe and two returns',
);

/** From the line along the toe to the weld's centroid, toward the support, mm. */
const inset = step('x_w', over(squared(weldReturn), legWeldLength), undefined, 'toe line to the centroid of the weld');

/** Arm of V, which stands at the face of the support, to the weld's centroid, mm. */
export const legWeldArm = step(
  'e_w',
  minus(legWeb, inset),
  undefined,
  'face of the support to the centroid of the weld',
);

const upright = plus(over(times(hp, squared(hp)), 12), over(times(weldReturn, squared(hp)), 2));
const along = plus(
  times(hp, squared(inset)),
  over(times(weldReturn, squared(weldReturn)), 6),
  times(2, weldReturn, squared(minus(over(weldReturn, 2), inset))),
);
/** Polar second moment of the weld about its centroid, per unit of throat, mm3. */
const polar = step('I_w', plus(upright, along), undefined, 'per unit of throat, about the centroid');

const share = over(V, k);
const ahead = minus(weldReturn, inset);

/**
 * Force per length at the ends of the returns, where it is greatest, N/mm: elastic vector method about the centroid of the C-shaped weld of
 * one cleat's web leg, which takes its share of V. Vertical and along the beam.
 */
export const legWeldForce = step(
  'q_w',
  root(
    plus(
      squared(plus(over(share, legWeldLength), over(times(share, legWeldArm, ahead), polar))),
      squared(over(times(share, legWeldArm, hp), times(2, polar))),
    ),
  ),
);

/** Arm of V to the weld along the toe of a support leg, mm: a pair shares V at the faces of the web; one cleat alone has it in the web's middle. */
export const supportLegArm = pick(
  [[pairOfCleats.when, legSupport]],
  step('e_s', plus(legSupport, over(tw, 2)), undefined, 'middle of the web to the weld'),
);

/** Force per length of the weld along the toe of one cleat's support leg, N/mm: elastic line of the cleat's depth, its share of V at that arm. */
export const supportLegWeldForce = step(
  'q_w',
  root(plus(squared(over(share, hp)), squared(over(times(6, share, supportLegArm), squared(hp))))),
);
