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
import { at, eBot, k, n, supportBolts, tp, tw, V } from '../../end/given.ts';
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
import { least, minus, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Length, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { bearingAt, bearingOn } from './bolts.ts';
import { phiU } from './factors.ts';
import { Fu, Fup } from './given.ts';
import { Fm, Fmp } from './meanStrength.ts';

const source = { clause: '13.11', basis: 'seen' } as const;
const both = { clause: '13.11, 13.12.1.2 a', basis: 'seen' } as const;
const practice = { clause: '13.11 planes', basis: 'practice' } as const;

/** Two gross shear planes of this length in a ply, cl. 13.11 without a tension plane. N */
const planes = (t: Tree<Length>, L: Tree<Length>, Fm: Tree<Stress>) => times(0.6, phiU, Fm, 2, t, L);

/** Bolts of one column or line, torn upright out of a ply: the way to the edge, rows, bearing of one bolt. */
interface Column {
  readonly tear: UprightTear;
  readonly edge: Tree<Length>;
  readonly rows: Tree<Pure>;
  readonly bearing: Tree<Force>;
  readonly Fm: Tree<Stress>;
}

/** One column: all its bolts torn out together, or the end bolt torn out while the others bear. N */
const column = ({ tear: { t, Lgv }, edge, rows, bearing, Fm }: Column): Tree<Force> => {
  const together = step('R_torn', planes(t, Lgv, Fm), source, 'all bolts of a column torn out');
  const endBolt = step(
    'R_end',
    plus(planes(t, edge, Fm), times(minus(rows, 1), bearing)),
    both,
    'end bolt torn out, the others bearing',
  );
  return step('R_col', least(together, endBolt), both);
};

/** What each of several plies takes of a force. */
const shared = (symbol: string, force: Tree<Force>, plies?: Tree<Pure>): Pick<Way, 'symbol' | 'demand'> =>
  plies ? { symbol: `${symbol}/k`, demand: step(`${symbol}/k`, over(force, plies)) } : { symbol, demand: force };

interface Upright extends Column {
  readonly of: string;
  readonly off: readonly Gate[];
  /** Plies that share the force; one where absent. */
  readonly plies?: Tree<Pure>;
}

/**
 * All columns against V, and with several columns the one nearest the support against what it takes of V at its arm, as an even share alone
 * would not hold V z.
 */
const upright = ({ of, off, plies, ...torn }: Upright): Way[] => {
  const one = column(torn);
  const columns = plies ? times(plies, torn.tear.columns) : torn.tear.columns;
  return [
    { of, symbol: 'V', load: 'V', demand: V, resistance: step('V_r', times(columns, one), both), off },
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
const along = ({ t, edge, next }: AlongTear, Fm: Tree<Stress>): Omit<Way, 'symbol' | 'demand'> => ({
  of: 'along',
  load: 'V',
  resistance: step('R_r', pick([[oneColumn, planes(t, edge.L, Fm)]], planes(t, least(edge.L, next.L), Fm)), practice),
  off: [singleRow],
  source: practice,
});

export const webTearout: StrengthRule = {
  source: both,
  ways: [
    ...upright({ of: 'up', tear: webTearUp, edge: at, rows: n, bearing: bearingOn(tw, Fu), Fm, off: [intactFlange] }),
    { ...along(webTearAlong, Fm), ...shared('H', H) },
  ],
};

const plateColumn: Column = { tear: plateTearDown, edge: eBot, rows: n, bearing: bearingOn(tp, Fup), Fm: Fmp };
const plateAlong = along(plateTearAlong, Fmp);

export const plateTearout: StrengthRule = {
  source: both,
  ways: [...upright({ ...plateColumn, of: 'down', off: [] }), { ...plateAlong, ...shared('H', H) }],
};

const supportLine = column({
  tear: supportTearUp,
  edge: supportBolts.ev,
  rows: supportBolts.n,
  bearing: bearingAt(tp, supportBolts.d, Fup),
  Fm: Fmp,
});
const supportLegUp: Way = {
  of: 'support leg, up',
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: step('V_r', times(supportTearUp.columns, supportLine), both),
};

/**
 * Out of the legs of the cleats: of the web leg as a plate, each cleat with its share; of the support leg up and, where one cleat hangs at an
 * arm, along to its free edge.
 */
export const cleatTearout: StrengthRule = {
  source: both,
  ways: [
    ...upright({ ...plateColumn, of: 'web leg, down', off: [noWebHoles], plies: k }),
    { ...plateAlong, ...shared('H', H, k), of: 'web leg, along', off: [noWebHoles, singleRow] },
    { ...supportLegUp, off: [noSupportBolts] },
    {
      of: 'support leg, along',
      symbol: 'H_s',
      load: 'V',
      demand: supportH,
      resistance: step('R_r', planes(tp, supportTearAlong.L, Fmp), practice),
      off: [noSupportBolts, pairOfCleats, oneSupportRow],
      source: practice,
    },
  ],
};

/** Out of an end plate, upward, beside both lines of bolts. */
export const endPlateTearout: StrengthRule = {
  source: both,
  ways: [{ ...supportLegUp, of: '', limits: [fullDepthPlate] }],
};
