import { fullDepthPlate, type Gate } from '../../end/gates.ts';
import { flag, V, Vo } from '../../end/given.ts';
import { minus, not, plus, type Source, step, type Tree } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';

export const noSupport: Gate = {
  when: flag('no support is given', (f) => f.supportKind === 'none'),
  reason: 'no-support',
};
const columnFlange: Gate = {
  when: flag("fixed to a column's flange", (f) => f.supportKind === 'column-flange'),
  reason: 'support-flange',
};
const notTold: Gate = {
  when: flag('thickness or grade of the support not told', (f) => f.ts === 0 || f.fys === 0),
  reason: 'support-not-told',
};

/** A beam on the other side hangs on the same web; a column's two flanges are not the same. */
export const sharedWeb = flag(
  'a beam on the other side of the same web',
  (f) => f.Vo > 0 && (f.supportKind === 'beam-web' || f.supportKind === 'column-web'),
);
const shared: Gate = { when: sharedWeb, reason: 'beam-opposite' };
const alone: Gate = { when: not(sharedWeb), reason: 'no-beam-opposite' };

/** The formula of a step without its name: leaned on so, the step itself stays the last line of a working. */
const bare = (tree: Tree<Force>): Tree<Force> => (tree.op === 'step' ? (tree.of[0] as Tree<Force>) : tree);

/**
 * What a web of the support carries, N, against V or, where a beam on the other side hangs on the same web, against V + V_o: its reaction is
 * taken as given, so that V may grow to what it leaves.
 */
export const onSupport = (way: Omit<Way, 'symbol' | 'demand' | 'load'> & { resistance: Tree<Force> }): Way[] => [
  { ...way, symbol: 'V', load: 'V', demand: V, off: [...(way.off ?? []), shared] },
  {
    ...way,
    symbol: 'V + V_o',
    load: 'V',
    demand: step('V_s', plus(V, Vo), undefined, 'with the beam on the other side'),
    failsAt: step('V_fail', minus(bare(way.resistance), Vo), undefined, 'what the beam on the other side leaves'),
    off: [...(way.off ?? []), alone],
  },
];

/**
 * Shear of the web that carries the joint, on both sides of it: N; the webs of beams and columns, not a column's flange. A beam on the other
 * side of that web is added.
 */
export const supportShear = (source: Source, resistance: Tree<Force>): StrengthRule => ({
  source,
  ways: onSupport({ of: '', resistance, off: [noSupport, columnFlange, notTold], limits: [fullDepthPlate] }),
});
