import { fullDepthPlate, oneSupportRow, wideSupportHole } from '../../end/gates.ts';
import { fup, fus, supportBolts, tp, ts } from '../../end/given.ts';
import { oneRowOfSupport, supportForce, supportH, supportUpright } from '../../end/supportGroup.ts';
import { pick } from '../../formula/tree.ts';
import { twoLines } from '../methods/supportBearing.ts';
import { oneSupportBoltRefers, supportPly } from '../methods/supportPly.ts';
import type { StrengthRule } from '../standard.ts';
import { inPly, source } from './plyBearing.ts';

const { ev, eh, p } = supportBolts;
const { byEdge, bySpacing, kb, bearingOn } = inPly(supportBolts);
const limits = [oneSupportBoltRefers, fullDepthPlate, wideSupportHole];

const up = pick([[oneRowOfSupport, kb(fup, byEdge(ev))]], kb(fup, byEdge(ev), bySpacing(p)));

/**
 * Bearing at the bolts into the support, IS 800:2007 cl. 10.3.4: of the cleat's leg or the end plate by the whole force and by its parts
 * (upright to the nearer of its upper and lower edges, safe for either direction), of the support's ply, which has no edges, to the next hole.
 */
export const supportBearing: StrengthRule = {
  source,
  ways: [
    {
      of: 'resultant',
      symbol: 'R_s',
      load: 'V',
      demand: supportForce,
      resistance: bearingOn(kb(fup), tp, fup),
      limits,
    },
    { of: 'up', symbol: 'R_v,s', load: 'V', demand: supportUpright, resistance: bearingOn(up, tp, fup), limits },
    {
      of: 'along',
      symbol: 'H_s',
      load: 'V',
      demand: supportH,
      resistance: bearingOn(kb(fup, byEdge(eh)), tp, fup),
      off: [twoLines, oneSupportRow],
      limits,
    },
    ...supportPly(bearingOn(kb(fus), ts, fus), bearingOn(kb(fus, bySpacing(p)), ts, fus), source),
  ],
};
