import { fullDepthPlate, oneSupportRow, wideSupportHole } from '../../end/gates.ts';
import { fup, fus, supportBolts, tp, ts } from '../../end/given.ts';
import { oneRowOfSupport, supportForce, supportH, supportUpright } from '../../end/supportGroup.ts';
import { least, pick } from '../../formula/tree.ts';
import { twoLines } from '../methods/supportBearing.ts';
import { oneSupportBoltRefers, supportPly } from '../methods/supportPly.ts';
import type { StrengthRule } from '../standard.ts';
import { inPly, nearest, source, tearing } from './plyBearing.ts';

const { ev, eh, p } = supportBolts;
const { crushing, toEdge, toNext } = inPly(supportBolts);
const limits = [oneSupportBoltRefers, fullDepthPlate, wideSupportHole];

const up = nearest(pick([[oneRowOfSupport, toEdge(ev)]], least(toEdge(ev), toNext(p))));

/**
 * Bearing at the bolts into the support, AS 4100:2020 cl. 9.2.2.4: of the cleat's leg or the end plate by the whole force and by its parts
 * (upright to the nearer of its upper and lower edges, safe for either direction), of the support's ply, which has no edges, to the next hole.
 */
export const supportBearing: StrengthRule = {
  source,
  ways: [
    { of: 'resultant', symbol: 'R_s', load: 'V', demand: supportForce, resistance: crushing(tp, fup), limits },
    { of: 'up', symbol: 'R_v,s', load: 'V', demand: supportUpright, resistance: tearing(up, tp, fup), limits },
    {
      of: 'along',
      symbol: 'H_s',
      load: 'V',
      demand: supportH,
      resistance: tearing(nearest(toEdge(eh)), tp, fup),
      off: [twoLines, oneSupportRow],
      limits,
    },
    ...supportPly(crushing(ts, fus), tearing(nearest(toNext(p)), ts, fus), source),
  ],
};
