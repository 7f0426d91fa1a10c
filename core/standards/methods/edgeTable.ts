import { d, found } from '../../end/given.ts';
import { type Source, step, type Tree } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';

/** Least edge distances of one bolt diameter, mm. */
export type EdgeRow = readonly [diameter: number, sheared: number, cut: number];

/**
 * Least edge distances by the bolt's diameter, mm, at sheared edges and at rolled, sawn or gas-cut ones. A size not listed takes the next
 * larger row; beyond the last, the given shares of d. `diameter` is the bolt's, of those through the web where it is not told.
 */
export const edgeTable = (
  rows: readonly EdgeRow[],
  [sheared, cut]: readonly [sheared: number, cut: number],
  title: string,
  source: Source,
  diameter: Tree<Length> = d,
): { readonly sheared: Tree<Length>; readonly cut: Tree<Length> } => {
  const row = (diameter: number): EdgeRow =>
    rows.find(([size]) => diameter <= size + 1e-9) ?? [diameter, sheared * diameter, cut * diameter];
  const least = (edge: string, column: 1 | 2): Tree<Length> =>
    step(
      'e_min',
      found('1,0', `${title}, ${edge} edge`, [diameter], (_, size) => row(size!)[column]),
      source,
    );
  return { sheared: least('sheared', 1), cut: least('rolled, sawn or gas-cut', 2) };
};
