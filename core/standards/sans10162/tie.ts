import { N } from '../../end/boltGroup.ts';
import { noTieForce, noWebHoles, singleRow } from '../../end/gates.ts';
import { dn, fu, fup, fy, fyp, ho, hp, k, n, T, tp, tw } from '../../end/given.ts';
import { type Block, platePulled, webPulled } from '../../end/tearPaths.ts';
import { least, minus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import { notCleat, notFinPlate, ofCleat } from '../methods/kinds.ts';
import { supportLegsBent } from '../methods/supportLegsBent.ts';
import { tieNotCovered } from '../methods/tieNotCovered.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { generalBlock } from './block.ts';
import { bearingOn, boltResistance } from './bolts.ts';
import { phi } from './factors.ts';
import { filletLine } from './weld.ts';

const source = { clause: '13.11 to 13.13', basis: 'memory' } as const;

const way = (of: string, resistance: Tree<Force>, off: Way['off'] = []): Way => ({
  of,
  symbol: 'T',
  load: 'T',
  demand: T,
  resistance,
  off: [noTieForce, noWebHoles, ...off],
  limits: [supportLegsBent],
});

const netTension = (t: Tree<Length>, depth: Tree<Length>, fu: Tree<Stress>) =>
  step('T_r', times(0.85, phi, t, minus(depth, times(n, dn)), fu), source);

/** Each row torn out by itself along two planes: weaker than the block where the rows stand far apart, and all there is with one row. */
const rowByRow = ({ Agv, Anv }: Block, fy: Tree<Stress>, fu: Tree<Stress>) =>
  step('T_r', times(n, least(times(0.6, phi, Agv, fy), times(0.6, phi, Anv, fu))), source);

const bolts = step('T_r', times(N, boltResistance), source);
const bearing = step('T_r', times(N, bearingOn(tp, fup)), source);
const block = generalBlock(platePulled, fyp, fup);
const rows = rowByRow(platePulled, fyp, fup);
const net = netTension(tp, hp, fup);
const eachCleat = (one: Tree<Force>): Tree<Force> => step('T_r', times(k, one), source, 'each cleat');

/**
 * Tie force along the beam, acting alone: bolts in shear shared evenly, bearing, a block or each row pulled out to the end, net tension;
 * in the web and, as the same joint hangs on them, in the plate and its weld, or in the web legs of cleats. Their support legs, bent open, and
 * the bolts there have no formula, nor have welded legs and end plates: these refer.
 */
export const webTie: StrengthRule = {
  source,
  ways: [
    way('bolts', bolts),
    way('bearing, web', step('T_r', times(N, bearingOn(tw, fu)), source)),
    way('block, web', generalBlock(webPulled, fy, fu), [singleRow]),
    way('rows, web', rowByRow(webPulled, fy, fu)),
    way('net tension, web', netTension(tw, ho, fu)),
    way('bearing, plate', bearing, [ofCleat]),
    way('block, plate', block, [ofCleat, singleRow]),
    way('rows, plate', rows, [ofCleat]),
    way('net tension, plate', net, [ofCleat]),
    way('weld', step('T_r', times(2, hp, filletLine), source), [notFinPlate]),
    way('bearing, web leg', eachCleat(bearing), [notCleat]),
    way('block, web leg', eachCleat(block), [notCleat, singleRow]),
    way('rows, web leg', eachCleat(rows), [notCleat]),
    way('net tension, web leg', eachCleat(net), [notCleat]),
    tieNotCovered,
  ],
};
