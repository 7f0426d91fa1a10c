import type { Gate } from '../../end/gates.ts';
import { fyp, hp, tp, V, z1 } from '../../end/given.ts';
import {
  atMost,
  constant,
  inMPa,
  minus,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Length, Moment, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';

const source = { clause: 'US bar form', basis: 'research' } as const;

/** Share of its yield moment that a rectangular bar of depth h_p, thickness t_p and this free length reaches: published US form. */
export const barFactor = (fy: Tree<Stress>, free: Tree<Length> = z1): Tree<Pure> => {
  const lambda = step(
    'λ',
    over(times(hp, root(over(inMPa(fy), 6.895))), times(10, tp, root(plus(475, times(280, squared(over(hp, free))))))),
    source,
  );
  return step(
    'Q',
    pick(
      [
        [atMost(lambda, 0.7), constant('1', 1)],
        [atMost(lambda, 1.41), minus(1.34, times(0.486, lambda))],
      ],
      over(1.3, squared(lambda)),
    ),
    source,
  );
};

/** A plate so short that it cannot buckle: z_1 <= t_p/0.15; sizes that meet it exactly keep meeting it after conversion from inches. */
const shortOf = (free: Tree<Length>): Gate => ({
  when: atMost(free, over(tp, constant('0.15', 0.15 * (1 - 1e-12)))),
  reason: 'short-plate',
});

/**
 * Buckling of a long plate between weld and first bolt column: published US form for a rectangular bar, no clause of the standard.
 * `resist` puts the standard's factor on Q f_y and the elastic modulus; `fy` is the plate's yield strength in the standard's own symbol, `free`
 * its length between what holds it.
 */
export const plateBuckling = (
  resist: (Q: Tree<Pure>, fy: Tree<Stress>, W: Tree<'3,0'>) => Tree<Moment>,
  fy: Tree<Stress> = fyp,
  free: Tree<Length> = z1,
): StrengthRule => ({
  source,
  ways: [
    {
      of: '',
      symbol: 'V z_1',
      load: 'V',
      demand: step('M', times(V, free), source),
      resistance: step('M_r', resist(barFactor(fy, free), fy, over(times(tp, squared(hp)), 6)), source),
      off: [shortOf(free)],
    },
  ],
});
