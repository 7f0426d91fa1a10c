import { byKind, isCleat } from '../../end/byKind.ts';
import { type Limit, noSupportBolts, noTieForce } from '../../end/gates.ts';
import { flag, fup, given, leg, supportBolts, T, tp, tw } from '../../end/given.ts';
import {
  any,
  atMost,
  constant,
  least,
  minus,
  over,
  pick,
  plus,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force } from '../../units/dimension.ts';
import type { Way } from '../standard.ts';
import { gammaMu } from './factors.ts';
import { noSupportTensileArea, supportBoltLimits } from './limits.ts';
import { guide, memory } from './sources.ts';

/** Outside diameters of washers by bolt, mm. */
const washers: Readonly<Record<number, number>> = { 12: 24, 16: 30, 20: 37, 22: 39, 24: 44, 27: 50, 30: 56, 36: 66 };
const dw = given('d_w', '1,0', (f) => washers[f.supportBolts.d] ?? 0);
const rootRadius = given('r_a', '1,0', (f) => f.rootRadius);
const noRadius = flag('no root radius given', (f) => f.rootRadius === 0);
const withCleats = byKind('', isCleat, 'cleats');

const { n, p, cc, d0, fub, As, ev, eh } = supportBolts;
const gap = minus(cc, tw);

/** From the lines of bolts to the weld of an end plate, or to the root of the cleats. mm */
const m = step(
  'm′',
  pick(
    [[withCleats, over(minus(minus(gap, times(2, tp)), times(1.6, rootRadius)), 2)]],
    over(minus(gap, times(1.6, leg)), 2),
  ),
  guide,
);
const edge = step('n′', least(eh, times(1.25, m)), guide);
/** Clear width between the welds or roots. Without a radius the thickness stands in its place. mm */
const s = pick(
  [[withCleats, step('s_c', minus(gap, times(2, pick([[noRadius, tp]], rootRadius))), guide)]],
  step('s_c', minus(gap, times(2, leg)), memory(guide.clause)),
);
const length = step(
  'Σl',
  plus(times(2, least(ev, plus(over(s, 2), over(d0, 2)))), times(minus(n, 1), least(p, plus(s, d0)))),
  guide,
  'length of the yield lines',
);
const M = step('M', over(times(0.25, length, squared(tp), fup), gammaMu), guide);
const bolts = step('F_t', over(times(2, n, 0.9, fub, As), gammaMu), guide, 'two lines');
const ew = step('e_w', over(dw, 4), guide);
const divisor = step('D', minus(times(2, m, edge), times(ew, plus(m, edge))), guide);

const none = constant('0 mm', 0, '1,0');
/** The bolts stand so near the web that no such bending is left. */
const tooNear: Limit = {
  when: any(atMost(m, none), atMost(edge, none), atMost(length, none), atMost(divisor, times(0, squared(m)))),
  reason: 'bolts-near-web',
  always: true,
  noNumber: true,
};

const way = (of: string, resistance: Tree<Force>, limits: readonly Limit[] = []): Way => ({
  of,
  symbol: 'T',
  load: 'T',
  demand: T,
  resistance: step('T_Rd', resistance, guide),
  off: [noTieForce, noSupportBolts],
  limits: [tooNear, ...limits, ...supportBoltLimits],
});

/** The three ways in which end plate or cleats, and their bolts into the support, give under the tie force, as a T-stub. */
export const stubWays: readonly Way[] = [
  way('bending beside the bolts', over(times(minus(times(8, edge), times(2, ew)), M), divisor)),
  way('bending and support bolts', over(plus(times(2, M), times(edge, bolts)), plus(m, edge)), [noSupportTensileArea]),
  way('support bolts', bolts, [noSupportTensileArea]),
];
