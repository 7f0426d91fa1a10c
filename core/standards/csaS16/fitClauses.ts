import { type Gate, intactFlange, singleColumn, singleRow } from '../../end/gates.ts';
import { ab, at, d, eBot, eEnd, eTop, ex, flag, p, q, tp, tw } from '../../end/given.ts';
import { step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { FitPart, FitRule } from '../standard.ts';
import { cutEdge, greatestEdge, plateEdge } from './edgeDistance.ts';

const spacing = { clause: '22.3.1', basis: 'seen' } as const;
const edges = { clause: 'Table 6, 22.3.3', basis: 'memory' } as const;
const inLine = { clause: '22.3.4', basis: 'seen' } as const;
const noBottomCope: Gate = {
  when: flag('', (f) => f.mBottom === 0, 'no column inside the bottom cope'),
  reason: 'no-bottom-cope',
};
const manyRows: Gate = { when: flag('', (f) => f.n > 2, 'three bolt rows or more'), reason: 'three-in-line' };
const manyColumns: Gate = { when: flag('', (f) => f.m > 2, 'three bolt columns or more'), reason: 'three-in-line' };
const untied: Gate = { when: flag('', (f) => f.T === 0, 'no tie force'), reason: 'no-tie' };

/** Least spacing of bolts 2.7 d, CSA S16:19 cl. 22.3.1. */
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

/** With one or two bolts in the line of the force the end beyond them is 1.5 d at least, cl. 22.3.4. */
const endInLine = (of: string, given: Tree<Length>, off: readonly Gate[]): FitPart => ({
  of,
  given,
  least: step('e_min', times(1.5, d), inLine),
  off,
  source: inLine,
});

/** Edge distances of the cut web: the table's row for cut edges; the end in the line of V. */
export const fitEdgeWeb: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: 'top', given: at, least: cutEdge, most: greatestEdge(tw), off: [intactFlange] },
    { of: 'bottom', given: ab, least: cutEdge, off: [noBottomCope] },
    endInLine('top, in line', at, [intactFlange, manyRows]),
  ],
};

export const fitEnd: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: '', given: eEnd, least: cutEdge, most: greatestEdge(tw) },
    endInLine('in line', eEnd, [untied, manyColumns]),
  ],
};

/** Edge distances of the plate: sheared edges unless option `plate-edges: cut`; the end in the line of V. */
export const fitEdgePlate: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    { of: 'top', given: eTop, least: plateEdge, most: greatestEdge(tp) },
    { of: 'bottom', given: eBot, least: plateEdge, most: greatestEdge(tp) },
    { of: 'free edge', given: ex, least: plateEdge, most: greatestEdge(tp) },
    endInLine('bottom, in line', eBot, [manyRows]),
  ],
};
