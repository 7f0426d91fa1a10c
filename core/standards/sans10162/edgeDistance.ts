import { d, flag, found } from '../../end/given.ts';
import { constant, least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';

/** Rows of the least edge distances of cl. 22.3, mm: bolt diameter, sheared edge, rolled, sawn or gas-cut edge. From memory; two rows seen. */
const rows: readonly (readonly [diameter: number, sheared: number, cut: number])[] = [
  [16, 28, 22],
  [19.05, 32, 25],
  [20, 34, 26],
  [22, 38, 28],
  [24, 42, 30],
  [27, 48, 34],
  [30, 52, 38],
  [36, 64, 46],
];

/** A size not listed takes the next larger row; beyond the last, 1.75 d and 1.25 d. */
const row = (diameter: number): readonly [sheared: number, cut: number] => {
  const found = rows.find(([size]) => diameter <= size + 1e-9);
  return found ? [found[1], found[2]] : [1.75 * diameter, 1.25 * diameter];
};

const source = { clause: '22.3', basis: 'memory' } as const;

export const shearedEdge: Tree<Length> = step(
  'e_min',
  found('1,0', 'table of cl. 22.3, sheared edge', [d], (_, diameter) => row(diameter!)[0]),
  source,
);
export const cutEdge: Tree<Length> = step(
  'e_min',
  found('1,0', 'table of cl. 22.3, rolled, sawn or gas-cut edge', [d], (_, diameter) => row(diameter!)[1]),
  source,
);

const cutPlates = flag('option plate-edges: cut', (f) => f.options['plate-edges'] === 'cut');

/** Least edge distance of a plate. */
export const plateEdge: Tree<Length> = pick([[cutPlates, cutEdge]], shearedEdge);

/** Greatest edge distance in a ply of this thickness. */
export const greatestEdge = (t: Tree<Length>): Tree<Length> =>
  step('e_max', least(times(12, t), constant('150 mm', 150, '1,0')), source);
