import { flag, supportBolts } from '../../end/given.ts';
import { constant, least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Length } from '../../units/dimension.ts';
import { type EdgeRow, edgeTable } from '../methods/edgeTable.ts';

/** Table 6, mm: bolt diameter, sheared edge, rolled, sawn or gas-cut edge. The rows of M20 and 3/4 in were seen, the rest is from memory. */
const rows: readonly EdgeRow[] = [
  [16, 28, 22],
  [19.05, 32, 25],
  [20, 34, 26],
  [22, 38, 28],
  [24, 42, 30],
  [27, 48, 34],
  [30, 52, 38],
  [36, 64, 46],
];

const source = { clause: 'Table 6', basis: 'memory' } as const;
const table = edgeTable(rows, [1.75, 1.25], 'Table 6', source);
const supportTable = edgeTable(rows, [1.75, 1.25], 'Table 6', source, supportBolts.d);
const cutPlates = flag('option plate-edges: cut', (f) => f.options['plate-edges'] === 'cut');
const most = { clause: '22.3.3', basis: 'seen' } as const;

/** Least edge distance of the cut web, and of a plate. */
export const cutEdge: Tree<Length> = table.cut;
export const plateEdge: Tree<Length> = pick([[cutPlates, table.cut]], table.sheared);

/** The same beside the bolts into the support; the toe of a cleat is rolled. */
export const supportCutEdge: Tree<Length> = supportTable.cut;
export const supportPlateEdge: Tree<Length> = pick([[cutPlates, supportTable.cut]], supportTable.sheared);

/** Greatest edge distance in a ply of this thickness. */
export const greatestEdge = (t: Tree<Length>): Tree<Length> =>
  step('e_max', least(times(12, t), constant('150 mm', 150, '1,0')), most);
