import { H } from '../../end/boltGroup.ts';
import { intactFlange, oneColumn, singleRow } from '../../end/gates.ts';
import { at, eBot, n, V } from '../../end/given.ts';
import {
  type AlongTear,
  plateTearAlong,
  plateTearDown,
  type UprightTear,
  webTearAlong,
  webTearUp,
} from '../../end/tearPaths.ts';
import { least, minus, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { bearingOn } from './bolts.ts';
import { phiU } from './factors.ts';
import { Fu, Fup } from './given.ts';
import { Fm, Fmp } from './meanStrength.ts';

const source = { clause: '13.11', basis: 'seen' } as const;
const both = { clause: '13.11, 13.12.1.2 a', basis: 'seen' } as const;
const practice = { clause: '13.11 planes', basis: 'practice' } as const;

/** Two gross shear planes of this length in a ply, cl. 13.11 without a tension plane. N */
const planes = (t: Tree<Length>, L: Tree<Length>, Fm: Tree<Stress>) => times(0.6, phiU, Fm, 2, t, L);

/** Each bolt column: all its bolts torn out together, or the end bolt torn out while the others bear. */
const upright = ({ t, columns, Lgv }: UprightTear, edge: Tree<Length>, Fm: Tree<Stress>, Fu: Tree<Stress>) => {
  const together = step('R_torn', planes(t, Lgv, Fm), source, 'all bolts of a column torn out');
  const endBolt = step(
    'R_end',
    plus(planes(t, edge, Fm), times(minus(n, 1), bearingOn(t, Fu))),
    both,
    'end bolt torn out, the others bearing',
  );
  return step('V_r', times(columns, least(together, endBolt)), both);
};

/** Two planes beside one bolt, torn along its row: the planes of cl. 13.11 applied rationally, no clause of its own. */
const along = ({ t, edge, next }: AlongTear, Fm: Tree<Stress>): Tree<Force> =>
  step('R_r', pick([[oneColumn, planes(t, edge.L, Fm)]], planes(t, least(edge.L, next.L), Fm)), practice);

export const webTearout: StrengthRule = {
  source: both,
  ways: [
    { of: 'up', symbol: 'V', load: 'V', demand: V, resistance: upright(webTearUp, at, Fm, Fu), off: [intactFlange] },
    {
      of: 'along',
      symbol: 'H',
      load: 'V',
      demand: H,
      resistance: along(webTearAlong, Fm),
      off: [singleRow],
      source: practice,
    },
  ],
};

export const plateTearout: StrengthRule = {
  source: both,
  ways: [
    { of: 'down', symbol: 'V', load: 'V', demand: V, resistance: upright(plateTearDown, eBot, Fmp, Fup) },
    {
      of: 'along',
      symbol: 'H',
      load: 'V',
      demand: H,
      resistance: along(plateTearAlong, Fmp),
      off: [singleRow],
      source: practice,
    },
  ],
};
