import { J, N, xMax, yMax } from '../../end/boltGroup.ts';
import { oneColumn } from '../../end/gates.ts';
import { As, d, flag, fub, given, n, p, V, z } from '../../end/given.ts';
import {
  atMost,
  constant,
  minus,
  most,
  over,
  pick,
  plus,
  root,
  squared,
  step,
  type Tree,
  times,
} from '../../formula/tree.ts';
import type { Force, Pure } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { gammaM2 } from './factors.ts';
import { boltLimits } from './limits.ts';
import { guide, memory, seen } from './sources.ts';

const table34 = seen('1-8 3.6.1');
const long = memory('1-8 3.8');

const threadsIn = flag('threads in the shear plane', (f) => f.threadsIn);
const noLong = flag('option long-joint: off', (f) => f.options['long-joint'] === 'off');

/** Share of f_ub that a bolt carries in shear, threads as they lie. */
const alphaV = given('α_v', '0,0', (f) => f.fnv / f.fub);
const area = step('A', pick([[threadsIn, As]], over(times(constant('π', Math.PI), squared(d)), 4)));

/** One bolt in one plane, N, before long joints. */
export const shearOf = (gamma: Tree<Pure>): Tree<Force> => step('F_v', over(times(alphaV, fub, area), gamma), table34);

const length = step('L', times(minus(n, 1), p));
const factor = step('β_Lf', most(minus(1, over(minus(length, times(15, d)), times(200, d))), 0.75), long);
const short = shearOf(gammaM2);
const boltShearOf = step(
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

/** Force on the farthest bolt for each unit of V, upright and along the beam: elastic, V at arm z. */
export const v = step('v', pick([[oneColumn, over(1, N)]], plus(over(1, N), over(times(z, xMax), J))), guide);
export const w = step('w', over(times(z, yMax), J), guide);

/** Bolts in shear, V that uses the farthest one up. N */
export const boltGroup = step('V_Rd', over(boltShearOf, root(plus(squared(v), squared(w)))), guide);

/** Bolts in single shear, EN 1993-1-8 3.6.1 and 3.8, elastic group of the joint guide. */
export const boltShear: StrengthRule = {
  source: table34,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: boltGroup, limits: boltLimits }],
};
