import { H } from '../../end/boltGroup.ts';
import { intactFlange, oneColumn, singleRow } from '../../end/gates.ts';
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
import type { StrengthRule } from '../standard.ts';
import { phi } from './factors.ts';

const source = { clause: '13.11', basis: 'memory' } as const;
const practice = { clause: '13.11 planes', basis: 'practice' } as const;

/** Two shear planes beside each bolt column, cl. 13.11 without a tension plane. */
const upright = ({ t, columns, Lgv, Lnv }: UprightTear, fy: Tree<Stress>, fu: Tree<Stress>) =>
  step('V_r', times(columns, least(times(0.6, phi, fy, 2, t, Lgv), times(0.6, phi, fu, 2, t, Lnv))), source);

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
    { of: 'up', symbol: 'V', load: 'V', demand: V, resistance: upright(webTearUp, fy, fu), off: [intactFlange] },
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
    { of: 'down', symbol: 'V', load: 'V', demand: V, resistance: upright(plateTearDown, fyp, fup) },
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
