import { type Gate, intactFlange, singleColumn, singleRow } from '../../end/gates.ts';
import { ab, at, d, eBot, eEnd, eTop, ex, flag, p, q, tp, tw } from '../../end/given.ts';
import { step, times } from '../../formula/tree.ts';
import type { FitRule } from '../standard.ts';
import { cutEdge, greatestEdge, plateEdge } from './edgeDistance.ts';

const spacing = { clause: '22.3.1', basis: 'memory' } as const;
const edges = { clause: '22.3', basis: 'memory' } as const;
const noBottomCope: Gate = { when: flag('', (f) => f.mBottom === 0), reason: 'no-bottom-cope' };

/** Least spacing of bolts 2.7 d, SANS 10162-1:2011 cl. 22.3.1. */
const leastSpacing = step('p_min', times(2.7, d), spacing);

export const fitPitch: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [{ of: '', given: p, least: leastSpacing, off: [singleRow] }],
};

export const fitGauge: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [{ of: '', given: q, least: leastSpacing, off: [singleColumn] }],
};

/** Edge distances of the cut web: the table's row for cut edges, cl. 22.3. */
export const fitEdgeWeb: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: 'top', given: at, least: cutEdge, most: greatestEdge(tw), off: [intactFlange] },
    { of: 'bottom', given: ab, least: cutEdge, off: [noBottomCope] },
  ],
};

export const fitEnd: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [{ of: '', given: eEnd, least: cutEdge, most: greatestEdge(tw) }],
};

/** Edge distances of the plate: sheared edges unless option `plate-edges: cut`. */
export const fitEdgePlate: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: 'top', given: eTop, least: plateEdge, most: greatestEdge(tp) },
    { of: 'bottom', given: eBot, least: plateEdge, most: greatestEdge(tp) },
    { of: 'free edge', given: ex, least: plateEdge, most: greatestEdge(tp) },
  ],
};
