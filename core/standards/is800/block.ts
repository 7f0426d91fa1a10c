import { copeLimits, fullDepthPlate, intactFlange, noSupportBolts, noWebHoles } from '../../end/gates.ts';
import { flag, fu, fup, fyp, k, V } from '../../end/given.ts';
import { type Block, plateBlock as plate, supportBlock, webBlock as web } from '../../end/tearPaths.ts';
import { all, constant, least, most, not, over, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Area, Force, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { gm0, gm1 } from './factors.ts';
import { fyw, nothing, ruptureShear, yieldShear } from './given.ts';

const source = { clause: '6.4.1', basis: 'memory' } as const;

/** The two forms of cl. 6.4.1, N: gross shear with net tension, net shear with gross tension; `k` on both tension planes. */
const forms = ({ Agv, Anv, Agt, Ant }: Block, fy: Tree<Stress>, fu: Tree<Stress>, k?: Tree<Pure>): Tree<Force> => {
  const share = (area: Tree<Area>) => (k ? times(k, area) : area);
  const first = step('T_db1', plus(yieldShear(Agv, fy), over(times(0.9, share(most(Ant, nothing)), fu), gm1)), {
    clause: '6.4.1',
    basis: 'seen',
  });
  const second = step('T_db2', plus(ruptureShear(most(Anv, nothing), fu), over(times(share(Agt), fy), gm0)), source);
  return least(first, second);
};

/** Block shear, N, by the lesser form. */
export const blockShear = (block: Block, fy: Tree<Stress>, fu: Tree<Stress>): Tree<Force> =>
  step('T_db', forms(block, fy, fu), source);

/** Two or more columns inside the cope. */
export const severalColumns = flag('two columns or more inside the cope', (f) => f.mTop > 1);
export const cautious = flag('option web-block: cautious', (f) => f.options['web-block'] === 'cautious');
const half = flag(
  'two columns or more inside the cope, option web-block: cautious',
  (f) => f.mTop > 1 && f.options['web-block'] === 'cautious',
);

/**
 * Block tearing of the coped web, columns inside the cope. With two or more, half of the tension plane counts, below the clause: tests found
 * such ends over-predicted. Option `web-block: standard` takes the clause as it stands, and refers where nothing else fails before.
 */
export const webBlock: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('T_db', pick([[half, forms(web, fyw, fu, constant('k', 0.5))]], forms(web, fyw, fu)), source),
      off: [intactFlange],
      limits: copeLimits,
      whereFirst: { when: all(severalColumns, not(cautious)), reason: 'block-as-clause' },
    },
  ],
};

const ofPlate = blockShear(plate, fyp, fup);
/** Beside one line of support bolts. */
const ofLine = blockShear(supportBlock, fyp, fup);

/** Block tearing of the plate, cl. 6.4.1. */
export const plateBlock: StrengthRule = {
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: ofPlate }],
};

/** Block tearing of the cleats: all web legs as plates, all support legs beside their line of bolts. */
export const cleatBlock: StrengthRule = {
  source,
  ways: [
    {
      of: 'web leg',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('ΣT_db', times(k, ofPlate), source),
      off: [noWebHoles],
    },
    {
      of: 'support leg',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('ΣT_db', times(k, ofLine), source),
      off: [noSupportBolts],
    },
  ],
};

/** Block tearing of the end plate, beside both lines of bolts. */
export const endPlateBlock: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('ΣT_db', times(2, ofLine), source),
      limits: [fullDepthPlate],
    },
  ],
};
