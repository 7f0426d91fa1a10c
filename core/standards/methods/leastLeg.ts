import type { Limit } from '../../end/gates.ts';
import { flag, leg, tp, ts, tw } from '../../end/given.ts';
import { atMost, below, constant, most, pick, plus, type Source, step, type Tree } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';

/** mm: sizes that meet a bound exactly keep meeting it after conversion from inches. */
const NOISE = 1e-9;

const size = (mm: number): Tree<Length> => constant('s_min', mm, '1,0');
const upTo = (mm: number): Tree<Length> => constant(`${mm} mm`, mm + NOISE, '1,0');

const toWeb = flag('', (f) => f.weldTo === 'web', 'a weld along the web');
/** Thicker of the parts joined, as far as the support's is told, mm. */
const thicker = step('t', pick([[toWeb, most(tp, tw)]], most(tp, ts)));

/** Least leg of a fillet by the thicker part joined, mm: rows of greatest thickness and leg, and the leg beyond the last row. */
export const leastLeg = (
  rows: readonly (readonly [thickness: number, leg: number])[],
  beyond: number,
  source: Source,
): Tree<Length> =>
  step(
    's_min',
    pick(
      rows.map(([thickness, leg]) => [atMost(thicker, upTo(thickness)), size(leg)] as const),
      size(beyond),
    ),
    source,
  );

/** Refers where the weld would hold but its leg is below the least. */
export const legBelow = (least: Tree<Length>): Limit => ({
  when: below(plus(leg, constant('noise', NOISE, '1,0')), least),
  reason: 'weld-leg-below-least',
  always: false,
});

/** A fillet along the toe of a cleat's leg, whose edge has no room for more than the cleat's thickness: a larger one refers where it would hold. */
export const legAboveEdge: Limit = {
  when: flag('a leg above the thickness of a cleat', (f) => f.legWeb > 0 && f.leg > f.tp + NOISE),
  reason: 'weld-above-edge',
  always: false,
};
