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
import { constant, least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { fitCopeRadius as practiceRadius } from '../methods/fitPractice.ts';
import { notCleat, ofCleat, oneLineOnly } from '../methods/kinds.ts';
import { besideOpposite } from '../methods/opposite.ts';
import { insideFlange, onColumn } from '../methods/supportOutline.ts';
import type { FitPart, FitRule } from '../standard.ts';

const spacing = { clause: '9.5.1, 9.5.3', basis: 'seen' } as const;
const edges = { clause: '9.5.2, 9.5.4', basis: 'seen' } as const;
const mm = (length: number) => constant(`${length} mm`, length, '1,0');
const noBottomCope: Gate = {
  when: flag('no column inside a bottom cope', (f) => f.mBottom === 0),
  reason: 'no-bottom-cope',
};

const leastSpacing = (d: Tree<Length>) => step('p_min', times(2.5, d), spacing);
const greatestSpacing = (t: Tree<Length>, ply: string) => step('p_max', least(times(15, t), mm(200)), spacing, ply);

const inWeb = { least: leastSpacing(d), most: greatestSpacing(least(tp, tw), 'the thinner ply') };
const inSupport = { least: leastSpacing(supportBolts.d), most: greatestSpacing(tp, 'leg or plate') };

export const fitPitch: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: '', given: p, ...inWeb, off: [noWebHoles, singleRow] },
    { of: 'support bolts', given: supportBolts.p, ...inSupport, off: [noSupportBolts, oneSupportRow] },
    besideOpposite(inSupport.least),
  ],
};

/** Between columns; the two lines of support bolts, with the web between them, need their least alone. */
export const fitGauge: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: '', given: q, ...inWeb, off: [noWebHoles, singleColumn] },
    { of: 'cross centres', given: supportBolts.cc, least: inSupport.least, off: [noSupportBolts, oneLineOnly] },
  ],
};

const machined = flag('option edges: machine', (f) => f.options.edges === 'machine');
/** An edge sheared or flame cut by hand, unless the shop cuts by machine; an edge sawn. */
const cutEdgeBy = (d: Tree<Length>): Tree<Length> =>
  step('e_min', pick([[machined, times(1.5, d)]], times(1.75, d)), edges);
const cutEdge = cutEdgeBy(d);
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

const rolledToe = (d: Tree<Length>): Tree<Length> => step('e_min', times(1.25, d), edges, 'rolled toe');
const most = greatestEdge(tp);
const edge = (of: string, given: Tree<Length>, least: Tree<Length>, off: readonly Gate[]): FitPart => ({
  of,
  given,
  least,
  most,
  off,
});
const cutAtSupport = cutEdgeBy(supportBolts.d);

/** Edges of plate, ply, or cleat, whose toes are rolled: beside the bolts through the web, and beside those into the support. */
export const fitEdgePlate: FitRule = {
  source: edges,
  breach: 'fails',
  parts: [
    edge('top', eTop, cutEdge, [noWebHoles]),
    edge('bottom', eBot, cutEdge, [noWebHoles]),
    edge('free edge', ex, cutEdge, [noWebHoles, ofCleat]),
    edge('toe of the web leg', ex, rolledToe(d), [noWebHoles, notCleat]),
    edge('top, support bolts', supportBolts.eTop, cutAtSupport, [noSupportBolts]),
    edge('bottom, support bolts', supportBolts.eBot, cutAtSupport, [noSupportBolts]),
    edge('side, support bolts', supportBolts.eh, cutAtSupport, [noSupportBolts, ofCleat]),
    edge('toe of the support leg', supportBolts.eh, rolledToe(supportBolts.d), [noSupportBolts, notCleat]),
    insideFlange(rolledToe(supportBolts.d)),
    ...onColumn,
  ],
};

/** Corner radius of a cope, 10 mm: here a clause, cl. 14.3.3. */
export const fitCopeRadius: FitRule = {
  ...practiceRadius,
  source: { clause: '14.3.3', basis: 'memory' },
  breach: 'fails',
};
