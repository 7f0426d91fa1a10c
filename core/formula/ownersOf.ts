import type { Node } from './nodes.ts';

/** Owner of a node that several groups lean on. */
export const SHARED = -1;
const UNKNOWN = -2;

const mark = (owners: Int32Array, node: Node, group: number): void => {
  const before = owners[node.at]!;
  const owner = before === UNKNOWN || before === group ? group : SHARED;
  if (owner === before) return;
  owners[node.at] = owner;
  for (const one of node.of) mark(owners, one, owner);
};

/** By node: the group that alone leans on it, or `SHARED`. `shared`: what is worked out whatever the gates say; `own`: by group, what stands behind its gates. */
export const ownersOf = (count: number, shared: readonly Node[], own: readonly (readonly Node[])[]): Int32Array => {
  const owners = new Int32Array(count).fill(UNKNOWN);
  for (const node of shared) mark(owners, node, SHARED);
  own.forEach((nodes, group) => {
    for (const node of nodes) mark(owners, node, group);
  });
  return owners;
};
