import { noSupportBolts, oneSupportRow } from '../../end/gates.ts';
import { fup, fus, supportBolts, tp, ts } from '../../end/given.ts';
import {
  atMost,
  constant,
  least,
  minus,
  most,
  not,
  over,
  pick,
  plus,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Length, Pure, Stress } from '../../units/dimension.ts';
import { oppositeApart } from '../methods/opposite.ts';
import { onSupport } from '../methods/supportShear.ts';
import type { StrengthRule } from '../standard.ts';
import { gammaM2 } from './factors.ts';
import { noSupportStressArea, oneCleat, supportBoltLimits, twoLineLimits } from './limits.ts';
import { bearingOf, bearingTermsOf, longShearOf, supportBolt } from './oneBolt.ts';
import { leastOf } from './optional.ts';
import { guide, memory, seen } from './sources.ts';
import { supportGates } from './support.ts';
import { underV } from './underV.ts';

const table34 = seen('1-8 3.6.1');
const groups = memory('1-8 3.7');
const { n, p, cc, ev, eh } = supportBolts;
const all = step('N_s', times(2, n), undefined, 'two lines');
const onePlane = longShearOf(supportBolt);

/** Bolts of both lines in shear, less a fifth for the tension that the end's turning puts into them: joint guide. */
export const supportBoltShear: StrengthRule = {
  source: table34,
  ways: [
    underV(
      '',
      step('V_Rd', times(0.8, all, onePlane), guide, '0.8 stands for tension in the bolts'),
      [noSupportBolts],
      [noSupportStressArea, ...supportBoltLimits],
    ),
  ],
};

const terms = bearingTermsOf(supportBolt);
const most1 = constant('1', 1);
const most25 = constant('2.5', 2.5);
const severalRows = not(oneSupportRow.when);
const strengthOver = (fu: Tree<Stress>): Tree<Pure> => over(supportBolt.fub, fu);
const floored = (symbol: string, of: Tree<Pure>): Tree<Pure> => step(symbol, most(of, 0), table34);

const onPly = (symbol: string, ply: { fu: Tree<Stress>; t: Tree<Length> }, k1: Tree<Pure>, alphaB: Tree<Pure>) =>
  bearingOf(symbol, supportBolt, ply, { k1, alphaB }, gammaM2);

const ofLeg = { fu: fup, t: tp };
const k1 = floored('k_1', least(terms.edge(eh), terms.between(cc), most25));
const endBolt = onPly('F_e', ofLeg, k1, floored('α_e', least(terms.end(ev), strengthOver(fup), most1)));
const innerBolt = onPly('F_i', ofLeg, k1, floored('α_i', least(terms.inner(p), strengthOver(fup), most1)));

/** The sum of the bolts where their shear lets each bear in full, else all by the weakest. */
const legGroup = step(
  'V_Rd',
  pick(
    [
      [oneSupportRow.when, times(2, endBolt)],
      [atMost(most(endBolt, innerBolt), onePlane), times(2, plus(endBolt, times(minus(n, 1), innerBolt)))],
    ],
    times(all, least(endBolt, innerBolt)),
  ),
  groups,
);

const inSupport = onPly(
  'F_s',
  { fu: fus, t: ts },
  floored('k_1', least(terms.between(cc), most25)),
  floored('α_b', leastOf([strengthOver(fus), most1], [[severalRows, terms.inner(p)]])),
);

/**
 * Bearing at the bolts of both lines, EN 1993-1-8 3.6.1 and 3.7: on the legs of a pair of cleats or on the end plate, to the nearer of its
 * ends; and on the support where it is told, whose own edges are taken as far, with a beam on the other side of the same web added.
 */
export const supportBearing: StrengthRule = {
  source: table34,
  ways: [
    underV('leg or plate', legGroup, [noSupportBolts], supportBoltLimits),
    ...onSupport({
      of: 'support',
      resistance: step('V_Rd', times(all, inSupport), table34),
      off: [noSupportBolts, ...supportGates],
      limits: [oneCleat, oppositeApart, ...twoLineLimits],
    }),
  ],
};
