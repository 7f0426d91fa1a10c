import {
  type Gate,
  intactFlange,
  noSupportBolts,
  noWebHoles,
  oneSupportRow,
  pairOfCleats,
  singleColumn,
  singleRow,
} from '../../end/gates.ts';
import { ab, at, d0, eBot, eEnd, eTop, ex, flag, p, q, supportBolts, tp, tw } from '../../end/given.ts';
import { constant, least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { besideOpposite } from '../methods/opposite.ts';
import { insideFlange, onColumn } from '../methods/supportOutline.ts';
import type { FitRule } from '../standard.ts';
import { notEndPlate } from './kinds.ts';
import { guide, seen } from './sources.ts';

const spacing = seen('1-8 3.5');
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

const bottomFlange: Gate = {
  when: flag('a bottom flange below every column', (f) => f.mBottom === 0),
  reason: 'no-bottom-cope',
};

/** Greatest spacing by the thinner outer ply, mm. */
const widest = (t: Tree<Length>): Tree<Length> => step('p_max', least(times(14, t), mm(200)), spacing);
/** The cleats of a pair are the outer plies; else the web and what lies beside it. */
const inWeb = widest(pick([[pairOfCleats.when, tp]], least(tw, tp)));

const leastInSupport = step('p_min', times(2.2, supportBolts.d0), spacing);

/** EN 1993-1-8 Table 3.3, steel not exposed to the weather. */
export const fitPitch: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    {
      of: '',
      given: p,
      least: step('p_min', times(2.2, d0), spacing),
      most: inWeb,
      off: [noWebHoles, singleRow],
    },
    {
      of: 'support bolts',
      given: supportBolts.p,
      least: leastInSupport,
      most: widest(tp),
      off: [noSupportBolts, oneSupportRow],
    },
    besideOpposite(leastInSupport),
  ],
};
/** The same between columns; the lines of an end plate stand as the joint guide has them. */
export const fitGauge: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: '', given: q, least: step('q_min', times(2.4, d0), spacing), most: inWeb, off: [noWebHoles, singleColumn] },
    {
      of: 'cross centres',
      given: supportBolts.cc,
      least: mm(90),
      most: mm(140),
      breach: 'refer',
      off: [notEndPlate],
      source: guide,
    },
  ],
};

const edge = step('e_min', times(1.2, d0), spacing);
const supportEdge = step('e_min', times(1.2, supportBolts.d0), spacing);

export const fitEdgeWeb: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: 'top', given: at, least: edge, off: [intactFlange] },
    { of: 'bottom', given: ab, least: edge, off: [bottomFlange] },
  ],
};
export const fitEnd: FitRule = { source: spacing, breach: 'fails', parts: [{ of: '', given: eEnd, least: edge }] };
/** All edges of a plate or ply, of both legs of a cleat, of an end plate. */
export const fitEdgePlate: FitRule = {
  source: spacing,
  breach: 'fails',
  parts: [
    { of: 'top', given: eTop, least: edge, off: [noWebHoles] },
    { of: 'bottom', given: eBot, least: edge, off: [noWebHoles] },
    { of: 'free edge', given: ex, least: edge, off: [noWebHoles] },
    { of: 'support bolts, top', given: supportBolts.eTop, least: supportEdge, off: [noSupportBolts] },
    { of: 'support bolts, bottom', given: supportBolts.eBot, least: supportEdge, off: [noSupportBolts] },
    { of: 'support bolts, free edge', given: supportBolts.eh, least: supportEdge, off: [noSupportBolts] },
    insideFlange(supportEdge),
    ...onColumn,
  ],
};
