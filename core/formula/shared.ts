import type { Condition, Tree } from './tree.ts';

const met = new WeakSet<Tree>();
const shared = new WeakSet<Tree>();

/** True for a step that more than one formula leans on. */
export const isShared = (tree: Tree): boolean => shared.has(tree);

const isStep = (tree: Tree): boolean => tree.op === 'step';

/** Marks the steps that more than one formula leans on; only these are remembered within a run. */
export const markShared = (...roots: readonly (Tree | Condition)[]): void => {
  for (const one of roots) {
    if (one.op === 'flag') continue;
    const tree = one as Tree;
    if (isStep(tree)) {
      if (met.has(tree)) {
        shared.add(tree);
        continue;
      }
      met.add(tree);
    }
    if (one.op === 'pick') markShared(...one.branches.flatMap(({ when, then }) => [when, then]), one.otherwise);
    else if ('of' in one) markShared(...(one.of as readonly (Tree | Condition)[]));
  }
};
