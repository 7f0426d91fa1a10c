import { atMost, inMPa, megapascals, over, pick, root, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Pure, Stress } from '../../units/dimension.ts';

const seen = { clause: '13.4.1.1', basis: 'seen' } as const;
const memory = { clause: '13.4.1.1', basis: 'memory' } as const;

/** Slenderness up to which a web held at both edges yields before it buckles in shear, no stiffeners. */
export const firstLimit = (Fy: Tree<Stress>): Tree<Pure> => over(1014, root(inMPa(Fy)));
const secondLimit = (Fy: Tree<Stress>): Tree<Pure> => over(1435, root(inMPa(Fy)));

/**
 * Limiting shear stress F_s of an unstiffened web, MPa, by its slenderness: yielding, inelastic and elastic buckling, no tension field.
 * CSA S16:19 cl. 13.4.1.1; the buckling branches from memory.
 */
export const shearStress = (slenderness: Tree<Pure>, Fy: Tree<Stress>): Tree<Stress> =>
  pick(
    [
      [atMost(slenderness, firstLimit(Fy)), step('F_s', times(0.66, Fy), seen)],
      [
        atMost(slenderness, secondLimit(Fy)),
        step('F_s', megapascals(over(times(670, root(inMPa(Fy))), slenderness)), memory),
      ],
    ],
    step('F_s', megapascals(over(961_200, squared(slenderness))), memory),
  );
