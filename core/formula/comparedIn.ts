import type { Condition, Tree } from './tree.ts';

/** The quantities that a condition compares, in their order. */
export const comparedIn = (condition: Condition): readonly Tree[] => {
  switch (condition.op) {
    case 'flag':
      return [];
    case 'atMost':
    case 'below':
      return condition.of;
    default:
      return (condition.of as readonly Condition[]).flatMap(comparedIn);
  }
};
