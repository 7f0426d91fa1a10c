import { noSupportBolts, noWebHoles } from '../../end/gates.ts';
import { d0, fup, fyp, hp, k, n, supportBolts, tp, V, z } from '../../end/given.ts';
import { type Block, plateBlock, supportBlock } from '../../end/tearPaths.ts';
import { legWeldArm } from '../../end/weldGroup.ts';
import { minus, over, pick, root, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Length, Pure } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { blockOf } from './block.ts';
import { gammaM0 } from './factors.ts';
import { holeLimits, supportHoleLimits } from './limits.ts';
import { guide, seen } from './sources.ts';
import { underV } from './underV.ts';

const block3102 = seen('1-8 3.10.2');

/** Shear of the depth of each cleat; 1.27 stands for the bending that goes with it. */
export const cleatGrossShear: StrengthRule = {
  source: guide,
  ways: [underV('', step('V_Rd', over(times(k, hp, tp, fyp), times(1.27, root(3), gammaM0)), guide))],
};

/** Rupture in shear through the bolts of either leg; a welded leg has no holes. */
export const cleatNetShear = (gammaM2n: Tree<Pure>): StrengthRule => {
  const through = (rows: Tree<Pure>, hole: Tree<Length>) => {
    const area = step('A_v,net', times(tp, minus(hp, times(rows, hole))), guide);
    return step('V_Rd,n', over(times(k, area, fup), times(root(3), gammaM2n)), guide);
  };
  return {
    source: guide,
    ways: [
      underV('web leg', through(n, d0), [noWebHoles], holeLimits),
      underV('support leg', through(supportBolts.n, supportBolts.d0), [noSupportBolts], supportHoleLimits),
    ],
  };
};

/** Block tearing of either leg, EN 1993-1-8 3.10.2(3): the web leg pressed down, the support leg to the nearer of its ends. */
export const cleatBlock = (gammaM2n: Tree<Pure>): StrengthRule => {
  const legs = (block: Block) => step('V_Rd,b', times(k, blockOf(block, { fy: fyp, fu: fup }, gammaM2n)), block3102);
  return {
    source: block3102,
    ways: [
      underV('web leg', legs(plateBlock), [noWebHoles], holeLimits),
      underV('support leg', legs(supportBlock), [noSupportBolts], supportHoleLimits),
    ],
  };
};

const arm = step('e', pick([[noWebHoles.when, legWeldArm]], z), guide, 'to the centroid of the bolts or of the weld');

/** First yield of the web legs under V at the centroid of what holds them to the web. */
export const cleatBending: StrengthRule = {
  source: guide,
  ways: [
    {
      of: '',
      symbol: 'V e',
      load: 'V',
      demand: step('M', times(V, arm), guide),
      resistance: step('M_Rd', over(times(fyp, k, tp, squared(hp)), times(6, gammaM0)), guide),
    },
  ],
};
