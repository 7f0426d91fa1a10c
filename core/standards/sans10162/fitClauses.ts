import {
  type Gate,
  intactFlange,
  noSupportBolts,
  noWebHoles,
  oneSupportRow,
  singleColumn,
  singleRow,
} from '../../end/gates.ts';
import { ab, at, d, eBot, eEnd, eTop, ex, flag, p, q, supportBolts, tp, tw } from '../../end/given.ts';
import { step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { notCleat, ofCleat, oneLineOnly } from '../methods/kinds.ts';
import { besideOpposite } from '../methods/opposite.ts';
import { insideFlange, onColumn } from '../methods/supportOutline.ts';
import type { FitPart, FitRule } from '../standard.ts';
import { cutEdge, greatestEdge, plateEdge, supportCutEdge, supportPlateEdge } from './edgeDistance.ts';

const spacing = { clause: '22.3.1', basis: 'memory' } as const;
const edges = { clause: '22.3', basis: 'memory' } as const;
const noBottomCope: Gate = { when: flag('', (f) => f.mBottom === 0), reason: 'no-bottom-cope' };

/** Least spacing of bolts 2.7 d, SANS 10162-1:2011 cl. 22.3.1. */
const leastSpacing = step('p_min', times(2.7, d), spacing);
const leastOfSupport = step('p_min', times(2.7, supportBolts.d), spacing);

export const fitPitch: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: '', given: p, least: leastSpacing, off: [noWebHoles, singleRow] },
    { of: 'support bolts', given: supportBolts.p, least: leastOfSupport, off: [noSupportBolts, oneSupportRow] },
    besideOpposite(leastOfSupport),
  ],
};

export const fitGauge: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: '', given: q, least: leastSpacing, off: [noWebHoles, singleColumn] },
    { of: 'cross centres', given: supportBolts.cc, least: leastOfSupport, off: [noSupportBolts, oneLineOnly] },
  ],
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

const edge = (of: string, given: Tree<Length>, least: Tree<Length>, off: readonly Gate[]): FitPart => ({
  of,
  given,
  least,
  most: greatestEdge(tp),
  off,
});
const { eTop: above, eBot: below, eh: beside } = supportBolts;

/** Edge distances of plate or cleat at its bolts: sheared edges unless option `plate-edges: cut`; the toes of a cleat are rolled. */
export const fitEdgePlate: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    edge('top', eTop, plateEdge, [noWebHoles]),
    edge('bottom', eBot, plateEdge, [noWebHoles]),
    edge('free edge', ex, plateEdge, [noWebHoles, ofCleat]),
    edge('toe of the web leg', ex, cutEdge, [noWebHoles, notCleat]),
    edge('top, support bolts', above, supportPlateEdge, [noSupportBolts]),
    edge('bottom, support bolts', below, supportPlateEdge, [noSupportBolts]),
    edge('side, support bolts', beside, supportPlateEdge, [noSupportBolts, ofCleat]),
    edge('toe of the support leg', beside, supportCutEdge, [noSupportBolts, notCleat]),
    insideFlange(supportCutEdge),
    ...onColumn,
  ],
};
