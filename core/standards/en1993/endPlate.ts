import { fullDepthPlate } from '../../end/gates.ts';
import { fup, fy, fyp, hp, supportBolts, tp, tw } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { oneRowOfSupport } from '../../end/supportGroup.ts';
import { supportBlock } from '../../end/tearPaths.ts';
import { all, below, constant, minus, not, over, pick, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Pure } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { blockOf } from './block.ts';
import { from } from './bound.ts';
import { gammaM0 } from './factors.ts';
import { supportHoleLimits } from './limits.ts';
import { fullWeb, plastic } from './shearArea.ts';
import { guide, memory, seen } from './sources.ts';
import { underV } from './underV.ts';

/** Shear of the plate on both sides of the web; 1.27 stands for the bending that goes with it. */
export const endPlateGrossShear: StrengthRule = {
  source: guide,
  ways: [
    underV('', step('V_Rd', over(times(2, hp, tp, fyp), times(1.27, root(3), gammaM0)), guide), [], [fullDepthPlate]),
  ],
};

/** Rupture in shear through both lines of bolts. */
export const endPlateNetShear = (gammaM2n: Tree<Pure>): StrengthRule => {
  const area = step('A_v,net', times(tp, minus(hp, times(supportBolts.n, supportBolts.d0))), guide);
  const resistance = step('V_Rd,n', over(times(2, area, fup), times(root(3), gammaM2n)), guide);
  return { source: guide, ways: [underV('', resistance, [], supportHoleLimits)] };
};

const block3102 = seen('1-8 3.10.2');

/** A plate less deep than 1.36 times the cross centres turns about its lines: half the tension plane then counts. */
const turns = all(below(hp, times(from(1.36), supportBolts.cc)), not(oneRowOfSupport));
const tension = step('κ', pick([[turns, constant('0.5', 0.5)]], constant('1', 1)), guide, 'share of the tension plane');

/** Block tearing beside both lines, EN 1993-1-8 3.10.2. */
export const endPlateBlock = (gammaM2n: Tree<Pure>): StrengthRule => {
  const block = blockOf(supportBlock, { fy: fyp, fu: fup }, gammaM2n, tension);
  return { source: block3102, ways: [underV('', step('V_Rd,b', times(2, block), block3102), [], supportHoleLimits)] };
};

const web = memory('1-1 6.2.6');
const webArea = step(
  'A_v',
  pick([[fullWeb, times(plateOnWeb, tw)]], times(0.9, plateOnWeb, tw)),
  web,
  'published notes differ: all of it, or 0.9',
);

/** Shear of the beam's web along the plate's depth, as of a plain web. */
export const endPlateWebShear: StrengthRule = {
  source: web,
  ways: [underV('', step('V_Rd', plastic(webArea, fy), web), [], [fullDepthPlate])],
};
