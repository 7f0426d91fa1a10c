import {
  channelCope,
  copeLimits,
  type Gate,
  noColumnInCope,
  noRectangle,
  noTee,
  noWebHoles,
  singleColumn,
  uncoped,
} from '../../end/gates.ts';
import { d, eEnd, flag, fy, g, m, q, V } from '../../end/given.ts';
import {
  all,
  atMost,
  below,
  least,
  minus,
  most,
  not,
  over,
  pick,
  plus,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force, Length, Moment } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { from } from './bound.ts';
import { gammaM0 } from './factors.ts';
import { type CutInShear, rectangleInShear, teeInShear } from './shearArea.ts';
import { guide } from './sources.ts';

/** A section in bending beside its shear: plastic shear resistance N, arm of V mm. */
interface Interaction {
  readonly M0: Tree<Moment>;
  readonly Vpl: Tree<Force>;
  readonly arm: Tree<Length>;
}

/** Bending resistance at V: whole up to half the shear resistance, nothing from all of it on. */
const resistanceAt = ({ M0, Vpl }: Interaction): Tree<Moment> =>
  step(
    'M_Rd',
    pick(
      [
        [atMost(V, times(0.5, Vpl)), M0],
        [below(V, Vpl), times(M0, minus(1, squared(minus(over(times(2, V), Vpl), 1))))],
      ],
      times(0, M0),
    ),
    guide,
  );

/** V at which V times its arm meets that resistance: the root of V e = M_0 [1 − (2 V/V_pl − 1)²]. */
const failsAt = ({ M0, Vpl, arm }: Interaction): Tree<Force> =>
  step(
    'V_f',
    pick(
      [[atMost(over(M0, arm), times(0.5, Vpl)), over(M0, arm)]],
      times(Vpl, minus(1, over(times(Vpl, arm), times(4, M0)))),
    ),
    guide,
    'root of V e = M_Rd',
  );

const limits = [channelCope, ...copeLimits];
const way = (of: string, symbol: string, at: Interaction, off: readonly Gate[]): Way => ({
  of,
  symbol,
  load: 'V',
  demand: step('M', times(V, at.arm), guide),
  resistance: resistanceAt(at),
  failsAt: failsAt(at),
  off: [uncoped, ...off],
  limits,
});

const severalColumns = flag('', (f) => f.m > 1, 'two bolt columns or more');
const lastColumn = plus(eEnd, times(minus(m, 1), q));

/**
 * One section behind a cope, at the cope's face and, with two columns, at the last of them, where block tearing counts as its shear too.
 * A face that stands less than 2 d beyond the last hole is taken as one with it: the longer arm, the lesser shear.
 */
const waysOf = (of: 'rectangle' | 'tee', { cut, V: Vpl }: CutInShear, block: Tree<Force>, none: Gate): Way[] => {
  const xN = step('x_N', minus(cut.c, lastColumn), guide, 'cope beyond the last column');
  const near = all(severalColumns, below(xN, times(from(2), d)));
  const M0 = step('M_0', over(times(fy, cut.W), gammaM0), guide);
  const beside = step('V_pl,2', pick([[noColumnInCope, Vpl]], least(Vpl, block)), guide);
  const column = plus(g, lastColumn);
  const asOne: Gate = { when: near, reason: 'last-column-at-face' };
  const apart: Gate = { when: not(near), reason: 'last-column-apart' };
  return [
    way(`${of}, last column`, 'V e', { M0, Vpl: beside, arm: column }, [noWebHoles, singleColumn, asOne, none]),
    way(of, 'V e', { M0, Vpl: beside, arm: step('e', most(cut.ec, column), guide, 'x_N < 2 d') }, [apart, none]),
    way(of, 'V e_c', { M0, Vpl, arm: cut.ec }, [asOne, none]),
  ];
};

/**
 * Bending of what remains behind each cope, elastic to the cut edge, less beyond half its shear resistance: EN 1993-1-1 6.2.8 in the form of
 * the joint guide, holes not taken off. `beside` is the web of an end that is not coped.
 */
export const copeBending = (block: Tree<Force>, beside: Way): StrengthRule => ({
  source: guide,
  ways: [
    beside,
    ...waysOf('rectangle', rectangleInShear, block, noRectangle),
    ...waysOf('tee', teeInShear, block, noTee),
  ],
});
