import { H, nearColumn } from '../../end/boltGroup.ts';
import { type Gate, intactFlange, oneColumn, singleColumn, singleRow } from '../../end/gates.ts';
import { fu, fup, fy, fyp, V } from '../../end/given.ts';
import {
  type AlongTear,
  plateTearAlong,
  plateTearDown,
  type UprightTear,
  webTearAlong,
  webTearUp,
} from '../../end/tearPaths.ts';
import { least, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';

const source = { clause: '13.11', basis: 'memory' } as const;
const practice = { clause: '13.11 planes', basis: 'practice' } as const;

/**
 * Two shear planes beside each bolt column, cl. 13.11 without a tension plane: all columns against V, and with several columns the one
 * nearest the support against what it takes of V at its arm, as an even share alone would not hold V z.
 */
const upright = (
  of: 'up' | 'down',
  tear: UprightTear,
  fy: Tree<Stress>,
  fu: Tree<Stress>,
  off: readonly Gate[],
): Way[] => {
  const { t, columns, Lgv, Lnv } = tear;
  const one = step('R_col', least(times(0.6, phi, fy, 2, t, Lgv), times(0.6, phi, fu, 2, t, Lnv)), source);
  return [
    { of, symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(columns, one), source), off },
    {
      of: `${of}, near column`,
      symbol: 'V_c',
      load: 'V',
      demand: nearColumn,
      resistance: one,
      off: [...off, singleColumn],
    },
  ];
};

/** Two planes beside one bolt, torn along its row: the planes of cl. 13.11 applied rationally, no clause of its own. */
const along = ({ t, edge, next }: AlongTear, fy: Tree<Stress>, fu: Tree<Stress>): Tree<Force> => {
  const planes = (L: Tree<Length>, Ln: Tree<Length>) =>
    least(times(0.6, phi, fy, 2, t, L), times(0.6, phi, fu, 2, t, Ln));
  const toEdge = step('R_edge', planes(edge.L, edge.Ln), practice, 'to the edge');
  const toNext = step('R_next', planes(next.L, next.Ln), practice, 'to the next column');
  return step('R_r', pick([[oneColumn, planes(edge.L, edge.Ln)]], least(toEdge, toNext)), practice);
};

export const webTearout: StrengthRule = {
  source,
  ways: [
    ...upright('up', webTearUp, fy, fu, [intactFlange]),
    {
      of: 'along',
      symbol: 'H',
      load: 'V',
      demand: H,
      resistance: along(webTearAlong, fy, fu),
      off: [singleRow],
      source: practice,
    },
  ],
};

export const plateTearout: StrengthRule = {
  source,
  ways: [
    ...upright('down', plateTearDown, fyp, fup, []),
    {
      of: 'along',
      symbol: 'H',
      load: 'V',
      demand: H,
      resistance: along(plateTearAlong, fyp, fup),
      off: [singleRow],
      source: practice,
    },
  ],
};
