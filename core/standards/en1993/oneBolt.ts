import { wideHole, wideSupportHole } from '../../end/gates.ts';
import { As, d, d0, flag, fub, given, n, p, supportBolts } from '../../end/given.ts';
import {
  atMost,
  type Condition,
  constant,
  minus,
  most,
  over,
  pick,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Area, Force, Length, Pure, Stress } from '../../units/dimension.ts';
import { gammaM2 } from './factors.ts';
import { memory, seen } from './sources.ts';

const table34 = seen('1-8 3.6.1');
const long = memory('1-8 3.8');

/** What the formulas of one bolt, its hole and its row ask for. */
export interface Bolt {
  readonly d: Tree<Length>;
  readonly As: Tree<Area>;
  readonly fub: Tree<Stress>;
  readonly d0: Tree<Length>;
  /** Rows and their pitch. */
  readonly n: Tree<Pure>;
  readonly p: Tree<Length>;
  /** Share of f_ub that it carries in shear, threads as they lie. */
  readonly alphaV: Tree<Pure>;
  readonly threadsIn: Condition;
  /** Its hole is wider than the standard one. */
  readonly wide: Condition;
}

export const webBolt: Bolt = {
  d,
  As,
  fub,
  d0,
  n,
  p,
  alphaV: given('α_v', '0,0', (f) => f.fnv / f.fub),
  threadsIn: flag('threads in the shear plane', (f) => f.threadsIn),
  wide: wideHole.when,
};

export const supportBolt: Bolt = {
  d: supportBolts.d,
  As: supportBolts.As,
  fub: supportBolts.fub,
  d0: supportBolts.d0,
  n: supportBolts.n,
  p: supportBolts.p,
  alphaV: given('α_v,s', '0,0', (f) => f.supportBolts.fnv / f.supportBolts.fub),
  threadsIn: flag('threads in the shear plane', (f) => f.supportBolts.threadsIn),
  wide: wideSupportHole.when,
};

/** One bolt in one plane, N, before long joints. */
export const shearOf = ({ d, As, fub, alphaV, threadsIn }: Bolt, gamma: Tree<Pure>): Tree<Force> => {
  const area = step('A', pick([[threadsIn, As]], over(times(constant('π', Math.PI), squared(d)), 4)));
  return step('F_v', over(times(alphaV, fub, area), gamma), table34);
};

const noLong = flag('option long-joint: off', (f) => f.options['long-joint'] === 'off');

/** The same in a joint as long as its rows, less beyond 15 d, N: EN 1993-1-8 3.8. */
export const longShearOf = (bolt: Bolt): Tree<Force> => {
  const { d, n, p } = bolt;
  const short = shearOf(bolt, gammaM2);
  const length = step('L', times(minus(n, 1), p));
  const factor = step('β_Lf', most(minus(1, over(minus(length, times(15, d)), times(200, d))), 0.75), long);
  return step(
    'F_v,Rd',
    pick(
      [
        [noLong, short],
        [atMost(length, times(15, d)), short],
      ],
      times(factor, short),
    ),
    long,
  );
};

/** Terms of bearing of one bolt, Table 3.4: toward an edge, beside an edge, between rows, between columns. */
export const bearingTermsOf = ({ d0 }: Pick<Bolt, 'd0'>) => ({
  end: (e: Tree<Length>): Tree<Pure> => over(e, times(3, d0)),
  edge: (e: Tree<Length>): Tree<Pure> => minus(over(times(2.8, e), d0), 1.7),
  inner: (s: Tree<Length>): Tree<Pure> => minus(over(s, times(3, d0)), 0.25),
  between: (s: Tree<Length>): Tree<Pure> => minus(over(times(1.4, s), d0), 1.7),
});

/** Bearing of one bolt on a ply, N: 0.8 of it in holes wider than the standard ones. */
export const bearingOf = (
  symbol: string,
  { d, wide }: Bolt,
  { fu, t }: { readonly fu: Tree<Stress>; readonly t: Tree<Length> },
  { k1, alphaB }: { readonly k1: Tree<Pure>; readonly alphaB: Tree<Pure> },
  gamma: Tree<Pure>,
): Tree<Force> =>
  step(
    symbol,
    pick([[wide, over(times(0.8, k1, alphaB, fu, d, t), gamma)]], over(times(k1, alphaB, fu, d, t), gamma)),
    table34,
  );
