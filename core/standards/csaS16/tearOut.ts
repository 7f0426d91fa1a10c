import { H, nearColumn } from '../../end/boltGroup.ts';
import { type Gate, intactFlange, oneColumn, singleColumn, singleRow } from '../../end/gates.ts';
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
import type { StrengthRule, Way } from '../standard.ts';
import { bearingOn } from './bolts.ts';
import { phiU } from './factors.ts';
import { Fu, Fup } from './given.ts';
import { Fm, Fmp } from './meanStrength.ts';

const source = { clause: '13.11', basis: 'seen' } as const;
const both = { clause: '13.11, 13.12.1.2 a', basis: 'seen' } as const;
const practice = { clause: '13.11 planes', basis: 'practice' } as const;

/** Two gross shear planes of this length in a ply, cl. 13.11 without a tension plane. N */
const planes = (t: Tree<Length>, L: Tree<Length>, Fm: Tree<Stress>) => times(0.6, phiU, Fm, 2, t, L);

interface Torn {
  readonly of: 'up' | 'down';
  readonly tear: UprightTear;
  readonly edge: Tree<Length>;
  readonly Fm: Tree<Stress>;
  readonly Fu: Tree<Stress>;
  readonly off: readonly Gate[];
}

/**
 * Each bolt column: all its bolts torn out together, or the end bolt torn out while the others bear. All columns stand against V, and with
 * several columns the one nearest the support against what it takes of V at its arm, as an even share alone would not hold V z.
 */
const upright = ({ of, tear: { t, columns, Lgv }, edge, Fm, Fu, off }: Torn): Way[] => {
  const together = step('R_torn', planes(t, Lgv, Fm), source, 'all bolts of a column torn out');
  const endBolt = step(
    'R_end',
    plus(planes(t, edge, Fm), times(minus(n, 1), bearingOn(t, Fu))),
    both,
    'end bolt torn out, the others bearing',
  );
  const one = step('R_col', least(together, endBolt), both);
  return [
    { of, symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(columns, one), both), off },
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
const along = ({ t, edge, next }: AlongTear, Fm: Tree<Stress>): Tree<Force> =>
  step('R_r', pick([[oneColumn, planes(t, edge.L, Fm)]], planes(t, least(edge.L, next.L), Fm)), practice);

export const webTearout: StrengthRule = {
  source: both,
  ways: [
    ...upright({ of: 'up', tear: webTearUp, edge: at, Fm, Fu, off: [intactFlange] }),
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
    ...upright({ of: 'down', tear: plateTearDown, edge: eBot, Fm: Fmp, Fu: Fup, off: [] }),
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
