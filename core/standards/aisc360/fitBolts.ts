import {
  type Gate,
  intactFlange,
  noSupportBolts,
  noWebHoles,
  oneSupportRow,
  singleColumn,
  singleRow,
} from '../../end/gates.ts';
import { ab, at, d, d0, eBot, eEnd, eTop, ex, flag, found, p, q, supportBolts, tp, ts, tw } from '../../end/given.ts';
import { least, most, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { besideOpposite } from '../methods/opposite.ts';
import { insideFlange, onColumn } from '../methods/supportOutline.ts';
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
const leastSpacing = (d: Tree<Length>, d0: Tree<Length>): Tree<Length> =>
  step('p_min', most(times(over(8, 3), d), plus(d, d0)), spacing);
const greatestSpacing = (t: Tree<Length>): Tree<Length> =>
  step('p_max', least(times(24, t), inches('12', 12)), spacing);

/** Between centres; more than the greatest refers. */
const spaced = (of: string, given: Tree<Length>, bounds: readonly Tree<Length>[], off: readonly Gate[]): FitPart[] => [
  { of, given, least: bounds[0]!, off },
  { of, given, most: bounds[1]!, off, breach: 'refer' },
];
const inWeb = [leastSpacing(d, d0), greatestSpacing(least(tp, tw))];
const supportThin = pick([[flag('', (f) => f.ts === 0, 'thickness of the support not told'), tp]], least(tp, ts));
const inSupport = [leastSpacing(supportBolts.d, supportBolts.d0), greatestSpacing(supportThin)];

export const fitPitch: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    ...spaced('', p, inWeb, [noWebHoles, singleRow]),
    ...spaced('support bolts', supportBolts.p, inSupport, [noSupportBolts, oneSupportRow]),
    besideOpposite(inSupport[0]!),
  ],
};
export const fitGauge: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: spaced('', q, inWeb, [noWebHoles, singleColumn]),
};

const tabled = (d: Tree<Length>): Tree<Length> =>
  step(
    'e_min',
    found('1,0', 'Table J3.4', [d], (_, diameter) => leastEdge(diameter!)),
    edges,
  );
const webTabled = tabled(d);
const supportTabled = tabled(supportBolts.d);

/** Below the table the lesser distance has to be proved: refers. Below d it fails. */
const apart = (of: string, given: Tree<Length>, off: readonly Gate[]): FitPart[] => [
  { of, given, least: webTabled, off },
  { of, given, least: d, off, breach: 'fails' },
];
const furthest = (t: Tree<Length>): Tree<Length> => step('e_max', least(times(12, t), inches('6', 6)), edges);
const near = (of: string, given: Tree<Length>, t: Tree<Length>): FitPart[] => [
  ...apart(of, given, [noWebHoles]),
  { of, given, most: furthest(t), off: [noWebHoles] },
];
/** Edges of the leg or end plate on the support. */
const nearSupport = (of: string, given: Tree<Length>): FitPart[] => {
  const off = [noSupportBolts];
  return [
    { of, given, least: supportTabled, off },
    { of, given, least: supportBolts.d, off, breach: 'fails' },
    { of, given, most: furthest(tp), off },
  ];
};

const rule = (parts: readonly FitPart[]): FitRule => ({ source: edges, breach: 'refer', parts });

export const fitEdgeWeb = rule([...apart('top', at, [intactFlange]), ...apart('bottom', ab, [noBottomCope])]);
export const fitEnd = rule(near('', eEnd, tw));
export const fitEdgePlate = rule([
  ...near('top', eTop, tp),
  ...near('bottom', eBot, tp),
  ...near('free edge', ex, tp),
  ...nearSupport('support bolts, top', supportBolts.eTop),
  ...nearSupport('support bolts, bottom', supportBolts.eBot),
  ...nearSupport('support bolts, side edge', supportBolts.eh),
  insideFlange(supportTabled),
  insideFlange(supportBolts.d, 'fails'),
  ...onColumn,
]);
