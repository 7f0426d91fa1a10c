import { N } from '../../end/boltGroup.ts';
import { type Limit, noTieForce, noWebHoles, singleRow } from '../../end/gates.ts';
import { dn, ho, n, T, tw } from '../../end/given.ts';
import { webPulled } from '../../end/tearPaths.ts';
import { least, minus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import { supportLegsBent } from '../methods/supportLegsBent.ts';
import { tieNotCovered } from '../methods/tieNotCovered.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { webPull } from './bearing.ts';
import { blockShear, even } from './block.ts';
import { boltLimits, boltResistance } from './bolts.ts';
import { phi } from './factors.ts';
import { fu, fyw } from './given.ts';

const source = { clause: '7.2, 9.1, 9.2', basis: 'seen' } as const;
const member = { clause: '7.2', basis: 'memory' } as const;

const way = (of: string, resistance: Tree<Force>, off: Way['off'] = [], limits: readonly Limit[] = []): Way => ({
  of,
  symbol: 'T',
  load: 'T',
  demand: T,
  resistance,
  off: [noTieForce, noWebHoles, ...off],
  limits: [...limits, supportLegsBent],
});

const gross = step('φN_y', times(phi, fyw, tw, ho), member);
const net = step('φN_u', times(phi, 0.85, fu, tw, minus(ho, times(n, dn))), member);

/**
 * Tie force along the beam, acting alone, in bolts and web: bolts in shear shared evenly, bearing and tear-out along the rows, the block
 * pulled out to the beam's end, the web in tension. Plate, weld and support are not covered; cleats, whose support legs it bends, and end
 * plates refer.
 */
export const webTie: StrengthRule = {
  source,
  ways: [
    way('bolts', step('φT', times(N, boltResistance), source), [], boltLimits),
    way('bearing, web', step('φT', times(N, webPull), source)),
    way('block, web', blockShear(webPulled, fyw, fu, even), [singleRow]),
    { ...way('net tension, web', step('φN_t', least(gross, net), member)), source: member },
    tieNotCovered,
  ],
};
