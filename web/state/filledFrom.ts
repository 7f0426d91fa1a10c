type Tree = Readonly<Record<string, unknown>>;

const isTree = (value: unknown): value is Tree => typeof value === 'object' && value !== null;

const valueAt = (tree: Tree, path: string): unknown =>
  path.split('.').reduce<unknown>((it, key) => (isTree(it) ? it[key] : undefined), tree);

const withValue = (tree: Tree, [key = '', ...rest]: readonly string[], value: unknown): Tree => {
  if (rest.length === 0) return { ...tree, [key]: value };
  const inner = tree[key];
  return { ...tree, [key]: withValue(isTree(inner) ? inner : {}, rest, value) };
};

/** An end whose gaps, given by their paths, are filled from another end where that has a value. */
export const filledFrom = (end: Tree, other: Tree, gaps: readonly string[]): Tree =>
  gaps.reduce((it, path) => {
    const value = valueAt(other, path);
    return value === undefined ? it : withValue(it, path.split('.'), value);
  }, end);
