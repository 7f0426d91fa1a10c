import { copeLimits, fullDepthPlate, intactFlange, noSupportBolts, noWebHoles } from '../../end/gates.ts';
import { flag, fu, fup, fy, fyp, k, V } from '../../end/given.ts';
import { type Block, plateBlock as plate, supportBlock, webBlock as web } from '../../end/tearPaths.ts';
import { constant, least, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule, Way } from '../standard.ts';
import { phi } from './factors.ts';

const source = { clause: '13.11', basis: 'memory' } as const;
const cautious = flag('option web-block: cautious', (f) => f.options['web-block'] === 'cautious');

/** Share of the tension plane that a coped web develops: 0.5; option `cautious` takes the 0.3 of later Canadian editions for two lines. */
const share = pick([[cautious, constant('k', 0.3)]], constant('k', 0.5));

/** General form: full tension plane, with gross shear yielding or net shear rupture, the lesser. */
export const generalBlock = ({ Agv, Anv, Ant }: Block, fy: Tree<Stress>, fu: Tree<Stress>) => {
  const pull = step('P_t', times(phi, Ant, fu), source);
  return step('R_r', least(plus(pull, times(0.6, phi, Agv, fy)), plus(pull, times(0.6, phi, Anv, fu))), source);
};

const copedBlock = ({ Agv, Anv, Ant }: Block) => {
  const pull = step(
    'P_t',
    times(share, phi, Ant, fu),
    source,
    'where the flange is cut away, this share of the tension plane counts',
  );
  return step('R_r', least(plus(pull, times(0.6, phi, Agv, fy)), plus(pull, times(0.6, phi, Anv, fu))), source);
};

/** Block tearing of the coped web, SANS 10162-1:2011 cl. 13.11, columns inside the cope. */
export const webBlock: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: copedBlock(web),
      off: [intactFlange],
      limits: copeLimits,
    },
  ],
};

/** Block tearing of the plate, cl. 13.11. */
export const plateBlock: StrengthRule = {
  source,
  ways: [{ of: '', symbol: 'V', load: 'V', demand: V, resistance: generalBlock(plate, fyp, fup) }],
};

const fitting = (of: string, count: Tree<Pure> | 2, block: Block): Way => ({
  of,
  symbol: 'V',
  load: 'V',
  demand: V,
  resistance: step('V_r', times(count, generalBlock(block, fyp, fup)), source),
});

/** Block tearing of each cleat, cl. 13.11: its web leg as a plate, its support leg pushed up beside the line of bolts. */
export const cleatBlock: StrengthRule = {
  source,
  ways: [
    { ...fitting('web leg', k, plate), off: [noWebHoles] },
    { ...fitting('support leg', k, supportBlock), off: [noSupportBolts] },
  ],
};

/** Block tearing of an end plate, cl. 13.11: pushed up beside each of the two lines of bolts. */
export const endPlateBlock: StrengthRule = {
  source,
  ways: [{ ...fitting('', 2, supportBlock), limits: [fullDepthPlate] }],
};
