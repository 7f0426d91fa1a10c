import { N } from '../../end/boltGroup.ts';
import { boltNotListed, type Gate, intactFlange, type Limit, noTieForce, oneColumn, oneRow } from '../../end/gates.ts';
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
  m,
  n,
  p,
  q,
  T,
  tp,
  tw,
} from '../../end/given.ts';
import { type Block, platePulled, webPulled } from '../../end/tearPaths.ts';
import { least, minus, over, pick, plus, root, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { plateTieBearing, webTieBearing } from './bearing.ts';
import { shearOf } from './bolts.ts';
import { gammaM0, gammaMu } from './factors.ts';
import { holeLimits } from './limits.ts';
import { guide } from './sources.ts';

const limits: readonly Limit[] = [
  { when: oneRow, reason: 'rows-below-two', always: true },
  boltNotListed,
  ...holeLimits,
];
const noBottomCope: Gate = {
  when: flag('no column inside a bottom cope', (f) => f.mBottom === 0),
  reason: 'no-bottom-cope',
};

const way = (of: string, resistance: Tree<Force>, off: Way['off'] = []): Way => ({
  of,
  symbol: 'T',
  load: 'T',
  demand: T,
  resistance,
  off: [noTieForce, ...off],
  limits,
});

const net = (t: Tree<Length>, depth: Tree<Length>, fu: Tree<Stress>) =>
  step('T_Rd', over(times(0.9, t, minus(depth, times(n, d0)), fu), gammaMu), guide);

const torn = ({ Ant, Anv }: Pick<Block, 'Ant' | 'Anv'>, fy: Tree<Stress>, fu: Tree<Stress>) =>
  step('T_Rd', plus(over(times(fu, Ant), gammaMu), over(times(fy, Anv), times(root(3), gammaM0))), guide);

/** A block of all rows down to one cut edge: one plane along the beam, tension from the far row to that edge. mm2 */
const toEdge = (t: Tree<Length>, edge: Tree<Length>, end: Tree<Length>): { Ant: Tree<Area>; Anv: Tree<Area> } => ({
  Ant: step('A_nt', times(t, minus(plus(edge, times(minus(n, 1), p)), times(minus(n, 0.5), d0)))),
  Anv: step(
    'A_nv',
    times(t, minus(pick([[oneColumn, end]], plus(end, times(minus(m, 1), q))), times(minus(m, 0.5), d0))),
  ),
});

/** Tie force acting alone, joint guide with f_u and γ_Mu: bolts, bearing, net tension and blocks of web and plate. */
export const webTie: StrengthRule = {
  source: guide,
  ways: [
    way('bolts', step('T_Rd', times(N, shearOf(gammaMu)), guide)),
    way('bearing, web', step('T_Rd', times(N, webTieBearing), guide)),
    way('net tension, web', net(tw, least(ho, hp), fu)),
    way('block, web', torn(webPulled, fy, fu)),
    way('block to the top, web', torn(toEdge(tw, at, eEnd), fy, fu), [intactFlange]),
    way('block to the foot, web', torn(toEdge(tw, ab, eEnd), fy, fu), [noBottomCope]),
    way('bearing, plate', step('T_Rd', times(N, plateTieBearing), guide)),
    way('net tension, plate', net(tp, hp, fup)),
    way('block, plate', torn(platePulled, fyp, fup)),
    way('block to an edge, plate', torn(toEdge(tp, least(eTop, eBot), ex), fyp, fup)),
  ],
};
