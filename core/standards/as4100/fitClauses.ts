import { type Gate, intactFlange, singleColumn, singleRow } from '../../end/gates.ts';
import { ab, at, d, eBot, eEnd, eTop, ex, flag, p, q, tp, tw } from '../../end/given.ts';
import { constant, least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { fitCopeRadius as practiceRadius } from '../methods/fitPractice.ts';
import type { FitRule } from '../standard.ts';

const spacing = { clause: '9.5.1, 9.5.3', basis: 'seen' } as const;
const edges = { clause: '9.5.2, 9.5.4', basis: 'seen' } as const;
const mm = (length: number) => constant(`${length} mm`, length, '1,0');
const noBottomCope: Gate = {
  when: flag('no column inside a bottom cope', (f) => f.mBottom === 0),
  reason: 'no-bottom-cope',
};

const leastSpacing = step('p_min', times(2.5, d), spacing);
const greatestSpacing = step('p_max', least(times(15, least(tp, tw)), mm(200)), spacing, 'the thinner ply');

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
const cutEdge = step('e_min', pick([[machined, times(1.5, d)]], times(1.75, d)), edges);
const sawnEdge = step('e_min', times(1.5, d), edges);
const greatestEdge = (t: Tree<Length>): Tree<Length> => step('e_max', least(times(12, t), mm(150)), edges);

/** Edge distances of the cut web, AS 4100:2020 cl. 9.5.2. */
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
  parts: [{ of: '', given: eEnd, least: sawnEdge, most: greatestEdge(tw) }],
};

export const fitEdgePlate: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: 'top', given: eTop, least: cutEdge, most: greatestEdge(tp) },
    { of: 'bottom', given: eBot, least: cutEdge, most: greatestEdge(tp) },
    { of: 'free edge', given: ex, least: cutEdge, most: greatestEdge(tp) },
  ],
};

/** Corner radius of a cope, 10 mm: here a clause, cl. 14.3.3. */
export const fitCopeRadius: FitRule = {
  ...practiceRadius,
  source: { clause: '14.3.3', basis: 'memory' },
  breach: 'fails',
};
