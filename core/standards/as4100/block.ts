import { copeLimits, intactFlange, oneColumn } from '../../end/gates.ts';
import { flag, fup, fyp, V } from '../../end/given.ts';
import { type Block, plateBlock as plate, webBlock as web } from '../../end/tearPaths.ts';
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

/** Block tearing of the plate: k_bs 1.0 for one column (the component rule of ASI Handbook 1), 0.5 for more. */
export const plateBlock: StrengthRule = {
  source,
  ways: [
    {
      of: '',
      symbol: 'V',
      load: 'V',
      demand: V,
      resistance: blockShear(plate, fyp, fup, pick([[all(oneColumn, not(plateUneven)), even]], uneven)),
    },
  ],
};
