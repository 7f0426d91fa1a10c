import { N } from '../../end/boltGroup.ts';
import {
  boltNotListed,
  fullDepthPlate,
  type Gate,
  intactFlange,
  type Limit,
  noTieForce,
  noWebHoles,
  oneColumn,
  oneRow,
  pairOfCleats,
} from '../../end/gates.ts';
import {
  ab,
  at,
  d0,
  eBot,
  eEnd,
  eTop,
  ex,
  flag,
  fu,
  fup,
  fy,
  fyp,
  ho,
  hp,
  k,
  m,
  n,
  p,
  q,
  T,
  tp,
  tw,
} from '../../end/given.ts';
import { type Block, platePulled, webPulled } from '../../end/tearPaths.ts';
import { least, minus, not, over, pick, plus, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { plateTieBearing, webTieBearing } from './bearing.ts';
import { gammaM0, gammaMu } from './factors.ts';
import { notCleat, notEndPlate, notPlate } from './kinds.ts';
import { holeLimits, noStressArea } from './limits.ts';
import { shearOf, webBolt } from './oneBolt.ts';
import { guide, memory, seen } from './sources.ts';
import { stubWays } from './tieStub.ts';
import { fullLength, weldLimits } from './weld.ts';
import { webWeldStrength } from './weldWeb.ts';

const limits: readonly Limit[] = [
  { when: oneRow, reason: 'rows-below-two', always: true },
  boltNotListed,
  ...holeLimits,
];
const noBottomCope: Gate = {
  when: flag('no column inside a bottom cope', (f) => f.mBottom === 0),
  reason: 'no-bottom-cope',
};

const underT = (of: string, resistance: Tree<Force>, off: readonly Gate[], limits: readonly Limit[]): Way => ({
  of,
  symbol: 'T',
  load: 'T',
  demand: T,
  resistance,
  off: [noTieForce, ...off],
  limits,
});

/** A way of what the bolts through the web hold. */
const bolted = (of: string, resistance: Tree<Force>, off: readonly Gate[] = []): Way =>
  underT(of, resistance, [noWebHoles, ...off], limits);

const net = (t: Tree<Length>, depth: Tree<Length>, fu: Tree<Stress>) =>
  over(times(0.9, t, minus(depth, times(n, d0)), fu), gammaMu);

const torn = ({ Ant, Anv }: Pick<Block, 'Ant' | 'Anv'>, fy: Tree<Stress>, fu: Tree<Stress>) =>
  plus(over(times(fu, Ant), gammaMu), over(times(fy, Anv), times(root(3), gammaM0)));

/** A block of all rows down to one cut edge: one plane along the beam, tension from the far row to that edge. mm2 */
const toEdge = (t: Tree<Length>, edge: Tree<Length>, end: Tree<Length>): { Ant: Tree<Area>; Anv: Tree<Area> } => ({
  Ant: step('A_nt', times(t, minus(plus(edge, times(minus(n, 1), p)), times(minus(n, 0.5), d0)))),
  Anv: step(
    'A_nv',
    times(t, minus(pick([[oneColumn, end]], plus(end, times(minus(m, 1), q))), times(minus(m, 0.5), d0))),
  ),
});

const bolts = times(N, shearOf(webBolt, gammaMu));

/** Ways of what lies on the web with its bolts: a plate or ply, or one cleat or two. */
const beside = (part: 'plate' | 'cleat', off: Gate, all: (one: Tree<Force>) => Tree<Force>): Way[] => {
  const way = (of: string, resistance: Tree<Force>) =>
    bolted(`${of}, ${part}`, step('T_Rd', all(resistance), guide), [off]);
  return [
    way('bearing', times(N, plateTieBearing)),
    way('net tension', net(tp, hp, fup)),
    way('block', torn(platePulled, fyp, fup)),
    way('block to an edge', torn(toEdge(tp, least(eTop, eBot), ex), fyp, fup)),
  ];
};

/** One cleat alone, and a leg that is welded, are not covered. */
const covered: Gate = {
  when: flag('covered under a tie force', (f) => f.legWeb === 0 || (f.k === 2 && f.weldTo === 'none')),
  reason: 'tie-covered',
};
const notCovered: Limit = { when: not(covered.when), reason: 'tie-not-covered', always: true, noNumber: true };

const onEndPlate = (of: string, resistance: Tree<Force>, limits: readonly Limit[]): Way =>
  underT(of, resistance, [notEndPlate], [...limits, fullDepthPlate]);

/**
 * Tie force acting alone, joint guide with f_u and γ_Mu: bolts, bearing, net tension and blocks of web and plate or cleats; bending of end
 * plate or cleats on the support with their bolts. The guide has the weld of an end plate in full strength; here it is summed, with γ_M2.
 */
export const webTie: StrengthRule = {
  source: guide,
  ways: [
    { of: '', symbol: 'T', load: 'T', demand: T, off: [noTieForce, covered], limits: [notCovered] },
    {
      ...bolted('bolts', step('T_Rd', pick([[pairOfCleats.when, times(k, bolts)]], bolts), guide)),
      limits: [noStressArea, ...limits],
    },
    bolted('bearing, web', step('T_Rd', times(N, webTieBearing), guide)),
    bolted('net tension, web', step('T_Rd', net(tw, least(ho, hp), fu), guide)),
    bolted('block, web', step('T_Rd', torn(webPulled, fy, fu), guide)),
    bolted('block to the top, web', step('T_Rd', torn(toEdge(tw, at, eEnd), fy, fu), guide), [intactFlange]),
    bolted('block to the foot, web', step('T_Rd', torn(toEdge(tw, ab, eEnd), fy, fu), guide), [noBottomCope]),
    ...beside('plate', notPlate, (one) => one),
    ...beside('cleat', notCleat, (one) => times(k, one)),
    ...stubWays,
    onEndPlate('web at the plate', step('T_Rd', over(times(tw, hp, fu), gammaMu), memory(guide.clause)), []),
    onEndPlate('weld', step('T_Rd', times(2, fullLength, webWeldStrength), seen('1-8 4.5.3.3')), weldLimits),
  ],
};
