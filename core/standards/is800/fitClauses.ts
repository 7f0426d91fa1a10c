import { type Gate, intactFlange, singleColumn, singleRow } from '../../end/gates.ts';
import { ab, at, d, d0, eBot, eEnd, eTop, ex, flag, fyp, p, q, tp, tw } from '../../end/given.ts';
import { constant, least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Stress } from '../../units/dimension.ts';
import type { FitRule } from '../standard.ts';
import { epsilon, fyw } from './given.ts';

const spacing = { clause: '10.2.2, 10.2.3', basis: 'seen' } as const;
const edges = { clause: '10.2.4', basis: 'seen' } as const;
const noBottomCope: Gate = {
  when: flag('no column inside a bottom cope', (f) => f.mBottom === 0),
  reason: 'no-bottom-cope',
};

const leastSpacing = step('p_min', times(2.5, d), spacing);
const greatestSpacing = step(
  'p_max',
  least(times(16, least(tp, tw)), constant('200 mm', 200, '1,0')),
  spacing,
  'the thinner ply',
);

export const fitPitch: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [{ of: '', given: p, least: leastSpacing, most: greatestSpacing, off: [singleRow] }],
};

export const fitGauge: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [{ of: '', given: q, least: leastSpacing, most: greatestSpacing, off: [singleColumn] }],
};

const machined = flag('option edges: machine', (f) => f.options.edges === 'machine');
/** An edge sheared or flame cut by hand, unless the shop cuts by machine; an edge sawn. */
const cutEdge = step('e_min', pick([[machined, times(1.5, d0)]], times(1.7, d0)), edges);
const sawnEdge = step('e_min', times(1.5, d0), edges);
const greatestEdge = (t: Tree<Length>, fy: Tree<Stress>): Tree<Length> =>
  step('e_max', times(12, t, epsilon(fy)), { ...edges, basis: 'memory' });
const plateMost = greatestEdge(tp, fyp);

/** Edge distances of the cut web, IS 800:2007 cl. 10.2.4, by the hole's diameter. */
export const fitEdgeWeb: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: 'top', given: at, least: cutEdge, off: [intactFlange] },
    { of: 'bottom', given: ab, least: cutEdge, off: [noBottomCope] },
  ],
};

export const fitEnd: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [{ of: '', given: eEnd, least: sawnEdge, most: greatestEdge(tw, fyw) }],
};

export const fitEdgePlate: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: 'top', given: eTop, least: cutEdge, most: plateMost },
    { of: 'bottom', given: eBot, least: cutEdge, most: plateMost },
    { of: 'free edge', given: ex, least: cutEdge, most: plateMost },
  ],
};
