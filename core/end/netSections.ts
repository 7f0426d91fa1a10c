import { step } from '../formula/tree.ts';
import { netModulus, netPlasticModulus } from '../shape/netSection.ts';
import { plainTeeModulus, plainTeePlasticModulus } from '../shape/plainTee.ts';
import type { Facts } from './facts.ts';
import { b, dn, eTop, found, given, hp, n, p, tee, tf, tp, tw } from './given.ts';

/** The tee behind a single cope as handbooks tabulate it: plain rectangles, no fillets. To the free edge, and plastic. mm3 */
export const plainTee = {
  S: step(
    'S',
    found('3,0', 'I/y of plain rectangles, to the free edge', [b, tf, tw, tee.depth], (_, b, tf, tw, depth) =>
      plainTeeModulus(b!, tf!, tw!, depth!),
    ),
    undefined,
    'elastic, no fillets',
  ),
  Z: step(
    'Z',
    found('3,0', 'halves of equal area, plain rectangles', [b, tf, tw, tee.depth], (_, b, tf, tw, depth) =>
      plainTeePlasticModulus(b!, tf!, tw!, depth!),
    ),
    undefined,
    'plastic, no fillets',
  ),
};

/** Columns whose section is cut at both edges, and at one edge at least. */
const columnsBoth = ({ mTop, mBottom }: Facts): number => Math.min(mTop, mBottom);
const columnsAny = ({ mTop, mBottom }: Facts): number => Math.max(mTop, mBottom);

/** A column of holes inside a cope, farthest from the support of those with the same section: arm of the reaction, and net modulus. */
const netAt = (columns: (f: Facts) => number) => ({
  /** Support's face to the column, mm. */
  arm: given('e_j', '1,0', (f) => f.g + f.eEnd + (columns(f) - 1) * f.q),
  /** Elastic, holes d' out at their heights, plain rectangles as coped at the column, to the farther edge. mm3 */
  S: step(
    'S_net',
    found(
      '3,0',
      'I/y as coped at the column, holes d′ out at their heights',
      [b, tf, tw, n, p, dn],
      (f, b, tf, tw, n, p, dn) => {
        const column = columns(f);
        const cut = {
          h: f.h,
          b: b!,
          tf: tf!,
          tw: tw!,
          from: f.mTop >= column ? f.dt : 0,
          to: f.mBottom >= column ? f.h - f.db : f.h,
        };
        return netModulus(cut, { first: f.y1, pitch: p!, count: n!, diameter: dn! });
      },
    ),
    undefined,
    'elastic, no fillets',
  ),
});

/** Where the web is cut at both edges, and where it is a tee. */
export const netRectangle = netAt(columnsBoth);
export const netTee = netAt(columnsAny);
export const noNetRectangle = (f: Facts): boolean => columnsBoth(f) === 0;
export const noNetTee = (f: Facts): boolean => columnsAny(f) === columnsBoth(f);

/** Plastic modulus of the plate at a bolt column, holes d' out at their heights. mm3 */
export const plateNetPlastic = step(
  'Z_net',
  found(
    '3,0',
    'halves of equal area, holes d′ out at their heights',
    [tp, hp, eTop, n, p, dn],
    (_, tp, hp, eTop, n, p, dn) => netPlasticModulus(tp!, hp!, { first: eTop!, pitch: p!, count: n!, diameter: dn! }),
  ),
);
