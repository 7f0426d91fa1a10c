import { copeLimits, fullDepthPlate, intactFlange, noSupportBolts, noWebHoles, oneColumn } from '../../end/gates.ts';
import { flag, fup, fyp, k, V } from '../../end/given.ts';
import { type Block, plateBlock as plate, supportBlock, webBlock as web } from '../../end/tearPaths.ts';
import { all, constant, least, not, pick, plus, step, type Tree, times } from '../../formula/tree.ts';
import type { Force, Pure, Stress } from '../../units/dimension.ts';
import type { StrengthRule } from '../standard.ts';
import { phiBs } from './factors.ts';
import { fu, fyw } from './given.ts';

const source = { clause: '9.1.9(e)', basis: 'seen' } as const;

/** Tension across the block spread evenly, or not. */
export const even = constant('k_bs', 1);
const uneven = constant('k_bs', 0.5);

const webEven = flag('option web-block: uniform', (f) => f.options['web-block'] === 'uniform');
const plateUneven = flag('option plate-block: non-uniform', (f) => f.options['plate-block'] === 'non-uniform');

/** Block shear, N, cl. 9.1.9(e): the lesser of net rupture and gross yield along the shear planes, with k_bs of the net tension plane. */
export const blockShear = (
  { Agv, Anv, Ant }: Block,
  fy: Tree<Stress>,
  fu: Tree<Stress>,
  kbs: Tree<Pure>,
): Tree<Force> =>
  step('φR_bs', times(phiBs, plus(times(0.6, least(times(fu, Anv), times(fy, Agv))), times(kbs, fu, Ant))), source);

/** Block tearing of the coped web, columns inside the cope: k_bs 0.5 with any number of columns, 1.0 by option. */
export const webBlock: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: blockShear(web, fyw, fu, pick([[webEven, even]], uneven)),
      off: [intactFlange],
      limits: copeLimits,
    },
  ],
};

const inPlate = pick([[all(oneColumn, not(plateUneven)), even]], uneven);
const ofPlate = blockShear(plate, fyp, fup, inPlate);
/** Beside one line of support bolts: one column. */
const ofLine = blockShear(supportBlock, fyp, fup, pick([[plateUneven, uneven]], even));

/** Block tearing of the plate: k_bs 1.0 for one column (the component rule of ASI Handbook 1), 0.5 for more. */
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
      resistance: step('ΣφR_bs', times(k, ofPlate), source),
      off: [noWebHoles],
    },
    {
      of: 'support leg',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: step('ΣφR_bs', times(k, ofLine), source),
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
      resistance: step('ΣφR_bs', times(2, ofLine), source),
      limits: [fullDepthPlate],
    },
  ],
};
