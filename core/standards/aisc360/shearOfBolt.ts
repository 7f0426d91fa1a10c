import { atMost, constant, minus, over, pick, squared, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Length, Pure, Stress } from '../../units/dimension.ts';
import { inches } from './given.ts';

/** Shank area of a bolt, mm2. */
export const shank = (d: Tree<Length>): Tree<Area> => step('A_b', over(times(constant('π', Math.PI), squared(d)), 4));

/** One bolt in one plane, J3.7, N: threads as they lie, less in rows longer than 38 in. */
export const inOnePlane = (Fnv: Tree<Stress>, area: Tree<Area>, n: Tree<Pure>, p: Tree<Length>): Tree<Force> => {
  const long = step('L', times(minus(n, 1), p));
  return pick([[atMost(long, inches('38', 38)), times(Fnv, area)]], times(0.833, Fnv, area));
};
