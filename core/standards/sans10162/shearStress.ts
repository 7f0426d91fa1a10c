import { atMost, inMPa, megapascals, over, pick, root, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Pure, Stress } from '../../units/dimension.ts';

/** Slenderness up to which a web held at both edges yields before it buckles in shear: k_v = 5.34, no stiffeners. */
export const firstLimit = (fy: Tree<Stress>): Tree<Pure> => times(440, root(over(5.34, inMPa(fy))));
const secondLimit = (fy: Tree<Stress>): Tree<Pure> => times(620, root(over(5.34, inMPa(fy))));

/**
 * Limiting shear stress f_s of an unstiffened web, MPa, by its slenderness: yielding, inelastic and elastic buckling.
 * SANS 10162-1:2011 cl. 13.4.1.1, from memory.
 */
export const shearStress = (slenderness: Tree<Pure>, fy: Tree<Stress>): Tree<Stress> =>
  step(
    'f_s',
    pick(
      [
        [atMost(slenderness, firstLimit(fy)), times(0.66, fy)],
        [
          atMost(slenderness, secondLimit(fy)),
          megapascals(over(times(290, root(times(5.34, inMPa(fy)))), slenderness)),
        ],
      ],
      megapascals(over(times(180_000, 5.34), squared(slenderness))),
    ),
    { clause: '13.4.1.1', basis: 'memory' },
  );
