import { isChannel, noRectangle, noTee, uncoped } from '../../end/gates.ts';
import { b, type Cut, d0, flag, fy, h, n, r, rectangle, tee, tf, tw, whole } from '../../end/given.ts';
import { atMost, inMPa, minus, most, over, pick, plus, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Stress } from '../../units/dimension.ts';
import { gammaM0 } from './factors.ts';
import { guide, seen } from './sources.ts';

const source = seen('1-1 6.2.6');
/** All of a plain web counts in shear, in place of 0.9 of it. */
export const fullWeb = flag('option plain-web: full', (f) => f.options['plain-web'] === 'full');
const firstPrint = flag('option tee-shear: first-print', (f) => f.options['tee-shear'] === 'first-print');

export const epsilon = step('ε', root(over(235, inMPa(fy))));

/** Web and root fillets beside a flange: one fillet in a channel. */
const withFillets = pick([[isChannel, plus(tw, r)]], plus(tw, times(2, r)));

export const hw = step('h_w', minus(h, times(2, tf)));

/** Shear area of the uncut section, root fillets in, EN 1993-1-1 6.2.6(3) with η = 1. */
export const wholeArea = step(
  'A_v',
  most(plus(minus(whole.A, times(2, b, tf)), times(withFillets, tf)), times(hw, tw)),
  source,
);

/** Tee behind a cope, 6.2.6(3)(c) as amended in 2009; option `first-print` takes the form of 2005. */
const teeArea = step(
  'A_v,T',
  pick(
    [[firstPrint, times(0.9, minus(tee.A, times(b, tf)))]],
    plus(minus(tee.A, times(b, tf)), over(times(withFillets, tf), 2)),
  ),
  source,
);

/** A plain web: 0.9 of it, as published notes differ; the joint guide takes all of it (option `full`). */
const rectangleArea = step(
  'A_v,r',
  pick([[fullWeb, times(tw, rectangle.depth)]], times(0.9, tw, rectangle.depth)),
  guide,
  'published notes differ: all of it, or 0.9',
);

/** Plastic shear resistance on a shear area, N. */
export const plastic = (Av: Tree<Area>, fy: Tree<Stress>): Tree<Force> => over(times(Av, fy), times(root(3), gammaM0));

/** A section behind a cope with its shear resistance. */
export interface CutInShear {
  readonly cut: Cut;
  readonly Av: Tree<Area>;
  readonly V: Tree<Force>;
}
const inShear = (cut: Cut, Av: Tree<Area>): CutInShear => ({ cut, Av, V: step('V_pl', plastic(Av, fy), source) });
export const rectangleInShear: CutInShear = inShear(rectangle, rectangleArea);
export const teeInShear: CutInShear = inShear(tee, teeArea);

const holes = times(n, d0, tw);
const rectangleNet = pick(
  [[fullWeb, times(tw, minus(rectangle.depth, times(n, d0)))]],
  times(0.9, tw, minus(rectangle.depth, times(n, d0))),
);
const teeNet = minus(teeArea, holes);

/** Net shear area through one bolt column, of the section whose gross shear is the least, wherever the column stands. */
export const netArea = step(
  'A_v,net',
  pick(
    [
      [uncoped.when, minus(wholeArea, holes)],
      [noTee.when, rectangleNet],
      [noRectangle.when, teeNet],
      [atMost(rectangleArea, teeArea), rectangleNet],
    ],
    teeNet,
  ),
  guide,
);
