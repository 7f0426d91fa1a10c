import { noSupportBolts } from '../../end/gates.ts';
import { d, fus, fy, fyp, supportBolts, tp, ts, tw } from '../../end/given.ts';
import { atMost, constant, inMPa, over, pick, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Stress } from '../../units/dimension.ts';
import type { FitRule } from '../standard.ts';
import { upTo } from './bound.ts';
import { gammaM2 } from './factors.ts';
import { notFinPlate } from './kinds.ts';
import { guide, memory } from './sources.ts';
import { supportGates } from './support.ts';
import { betaW, throat, weldedFu } from './weld.ts';

const ductility = memory('joint guide 2008');
const mm = (length: number) => constant(`${length} mm`, length, '1,0');

/** Thickest ply in which a bolt's hole gives before the bolt; none above S355. */
const thickest = (fy: Tree<Stress>): Tree<Length> =>
  pick(
    [
      [atMost(inMPa(fy), upTo(275)), times(0.5, d)],
      [atMost(inMPa(fy), upTo(355)), times(0.42, d)],
    ],
    mm(0),
  );
const ofWeb = step('t_max,w', thickest(fy), ductility);
const ofPlate = step('t_max,p', thickest(fyp), ductility);
const webFirst = atMost(times(tw, ofPlate), times(tp, ofWeb));

/** Thickness of end plate or cleat that bends before the bolts into the support break. */
const bending = step('t_max', over(times(supportBolts.d, root(over(supportBolts.fub, fyp))), 2.8), ductility);

/**
 * The end turns. Fin plate: by its bolts ploughing the plate or the web; the weld outlasts the plate, and the plate does not punch through the
 * support. End plate and cleats bolted to the support: by bending beside those bolts.
 */
export const fitRotation: FitRule = {
  source: ductility,
  breach: 'refer',
  parts: [
    {
      of: 'plate or web',
      given: step('t', pick([[webFirst, tw]], tp), ductility),
      most: step('t_max', pick([[webFirst, ofWeb]], ofPlate), ductility),
      off: [notFinPlate],
    },
    {
      of: 'throat of the weld',
      given: throat,
      least: step('a_min', over(times(tp, fyp, betaW, gammaM2), times(root(2), weldedFu)), guide),
      off: [notFinPlate],
      source: guide,
    },
    {
      of: 'plate on the support',
      given: tp,
      most: step('t_max', over(times(ts, fus), times(fyp, gammaM2)), ductility),
      off: [notFinPlate, ...supportGates],
    },
    { of: 'bending beside the bolts', given: tp, most: bending, off: [noSupportBolts] },
  ],
};
