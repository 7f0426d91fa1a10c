import { N } from '../../end/boltGroup.ts';
import { type Gate, noTieForce, singleRow } from '../../end/gates.ts';
import { dn, flag, fu, fup, fy, fyp, ho, hp, n, T, tp, tw } from '../../end/given.ts';
import { type Block, platePulled, webPulled } from '../../end/tearPaths.ts';
import { least, minus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
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
  off: [noTieForce, ...off],
});

const netTension = (t: Tree<Length>, depth: Tree<Length>, fu: Tree<Stress>) =>
  step('T_r', times(0.85, phi, t, minus(depth, times(n, dn)), fu), source);

/** Each row torn out by itself along two planes: weaker than the block where the rows stand far apart, and all there is with one row. */
const rowByRow = ({ Agv, Anv }: Block, fy: Tree<Stress>, fu: Tree<Stress>) =>
  step('T_r', times(n, least(times(0.6, phi, Agv, fy), times(0.6, phi, Anv, fu))), source);

const noWeld: Gate = { when: flag('no weld', (f) => f.kind === 'web-bolts'), reason: 'no-weld' };

const bolts = step('T_r', times(N, boltResistance), source);

/**
 * Tie force along the beam, acting alone: bolts in shear shared evenly, bearing, a block or each row pulled out to the end, net tension;
 * in the web and, as the same joint hangs on them, in the plate and its weld.
 */
export const webTie: StrengthRule = {
  source,
  ways: [
    way('bolts', bolts),
    way('bearing, web', step('T_r', times(N, bearingOn(tw, fu)), source)),
    way('block, web', generalBlock(webPulled, fy, fu), [singleRow]),
    way('rows, web', rowByRow(webPulled, fy, fu)),
    way('net tension, web', netTension(tw, ho, fu)),
    way('bearing, plate', step('T_r', times(N, bearingOn(tp, fup)), source)),
    way('block, plate', generalBlock(platePulled, fyp, fup), [singleRow]),
    way('rows, plate', rowByRow(platePulled, fyp, fup)),
    way('net tension, plate', netTension(tp, hp, fup)),
    way('weld', step('T_r', times(2, hp, filletLine), source), [noWeld]),
  ],
};
