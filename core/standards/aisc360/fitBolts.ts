import { type Gate, intactFlange, singleColumn, singleRow } from '../../end/gates.ts';
import { ab, at, d, d0, eBot, eEnd, eTop, ex, flag, found, p, q, tp, tw } from '../../end/given.ts';
import { least, most, over, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { FitPart, FitRule } from '../standard.ts';
import { leastEdge } from './boltTable.ts';
import { clause } from './clauses.ts';
import { inches } from './given.ts';

const spacing = clause('J3.3, J3.6');
const edges = clause('J3.5, J3.6');
const noBottomCope: Gate = {
  when: flag('', (f) => f.mBottom === 0, 'no cope below the bolts'),
  reason: 'no-bottom-cope',
};

/** Centres 2-2/3 d apart, holes d clear of one another. */
const leastSpacing = step('p_min', most(times(over(8, 3), d), plus(d, d0)), spacing);
const greatestSpacing = step('p_max', least(times(24, least(tp, tw)), inches('12', 12)), spacing);

const spaced = (given: Tree<Length>, off: Gate): FitRule => ({
  source: spacing,
  breach: 'fails',
  parts: [
    { of: '', given, least: leastSpacing, off: [off] },
    { of: '', given, most: greatestSpacing, off: [off], breach: 'refer' },
  ],
});

export const fitPitch = spaced(p, singleRow);
export const fitGauge = spaced(q, singleColumn);

const tabled = step(
  'e_min',
  found('1,0', 'Table J3.4', [d], (_, diameter) => leastEdge(diameter!)),
  edges,
);

/** Below the table the lesser distance has to be proved: refers. Below d it fails. */
const apart = (of: string, given: Tree<Length>, off: readonly Gate[] = []): FitPart[] => [
  { of, given, least: tabled, off },
  { of, given, least: d, off, breach: 'fails' },
];
const near = (of: string, given: Tree<Length>, t: Tree<Length>): FitPart[] => [
  ...apart(of, given),
  { of, given, most: step('e_max', least(times(12, t), inches('6', 6)), edges) },
];

const rule = (parts: readonly FitPart[]): FitRule => ({ source: edges, breach: 'refer', parts });

export const fitEdgeWeb = rule([...apart('top', at, [intactFlange]), ...apart('bottom', ab, [noBottomCope])]);
export const fitEnd = rule(near('', eEnd, tw));
export const fitEdgePlate = rule([...near('top', eTop, tp), ...near('bottom', eBot, tp), ...near('free edge', ex, tp)]);
