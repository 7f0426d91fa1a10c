import { boltNotListed, noTieForce, noWebHoles, oneColumn, singleRow } from '../../end/gates.ts';
import { dn, ho, m, n, T, tw } from '../../end/given.ts';
import { pulled as pulledBlock } from '../../end/tearPaths.ts';
import { least, minus, most, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import { supportLegsBent } from '../methods/supportLegsBent.ts';
import { tieNotCovered } from '../methods/tieNotCovered.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { blockForce } from './block.ts';
import { clause } from './clauses.ts';
import { Fu, Fy, noLength } from './given.ts';
import { wideHoleRefers } from './limits.ts';
import { type Method, rupture, tensionYielding } from './method.ts';
import { pulled, rv } from './oneBolt.ts';
import { endUsed } from './webEnd.ts';

const tension = clause('J4.1');
const bolted = clause('J3.7, J3.11');
const block = clause('J4.3, J4-5');

const { webLast, webInner, plateLast, plateInner } = pulled;
/** The web's end lies at the first column, the plate's free edge at the last. */
const row = step(
  'Σr',
  pick(
    [[oneColumn, least(rv, webLast, plateLast)]],
    plus(
      least(rv, webLast, plateInner),
      times(minus(m, 2), least(rv, webInner, plateInner)),
      least(rv, webInner, plateLast),
    ),
  ),
  bolted,
  'bolts of one row, each by what gives way first',
);
const bolts = step('R_n', times(n, row), bolted);
const webBlock = blockForce(pulledBlock(tw, endUsed), Fy, Fu);
const net = step('R_n', times(Fu, tw, most(minus(ho, times(n, dn)), noLength)), tension);
const gross = step('R_n', times(Fy, tw, ho), tension);

/**
 * Tie force along the beam, acting alone: ordinary strengths of the web's bolts and of the web; plate, angles' legs, weld, support and its bolts
 * are not in this check. Angles, whose support legs it bends, and end plates refer.
 */
export const webTie = ({ available }: Method): StrengthRule => {
  const way = (of: string, resistance: Tree<Force>, source: Way['source'] & object, more: Partial<Way> = {}): Way => ({
    of,
    symbol: 'T',
    load: 'T',
    demand: T,
    resistance,
    source,
    ...more,
    off: [noTieForce, noWebHoles, ...(more.off ?? [])],
    limits: [...(more.limits ?? []), supportLegsBent],
  });
  return {
    source: tension,
    ways: [
      way('bolts', available(bolts, rupture, bolted), bolted, { limits: [wideHoleRefers, boltNotListed] }),
      way('block, web', available(webBlock, rupture, block), block, { off: [singleRow] }),
      way('net tension, web', available(net, rupture, tension), tension),
      way('gross tension, web', available(gross, tensionYielding, tension), tension),
      tieNotCovered,
    ],
  };
};
