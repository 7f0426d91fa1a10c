import { byKind, isEndPlate } from '../../end/byKind.ts';
import { fullDepthPlate, type Gate } from '../../end/gates.ts';
import { k, leg, tp, tw, V } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { legWeldForce } from '../../end/weldGroup.ts';
import { below, least, minus, most, not, over, root, step, times } from '../../formula/tree.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { clause } from './clauses.ts';
import { FEXX, Fu, noLength } from './given.ts';
import { leastLeg } from './leastLeg.ts';
import { type Method, rupture } from './method.ts';
import { edgeTooThin } from './supportLegWeld.ts';

const line = clause('J2.4');
const base = clause('J4.2, J4-4');

const notEndPlate: Gate = { when: byKind('', (kind) => !isEndPlate(kind), 'no end plate'), reason: 'no-weld' };
const endPlate: Gate = { when: not(notEndPlate.when), reason: 'no-weld' };

/** Least leg by the thinner of web and plate or angle: a smaller fillet is no fillet of the standard and fails. */
const legAsked = leastLeg(step('t', least(tp, tw), undefined, 'the thinner part'));
const tooSmall = below(leg, legAsked);
const legSmall: Gate = { when: tooSmall, reason: 'weld-leg-below-least' };
const legEnough: Gate = { when: not(tooSmall), reason: 'weld-by-strength' };

const along = step('L', most(minus(plateOnWeb, times(2, leg)), noLength), line, 'one leg less at each end');
const perLength = step('R_nw', over(times(0.6, FEXX, leg), root(2)), line, 'along one weld, k_ds = 1.0');
const filletForce = step('R_n', times(2, perLength, along), line, 'both sides of the web');
const webForce = step('R_n', times(0.6, Fu, tw, along), base);
const webPerLength = step('R_nb', times(0.6, Fu, tw), base, 'web behind the welds');

/**
 * Fillets along the beam's web: an end plate's on both sides under V; the C-shaped weld of each angle's leg under its share of V at the face
 * of the support, where the web behind holds all of them.
 */
export const weldWeb = ({ available }: Method): StrengthRule => {
  const byLength = { symbol: 'v', load: 'V', off: [endPlate, legSmall] } as const;
  const ways: readonly Way[] = [
    { of: 'least leg', symbol: 's', load: 'none', demand: legAsked, resistance: step('s', leg), off: [legEnough] },
    {
      of: 'along the plate',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: available(filletForce, rupture, line),
      off: [notEndPlate, legSmall],
      limits: [fullDepthPlate],
      source: line,
    },
    {
      ...byLength,
      of: 'toe and returns',
      demand: legWeldForce,
      resistance: available(perLength, rupture, line, 'R_nw'),
      limits: [edgeTooThin],
      source: line,
    },
    {
      ...byLength,
      of: 'web',
      demand: step('v', times(k, legWeldForce), base),
      resistance: available(webPerLength, rupture, base, 'R_nb'),
      source: base,
    },
  ];
  return { source: line, ways };
};

/** Rupture in shear of the web beside an end plate's welds, J4-4. */
export const endplateWebShear = ({ available }: Method): StrengthRule => ({
  source: base,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: available(webForce, rupture, base),
      limits: [fullDepthPlate],
    },
  ],
});
