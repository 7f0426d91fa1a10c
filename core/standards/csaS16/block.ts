import {
  copeLimits,
  fullDepthPlate,
  type Gate,
  intactFlange,
  noSupportBolts,
  noWebHoles,
  oneColumn,
} from '../../end/gates.ts';
import { k, mTop, V } from '../../end/given.ts';
import { type Block, plateBlock as plate, supportBlock, webBlock as web } from '../../end/tearPaths.ts';
import { atMost, below, constant, not, plus, type Source, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phiU } from './factors.ts';
import { Fu, Fup } from './given.ts';
import { Fm, Fmp } from './meanStrength.ts';

const source = { clause: '13.11', basis: 'seen' } as const;
const memory = { clause: '13.11', basis: 'memory' } as const;

/** Block tearing with the share U_t of the tension plane: gross shear plane at F_m, net tension plane at F_u. N */
export const tornBlock = (
  pull: Tree<Force>,
  { Agv }: Pick<Block, 'Agv'>,
  Fm: Tree<Stress>,
  source: Source,
): Tree<Force> => step('V_r', plus(pull, times(0.6, phiU, Agv, Fm)), source);

const severalInside: Gate = { when: below(1, mTop), reason: 'several-columns' };
const oneInside: Gate = { when: atMost(mTop, 1), reason: 'single-column' };
const severalColumns: Gate = { when: not(oneColumn), reason: 'several-columns' };
const single: Gate = { when: oneColumn, reason: 'single-column' };

const torn = (block: Block, Ut: number, Fu: Tree<Stress>, Fm: Tree<Stress>, source: Source): Tree<Force> =>
  tornBlock(step('P_t', times(phiU, constant('U_t', Ut), block.Ant, Fu), source), block, Fm, source);

const against = (resistance: Tree<Force>, source: Source): Way => ({
  of: '',
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance,
  source,
});

const way = (block: Block, Ut: number, Fu: Tree<Stress>, Fm: Tree<Stress>, source: Source): Way =>
  against(torn(block, Ut, Fu, Fm, source), source);

/** Block tearing of the coped web, CSA S16:19 cl. 13.11, columns inside the cope: U_t 0.9 with one, 0.3 with two or more. */
export const webBlock: StrengthRule = {
  source,
  ways: [
    { ...way(web, 0.9, Fu, Fm, source), off: [intactFlange, severalInside], limits: copeLimits },
    { ...way(web, 0.3, Fu, Fm, memory), off: [intactFlange, oneInside], limits: copeLimits },
  ],
};

/** Block tearing of the plate, cl. 13.11: U_t 0.6 with one column (a one-sided block), 0.3 with two or more as in the web. */
export const plateBlock: StrengthRule = {
  source,
  ways: [
    { ...way(plate, 0.6, Fup, Fmp, source), off: [severalColumns] },
    { ...way(plate, 0.3, Fup, Fmp, memory), off: [single] },
  ],
};

/** Blocks of the same kind, one in each cleat or on each side of the web. */
const several = (count: Tree<Pure> | 2, block: Block, Ut: number, source: Source): Way =>
  against(step('V_r', times(count, torn(block, Ut, Fup, Fmp, source)), source), source);

/** Block tearing of each cleat: its web leg as a plate, its support leg one-sided beside the line of bolts, U_t 0.6. */
export const cleatBlock: StrengthRule = {
  source,
  ways: [
    { ...several(k, plate, 0.6, source), of: 'web leg', off: [noWebHoles, severalColumns] },
    { ...several(k, plate, 0.3, memory), of: 'web leg', off: [noWebHoles, single] },
    { ...several(k, supportBlock, 0.6, source), of: 'support leg', off: [noSupportBolts] },
  ],
};

/** Block tearing of an end plate, one-sided beside each of the two lines of bolts, U_t 0.6. */
export const endPlateBlock: StrengthRule = {
  source,
  ways: [{ ...several(2, supportBlock, 0.6, source), limits: [fullDepthPlate] }],
};
