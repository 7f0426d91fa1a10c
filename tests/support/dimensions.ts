import type { Condition, Tree } from '../../core/formula/tree.ts';
import { powersOf } from '../../core/units/dimension.ts';

type Powers = [length: number, force: number];

const same = (a: Powers, b: Powers) => a[0] === b[0] && a[1] === b[1];

/** Works the dimension of a tree out from its leaves alone and throws where a sum, a comparison or a declared dimension is at odds with it. */
export const dimensionFromLeaves = (tree: Tree): Powers => {
  const declared = powersOf(tree.dimension);
  const worked = work(tree);
  if (!same(declared, worked)) throw new Error(`${tree.op} is declared ${declared} but works out to ${worked}`);
  return worked;
};

const alike = (trees: readonly Tree[]): Powers => {
  const [first, ...rest] = trees.map(dimensionFromLeaves) as [Powers, ...Powers[]];
  for (const one of rest) if (!same(first, one)) throw new Error(`${first} against ${one}`);
  return first;
};

const work = (tree: Tree): Powers => {
  switch (tree.op) {
    case 'literal':
      return [0, 0];
    case 'constant':
    case 'given':
      return powersOf(tree.dimension);
    case 'found':
      tree.of.map(dimensionFromLeaves);
      return powersOf(tree.dimension);
    case 'times':
      return tree.of.map(dimensionFromLeaves).reduce<Powers>(([a, b], [c, d]) => [a + c, b + d], [0, 0]);
    case 'over': {
      const [[a, b], [c, d]] = tree.of.map(dimensionFromLeaves) as [Powers, Powers];
      return [a - c, b - d];
    }
    case 'plus':
    case 'minus':
    case 'least':
    case 'most':
      return alike(tree.of);
    case 'root': {
      const [a, b] = dimensionFromLeaves(tree.of[0]);
      return [a / 2, b / 2];
    }
    case 'power': {
      const [a, b] = dimensionFromLeaves(tree.of[0]);
      if (!Number.isInteger(tree.exponent) && (a || b)) throw new Error('a broken power of a dimension');
      return [a * tree.exponent || 0, b * tree.exponent || 0];
    }
    case 'bare':
      if (!same(dimensionFromLeaves(tree.of[0]), [-2, 1])) throw new Error('only a stress is bared to MPa');
      return [0, 0];
    case 'stress':
      if (!same(dimensionFromLeaves(tree.of[0]), [0, 0])) throw new Error('only a pure number becomes MPa');
      return [-2, 1];
    case 'pick':
      for (const { when } of tree.branches) checkCondition(when);
      return alike([...tree.branches.map(({ then }) => then), tree.otherwise]);
    case 'step':
      return dimensionFromLeaves(tree.of[0]);
  }
};

/** The same for a condition: its two sides are alike. */
export const checkCondition = (condition: Condition): void => {
  switch (condition.op) {
    case 'flag':
      return;
    case 'atMost':
    case 'below':
      alike(condition.of);
      return;
    default:
      for (const one of condition.of) checkCondition(one as Condition);
  }
};
