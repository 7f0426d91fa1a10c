import { H, nearColumn } from '../../end/boltGroup.ts';
import {
  fullDepthPlate,
  type Gate,
  intactFlange,
  noSupportBolts,
  noWebHoles,
  oneColumn,
  oneSupportRow,
  pairOfCleats,
  singleColumn,
  singleRow,
} from '../../end/gates.ts';
import { fu, fup, fy, fyp, k, tp, V } from '../../end/given.ts';
import { supportH } from '../../end/supportGroup.ts';
import {
  type AlongTear,
  plateTearAlong,
  plateTearDown,
  supportTearAlong,
  supportTearUp,
  type UprightTear,
  webTearAlong,
  webTearUp,
} from '../../end/tearPaths.ts';
import { least, over, pick, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';

const source = { clause: '13.11', basis: 'memory' } as const;
const practice = { clause: '13.11 planes', basis: 'practice' } as const;

/** Two shear planes beside one bolt column, cl. 13.11 without a tension plane. */
const column = ({ t, Lgv, Lnv }: UprightTear, fy: Tree<Stress>, fu: Tree<Stress>): Tree<Force> =>
  step('R_col', least(times(0.6, phi, fy, 2, t, Lgv), times(0.6, phi, fu, 2, t, Lnv)), source);

interface Upright {
  readonly of: string;
  readonly tear: UprightTear;
  readonly fy: Tree<Stress>;
  readonly fu: Tree<Stress>;
  readonly off: readonly Gate[];
  /** Plies that share the force; one where absent. */
  readonly plies?: Tree<Pure>;
}

/** What each of several plies takes of a force. */
const shared = (symbol: string, force: Tree<Force>, plies?: Tree<Pure>): Pick<Way, 'symbol' | 'demand'> =>
  plies ? { symbol: `${symbol}/k`, demand: step(`${symbol}/k`, over(force, plies)) } : { symbol, demand: force };

/**
 * Every bolt column against V, and with several columns the one nearest the support against what it takes of V at its arm, as an even share
 * alone would not hold V z.
 */
const upright = ({ of, tear, fy, fu, off, plies }: Upright): Way[] => {
  const one = column(tear, fy, fu);
  const columns = plies ? times(plies, tear.columns) : tear.columns;
  return [
    { of, symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(columns, one), source), off },
    {
      of: `${of}, near column`,
      ...shared('V_c', nearColumn, plies),
      load: 'V',
      resistance: one,
      off: [...off, singleColumn],
    },
  ];
};

/** Two planes beside one bolt, torn along its row: the planes of cl. 13.11 applied rationally, no clause of its own. */
const planes = (t: Tree<Length>, { L, Ln }: AlongTear['edge'], fy: Tree<Stress>, fu: Tree<Stress>): Tree<Force> =>
  least(times(0.6, phi, fy, 2, t, L), times(0.6, phi, fu, 2, t, Ln));

const along = ({ t, edge, next }: AlongTear, fy: Tree<Stress>, fu: Tree<Stress>): Omit<Way, 'symbol' | 'demand'> => {
  const toEdge = step('R_edge', planes(t, edge, fy, fu), practice, 'to the edge');
  const toNext = step('R_next', planes(t, next, fy, fu), practice, 'to the next column');
  return {
    of: 'along',
    load: 'V',
    resistance: step('R_r', pick([[oneColumn, planes(t, edge, fy, fu)]], least(toEdge, toNext)), practice),
    off: [singleRow],
    source: practice,
  };
};

export const webTearout: StrengthRule = {
  source,
  ways: [
    ...upright({ of: 'up', tear: webTearUp, fy, fu, off: [intactFlange] }),
    { ...along(webTearAlong, fy, fu), ...shared('H', H) },
  ],
};

const plateAlong = along(plateTearAlong, fyp, fup);

export const plateTearout: StrengthRule = {
  source,
  ways: [
    ...upright({ of: 'down', tear: plateTearDown, fy: fyp, fu: fup, off: [] }),
    { ...plateAlong, ...shared('H', H) },
  ],
};

const supportLegUp: Way = {
  of: 'support leg, up',
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: step('V_r', times(supportTearUp.columns, column(supportTearUp, fyp, fup)), source),
};

/**
 * Out of the legs of the cleats: of the web leg as a plate, each cleat with its share; of the support leg up and, where one cleat hangs at an
 * arm, along to its free edge.
 */
export const cleatTearout: StrengthRule = {
  source,
  ways: [
    ...upright({ of: 'web leg, down', tear: plateTearDown, fy: fyp, fu: fup, off: [noWebHoles], plies: k }),
    { ...plateAlong, ...shared('H', H, k), of: 'web leg, along', off: [noWebHoles, singleRow] },
    { ...supportLegUp, off: [noSupportBolts] },
    {
      of: 'support leg, along',
      symbol: 'H_s',
      load: 'V',
      demand: supportH,
      resistance: step('R_r', planes(tp, supportTearAlong, fyp, fup), practice),
      off: [noSupportBolts, pairOfCleats, oneSupportRow],
      source: practice,
    },
  ],
};

/** Out of an end plate, upward, beside both lines of bolts. */
export const endPlateTearout: StrengthRule = {
  source,
  ways: [{ ...supportLegUp, of: '', limits: [fullDepthPlate] }],
};
