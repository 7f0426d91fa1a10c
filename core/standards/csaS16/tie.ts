import { N } from '../../end/boltGroup.ts';
import { noTieForce, noWebHoles, singleRow } from '../../end/gates.ts';
import { dn, ho, hp, k, n, T, tp, tw } from '../../end/given.ts';
import { type Block, platePulled, webPulled } from '../../end/tearPaths.ts';
import { minus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import { notCleat, notFinPlate, ofCleat } from '../methods/kinds.ts';
import { supportLegsBent } from '../methods/supportLegsBent.ts';
import { tieNotCovered } from '../methods/tieNotCovered.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { tornBlock } from './block.ts';
import { bearingOn, boltTied } from './bolts.ts';
import { phi, phiU } from './factors.ts';
import { Fu, Fup, Fy, Fyp } from './given.ts';
import { Fm, Fmp } from './meanStrength.ts';
import { filletLine } from './weld.ts';

const source = { clause: '13.2, 13.11 to 13.13', basis: 'memory' } as const;

const way = (of: string, resistance: Tree<Force>, off: Way['off'] = []): Way => ({
  of,
  symbol: 'T',
  load: 'T',
  demand: T,
  resistance,
  off: [noTieForce, noWebHoles, ...off],
  limits: [supportLegsBent],
});

/** Pulled straight, so the whole tension plane counts: U_t = 1.0. */
const block = (path: Block, Fm: Tree<Stress>, Fu: Tree<Stress>) =>
  tornBlock(step('P_t', times(phiU, path.Ant, Fu), source, 'U_t = 1.0'), path, Fm, source);

/** Each row torn out by itself along two planes: weaker than the block where the rows stand far apart, and all there is with one row. */
const rowByRow = ({ Agv }: Block, Fm: Tree<Stress>) => step('T_r', times(n, 0.6, phiU, Agv, Fm), source);

const netTension = (t: Tree<Length>, depth: Tree<Length>, Fu: Tree<Stress>) =>
  step('T_r', times(phiU, Fu, t, minus(depth, times(n, dn))), source);
const grossTension = (t: Tree<Length>, depth: Tree<Length>, Fy: Tree<Stress>) =>
  step('T_r', times(phi, Fy, t, depth), source);

const bearing = step('T_r', times(N, bearingOn(tp, Fup)), source);
const plateBlock = block(platePulled, Fmp, Fup);
const rows = rowByRow(platePulled, Fmp);
const net = netTension(tp, hp, Fup);
const gross = grossTension(tp, hp, Fyp);
const eachCleat = (one: Tree<Force>): Tree<Force> => step('T_r', times(k, one), source, 'each angle');

/**
 * Tie force along the beam, acting alone: bolts in shear shared evenly, bearing, a block or each row pulled out to the end, net and gross
 * tension of the web alone, flanges not counted; in the web and, as the same joint hangs on them, in the plate and its weld, or in the web legs
 * of cleats. Their support legs, bent open, and the bolts there have no formula, nor have welded legs and end plates: these refer.
 */
export const webTie: StrengthRule = {
  source,
  ways: [
    way('bolts', step('T_r', times(N, boltTied), source)),
    way('bearing, web', step('T_r', times(N, bearingOn(tw, Fu)), source)),
    way('block, web', block(webPulled, Fm, Fu), [singleRow]),
    way('rows, web', rowByRow(webPulled, Fm)),
    way('net tension, web', netTension(tw, ho, Fu)),
    way('gross tension, web', grossTension(tw, ho, Fy)),
    way('bearing, plate', bearing, [ofCleat]),
    way('block, plate', plateBlock, [ofCleat, singleRow]),
    way('rows, plate', rows, [ofCleat]),
    way('net tension, plate', net, [ofCleat]),
    way('gross tension, plate', gross, [ofCleat]),
    way('weld', step('T_r', times(2, hp, filletLine), source), [notFinPlate]),
    way('bearing, web leg', eachCleat(bearing), [notCleat]),
    way('block, web leg', eachCleat(plateBlock), [notCleat, singleRow]),
    way('rows, web leg', eachCleat(rows), [notCleat]),
    way('net tension, web leg', eachCleat(net), [notCleat]),
    way('gross tension, web leg', eachCleat(gross), [notCleat]),
    tieNotCovered,
  ],
};
