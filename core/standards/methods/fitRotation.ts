import { byKind, isPlate } from '../../end/byKind.ts';
import { fullDepthPlate, type Gate, noSupportBolts, noWebHoles, oneColumn } from '../../end/gates.ts';
import { d, h, hp, leg, r, supportBolts, tf, tp, tw } from '../../end/given.ts';
import { constant, least, minus, most, not, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import type { FitRule } from '../standard.ts';

/** Practice, no clause: an end that breaks it is referred, never failed. */
const source = { clause: 'practice', basis: 'practice' } as const;

const thinner = pick([[oneColumn, least(tp, tw)]], most(tp, tw));
const notFinPlate: Gate = { when: byKind('', (kind) => kind !== 'fin-plate'), reason: 'fin-plates-only' };
const noThinPart: Gate = {
  when: byKind('neither cleat nor end plate', isPlate),
  reason: 'fin-plates-only',
};
const partDepth: Gate = { when: not(fullDepthPlate.when), reason: 'fin-plates-only' };

/**
 * How the end turns: with a fin plate bolts plough the thinner ply (both plies from two columns up) and the weld outlasts the plate; cleat or
 * end plate bends, being thin beside `bolt`, the bolts' diameter, mm. An end plate joined to the flanges turns too little.
 */
export const fitRotationBy = (bolt: Tree<Length>): FitRule => {
  const most = (d: Tree<Length>) => step('t_max', plus(over(d, 2), constant('2 mm', 2, '1,0')), source);
  return {
    source,
    breach: 'refer',
    parts: [
      { of: 'ply', given: step('t', thinner, source), most: most(d), off: [notFinPlate] },
      { of: 'weld leg', given: leg, least: step('s_min', times(0.625, tp), source), off: [notFinPlate] },
      { of: 'thickness', given: tp, most: most(bolt), off: [noThinPart] },
      {
        of: 'depth',
        given: hp,
        most: step('h_max', minus(h, times(2, plus(tf, r))), source, 'the clear web'),
        off: [partDepth],
      },
    ],
  };
};

/** By the smaller of the bolts in web and support. */
export const fitRotation: FitRule = fitRotationBy(
  pick(
    [
      [noWebHoles.when, supportBolts.d],
      [noSupportBolts.when, d],
    ],
    least(d, supportBolts.d),
  ),
);
