import { N } from '../../end/boltGroup.ts';
import { type Limit, noTieForce, noWebHoles, singleRow } from '../../end/gates.ts';
import { dn, fu, ho, n, T, tw } from '../../end/given.ts';
import { webPulled } from '../../end/tearPaths.ts';
import { least, minus, most, over, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import { supportLegsBent } from '../methods/supportLegsBent.ts';
import { tieNotCovered } from '../methods/tieNotCovered.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { webAlong } from './bearing.ts';
import { blockShear } from './block.ts';
import { boltLimits, boltResistance } from './bolts.ts';
import { gm0, gm1 } from './factors.ts';
import { fyw, nothing } from './given.ts';

const source = { clause: '6.4.1, 10.3', basis: 'memory' } as const;
const member = { clause: '6.2, 6.3.1', basis: 'memory' } as const;

const way = (of: string, resistance: Tree<Force>, off: Way['off'] = [], limits: readonly Limit[] = []): Way => ({
  of,
  symbol: 'T',
  load: 'T',
  demand: T,
  resistance,
  off: [noTieForce, noWebHoles, ...off],
  limits: [...limits, supportLegsBent],
});

const gross = step('T_dg', over(times(fyw, tw, ho), gm0), member);
const net = step('T_dn', over(times(0.9, fu, most(times(tw, minus(ho, times(n, dn))), nothing)), gm1), member);

/**
 * Tie force along the beam, acting alone, in bolts and web: bolts in shear shared evenly, bearing along the rows, the block pulled out to
 * the beam's end, the web in tension. Plate, weld and support are not covered; cleats, whose support legs it bends, and end plates refer.
 */
export const webTie: StrengthRule = {
  source,
  ways: [
    way('bolts', step('T_d', times(N, boltResistance), source), [], boltLimits),
    way('bearing, web', step('T_d', times(N, webAlong), source)),
    way('block, web', blockShear(webPulled, fyw, fu), [singleRow]),
    { ...way('net tension, web', step('T_d', least(gross, net), member)), source: member },
    tieNotCovered,
  ],
};
