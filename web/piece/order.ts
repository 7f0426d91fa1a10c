/** Fields in the order in which an end is described: cut, bolts, joint, load. */
const parts = ['top', 'bottom', 'setback', 'joint.firstRow', 'joint.bolts', 'joint.endDistance', 'joint', 'reaction'];

const rank = (path: string): number => {
  const at = parts.findIndex((part) => path === part || path.startsWith(`${part}.`));
  return at < 0 ? parts.length : at;
};

/** Sorts by trade order; within a part the order is kept. */
export const inTradeOrder = <T extends { readonly path: string }>(fields: readonly T[]): T[] =>
  [...fields].sort((a, b) => rank(a.path) - rank(b.path));
