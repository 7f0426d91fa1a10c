import type { Limit } from '../../end/gates.ts';
import { flag, fup, fus, hp, k, leg, V, Xu, z } from '../../end/given.ts';
import { plateOnWeb } from '../../end/plateOnWeb.ts';
import { supportLegArm } from '../../end/weldGroup.ts';
import {
  atMost,
  below,
  constant,
  inMPa,
  minus,
  most,
  not,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Length, Pure, Stress } from '../../units/dimension.ts';
import { legAboveEdge } from '../methods/leastLeg.ts';
import type { StrengthRule } from '../standard.ts';
import { upTo } from './bound.ts';
import { gammaM2 } from './factors.ts';
import { notCleat } from './kinds.ts';
import { leastOf } from './optional.ts';
import { guide, seen } from './sources.ts';

const source = seen('1-8 4.5.3.3');
const mm = (length: number) => constant(`${length} mm`, length, '1,0');
const beta = (value: number) => constant('β_w', value);

/** Throat of a fillet with equal legs, mm. */
export const throat = step('a', over(leg, root(2)), source);

/** Correlation factor by tensile strength, Table 4.1. */
export const betaOf = (fu: Tree<Stress>): Tree<Pure> =>
  pick(
    [
      [atMost(inMPa(fu), upTo(360)), beta(0.8)],
      [atMost(inMPa(fu), upTo(430)), beta(0.85)],
      [atMost(inMPa(fu), upTo(510)), beta(0.9)],
    ],
    beta(1),
  );

/**
 * That factor by the plate's strength. A weaker support would have a smaller one, and the larger of the two stands with the weaker strength,
 * so that it is always the plate's.
 */
export const betaW = step('β_w', betaOf(fup), source);

/** Tensile strength of the weld metal, where it is told. */
export const metal = [flag('', (f) => f.Xu > 0, 'the weld metal is told'), Xu] as const;

/** The least tensile strength of the parts joined and of the weld metal, as far as they are told, MPa. */
export const weldedFu = step(
  'f_u',
  leastOf([fup], [[flag('', (f) => f.fus > 0, 'the grade of the support is told'), fus], metal]),
  source,
);

/** Full-size length, without a throat at either end, mm. */
const fullLengthOf = (depth: Tree<Length>) => step('l', minus(depth, times(2, throat)), source);
export const fullLength = fullLengthOf(hp);
/** That of an end plate's fillets along the beam's web. */
export const fullWebLength = fullLengthOf(plateOnWeb);

/** Strength of a fillet whatever the direction of its force, simplified method, N/mm. */
export const filletStrength = (fu: Tree<Stress>, betaW: Tree<Pure>) =>
  step('f_vw,d', over(times(throat, fu), times(root(3), betaW, gammaM2)), source);

export const weldLimits: readonly Limit[] = [
  { when: atMost(fullLength, mm(0)), reason: 'weld-too-short', always: true, noNumber: true },
  { when: below(throat, mm(3)), reason: 'weld-throat-below-least', always: false },
  { when: below(fullLength, most(mm(30), times(6, throat))), reason: 'weld-too-short', always: false },
  legAboveEdge,
];

/** How a cleat welded to its support turns with the end, no rule says. */
const stiffLeg: Limit = { when: flag('always', () => true), reason: 'welded-support-leg', always: false };

const resistance = filletStrength(weldedFu, betaW);
const note = 'elastic line: shear, and bending at its ends';

/**
 * Fillets to the support, EN 1993-1-8 4.5.3.3: two along a fin plate under V and V z; one along the toe of each cleat under its share of V,
 * at the arm of that leg.
 */
export const weld: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'v',
      load: 'V',
      demand: step(
        'v',
        root(plus(squared(over(V, times(2, fullLength))), squared(over(times(3, V, z), squared(fullLength))))),
        guide,
        note,
      ),
      resistance,
      off: [{ when: not(notCleat.when), reason: 'fin-plates-only' }],
      limits: weldLimits,
    },
    {
      of: 'support leg',
      symbol: 'v',
      load: 'V',
      demand: step(
        'v',
        root(
          plus(
            squared(over(V, times(k, fullLength))),
            squared(over(times(6, V, supportLegArm), times(k, squared(fullLength)))),
          ),
        ),
        guide,
        note,
      ),
      resistance,
      off: [notCleat],
      limits: [...weldLimits, stiffLeg],
    },
  ],
};
